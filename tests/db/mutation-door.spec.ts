import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, it } from 'vitest'
import { findJobRecord } from '#server/db/queries/job-record'
import { addJob } from '#server/services/jobs/add-job'
import { applyMutation } from '#server/services/record/apply-mutation'
import { bookVisit, moveVisit } from '#server/services/visits/book-visit'
import { MUTATION_KINDS } from '#shared/job/mutations'
import { PART_NAMES } from '#shared/job/parts'
import { STAGES, mayChangeWork } from '#shared/job/stages'
import type { JobRecord } from '#shared/types/record'
import { applierOf } from '#server/mutations/registry'
import { inFirm, makeFirm, makeJob, makeOwnJob, mutation, readingOf, send, type TestFirm } from '../support/build/firm'

let firm: TestFirm

beforeAll(async () => {
  firm = await makeFirm()
})

async function recordOf(jobId: string): Promise<JobRecord> {
  const { office } = firm.people
  const record = await office.read(tx => findJobRecord(tx, firm.id, jobId, null))
  expect(record).not.toBeNull()
  return record!
}

const surveyOf = async (jobId: string) => (await recordOf(jobId)).parts.survey[0]
const change = (fields: Record<string, unknown>) => ({ key: 'survey', fields })
const refused = (code: string, rest: Record<string, unknown> = {}) => ({ status: 'refused', problem: { code, ...rest } })

it('knows what applies each kind of change', () => {
  expect(Object.keys(MUTATION_KINDS).filter(kind => applierOf(kind) === undefined)).toEqual([])
})

