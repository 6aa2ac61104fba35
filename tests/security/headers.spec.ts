import { request } from 'node:http'
import { beforeAll, describe, expect, it } from 'vitest'
import { ask, base, nobody, type Caller, type Reply } from '../support/http'
import { fillRoute, isWrite, listRoutes, paramsOf } from '../support/route-inventory'
import { makeServedFirm, type ServedFirm } from '../support/served-firm'

let firm: ServedFirm
let caller: Caller
let stranger: Caller
beforeAll(async () => {
  const other = await makeServedFirm()
  firm = await makeServedFirm()
  ;[caller, stranger] = [await firm.signIn('office'), await other.signIn('office')]
})

const page = (path: string, who = nobody, headers = {}) => ask(who, `GET ${path}`, { headers: { accept: 'text/html', ...headers } })
const directives = (reply: Reply) => new Map((reply.headers.get('content-security-policy') ?? '').split(';').map(part => part.trim().split(/\s+/)).map(([name, ...values]) => [name!, values]))
const nonceOf = (reply: Reply) => /'nonce-([^']+)'/.exec(reply.headers.get('content-security-policy') ?? '')?.[1]

function expectStrict(reply: Reply) {
  const { headers } = reply
  expect(headers.get('x-content-type-options')).toBe('nosniff')
  expect(headers.get('x-powered-by')).toBeNull()
  expect(headers.get('referrer-policy')).toMatch(/^(no-referrer|same-origin|strict-origin(-when-cross-origin)?)$/)
  expect(headers.get('strict-transport-security')).toMatch(/max-age=31536000.*includeSubDomains/i)
}

describe('a page', () => {
  it.each(['/sign-in', '/check', '/forgotten', '/welcome', '/c/quote/none', '/c/pack/none', '/c/paid?session=none', '/c/nothing/here'])('%s carries a strict policy with a nonce of its own', async (path) => {
    const reply = await page(path)
    expectStrict(reply)
    const policy = directives(reply)
    const nonce = nonceOf(reply)
    expect(nonce).toMatch(/^[A-Za-z0-9+/=_-]{16,}$/)
    expect(policy.get('script-src')!.sort()).toEqual(['\'self\'', `'nonce-${nonce}'`].sort())
    for (const name of ['object-src', 'base-uri', 'frame-ancestors', 'script-src-attr']) expect([name, policy.get(name)]).toEqual([name, ['\'none\'']])
    expect(policy.get('form-action')).toEqual(['\'self\''])
    expect(policy.get('default-src')).toEqual(['\'self\''])
    const inline = [...reply.text.matchAll(/<script(?![^>]*\btype="application\/json")([^>]*)>/g)].map(([, attributes]) => attributes!)
    expect(inline.filter(attributes => !attributes.includes(`nonce="${nonce}"`))).toEqual([])
    expect(reply.text).not.toMatch(/\son(load|error|click)=/i)
  })

  it('gets another nonce each time, and never the one that a request brings', async () => {
    const brought = 'broughtbytherequest00'
    const nonces = []
    for (let count = 0; count < 10; count++) nonces.push(nonceOf(await page('/sign-in', nobody, { 'x-nonce': brought, 'content-security-policy': `script-src 'nonce-${brought}'` })))
    expect(new Set(nonces).size).toBe(10)
    expect(nonces).not.toContain(brought)
  })

  it('that sends people to sign in names no nonce that everybody knows', async () => {
    const reply = await page('/jobs')
    expect([reply.status, reply.headers.get('location')]).toEqual([302, '/sign-in?next=/jobs'])
    expectStrict(reply)
    expect(directives(reply).get('script-src')).toEqual(['\'self\''])
  })

  it('of somebody signed in is kept by no cache', async () => {
    const reply = await page('/jobs', caller)
    expect([reply.status, reply.headers.get('cache-control')]).toEqual([200, expect.stringContaining('no-store')])
  })
})

