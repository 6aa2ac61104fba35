import { randomUUID } from 'node:crypto'
import sharp from 'sharp'
import { beforeAll, describe, expect, it } from 'vitest'
import { ACCESS, lets, NO_ROW, type AccessRow } from '../support/access-table'
import { ask, nobody, type Caller, type Reply } from '../support/http'
import { fillRoute, listRoutes, paramsOf } from '../support/route-inventory'
import { makeServedFirm, ROLES, type Role, type ServedFirm } from '../support/served-firm'

type Values = Record<string, string>

let ours: ServedFirm
let theirs: ServedFirm
let callers: Record<Role, Caller>
let stranger: Caller
let photographs: { ours: string, theirs: string }

async function keepPhotograph(caller: Caller, firm: ServedFirm, shade: number): Promise<string> {
  const picture = await sharp({ create: { width: 16, height: 16, channels: 3, background: { r: shade, g: 90, b: 60 } } }).jpeg().toBuffer()
  const reply = await ask(caller, `POST /api/jobs/${firm.ids.jobId}/photographs`, { raw: picture, headers: { 'content-type': 'image/jpeg' } })
  return reply.json<{ sha256: string }>().sha256
}

beforeAll(async () => {
  ;[ours, theirs] = await Promise.all([makeServedFirm(), makeServedFirm()])
  callers = Object.fromEntries(await Promise.all(ROLES.map(async role => [role, await ours.signIn(role)]))) as Record<Role, Caller>
  stranger = await theirs.signIn('office')
  photographs = { ours: await keepPhotograph(callers.office, ours, 10), theirs: await keepPhotograph(stranger, theirs, 200) }
})

const valuesOf = (firm: ServedFirm): Values => ({ ...firm.ids, sha256: firm === ours ? photographs.ours : photographs.theirs, name: 'design-current', token: 'x'.repeat(43), page: 'cs_test_none', claim: 'cut-out' })
const nowhere = (param: string) => param === 'sha256' ? 'ab'.repeat(32) : randomUUID()

function call(caller: Caller, route: string, row: AccessRow, values: Values, body: unknown = {}): Promise<Reply> {
  const isForm = route.startsWith('POST /c/')
  return ask(caller, `${fillRoute(route, values)}${row.query ?? ''}`, isForm ? { raw: 'postcode=UX4+2AA', headers: { 'content-type': 'application/x-www-form-urlencoded' } } : { body })
}

/** What may differ between two answers: the id that was asked for, and the sender's own. */
const withoutIds = ({ status, text, headers }: Reply, ids: string[]) => ({ status, type: headers.get('content-type'), text: ids.reduce((left, id) => left.replaceAll(id, 'ID'), text) })

it('has a row for every route of the server, and none for a route that is gone', () => {
  expect(Object.keys(ACCESS).sort()).toEqual(listRoutes())
})

const closed = Object.entries(ACCESS).filter(([, row]) => row.may !== null)
const open = Object.entries(ACCESS).filter(([, row]) => row.may === null)

