/** What a page of tests does with a kept reading, without a screen: what is sent, how it would be judged, with what it may be measured. */
import { applyLocally } from '#shared/job/apply-locally'
import { judgeJob } from '#shared/job/judge/judge-job'
import { calibrationOn, whyOutOfCalibration } from '#shared/job/judge/counted'
import type { JudgedReading, Judgement } from '#shared/job/judge/types'
import type { ReadingPayload } from '#shared/job/mutations'
import { TEST_KEYS, testSpec, type InstrumentFunction, type TestKey, type TestSpec } from '#shared/job/tests.data'
import type { InstrumentRow, JobRecord, ReadingContext } from '#shared/types/record'
import { formatDay, londonDay } from '#shared/utils/dates'
import type { Kept } from '~/utils/reading-pad'

export type ChosenInstruments = Partial<Record<InstrumentFunction, string>>
export type NewReading = Omit<ReadingPayload, 'deviceId'>
export interface ReadingAround { id: string, instrumentId: string | null, context: ReadingContext, measuredBy?: string }

/** Units the pad toggles between; the test's own comes first. */
const PAD_UNITS: Record<string, readonly string[]> = { 'Ω': ['Ω', 'kΩ'], 'MΩ': ['MΩ', 'kΩ'], 'kA': ['kA', 'A'], 's': ['s', 'ms'] }
/** The finest step that testers of this kind show: finer digits are a slip, coarser ones are kept as they stand. */
const FINEST: Record<string, number> = { 'Ω': 0.001, 'kΩ': 0.001, 'MΩ': 0.001, 'kA': 0.001, 'A': 0.1, 's': 0.001, 'ms': 0.1 }

export const padUnits = (spec: TestSpec): string[] => [...PAD_UNITS[spec.unit] ?? [spec.unit]]
export const padResolution = (spec: TestSpec): Record<string, number> => Object.fromEntries(padUnits(spec).map(unit => [unit, FINEST[unit] ?? 1]))

/** The rows of a page in meter order. */
export const rowsOfPage = (judgement: Judgement, page: TestSpec['page']): JudgedReading[] => TEST_KEYS.map(test => judgement.readings[test]).filter(row => row.page === page && row.applies)

/** The instruments' uses that a page needs, in the order of its tests. */
export function functionsOf(rows: readonly JudgedReading[]): InstrumentFunction[] {
  return [...new Set(rows.map(row => testSpec(row.test).instrument).filter(use => use !== null))]
}

/** The next required test after this one that nobody has taken, or null at the end of the page. */
export function nextOpen(rows: readonly JudgedReading[], test: TestKey): JudgedReading | null {
  const from = rows.findIndex(row => row.test === test)
  return rows.slice(from + 1).find(row => row.isRequired && row.verdict === 'not-entered') ?? null
}

/** The kit that measures this, with the reason where one is out of calibration at that moment. */
export function kitFor(instruments: readonly InstrumentRow[], use: InstrumentFunction, at: string): { instrument: InstrumentRow, why: string | null, until: string }[] {
  return instruments.filter(each => each.active && each.functions.includes(use)).map((instrument) => {
    const good = calibrationOn(instrument, londonDay(at))
    return { instrument, why: whyOutOfCalibration(instrument, at), until: good ? `cal. to ${formatDay(good.goodUntil)}` : 'out of calibration' }
  })
}

/** The choice that stands without asking: what this job was last measured with, or the only one there is. */
export function usualInstrument(record: JobRecord, use: InstrumentFunction, at: string): string | undefined {
  const usable = kitFor(record.instruments, use, at).filter(each => each.why === null).map(each => each.instrument.id)
  const last = record.readings.findLast(row => row.instrumentId !== null && testSpec(row.test).instrument === use && usable.includes(row.instrumentId))
  return last?.instrumentId ?? (usable.length === 1 ? usable[0] : undefined)
}

/** A chosen instrument is taken for every other use it has and for which none is chosen yet. */
export function chooseInstrument(chosen: ChosenInstruments, use: InstrumentFunction, instrument: InstrumentRow, uses: readonly InstrumentFunction[]): ChosenInstruments {
  const rest = uses.filter(other => other !== use && chosen[other] === undefined && instrument.functions.includes(other))
  return { ...chosen, ...Object.fromEntries([use, ...rest].map(each => [each, instrument.id])) }
}

const decimalsOf = (shown: string) => (shown.split('.')[1] ?? '').length

/** What the pad kept, as it is sent. A reading that could not be taken names no instrument. */
export function figureReading(test: TestKey, kept: Kept, { id, instrumentId, context, measuredBy }: ReadingAround): NewReading {
  const isFigure = kept.kind === 'value' || kept.kind === 'over-range'
  return {
    id, test, kind: kept.kind, shown: kept.shown, value: kept.value, unit: kept.unit, resolution: isFigure ? Number(`1e-${decimalsOf(kept.shown)}`) : null,
    reason: kept.reason ?? '', context, instrumentId: isFigure && !context.byEnquiry ? instrumentId : null, ...(measuredBy && { measuredBy }),
  }
}

/** What was seen: correct or wrong. */
export function seenReading(test: TestKey, shown: 'correct' | 'wrong', { id, instrumentId, context, measuredBy }: ReadingAround): NewReading {
  return { id, test, kind: 'seen', shown, value: null, unit: testSpec(test).unit, resolution: null, reason: '', context, instrumentId, ...(measuredBy && { measuredBy }) }
}

/** How the test would stand with this reading, judged by the same rules as everywhere. Nothing is kept. */
export function judgeWith(record: JobRecord, reading: NewReading, personId: string, at: string): JudgedReading {
  const { measuredBy: _, ...asOwn } = reading
  const tried = applyLocally(record, { id: reading.id, kind: 'add-reading', jobId: record.job.id, baseVersion: null, at, payload: asOwn }, personId)
  return judgeJob(tried, londonDay(at)).readings[reading.test]
}
