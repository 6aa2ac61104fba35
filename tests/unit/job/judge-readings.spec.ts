import { describe, expect, it } from 'vitest'
import { judgeJob } from '#shared/job/judge/judge-job'
import type { TestKey } from '#shared/job/tests.data'
import type { JobRecord, ReadingRow } from '#shared/types/record'
import { instruments, jobRecord, reading, threePhaseJob, ttJob, withFields, withoutReading, withReading, WORK_DAY } from '../../support/build/job-record'

const judged = (record: JobRecord, test: TestKey) => judgeJob(record, WORK_DAY).readings[test]
/** The sound job with this one reading in place of the sound one. */
const only = (test: TestKey, shown: string, rest: Partial<ReadingRow> = {}, record = jobRecord()): JobRecord =>
  ({ ...record, readings: [...withoutReading(record, test).readings, reading(test, shown, rest)] })

describe('limits', () => {
  it.each<[TestKey, string, string]>([
    // 80 % of 0.95 × 230 ÷ 200 is 0.874 Ω; that much is odd beside Ze 0.21 Ω and R1+R2 0.11 Ω.
    ['Zs', '0.50', 'within'], ['Zs', '0.874', 'unexpected'], ['Zs', '0.875', 'outside'],
    // What Zs leaves beside Ze 0.21 Ω is 0.664 Ω; that much R1+R2 is odd on 18 m.
    ['R1R2', '0.664', 'unexpected'], ['R1R2', '0.665', 'outside'],
    ['IR-live-earth', '1.00', 'within'], ['IR-live-earth', '0.99', 'outside'],
    ['RCD-time', '299', 'within'], ['RCD-time', '300', 'within'], ['RCD-time', '301', 'outside'],
    ['RCD-dc', '10.0', 'within'], ['RCD-dc', '10.1', 'outside'],
    // The board's conditional rating of 16 kA covers a 6 kA device.
    ['Ipf', '16.00', 'within'], ['Ipf', '16.01', 'outside'],
    ['polarity', 'correct', 'within'], ['polarity', 'wrong', 'outside'],
  ])('%s at %s is %s', (test, shown, verdict) => {
    expect(judged(only(test, shown), test).verdict).toBe(verdict)
  })

  it('never rounds a reading into its limit', () => {
    const outside = judged(only('Zs', '0.8741'), 'Zs')
    expect(outside.verdict).toBe('outside')
    expect(outside.limit!.text).toBe('≤ 0.87\u2009Ω')
    expect(outside.words).toBe('Outside limit · by 0.0001\u2009Ω')
  })

  it('says how far inside, for eye and ear', () => {
    expect(judged(jobRecord(), 'Zs')).toMatchObject({ words: 'Within limit · 0.54\u2009Ω inside', speech: 'within limit, 0.54 ohms inside', shown: '0.33\u2009Ω' })
  })

  it('has an expected value before anybody measures', () => {
    const empty = { ...jobRecord(), readings: [] }
    expect(judged(empty, 'R1R2').expected!.value).toBeCloseTo(2 * 3.08 * 18 / 1000, 6)
    expect(judged(empty, 'Zs').expected!.value).toBeCloseTo(0.35 + 2 * 3.08 * 18 / 1000, 6)
    expect(judged(empty, 'Zs')).toMatchObject({ verdict: 'not-entered', stops: true, words: 'Not entered' })
  })

  it('judges a value over the range of the tester by its bound', () => {
    expect(judged(only('RCD-time', '>300'), 'RCD-time').verdict).toBe('outside')
    expect(judged(only('IR-live-earth', '>999'), 'IR-live-earth').verdict).toBe('within')
    expect(judged(only('Zs', '>0.5'), 'Zs').verdict).toBe('waiting')
    expect(judged(only('Zs', 'OL', { kind: 'over-range', value: null }), 'Zs').verdict).toBe('outside')
  })

  it('reads another unit of the same kind', () => {
    expect(judged(only('Ipf', '1100', { unit: 'A', value: 1100 }), 'Ipf').verdict).toBe('within')
    expect(judged(only('IR-live-earth', '500', { unit: 'Ω', value: 500 }), 'IR-live-earth').verdict).toBe('outside')
  })

  it('refuses a cable tested below 500 V', () => {
    expect(judged(only('IR-live-earth', '412', { context: { testVoltage_V: 250 } }), 'IR-live-earth')).toMatchObject({ verdict: 'outside', detail: expect.stringContaining('500 V') as string })
  })

  it('refuses a device of type AC however fast it is', () => {
    const record = withFields(jobRecord(), 'circuit', 'designed', { rcd_type: 'AC' })
    expect(judged(record, 'RCD-time')).toMatchObject({ verdict: 'outside', detail: expect.stringContaining('EAR-16') as string })
  })

  it('waits for the device where its limit depends on it', () => {
    let record = withFields(jobRecord(), 'circuit', 'designed', { In_A: null })
    record = withFields(record, 'circuit', 'installed', { In_A: null })
    expect(judged(record, 'Zs')).toMatchObject({ verdict: 'waiting', stops: true, words: 'Cannot tell yet · needs the device\'s rating' })
  })
})

