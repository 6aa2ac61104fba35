import { request } from 'node:http'
import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, it } from 'vitest'
import { ask, base, type Caller } from '../support/http'
import { fillRoute, isWrite, listRoutes, paramsOf } from '../support/route-inventory'
import { countEvents } from '../support/served-database'
import { makeServedFirm, type ServedFirm } from '../support/served-firm'

const FOREIGN = 'https://elsewhere.example'
/** Proven by its signature instead of where it comes from. */
const SIGNED = 'POST /api/stripe/webhook'

let firm: ServedFirm
let caller: Caller
beforeAll(async () => {
  firm = await makeServedFirm()
  caller = await firm.signIn('principal')
})

const forgeries: [string, Record<string, string | undefined>][] = [
  ['a foreign origin', { origin: FOREIGN }],
  ['the origin "null"', { origin: 'null' }],
  ['no sign of where it comes from', { origin: undefined }],
  ['another site, by the browser\'s word', { 'origin': undefined, 'sec-fetch-site': 'cross-site' }],
  ['a neighbour of the same site', { 'origin': undefined, 'sec-fetch-site': 'same-site' }],
  ['an address typed in', { 'origin': undefined, 'sec-fetch-site': 'none' }],
  ['our origin but another site by the browser\'s word', { 'sec-fetch-site': 'cross-site' }],
  ['an origin that only begins like ours', { origin: 'ours.elsewhere.example' }],
  ['plain text', { 'content-type': 'text/plain' }],
  ['JSON said to be plain text', { 'content-type': 'text/plain; application/json' }],
  ['a form with a file', { 'content-type': 'multipart/form-data; boundary=x' }],
  ['no type', { 'content-type': '' }],
]

const writes = listRoutes().filter(route => isWrite(route) && route !== SIGNED)
const fill = (route: string) => fillRoute(route, { ...Object.fromEntries(paramsOf(route).map(param => [param, randomUUID()])), ...firm.ids, name: 'mounting', token: firm.tokens.quote })

describe('a change that does not come from our own pages', () => {
  it.each(writes)('%s is refused however it is forged', async (route) => {
    const before = await countEvents(firm.id)
    const found = []
    for (const [how, headers] of forgeries) {
      const sent = how.startsWith('an origin that only') ? { origin: `${new URL(base()).origin}.elsewhere.example` } : headers
      const reply = await ask(caller, fill(route), { headers: sent })
      found.push([how, reply.status, reply.json<{ data?: { code: string } }>().data?.code])
    }
    expect(found).toEqual(forgeries.map(([how]) => [how, 403, 'not-allowed']))
    const form = await ask(caller, fill(route), { raw: 'mutationId=1&_method=GET', headers: { 'origin': FOREIGN, 'content-type': 'application/x-www-form-urlencoded' } })
    expect(form.status).toBe(403)
    expect(await countEvents(firm.id)).toBe(before)
  })

  it('keeps signed in: a stranger\'s page cannot even sign somebody out', async () => {
    expect((await ask(caller, 'POST /api/auth/sign-out', { headers: { origin: FOREIGN } })).status).toBe(403)
    expect((await ask(caller, 'GET /api/jobs')).status).toBe(200)
  })
})

/** The path as it is written: `fetch` would tidy it first. */
function writePath(path: string, headers: Record<string, string>): Promise<{ status: number, text: string }> {
  const { hostname, port } = new URL(base())
  return new Promise((resolve, reject) => {
    const sent = request({ hostname, port, path, method: 'POST', headers: { 'content-type': 'application/json', 'cookie': caller.cookie!, ...headers } }, (answer) => {
      let text = ''
      answer.setEncoding('utf8').on('data', chunk => text += chunk).on('end', () => resolve({ status: answer.statusCode!, text }))
    })
    sent.on('error', reject).end('{}')
  })
}

describe('a path written oddly', () => {
  it.each(['//api/crews', '/API/crews', '/api//crews', '/api/stripe/webhook/../../crews', '/api/stripe/webhook%2f..%2f..%2fcrews', '/api/crews?x=/api/stripe/webhook', '/api/crews/', '/api/stripe/../crews', '/api/crews#/api/stripe/webhook'])('%s lets nothing foreign through', async (path) => {
    const before = await countEvents(firm.id)
    const { status, text } = await writePath(path, { origin: FOREIGN })
    expect([400, 403, 404, 405]).toContain(status)
    expect(text).not.toContain(firm.canary)
    expect(await countEvents(firm.id)).toBe(before)
  })

  it('with a method in the query or in a header is still a read', async () => {
    const before = await countEvents(firm.id)
    for (const headers of [{}, { 'x-http-method-override': 'POST' }, { 'x-method-override': 'DELETE' }]) {
      const reply = await ask(caller, 'GET /api/crews?_method=POST', { headers: { ...headers, origin: FOREIGN } })
      expect([404, 405]).toContain(reply.status)
    }
    expect(await countEvents(firm.id)).toBe(before)
  })
})

it('takes the payment service\'s events by their signature alone', async () => {
  for (const headers of [{}, { 'stripe-signature': 't=1,v1=00' }, { 'origin': FOREIGN, 'stripe-signature': `t=${Math.floor(Date.now() / 1000)},v1=${'0'.repeat(64)}` }]) {
    const reply = await ask(caller, SIGNED, { headers, body: { id: 'evt_1', type: 'checkout.session.completed' } })
    expect([reply.status, reply.json<{ data: { code: string } }>().data.code]).toEqual([400, 'not-genuine'])
  }
})
