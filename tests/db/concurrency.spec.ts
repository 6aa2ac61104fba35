import { randomUUID } from 'node:crypto'
import { beforeEach, describe, expect, it } from 'vitest'
import { findJobRecord } from '#server/db/queries/job-record'
import { changeAsFirm } from '#server/db/firm-db'
import { addJob } from '#server/services/jobs/add-job'
import { applyMutation } from '#server/services/record/apply-mutation'
import { sql } from 'drizzle-orm'
import { inFirm, makeFirm, makeJob, makeOwnJob, mutation, readingOf, send, type TestFirm } from '../support/build/firm'

let firm: TestFirm

beforeEach(async () => {
  firm = await makeFirm()
})

const times = <T>(count: number, act: (at: number) => Promise<T>) => Promise.all(Array.from({ length: count }, (_, at) => act(at)))
const takeNumber = () => changeAsFirm(firm.id, async tx => (await tx.execute<{ n: number }>(sql`select next_number('test') as n`)).rows[0]!.n)

describe('numbers', () => {
  it('given to many at once are each given once and leave no gap', async () => {
    const numbers = await times(24, takeNumber)
    expect(numbers.toSorted((x, y) => x - y)).toEqual(Array.from({ length: 24 }, (_, at) => at + 1))
  })

  it('taken by an act that fails are given to the next', async () => {
    await takeNumber()
    const failing = changeAsFirm(firm.id, async (tx) => {
      await tx.execute(sql`select next_number('test')`)
      throw new Error('changed its mind')
    })
    await expect(failing).rejects.toThrow('changed its mind')
    expect(await takeNumber()).toBe(2)
  })

  it('of jobs taken by many people at once run on', async () => {
    await times(10, () => makeJob(firm))
    const refs = await inFirm<{ ref: string }>(firm.id, 'select ref from job order by ref')
    expect(refs.map(row => row.ref)).toEqual(Array.from({ length: 10 }, (_, at) => `J${String(at + 1).padStart(4, '0')}`))
  })

  it('of events run on through writers at once, and the chain holds', async () => {
    const jobs = await times(4, () => makeOwnJob(firm))
    await times(20, at => send(firm.people.installer, 'add-reading', jobs[at % 4]!, readingOf(firm)))
    const events = await inFirm<{ number: string }>(firm.id, 'select number from audit_event order by number')
    expect(events.map(row => Number(row.number))).toEqual(Array.from({ length: 28 }, (_, at) => at + 1))
    expect(await inFirm(firm.id, 'select first_broken_event() as broken')).toEqual([{ broken: null }])
  })
})

describe('one change sent five times at once', () => {
  it('is applied once; the others get its outcome', async () => {
    const jobId = await makeOwnJob(firm)
    const one = mutation('add-reading', jobId, readingOf(firm))
    const outcomes = await times(5, () => applyMutation(firm.people.installer, one))
    expect(outcomes.map(outcome => outcome.status).sort()).toEqual(['applied', 'repeated', 'repeated', 'repeated', 'repeated'])
    expect(new Set(outcomes.map(outcome => 'recordVersion' in outcome && outcome.recordVersion)).size).toBe(1)
    expect(await inFirm(firm.id, 'select count(*)::int as n from reading where job_id = $1', [jobId])).toEqual([{ n: 1 }])
    expect(await inFirm(firm.id, 'select count(*)::int as n from audit_event where type = \'reading-added\'')).toEqual([{ n: 1 }])
  })

  it('makes one job', async () => {
    const asked = { mutationId: randomUUID(), customer: { name: 'Once', email: '', telephone: '' }, premises: { address: '1', town: '', postcode: 'UX4 1AA', country: 'England' as const, mpan: '' }, wanted: {}, note: '' }
    const made = await times(5, () => addJob(firm.people.office, asked))
    expect(new Set(made.map(job => job.id)).size).toBe(1)
    expect(await inFirm(firm.id, 'select count(*)::int as n from job')).toEqual([{ n: 1 }])
  })
})

describe('many changes of one row at once', () => {
  it('lose none where each is another field', async () => {
    const jobId = await makeOwnJob(firm)
    const fields = { tails_mm2: 25, tails_m: 2, cutout_A: 80, looped: 'no', asbestos: 'no', unmetered: 'no', supply_phases: '1', nominal_V: 230 }
    const outcomes = await Promise.all(Object.entries(fields).map(([field, value], at) =>
      send(at % 2 ? firm.people.installer : firm.people.supervisor, 'change-survey', jobId, { key: 'survey', fields: { [field]: value } })))
    expect(outcomes.map(outcome => outcome.status)).toEqual(Object.keys(fields).map(() => 'applied'))
    const record = await firm.people.office.read(tx => findJobRecord(tx, firm.id, jobId, null))
    expect(record!.parts.survey[0]).toMatchObject({ content: fields, version: 8 })
  })

  it('let one of two win a field and tell the other', async () => {
    const jobId = await makeOwnJob(firm)
    const outcomes = await Promise.all([
      send(firm.people.installer, 'change-survey', jobId, { key: 'survey', fields: { cutout_A: 60 } }),
      send(firm.people.supervisor, 'change-survey', jobId, { key: 'survey', fields: { cutout_A: 80 } }),
    ])
    expect(outcomes.map(outcome => outcome.status).sort()).toEqual(['applied', 'stale'])
  })
})