describe('a change', () => {
  it('makes the row, raises the record\'s version and stands in the story', async () => {
    const jobId = await makeOwnJob(firm)
    const before = (await recordOf(jobId)).job.recordVersion
    const outcome = await send(firm.people.installer, 'change-survey', jobId, change({ cutout_A: 80, cutout_A_how: 'read' }))
    expect(outcome).toMatchObject({ status: 'applied', recordVersion: before + 1, row: { part: 'survey', row: { key: 'survey', version: 1, content: { cutout_A: 80 } } } })
    const record = await recordOf(jobId)
    expect(record.parts.survey[0]).toMatchObject({ content: { cutout_A: 80, cutout_A_how: 'read' }, stamps: { cutout_A: { v: 1, by: firm.people.installer.person.id } } })
    expect(record.story[0]).toMatchObject({ type: 'record-changed', personId: firm.people.installer.person.id, detail: { part: 'survey', key: 'survey' } })
    // Personal data stays out of the chain: names of fields, never what was entered.
    expect(JSON.stringify(record.story[0]!.detail)).not.toContain('80')
  })

  it('sent twice is applied once and answered alike', async () => {
    const jobId = await makeOwnJob(firm)
    const once = mutation('change-survey', jobId, change({ tails_mm2: 25 }))
    const first = await applyMutation(firm.people.installer, once)
    const second = await applyMutation(firm.people.installer, once)
    expect(first).toMatchObject({ status: 'applied' })
    expect(second).toEqual({ ...first, status: 'repeated' })
    expect((await surveyOf(jobId))!.version).toBe(1)
  })

  it('of the same id with other content is refused and changes nothing', async () => {
    const jobId = await makeOwnJob(firm)
    const id = randomUUID()
    await send(firm.people.installer, 'change-survey', jobId, change({ tails_mm2: 25 }), { id })
    expect(await send(firm.people.installer, 'change-survey', jobId, change({ tails_mm2: 16 }), { id })).toMatchObject(refused('check-answers'))
    expect((await surveyOf(jobId))!.content).toEqual({ tails_mm2: 25 })
  })

  it('of the same id for another job is refused', async () => {
    const [one, two] = [await makeOwnJob(firm), await makeOwnJob(firm)]
    const id = randomUUID()
    await send(firm.people.installer, 'change-survey', one, change({ tails_mm2: 25 }), { id })
    expect(await send(firm.people.installer, 'change-survey', two, change({ tails_mm2: 25 }), { id })).toMatchObject(refused('check-answers'))
    expect(await surveyOf(two)).toBeUndefined()
  })

  it('that was refused may be sent again, mended, under its id', async () => {
    const jobId = await makeOwnJob(firm)
    const id = randomUUID()
    expect(await send(firm.people.installer, 'change-survey', jobId, change({ cutout_A: 81 }), { id })).toMatchObject(refused('check-answers'))
    expect(await send(firm.people.installer, 'change-survey', jobId, change({ cutout_A: 80 }), { id })).toMatchObject({ status: 'applied' })
  })

  it('takes a value away where it is null', async () => {
    const jobId = await makeOwnJob(firm)
    await send(firm.people.installer, 'change-survey', jobId, change({ tails_mm2: 25, tails_m: 2 }))
    await send(firm.people.installer, 'change-survey', jobId, change({ tails_m: null }), { baseVersion: 1 })
    expect((await surveyOf(jobId))!.content).toEqual({ tails_mm2: 25 })
  })

  it('removes a row, and the row may come back', async () => {
    const jobId = await makeOwnJob(firm)
    const leg = { key: 'inside', fields: { method: 'C', L_m: 4 } }
    await send(firm.people.installer, 'change-leg', jobId, leg)
    expect(await send(firm.people.installer, 'remove-leg', jobId, { key: 'inside' })).toMatchObject({ status: 'applied' })
    expect((await recordOf(jobId)).parts.leg).toEqual([])
    await send(firm.people.installer, 'change-leg', jobId, { key: 'inside', fields: { L_m: 5 } })
    expect((await recordOf(jobId)).parts.leg).toMatchObject([{ key: 'inside', content: { L_m: 5 } }])
  })

  it('of customer, premises and job goes into their columns', async () => {
    const jobId = await makeJob(firm)
    const { office } = firm.people
    await send(office, 'change-customer', jobId, { fields: { name: 'Ada Tester', telephone: '07700 900999' } })
    await send(office, 'change-premises', jobId, { fields: { mpan: '13 1234-5678 907', tenure: 'tenant' } })
    await send(office, 'change-job', jobId, { fields: { sideState: 'waiting', sideNote: 'Parts' } })
    const { customer, premises, job } = await recordOf(jobId)
    expect(customer).toMatchObject({ name: 'Ada Tester', telephone: '07700 900999' })
    expect(premises).toMatchObject({ mpan: '1312345678907', tenure: 'tenant' })
    expect(job).toMatchObject({ sideState: 'waiting', sideNote: 'Parts' })
  })

  it('of every part is let in with its first field', async () => {
    const jobId = await makeOwnJob(firm)
    const values = { wanted: { rating_kW: 7.36 }, consent: { kind: 'planning' }, survey: { earthing: 'TT' }, appliance: { name: 'Oven' }, recordedDemand: { days: 365 }, leg: { L_m: 3 }, circuit: { Ib_A: 32 }, earthing: { method: 'TT' }, departure: { regulation: '1' }, equipment: { serial: 'S' }, loadLimit: { state: 'none' }, putBack: { done: 'yes' }, inspection: { outcome: 'satisfactory' }, unexpected: { sentence: 'S' }, statement: { nature: 'new' }, handover: { received_by: 'A' }, promise: { what: 'label' } }
    const keys: Record<string, string> = { wanted: 'wanted', survey: 'survey', recordedDemand: 'recorded', circuit: 'installed', earthing: 'earthing', equipment: 'charger', loadLimit: 'limit', statement: 'statement', handover: 'handover' }
    const office = new Set(['wanted', 'consent', 'promise'])
    for (const part of PART_NAMES) {
      const kind = `change-${part.replace(/[A-Z]/g, letter => `-${letter.toLowerCase()}`)}`
      const who = office.has(part) ? firm.people.office : firm.people.installer
      expect([part, await send(who, kind, jobId, { key: keys[part] ?? 'k', fields: values[part] })]).toMatchObject([part, { status: 'applied' }])
    }
    const { parts } = await recordOf(jobId)
    expect(PART_NAMES.filter(part => parts[part].length !== 1)).toEqual([])
  })
})

