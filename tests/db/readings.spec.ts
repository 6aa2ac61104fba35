import { randomUUID } from 'node:crypto'
import { beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { findJobRecord } from '#server/db/queries/job-record'
import type { ReadingRow } from '#shared/types/record'
import { makeFirm, makeOwnJob, READ_AT, readingOf, send, type TestFirm } from '../support/build/firm'

let firm: TestFirm
let jobId: string

beforeAll(async () => {
  firm = await makeFirm()
})
beforeEach(async () => {
  jobId = await makeOwnJob(firm)
})

async function readings(): Promise<ReadingRow[]> {
  const record = await firm.people.office.read(tx => findJobRecord(tx, firm.id, jobId, null))
  return record!.readings
}

const add = (payload: Record<string, unknown> = {}, who: keyof TestFirm['people'] = 'installer', at = READ_AT) => send(firm.people[who], 'add-reading', jobId, readingOf(firm, payload), { at })
const refused = (code: string, fields?: string) => ({ status: 'refused', problem: { code, ...(fields && { fields: { [fields]: expect.any(String) } }) } })

describe('a reading', () => {
  it('is kept as shown, with who, when and by which instrument', async () => {
    expect(await add({ shown: '0.190', value: 0.19, resolution: 0.001, context: { ambient_C: 12 } })).toMatchObject({ status: 'applied' })
    expect(await readings()).toMatchObject([{ test: 'R1R2', shown: '0.190', value: 0.19, unit: 'Ω', resolution: 0.001, context: { ambient_C: 12 }, personId: firm.people.installer.person.id, typedBy: null, instrumentId: firm.instruments.tester }])
    expect(Date.parse((await readings())[0]!.deviceAt)).toBe(Date.parse(READ_AT))
  })

  it('followed by a second is a re-test beside it', async () => {
    await add()
    await add({ shown: '0.21', value: 0.21 })
    expect((await readings()).map(row => row.shown)).toEqual(['0.19', '0.21'])
  })

  it('of an id that is taken changes nothing', async () => {
    const id = randomUUID()
    await add({ id })
    expect(await add({ id, shown: '0.01', value: 0.01 })).toMatchObject(refused('check-answers'))
    expect((await readings()).map(row => row.shown)).toEqual(['0.19'])
  })

  it.each([
    ['no figure', { value: null }, 'value'],
    ['a figure below zero', { value: -1 }, 'value'],
    ['LIM without a reason', { kind: 'limited', shown: 'LIM', value: null, resolution: null }, 'reason'],
    ['"seen" where a figure is due', { kind: 'seen', shown: 'correct', value: null }, 'kind'],
    ['a figure where something is looked at', { test: 'polarity' }, 'kind'],
    ['neither correct nor wrong', { test: 'polarity', kind: 'seen', shown: 'fine', value: null, resolution: null, unit: '' }, 'shown'],
  ])('is refused with %s', async (_, payload, field) => {
    expect(await add(payload)).toMatchObject(refused('check-answers', field))
    expect(await readings()).toEqual([])
  })

  it('of a test that is none is refused', async () => {
    expect(await add({ test: 'Zx' })).toMatchObject(refused('check-answers'))
  })
})

describe('its instrument', () => {
  it('is named', async () => {
    expect(await add({ instrumentId: null })).toMatchObject(refused('check-answers', 'instrumentId'))
  })

  it('measures such things', async () => {
    expect(await add({ instrumentId: firm.instruments.adapter })).toMatchObject(refused('check-answers', 'instrumentId'))
  })

  it('is the firm\'s', async () => {
    expect(await add({ instrumentId: randomUUID() })).toMatchObject(refused('check-answers', 'instrumentId'))
  })

  it('is in calibration on the day of the reading', async () => {
    const { expired } = firm.instruments
    const outcome = await add({ instrumentId: expired })
    expect(outcome).toMatchObject(refused('check-answers', 'instrumentId'))
    expect(JSON.stringify(outcome)).toContain('out of calibration')
    // Good until 1 March: the last minute of that day in London still counts, the day before calibration does not.
    expect(await add({ instrumentId: expired }, 'installer', '2027-03-01T23:59:00.000Z')).toMatchObject({ status: 'applied' })
    expect(await add({ instrumentId: expired }, 'installer', '2027-03-02T00:00:00.000Z')).toMatchObject(refused('check-answers'))
    expect(await add({ instrumentId: expired }, 'installer', '2026-08-31T12:00:00.000Z')).toMatchObject(refused('check-answers'))
  })

  it('is not asked for where nothing was measured', async () => {
    expect(await add({ kind: 'limited', shown: 'LIM', value: null, resolution: null, reason: 'No access', instrumentId: null })).toMatchObject({ status: 'applied' })
    expect(await add({ test: 'Ze', context: { byEnquiry: true }, instrumentId: null })).toMatchObject({ status: 'applied' })
    expect(await add({ test: 'RCD-button', kind: 'seen', shown: 'correct', value: null, resolution: null, unit: '', instrumentId: null })).toMatchObject({ status: 'applied' })
  })
})

describe('a sheet of paper', () => {
  const measuredBy = () => ({ measuredBy: firm.people.installer.person.id })

  it('typed by the office names who measured and waits for that person\'s word', async () => {
    expect(await add(measuredBy(), 'office')).toMatchObject({ status: 'applied' })
    const [row] = await readings()
    expect(row).toMatchObject({ personId: firm.people.installer.person.id, typedBy: firm.people.office.person.id, confirmedAt: null })
    expect(await send(firm.people.supervisor, 'confirm-reading', jobId, { readingId: row!.id })).toMatchObject(refused('not-allowed'))
    expect(await send(firm.people.installer, 'confirm-reading', jobId, { readingId: row!.id })).toMatchObject({ status: 'applied' })
    expect((await readings())[0]!.confirmedAt).not.toBeNull()
    // A second word adds nothing and is no failure.
    expect(await send(firm.people.installer, 'confirm-reading', jobId, { readingId: row!.id })).toMatchObject({ status: 'applied' })
  })

  it('typed by the office without naming who measured is refused', async () => {
    expect(await add({}, 'office')).toMatchObject(refused('not-allowed', 'measuredBy'))
    expect(await add({ measuredBy: firm.people.office.person.id }, 'office')).toMatchObject(refused('not-allowed', 'measuredBy'))
  })

  it('names one of the firm\'s people', async () => {
    expect(await add({ measuredBy: randomUUID() }, 'office')).toMatchObject(refused('check-answers', 'measuredBy'))
  })

  it('is confirmed on its own job alone', async () => {
    await add(measuredBy(), 'office')
    const [row] = await readings()
    const elsewhere = await makeOwnJob(firm)
    expect(await send(firm.people.installer, 'confirm-reading', elsewhere, { readingId: row!.id })).toMatchObject(refused('not-found'))
  })
})