describe('a route of the firm\'s', () => {
  it.each(closed)('%s lets in those who may, with ids of their own firm', async (route, row) => {
    const jobs = { own: ours.ids.jobId, other: ours.ids.otherJobId }
    const found: Record<string, number> = { anonymous: (await call(nobody, route, row, valuesOf(ours))).status }
    const wanted: Record<string, number> = { anonymous: 401 }
    for (const role of row.endsSession ? [] : ROLES) {
      for (const whose of route.includes('[jobId]') ? ['own', 'other'] as const : ['own'] as const) {
        found[`${role}, ${whose}`] = (await call(callers[role], route, row, { ...valuesOf(ours), jobId: jobs[whose] })).status
        wanted[`${role}, ${whose}`] = lets(row, role, whose === 'own') ? row.answers : 403
      }
    }
    expect(found).toEqual(wanted)
  })

  const withIds = closed.flatMap(([route, row]) => paramsOf(route).filter(param => !NO_ROW.has(param)).map(param => [route, param, row] as const))

  it.each(withIds)('%s answers another firm\'s %s as one that is not there', async (route, param, row) => {
    const body = row.body?.(ours) ?? {}
    for (const role of ROLES) {
      const none = nowhere(param)
      const [foreign, missing] = [await call(callers[role], route, row, { ...valuesOf(ours), [param]: valuesOf(theirs)[param]! }, body), await call(callers[role], route, row, { ...valuesOf(ours), [param]: none }, body)]
      const isAsked = param === 'jobId' || lets(row, role, true)
      expect([role, foreign.status]).toEqual([role, isAsked ? row.missing?.[param] ?? 404 : 403])
      expect(withoutIds(foreign, [valuesOf(theirs)[param]!])).toEqual(withoutIds(missing, [none]))
      expect(foreign.text).not.toContain(theirs.canary)
    }
    const crossed = await call(stranger, route, row, valuesOf(ours), row.body?.(theirs) ?? {})
    expect([403, 404]).toContain(crossed.status)
    expect(crossed.text).not.toContain(ours.canary)
  })

  it.each(withIds)('%s answers a %s that is no id as one that is not there', async (route, param, row) => {
    const odd = await call(callers.principal, route, row, { ...valuesOf(ours), [param]: '1 or 1=1' }, row.body?.(ours) ?? {})
    const isAsked = param === 'jobId' || lets(row, 'principal', true)
    expect(odd.status).toBe(isAsked ? 404 : 403)
  })
})

describe('a route that is open', () => {
  it.each(open)('%s answers everyone alike', async (route, row) => {
    for (const caller of [nobody, callers.office, stranger]) {
      const reply = await call(caller, route, row, valuesOf(ours), row.body?.(ours) ?? {})
      expect([caller.name, reply.status]).toEqual([caller.name, caller === nobody ? row.nobody ?? row.answers : row.answers])
      expect(reply.text).not.toContain(ours.canary)
    }
  })
})

describe('a customer link', () => {
  it('opens its own subject and nothing else', async () => {
    const { quote, pack, withdrawn } = ours.tokens
    const right = await ask(nobody, `GET /api/customer/quote/${quote}`)
    expect([right.status, right.json<{ number: string }>().number]).toEqual([200, 'Q1'])
    expect((await ask(nobody, `GET /api/customer/pack/${pack}`)).json()).toMatchObject({ state: 'locked' })
    const refused = await Promise.all([`pack/${quote}`, `quote/${pack}`, `quote/${withdrawn}`, `quote/${'x'.repeat(43)}`].map(async path => withoutIds(await ask(nobody, `GET /api/customer/${path}`), [quote, pack, withdrawn, 'x'.repeat(43), 'customer/pack', 'customer/quote'])))
    expect(refused.map(reply => reply.status)).toEqual([404, 404, 404, 404])
    expect(new Set(refused.map(reply => reply.text)).size).toBe(1)
  })

  it('keeps the pack behind the postcode', async () => {
    const { pack } = ours.tokens
    expect((await ask(nobody, `GET /api/customer/pack/${pack}/pack.pdf`)).status).toBe(403)
    expect((await ask(nobody, `POST /api/customer/pack/${pack}/question`, { body: { mutationId: randomUUID(), question: 'Why?' } })).status).toBe(403)
    expect((await ask(nobody, `GET /api/customer/pack/${pack}`)).text).not.toContain(ours.canary)
  })

  it('says of a payment page only what the firm is called and what came of it', async () => {
    expect((await ask(nobody, `GET /api/customer/paid/${ours.tokens.page}`)).json()).toEqual({ state: 'waiting', firmName: `Firm ${ours.id.slice(0, 8)}` })
  })
})