describe('two people at one row', () => {
  it('merge where they changed different fields', async () => {
    const jobId = await makeOwnJob(firm)
    await send(firm.people.installer, 'change-survey', jobId, change({ tails_mm2: 25 }))
    const outcome = await send(firm.people.supervisor, 'change-survey', jobId, change({ tails_m: 2 }))
    expect(outcome).toMatchObject({ status: 'applied', row: { row: { version: 2, content: { tails_mm2: 25, tails_m: 2 } } } })
  })

  it('get both versions where they changed the same field, and nothing is applied', async () => {
    const jobId = await makeOwnJob(firm)
    await send(firm.people.installer, 'change-survey', jobId, change({ cutout_A: 60 }))
    const { job } = await recordOf(jobId)
    const late = mutation('change-survey', jobId, change({ cutout_A: 80, tails_m: 3 }))
    const outcome = await applyMutation(firm.people.supervisor, late)
    expect(outcome).toMatchObject({ status: 'stale', mine: { cutout_A: 80, tails_m: 3 }, theirs: { part: 'survey', row: { version: 1, content: { cutout_A: 60 } } } })
    expect((await surveyOf(jobId))!.content).toEqual({ cutout_A: 60 })
    expect((await recordOf(jobId)).job.recordVersion).toBe(job.recordVersion)
    expect(await applyMutation(firm.people.supervisor, late)).toEqual(outcome)
  })

  it('agree where both entered the same value', async () => {
    const jobId = await makeOwnJob(firm)
    await send(firm.people.installer, 'change-survey', jobId, change({ cutout_A: 60 }))
    expect(await send(firm.people.supervisor, 'change-survey', jobId, change({ cutout_A: 60 }))).toMatchObject({ status: 'applied' })
  })

  it('may overwrite what they have seen', async () => {
    const jobId = await makeOwnJob(firm)
    await send(firm.people.installer, 'change-survey', jobId, change({ cutout_A: 60 }))
    expect(await send(firm.people.supervisor, 'change-survey', jobId, change({ cutout_A: 80 }), { baseVersion: 1 })).toMatchObject({ status: 'applied', row: { row: { content: { cutout_A: 80 } } } })
  })

  it('may not move one visit past each other', async () => {
    const jobId = await makeJob(firm)
    const { office, principal } = firm.people
    const { id } = await bookVisit(office, { mutationId: randomUUID(), jobId, kind: 'survey', day: '2027-03-02', half: 'am', crewId: firm.crewId, hours: 1, note: '' })
    expect(await moveVisit(office, id, { mutationId: randomUUID(), baseVersion: 1, day: '2027-03-03' })).toEqual({ version: 2 })
    await expect(moveVisit(principal, id, { mutationId: randomUUID(), baseVersion: 1, day: '2027-03-04' })).rejects.toMatchObject({ problem: { code: 'stale-copy' } })
    expect((await recordOf(jobId)).job.nextDay).toBe('2027-03-03')
  })
})

