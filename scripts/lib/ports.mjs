import { createServer } from 'node:net'
import { Mendable } from './say.mjs'

/** True when nothing listens on this port of this address. */
export function isFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () => resolve(false))
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

/** The first free port from `from` upwards. */
export async function nextFree(from, host = '127.0.0.1') {
  for (let port = from; port < from + 200 && port < 65_536; port++) if (await isFree(port, host)) return port
  throw new Mendable(`No free port between ${from} and ${from + 199}`, 'stop something that listens there')
}

/** The sentence for a port in use; it names the variable to change. */
export function takenSentence(what, port, variable) {
  return {
    what: `Port ${port} for ${what} is already in use`,
    mend: `stop what uses it, or set ${variable} to another number, such as ${variable}=${port + 10}`,
  }
}

/** A whole number from 1 to 65535, or a clear sentence. */
export function portFrom(env, variable, standard) {
  const text = env[variable]
  if (text === undefined || text === '') return standard
  const port = Number(text)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new Mendable(`${variable} is "${text}"`, `set ${variable} to a number from 1 to 65535`)
  return port
}

/** Refuses to go on when the port is taken. */
export async function mustBeFree(what, port, variable, host = '127.0.0.1') {
  if (await isFree(port, host)) return
  const { what: failed, mend } = takenSentence(what, port, variable)
  throw new Mendable(failed, mend)
}
