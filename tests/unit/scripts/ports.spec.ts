import { createServer, type AddressInfo } from 'node:net'
import { describe, expect, it } from 'vitest'
import { isFree, mustBeFree, nextFree, portFrom, takenSentence } from '../../../scripts/lib/ports.mjs'

async function withTakenPort(work: (port: number) => Promise<void>) {
  const server = createServer()
  await new Promise<void>(resolve => server.listen(0, '127.0.0.1', resolve))
  try {
    await work((server.address() as AddressInfo).port)
  }
  finally {
    await new Promise(resolve => server.close(resolve))
  }
}

describe('takenSentence', () => {
  it('names the port, what it is for and the variable to change', () => {
    expect(takenSentence('the web pages', 3000, 'PORT')).toEqual({
      what: 'Port 3000 for the web pages is already in use',
      mend: 'stop what uses it, or set PORT to another number, such as PORT=3010',
    })
  })
})

describe('portFrom', () => {
  it.each([[{}, 3000], [{ PORT: '' }, 3000], [{ PORT: '8080' }, 8080]])('reads %j as %i', (env, port) => {
    expect(portFrom(env, 'PORT', 3000)).toBe(port)
  })

  it.each(['0', '65536', 'eighty', '80.5', '-1'])('refuses %s', (value) => {
    expect(() => portFrom({ PORT: value }, 'PORT', 3000)).toThrow(`PORT is "${value}" — set PORT to a number from 1 to 65535`)
  })
})

describe('a port in use', () => {
  it('is not free, is passed over, and stops a run that asks for it', async () => {
    await withTakenPort(async (port) => {
      expect(await isFree(port)).toBe(false)
      expect(await nextFree(port)).toBeGreaterThan(port)
      await expect(mustBeFree('the worker\'s health', port, 'WORKER_HEALTH_PORT')).rejects.toThrow(`Port ${port} for the worker's health is already in use — `)
    })
  })
})