describe('what is not allowed', () => {
  it('is refused by role', async () => {
    const jobId = await makeOwnJob(firm)
    const { office, installer, principal } = firm.people
    expect(await send(installer, 'change-customer', jobId, { fields: { name: 'X' } })).toMatchObject(refused('not-allowed'))
    expect(await send(principal, 'change-survey', jobId, change({ cutout_A: 80 }))).toMatchObject(refused('not-allowed'))
    expect(await send(office, 'change-equipment', jobId, { key: 'charger', fields: { serial: 'S' } })).toMatchObject(refused('not-allowed'))
    expect(await send(principal, 'add-reading', jobId, readingOf(firm))).toMatchObject(refused('not-allowed'))
  })

  it('is refused to an installer on somebody else\'s job', async () => {
    const jobId = await makeOwnJob(firm)
    expect(await send(firm.people.other, 'change-survey', jobId, change({ cutout_A: 80 }))).toMatchObject(refused('not-allowed'))
    expect(await send(firm.people.other, 'add-reading', jobId, readingOf(firm))).toMatchObject(refused('not-allowed'))
    const elsewhere = await makeJob(firm)
    expect(await send(firm.people.installer, 'change-survey', elsewhere, change({ cutout_A: 80 }))).toMatchObject(refused('not-allowed'))
  })

  it('is refused after a visit was cancelled: the job is no longer the crew\'s own', async () => {
    const jobId = await makeJob(firm)
    const { id } = await bookVisit(firm.people.office, { mutationId: randomUUID(), jobId, kind: 'install', day: '2027-03-02', half: 'am', crewId: firm.crewId, hours: 4, note: '' })
    await moveVisit(firm.people.office, id, { mutationId: randomUUID(), baseVersion: 1, state: 'cancelled' })
    expect(await send(firm.people.installer, 'add-reading', jobId, readingOf(firm))).toMatchObject(refused('not-allowed'))
  })

  it('leaves nothing behind', async () => {
    const jobId = await makeOwnJob(firm)
    const before = await recordOf(jobId)
    const one = mutation('change-survey', jobId, change({ cutout_A: 80 }))
    await applyMutation(firm.people.other, one)
    expect(await recordOf(jobId)).toEqual(before)
    expect(await inFirm(firm.id, 'select 1 from mutation_record where id = $1', [one.id])).toEqual([])
  })

  it('is a measured value from the office, which only sees photographs and talks', async () => {
    const jobId = await makeJob(firm)
    const { office, supervisor } = firm.people
    expect(await send(office, 'change-survey', jobId, change({ earthing: 'TT', earthing_how: 'measured' }))).toMatchObject(refused('not-allowed', { fields: { earthing_how: expect.any(String) } }))
    expect(await send(office, 'change-survey', jobId, change({ earthing: 'TT', earthing_how: 'told' }))).toMatchObject({ status: 'applied' })
    expect(await send(supervisor, 'change-survey', jobId, change({ earthing: 'TT', earthing_how: 'measured' }), { baseVersion: 1 })).toMatchObject({ status: 'applied' })
  })

  it.each([
    ['a field that is none', { colour: 'red' }],
    ['a size that is none', { cutout_A: 81 }],
    ['text for a figure', { cutout_A: '80' }],
    ['a choice that is none', { earthing: 'TN-X' }],
    ['how a value is known where that is not asked', { tails_mm2_how: 'read' }],
  ])('is %s', async (_, fields) => {
    const jobId = await makeOwnJob(firm)
    expect(await send(firm.people.installer, 'change-survey', jobId, change(fields))).toMatchObject(refused('check-answers'))
  })

  it('is a kind, a key or a job that is not there', async () => {
    const jobId = await makeOwnJob(firm)
    const { installer } = firm.people
    expect(await send(installer, 'change-everything', jobId, {})).toMatchObject(refused('check-answers'))
    expect(await send(installer, 'constructor', jobId, {})).toMatchObject(refused('check-answers'))
    expect(await send(installer, 'change-circuit', jobId, { key: 'imagined', fields: { Ib_A: 32 } })).toMatchObject(refused('check-answers'))
    expect(await send(installer, 'change-survey', randomUUID(), change({ cutout_A: 80 }))).toMatchObject(refused('not-found'))
  })

  it('is any work once the capacities have signed, though talk with the customer goes on', async () => {
    const jobId = await makeOwnJob(firm)
    const { office, installer } = firm.people
    for (const stage of STAGES) {
      await inFirm(firm.id, 'update job set stage = $1 where id = $2', [stage, jobId])
      const expected = mayChangeWork(stage) ? { status: 'applied' } : refused('wrong-stage')
      expect([stage, await send(installer, 'change-survey', jobId, change({ position: stage }), { baseVersion: 99 })]).toMatchObject([stage, expected])
      expect([stage, await send(office, 'change-customer', jobId, { fields: { telephone: '01632 960001' } })]).toMatchObject([stage, { status: 'applied' }])
      await inFirm(firm.id, 'update job set stage = $1 where id = $2', [stage, jobId])
      const reading = await send(installer, 'add-reading', jobId, readingOf(firm))
      expect([stage, reading]).toMatchObject([stage, expected])
    }
  })

  it('is a change of a cancelled job, until the office takes it up again', async () => {
    const jobId = await makeOwnJob(firm)
    const { office, installer } = firm.people
    await send(office, 'change-job', jobId, { fields: { sideState: 'cancelled' } })
    expect(await send(installer, 'change-survey', jobId, change({ cutout_A: 80 }))).toMatchObject(refused('wrong-stage'))
    await send(office, 'change-job', jobId, { fields: { sideState: null } })
    expect(await send(installer, 'change-survey', jobId, change({ cutout_A: 80 }))).toMatchObject({ status: 'applied' })
  })
})

describe('an act that happens once', () => {
  it('answers a repeat with the same job', async () => {
    const asked = { mutationId: randomUUID(), customer: { name: 'Once', email: '', telephone: '' }, premises: { address: '1', town: '', postcode: 'UX4 1AA', country: 'England' as const, mpan: '' }, wanted: {}, note: '' }
    const [first, second] = [await addJob(firm.people.office, asked), await addJob(firm.people.office, asked)]
    expect(second).toEqual(first)
    expect(await inFirm(firm.id, 'select count(*)::int as n from customer where name = \'Once\'')).toEqual([{ n: 1 }])
    await expect(addJob(firm.people.office, { ...asked, note: 'Other' })).rejects.toMatchObject({ problem: { code: 'check-answers' } })
  })

  it('moves the job along with its visits', async () => {
    const jobId = await makeJob(firm)
    const book = (kind: 'survey' | 'install' | 'return') => bookVisit(firm.people.office, { mutationId: randomUUID(), jobId, kind, day: '2027-03-02', half: 'am', crewId: firm.crewId, hours: 1, note: '' })
    const stages: string[] = []
    for (const kind of ['survey', 'install', 'return', 'survey'] as const) {
      await book(kind)
      stages.push((await recordOf(jobId)).job.stage)
    }
    expect(stages).toEqual(['survey-booked', 'install-booked', 'install-booked', 'install-booked'])
    await send(firm.people.installer, 'add-reading', jobId, readingOf(firm))
    expect((await recordOf(jobId)).job).toMatchObject({ stage: 'on-site', withWhom: 'installer' })
  })
})