describe('assessment by temperature', () => {
  const at = (shown: string, ambient_C?: number) => judged(only('Zs', shown, { context: ambient_C === undefined ? {} : { ambient_C } }, only('R1R2', '0.60')), 'Zs')

  it('lifts a reading over 80 % only with R1+R2 and the temperature', () => {
    expect(at('0.90').verdict).toBe('outside')
    const assessed = at('0.90', 20)
    expect(assessed.corrected!.value).toBeCloseTo(0.9 + 0.6 * 0.2, 9)
    expect(assessed.verdict).not.toBe('outside')
  })

  it('does not lift what is outside when hot', () => {
    expect(at('1.00', 20).verdict).toBe('outside')
  })
})

describe('what does not fit', () => {
  it('calls a reading within its limit but off the cable Unexpected', () => {
    const odd = judged(only('R1R2', '0.23'), 'R1R2')
    expect(odd).toMatchObject({ verdict: 'unexpected', stops: true, words: 'Unexpected · 2.1 × design' })
    expect(odd.odd[0]).toContain('37 m')
  })

  it('stands once a sentence says why', () => {
    const explained = withFields(only('R1R2', '0.23'), 'unexpected', 'R1R2', { sentence: 'The route goes round the extension.' })
    expect(judged(explained, 'R1R2')).toMatchObject({ verdict: 'unexpected', stops: false, sentence: 'The route goes round the extension.' })
  })

  it('never lets a sentence lift an outside figure', () => {
    const explained = withFields(only('Zs', '0.95'), 'unexpected', 'Zs', { sentence: 'It is always like that.' })
    expect(judged(explained, 'Zs')).toMatchObject({ verdict: 'outside', stops: true })
  })

  it('finds a loop below the sum of its parts', () => {
    expect(judged(only('Zs', '0.15'), 'Zs').verdict).toBe('unexpected')
  })

  it.each([['0.35', 'within'], ['0.36', 'unexpected']])('holds Ze %s against what is usually declared: %s', (shown, verdict) => {
    expect(judged(only('Ze', shown), 'Ze').verdict).toBe(verdict)
  })
})

describe('LIM and N/A', () => {
  const limited = (test: TestKey) => judged(only(test, 'LIM', { kind: 'limited', value: null, resolution: null, reason: 'no access' }), test)
  const notApplicable = (test: TestKey) => judged(only(test, 'N/A', { kind: 'not-applicable', value: null, resolution: null, reason: 'the maker gives no such test' }), test)

  it('stops on a required test of the new circuit', () => {
    expect(limited('Zs')).toMatchObject({ verdict: 'limited', stops: true, words: 'LIM · no access' })
    expect(notApplicable('Zs')).toMatchObject({ verdict: 'not-applicable', stops: true })
  })

  it('may stand against the existing board', () => {
    expect(limited('Zs-board').stops).toBe(false)
  })

  it('may stand where a d.c. device only tests itself', () => {
    expect(notApplicable('RCD-dc')).toMatchObject({ verdict: 'not-applicable', stops: false })
  })

  it('says by itself what does not belong to the job', () => {
    expect(judged(jobRecord(), 'RA')).toMatchObject({ verdict: 'not-applicable', applies: false, stops: false })
    expect(judged(jobRecord(), 'phase-sequence').applies).toBe(false)
    expect(judged(threePhaseJob(), 'phase-sequence').applies).toBe(true)
    expect(judged(withFields(jobRecord(), 'circuit', 'designed', { rcd_type: 'B', dc_where: 'type_b' }), 'RCD-dc').applies).toBe(false)
  })
})