describe('an id in a body', () => {
  const visit = { kind: 'return', day: '2027-04-01', half: 'am' }
  const reading = { test: 'R1R2', kind: 'value', shown: '0.19', value: 0.19, unit: 'Ω', resolution: 0.01 }
  const price = { code: 'HOUR', description: 'Hour', unit: 'hour', netPence: 5_000, vatBp: 2_000 }
  const change = (kind: string, payload: (id: string) => Record<string, unknown>) => (id: string) => ({ items: [{ id: randomUUID(), kind, jobId: ours.ids.jobId, baseVersion: null, at: '2027-03-02T11:00:00.000Z', payload: payload(id) }] })

  const bodies: [string, Role, string, () => string, (id: string) => unknown][] = [
    ['a visit\'s job', 'office', 'POST /api/visits', () => theirs.ids.jobId, jobId => ({ ...visit, jobId, crewId: ours.ids.crewId })],
    ['a visit\'s crew', 'office', 'POST /api/visits', () => theirs.ids.crewId, crewId => ({ ...visit, jobId: ours.ids.jobId, crewId })],
    ['a moved visit\'s crew', 'office', 'PATCH /api/visits/[visitId]', () => theirs.ids.crewId, crewId => ({ baseVersion: 1, crewId })],
    ['an invited person\'s crew', 'principal', 'POST /api/people', () => theirs.ids.crewId, crewId => ({ name: 'Ann', email: 'ann@test.example', roles: ['installer'], crewId })],
    ['a person\'s crew', 'principal', 'PATCH /api/people/[personId]', () => theirs.ids.crewId, crewId => ({ crewId })],
    ['a link', 'office', 'POST /api/jobs/[jobId]/quotes/withdraw-link', () => theirs.ids.linkId, linkId => ({ linkId })],
    ['a price', 'principal', 'POST /api/prices', () => theirs.ids.priceId, id => ({ ...price, id })],
    ['a change\'s job', 'office', 'POST /api/mutations', () => theirs.ids.jobId, jobId => ({ items: [{ id: randomUUID(), kind: 'change-job', jobId, baseVersion: null, at: '2027-03-02T11:00:00.000Z', payload: { fields: { note: 'x' } } }] })],
    ['a reading\'s instrument', 'installer', 'POST /api/mutations', () => theirs.ids.instrumentId, change('add-reading', instrumentId => ({ ...reading, id: randomUUID(), instrumentId }))],
    ['who measured', 'office', 'POST /api/mutations', () => theirs.people.installer, change('add-reading', measuredBy => ({ ...reading, id: randomUUID(), instrumentId: ours.ids.instrumentId, measuredBy }))],
    ['a photograph\'s file', 'installer', 'POST /api/mutations', () => photographs.theirs, change('keep-photograph', sha256 => ({ id: randomUUID(), claim: 'cutout', sha256, takenAt: '2027-03-02T11:00:00.000Z' }))],
    ['a query', 'installer', 'POST /api/mutations', () => theirs.ids.quoteId, change('answer-query', id => ({ id, answer: 'Done' }))],
  ]

  it.each(bodies)('of another firm (%s) is refused as one that is not there', async (_, role, route, foreignId, bodyFor) => {
    const send = async (id: string) => {
      const body = bodyFor(id) as Record<string, unknown>
      const sent = 'items' in body ? body : { mutationId: randomUUID(), ...body }
      const senders = JSON.stringify(sent).match(/[0-9a-f]{8}-[0-9a-f-]{27}/g) ?? []
      const reply = await ask(callers[role], fillRoute(route, valuesOf(ours)), { body: sent })
      return withoutIds(reply, [id, ...senders])
    }
    const [foreign, missing] = [await send(foreignId()), await send(foreignId().length === 64 ? nowhere('sha256') : randomUUID())]
    expect(foreign).toEqual(missing)
    expect(foreign.status === 200 ? JSON.parse(foreign.text).outcomes[0].status : String(foreign.status)).toMatch(/^(refused|404|422)$/)
  })
})
