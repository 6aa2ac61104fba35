import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, it } from 'vitest'
import type { MutationOutcome } from '#shared/job/mutations'
import { ask, secondBase, type Asked, type Caller } from '../support/http'
import { countEvents } from '../support/served-database'
import { makeServedFirm, type ServedFirm } from '../support/served-firm'

let firm: ServedFirm
let office: Caller
let installer: Caller
let supervisor: Caller

beforeAll(async () => {
  firm = await makeServedFirm()
  ;[office, installer, supervisor] = await Promise.all([firm.signIn('office'), firm.signIn('installer'), firm.signIn('supervisor')])
})

interface Change { id: string, kind: string, jobId: string, baseVersion: number | null, at: string, payload: Record<string, unknown> }

const change = (kind: string, payload: Record<string, unknown>, rest: Partial<Change> = {}): Change => ({ id: randomUUID(), kind, jobId: firm.ids.jobId, baseVersion: null, at: '2027-03-02T11:00:00.000Z', payload, ...rest })
const survey = (fields: Record<string, unknown>, rest: Partial<Change> = {}) => change('change-survey', { key: 'survey', fields }, rest)
const post = (who: Caller, items: unknown[], rest: Asked = {}) => ask(who, 'POST /api/mutations', { body: { items }, ...rest })

async function outcomesOf(who: Caller, items: unknown[], rest: Asked = {}): Promise<MutationOutcome[]> {
  const reply = await post(who, items, rest)
  expect([reply.status, reply.text.slice(0, 200)]).toEqual([200, expect.any(String)])
  return reply.json<{ outcomes: MutationOutcome[] }>().outcomes
}

async function record(who: Caller) {
  const reply = await ask(who, `GET /api/jobs/${firm.ids.jobId}/record`)
  return reply.json<{ job: { recordVersion: number }, parts: Record<string, { key: string, version: number, content: Record<string, unknown> }[]> }>()
}

const leg = async (who: Caller, key: string) => (await record(who)).parts.leg!.find(row => row.key === key)

describe('a change over HTTP', () => {
  it('is applied, and repeated it is answered alike and applied no second time', async () => {
    const once = change('change-leg', { key: 'repeat', fields: { method: 'C', L_m: 4 } })
    const [first] = await outcomesOf(installer, [once])
    expect(first).toMatchObject({ id: once.id, status: 'applied', row: { part: 'leg', row: { key: 'repeat', version: 1 } } })
    const before = [await countEvents(firm.id), (await record(office)).job.recordVersion]
    expect(await outcomesOf(installer, [once], { base: secondBase(), headers: { origin: new URL(secondBase()).origin } })).toEqual([{ ...first, status: 'repeated' }])
    expect([await countEvents(firm.id), (await record(office)).job.recordVersion]).toEqual(before)
  })

  it('sent five times at once is applied once', async () => {
    const once = change('change-leg', { key: 'parallel', fields: { L_m: 7 } })
    const all = await Promise.all(Array.from({ length: 5 }, () => outcomesOf(installer, [once])))
    expect(all.map(([outcome]) => outcome!.status).sort()).toEqual(['applied', 'repeated', 'repeated', 'repeated', 'repeated'])
    for (const [outcome] of all) expect({ ...outcome, status: '' }).toEqual({ ...all[0]![0], status: '' })
    expect(await leg(office, 'parallel')).toMatchObject({ version: 1, content: { L_m: 7 } })
  })

  it('based on an older copy of the same field gets both versions', async () => {
    await outcomesOf(installer, [survey({ cutout_A: 60 })])
    const before = await record(office)
    expect(await outcomesOf(supervisor, [survey({ cutout_A: 80 })])).toMatchObject([{ status: 'stale', mine: { cutout_A: 80 }, theirs: { part: 'survey', row: { content: { cutout_A: 60 } } } }])
    expect(await record(office)).toMatchObject({ job: { recordVersion: before.job.recordVersion }, parts: { survey: [{ content: { cutout_A: 60 } }] } })
  })

  it('keeps the order of a batch, each with an outcome of its own', async () => {
    const items = [change('change-leg', { key: 'batch', fields: { L_m: 1 } }), change('change-leg', { key: 'batch', fields: { L_m: -5 } }), change('remove-leg', { key: 'batch' })]
    expect((await outcomesOf(installer, items)).map(outcome => [outcome.id, outcome.status])).toEqual(items.map((item, at) => [item.id, ['applied', 'refused', 'applied'][at]]))
    expect(await leg(office, 'batch')).toBeUndefined()
  })

  it.each([
    ['of a kind nobody knows', () => change('change-weather', { key: 'x', fields: {} }), 'check-answers'],
    ['of a kind that every object has', () => change('constructor', {}), 'check-answers'],
    ['of a job that is not there', () => survey({ tails_mm2: 25 }, { jobId: randomUUID() }), 'not-found'],
    ['with a field nobody knows', () => survey({ colour: 'red' }), 'check-answers'],
    ['on a job of another crew\'s', () => survey({ tails_mm2: 25 }, { jobId: firm.ids.otherJobId }), 'not-allowed'],
    ['that is for the office', () => change('change-customer', { fields: { name: 'Bob' } }), 'not-allowed'],
  ])('%s is refused in words', async (_, made, code) => {
    const [outcome] = await outcomesOf(installer, [made()])
    expect(outcome).toMatchObject({ status: 'refused', problem: { code, message: expect.stringMatching(/\.$/) } })
  })
})

describe('a batch', () => {
  it('of 101 changes is refused whole', async () => {
    const before = await countEvents(firm.id)
    const reply = await post(installer, Array.from({ length: 101 }, () => survey({ tails_mm2: 25 })))
    expect([reply.status, reply.json<{ data: { code: string } }>().data.code]).toEqual([422, 'check-answers'])
    expect(await countEvents(firm.id)).toBe(before)
  })

  it.each([
    ['nothing in it', { items: [] }, 'items'],
    ['a misspelt key', { items: [], extra: 1 }, 'form'],
    ['an id that is none', { items: [{ id: 'one', kind: 'change-survey', jobId: randomUUID(), baseVersion: null, at: '2027-03-02T11:00:00.000Z', payload: {} }] }, 'items.0.id'],
    ['no job', { items: [{ id: randomUUID(), kind: 'change-survey', baseVersion: null, at: '2027-03-02T11:00:00.000Z', payload: {} }] }, 'items.0.jobId'],
  ])('with %s is refused and says at which field', async (_, body, field) => {
    const reply = await ask(installer, 'POST /api/mutations', { body })
    expect(reply.status).toBe(422)
    expect(Object.keys(reply.json<{ data: { fields: Record<string, string> } }>().data.fields)).toContain(field)
  })

  it('that is no JSON is refused', async () => {
    const reply = await ask(installer, 'POST /api/mutations', { raw: '{"items": [' })
    expect([reply.status, reply.json<{ data: { message: string } }>().data.message]).toEqual([422, 'The request could not be read.'])
  })

  it('larger than one request may be is refused', async () => {
    const reply = await ask(installer, 'POST /api/mutations', { body: { items: [survey({ note: 'x'.repeat(300_000) })] } })
    expect(reply.status).toBe(413)
  })
})