describe('which reading counts', () => {
  it('is the latest; the earlier ones stay with their own verdicts', () => {
    const retested = withReading(only('Zs', '0.95'), 'Zs', '0.33')
    const zs = judged(retested, 'Zs')
    expect(zs).toMatchObject({ verdict: 'within', shown: '0.33\u2009Ω' })
    expect(zs.earlier).toMatchObject([{ verdict: 'outside', isCounted: true, reading: { shown: '0.95' } }])
  })

  it('is by the order in which the server took them, whatever a tablet\'s clock said', () => {
    const clockBehind = withReading(jobRecord(), 'Zs', '0.95', { deviceAt: `${WORK_DAY}T08:00:00Z` })
    expect(judged(clockBehind, 'Zs')).toMatchObject({ verdict: 'outside', shown: '0.95\u2009Ω' })
  })

  it('leaves a typed reading out until the measurer confirms it', () => {
    const typed = only('Zs', '0.33', { typedBy: 'p-office' })
    expect(judged(typed, 'Zs')).toMatchObject({ verdict: 'not-entered', stops: true, notCounted: expect.stringContaining('not yet confirmed') as string })
    expect(judged(only('Zs', '0.33', { typedBy: 'p-office', confirmedAt: `${WORK_DAY}T18:00:00Z` }), 'Zs')).toMatchObject({ verdict: 'within', stops: false })
  })

  it('keeps stopping while the latest does not count, though an earlier one does', () => {
    const zs = judged(withReading(jobRecord(), 'Zs', '0.95', { typedBy: 'p-office' }), 'Zs')
    expect(zs).toMatchObject({ verdict: 'within', stops: true })
    expect(zs.earlier).toMatchObject([{ isCounted: false, verdict: 'not-entered' }])
  })

  it.each([
    ['2027-03-01', false], ['2027-03-02', true], ['2027-03-03', true],
  ])('with calibration good until %s on the day of work counts: %s', (goodUntil, counts) => {
    const kit = instruments().map(each => (each.id === 'i-tester' ? { ...each, calibrations: [{ doneOn: '2026-03-02', goodUntil, reference: '' }] } : each))
    const zs = judged({ ...jobRecord(), instruments: kit }, 'Zs')
    expect(zs.verdict).toBe(counts ? 'within' : 'not-entered')
    if (!counts) expect(zs.notCounted).toContain('out of calibration on Tue 2 Mar 2027')
  })

  it('asks for calibration on the London day of the reading', () => {
    const kit = instruments().map(each => ({ ...each, calibrations: [{ doneOn: '2026-06-01', goodUntil: '2027-06-01', reference: '' }] }))
    const lateAtNight = { deviceAt: '2027-06-01T23:30:00Z' }
    expect(judged({ ...only('Zs', '0.33', lateAtNight), instruments: kit }, 'Zs').verdict).toBe('not-entered')
  })

  it('needs an instrument for a figure, and none by enquiry', () => {
    expect(judged(only('Ze', '0.21', { instrumentId: null }), 'Ze').verdict).toBe('not-entered')
    expect(judged(only('Ze', '0.21', { instrumentId: null, context: { byEnquiry: true } }), 'Ze').verdict).toBe('within')
  })
})

describe('the charger\'s start delay', () => {
  it('waits, and says how long, before it is called a fault', () => {
    const early = judged(only('vehicle-states', 'wrong', { context: { waited_s: 240 } }), 'vehicle-states')
    expect(early).toMatchObject({ verdict: 'waiting', words: 'Cannot tell yet · the charger\'s start delay: up to 6 min more' })
    expect(judged(only('vehicle-states', 'wrong', { context: { waited_s: 600 } }), 'vehicle-states').verdict).toBe('outside')
  })
})

describe('TT', () => {
  it.each([['1666.6', 'within'], ['1666.7', 'outside']])('holds an electrode of %s Ω against 50 V: %s', (shown, verdict) => {
    expect(judged(only('RA', shown, {}, ttJob()), 'RA').verdict).toBe(verdict)
  })

  it('has no 80 % and notes an unsteady electrode', () => {
    const record = only('RA', '240', {}, ttJob())
    expect(judged(record, 'RA').notes[0]).toContain('EAR-09')
    expect(judged(ttJob(), 'Zs').limit!.value).toBeCloseTo(50 / 0.03)
  })
})
