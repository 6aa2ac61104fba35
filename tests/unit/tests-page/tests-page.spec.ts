import { describe, expect, it } from 'vitest'
import { judgeJob } from '#shared/job/judge/judge-job'
import { testSpec } from '#shared/job/tests.data'
import { chooseInstrument, figureReading, functionsOf, judgeWith, kitFor, nextOpen, padResolution, padUnits, rowsOfPage, seenReading, usualInstrument } from '~/utils/tests-page'
import { instruments, jobRecord, TESTER, withoutReading, WORK_DAY } from '../../support/build/job-record'

const NOON = `${WORK_DAY}T12:00:00.000Z`
const LATER = `${WORK_DAY}T16:00:00.000Z`
const around = { id: 'n-1', instrumentId: 'i-tester', context: {} }

describe('what a kept reading is sent as', () => {
  it('keeps the last place shown as its resolution', () => {
    expect(figureReading('R1R2', { kind: 'value', shown: '0.110', value: 0.11, unit: 'Ω', reason: null }, around)).toEqual({ id: 'n-1', test: 'R1R2', kind: 'value', shown: '0.110', value: 0.11, unit: 'Ω', resolution: 0.001, reason: '', context: {}, instrumentId: 'i-tester' })
  })
  it('keeps an over-range reading with its bound', () => {
    expect(figureReading('IR-live-earth', { kind: 'over-range', shown: '>999', value: 999, unit: 'MΩ', reason: null }, around)).toMatchObject({ kind: 'over-range', shown: '>999', value: 999, resolution: 1 })
  })
  it('names no instrument where nothing was measured', () => {
    expect(figureReading('RCD-dc', { kind: 'not-applicable', shown: 'N/A', value: null, unit: 's', reason: 'The device tests itself' }, around)).toMatchObject({ instrumentId: null, resolution: null, reason: 'The device tests itself' })
    expect(figureReading('Ze', { kind: 'value', shown: '0.35', value: 0.35, unit: 'Ω', reason: null }, { ...around, context: { byEnquiry: true } }).instrumentId).toBeNull()
  })
  it('says what was seen', () => {
    expect(seenReading('polarity', 'correct', { ...around, measuredBy: TESTER })).toMatchObject({ kind: 'seen', shown: 'correct', value: null, measuredBy: TESTER })
  })
})

describe('judging before keeping', () => {
  const record = withoutReading(jobRecord(), 'R1R2', 'Zs')
  const tried = (value: number) => judgeWith(record, figureReading('R1R2', { kind: 'value', shown: String(value), value, unit: 'Ω', reason: null }, around), TESTER, LATER)
  it('gives the verdict and margin of the job\'s own rules', () => {
    expect(tried(0.11).verdict).toBe('within')
    expect(tried(0.11).detail).toContain('inside')
    expect(tried(9).verdict).toBe('outside')
  })
  it('leaves the record as it was', () => {
    const before = record.readings.length
    tried(0.11)
    expect(record.readings).toHaveLength(before)
  })
})

describe('the kit', () => {
  it('shows one out of calibration, with the reason', () => {
    const old = { ...instruments()[0]!, id: 'i-old', name: 'Old tester', calibrations: [{ doneOn: '2025-01-01', goodUntil: '2026-01-01', reference: 'C-0' }] }
    const kit = kitFor([...instruments(), old], 'continuity', NOON)
    expect(kit.map(each => each.instrument.id)).toEqual(['i-tester', 'i-old'])
    expect(kit[0]!.why).toBeNull()
    expect(kit[1]!.why).toContain('out of calibration')
  })
  it('is taken for its other uses too, but never over a choice made', () => {
    const tester = instruments()[0]!
    expect(chooseInstrument({}, 'continuity', tester, ['continuity', 'insulation', 'vehicle-adapter'])).toEqual({ continuity: 'i-tester', insulation: 'i-tester' })
    expect(chooseInstrument({ insulation: 'other' }, 'continuity', tester, ['continuity', 'insulation'])).toEqual({ continuity: 'i-tester', insulation: 'other' })
  })
  it('stands chosen only where there is no doubt', () => {
    const record = { ...jobRecord(), readings: [] }
    expect(usualInstrument(record, 'loop', NOON)).toBe('i-tester')
    expect(usualInstrument({ ...record, instruments: [...record.instruments, { ...record.instruments[0]!, id: 'i-second' }] }, 'loop', NOON)).toBeUndefined()
  })
})

describe('the order of a page', () => {
  const judgement = judgeJob(withoutReading(jobRecord(), 'IR-live-earth', 'polarity'), WORK_DAY)
  const rows = rowsOfPage(judgement, 'dead')
  it('holds only what applies', () => {
    expect(rows.map(row => row.test)).toEqual(['R1R2', 'R1Rn', 'IR-live-earth', 'IR-neutral-earth', 'IR-line-neutral', 'IR-charger', 'polarity'])
    expect(functionsOf(rows)).toEqual(['continuity', 'insulation'])
  })
  it('goes on to the next required test that nobody took', () => {
    expect(nextOpen(rows, 'R1R2')?.test).toBe('IR-live-earth')
    expect(nextOpen(rows, 'IR-live-earth')?.test).toBe('polarity')
    expect(nextOpen(rows, 'polarity')).toBeNull()
  })
  it('sets the pad up in the test\'s own unit first', () => {
    expect(padUnits(testSpec('IR-live-earth'))).toEqual(['MΩ', 'kΩ'])
    expect(padResolution(testSpec('RCD-dc'))).toEqual({ s: 0.001, ms: 0.1 })
  })
})