describe('an answer of the API', () => {
  const fill = (route: string) => fillRoute(route, { ...Object.fromEntries(paramsOf(route).map(param => [param, '00000000-0000-4000-8000-000000000000'])), name: 'mounting' })

  it.each(listRoutes().filter(route => route !== 'POST /api/auth/sign-out'))('%s is kept by no cache and guessed at by no browser, with and without a session', async (route) => {
    for (const who of [nobody, caller]) {
      const reply = await ask(who, fill(route))
      expectStrict(reply)
      expect(directives(reply).get('frame-ancestors')).toEqual(['\'none\''])
      // The framework's own answer to an address with nothing at it has nothing in it to keep.
      expect([who.name, reply.headers.get('cache-control')]).toEqual([who.name, reply.status === 404 ? expect.stringMatching(/no-store|no-cache/) : expect.stringContaining('no-store')])
      expect(reply.headers.get('access-control-allow-origin')).toBeNull()
      if (isWrite(route)) expect((await ask(who, fill(route), { headers: { origin: 'https://elsewhere.example' } })).headers.get('cache-control')).toContain('no-store')
    }
  })

  it.each(['/api/nothing', '/api/jobs/nothing/here', '/api/'])('%s is not there, strictly', async (path) => {
    for (const who of [nobody, caller]) {
      const reply = await ask(who, `GET ${path}`)
      expectStrict(reply)
      expect([401, 404]).toContain(reply.status)
    }
  })

  it('to another origin opens nothing', async () => {
    const reply = await ask(caller, 'GET /api/jobs', { headers: { origin: 'https://elsewhere.example' } })
    expect([...reply.headers.keys()].filter(name => name.startsWith('access-control-'))).toEqual([])
    expect(reply.headers.get('cross-origin-resource-policy')).toBe('same-origin')
  })
})

/** The path as it is written: `fetch` would tidy it first. */
function readPath(path: string, cookie: string | null, method = 'GET'): Promise<{ status: number, text: string, type: string }> {
  const { hostname, port } = new URL(base())
  return new Promise((resolve, reject) => {
    request({ hostname, port, path, method, headers: { accept: 'application/json', ...(cookie && { cookie }) } }, (answer) => {
      let text = ''
      answer.setEncoding('utf8').on('data', chunk => text += chunk).on('end', () => resolve({ status: answer.statusCode!, text, type: answer.headers['content-type'] ?? '' }))
    }).on('error', reject).end()
  })
}

describe('a path written oddly', () => {
  const odd = ['//api/jobs', '/API/jobs', '/Api/Jobs', '/api//jobs', '/api/jobs/', '/api%2fjobs', '/%61pi/jobs', '/api/./jobs', '/x/../api/jobs', '/x/..%2fapi/jobs', '/api;/jobs', '/api/jobs;x', '/api\\jobs', '/api/jobs%00', '/api/jobs/_payload.json', '/jobs/_payload.json', '/jobs/../api/jobs', '/_nuxt/../api/jobs', '/api/me/../jobs', '/api/customer/../jobs', '/api/customer/%2e%2e/jobs', '/api/customer/..%2fjobs', '/api/check/../jobs', '/api/health/../jobs', '/api/jobs?/api/health']

  it.each(odd)('%s gives nothing to somebody without a session, and a stranger only their own', async (path) => {
    const anonymous = await readPath(path, null)
    expect(anonymous.status).toBeLessThan(500)
    expect(anonymous.text).not.toContain('"lines"')
    expect(anonymous.text).not.toContain(firm.canary)
    const other = await readPath(path, stranger.cookie)
    expect(other.status).toBeLessThan(500)
    expect(other.text).not.toContain(firm.canary)
  })

  it.each(['/__nuxt_island/JobLine', '/__nuxt_island/JobLine_abc.json?props=%7B%7D', '/__nuxt_error', '/__nuxt_error?statusCode=500&message=x', '/_nitro/tasks', '/_nitro/openapi.json', '/_swagger', '/__nuxt_devtools__/client/', '/_scalar', '/.git/config', '/.env', '/.output/server/index.mjs', '/server/index.mjs', '/package.json', '/_vfs.json', '/api/_auth/session', '/api/_mdc/highlight'])('%s is not open', async (path) => {
    for (const cookie of [null, stranger.cookie]) {
      const reply = await readPath(path, cookie)
      expect([path, reply.status]).toEqual([path, expect.toSatisfy((status: number) => status >= 300 && status < 500)])
      expect(reply.text).not.toContain(firm.canary)
    }
  })

  it.each(['TRACE', 'PROPFIND', 'OPTIONS', 'HEAD'])('with the method %s gives no data', async (method) => {
    const reply = await readPath('/api/jobs', caller.cookie, method)
    expect(reply.text).not.toContain(firm.canary)
    expect(reply.status).toBeLessThan(500)
  })
})

it('serves built files without a map of the sources', async () => {
  const { text } = await page('/sign-in')
  const script = /\/_nuxt\/[\w.-]+\.js/.exec(text)![0]
  const file = await ask(nobody, `GET ${script}`)
  expect([file.status, file.headers.get('x-content-type-options'), file.text.includes('sourceMappingURL')]).toEqual([200, 'nosniff', false])
  expect((await ask(nobody, `GET ${script}.map`)).status).toBe(404)
})
