/** Which reading of each test counts. Readings are append-only: the latest that counts is the one that stands. */
import type { InstrumentRow, JobRecord, ReadingRow } from '../../types/record'
import { formatDay, londonDay } from '../../utils/dates'
import { INSTRUMENT_WORDS, TEST_KEYS, testSpec, type TestKey } from '../tests.data'

export interface TestReadings {
  counted: ReadingRow | null
  /** All others, oldest first, with why they do not count where they do not. */
  others: { reading: ReadingRow, notCounted: string | null }[]
  /** Why the latest reading does not count; null where it does or there is none. */
  notCounted: string | null
}

/** The readings of every test, sorted out. */
export function countReadings(record: JobRecord): Record<TestKey, TestReadings> {
  const instruments = new Map(record.instruments.map(each => [each.id, each]))
  const byTest = new Map<TestKey, ReadingRow[]>()
  for (const reading of record.readings) {
    const rows = byTest.get(reading.test)
    if (rows) rows.push(reading)
    else byTest.set(reading.test, [reading])
  }
  return Object.fromEntries(TEST_KEYS.map(test => [test, sortOut(byTest.get(test) ?? [], instruments)])) as Record<TestKey, TestReadings>
}

function sortOut(rows: ReadingRow[], instruments: ReadonlyMap<string, InstrumentRow>): TestReadings {
  // The record lists readings in the order the server took them, the device's own newest last: never by a tablet's clock.
  const judged = rows.map(reading => ({ reading, notCounted: whyNotCounted(reading, instruments) }))
  const last = judged.findLastIndex(each => each.notCounted === null)
  return {
    counted: judged[last]?.reading ?? null,
    others: judged.filter((_, index) => index !== last),
    notCounted: judged.at(-1)?.notCounted ?? null,
  }
}

/** Why a reading counts as not entered, as a sentence that says what to do; null where it counts. */
export function whyNotCounted(reading: ReadingRow, instruments: ReadonlyMap<string, InstrumentRow>): string | null {
  if (reading.typedBy !== null && reading.confirmedAt === null) return 'Typed from a sheet and not yet confirmed by the person who measured it.'
  const isFigure = reading.kind === 'value' || reading.kind === 'over-range'
  const needed = testSpec(reading.test).instrument
  if (!needed || reading.context.byEnquiry || (!isFigure && reading.instrumentId === null) || reading.kind === 'limited' || reading.kind === 'not-applicable') return null
  const instrument = reading.instrumentId === null ? undefined : instruments.get(reading.instrumentId)
  if (!instrument) return `No instrument is named: measure again with one of the kit for ${INSTRUMENT_WORDS[needed].toLowerCase()}.`
  return whyOutOfCalibration(instrument, reading.deviceAt)
}

/** Calibration is asked for on the London day of the reading, not on the day it is judged. */
export function whyOutOfCalibration(instrument: InstrumentRow, at: string): string | null {
  const day = londonDay(at)
  if (calibrationOn(instrument, day)) return null
  const last = instrument.calibrations.map(each => each.goodUntil).sort().at(-1)
  const until = last === undefined ? 'no calibration is on file' : last < day ? `its calibration was good until ${formatDay(last)}` : `no calibration covers ${formatDay(day)}`
  return `${instrument.name} was out of calibration on ${formatDay(day)}: ${until}. Measure again with another instrument.`
}

export function calibrationOn(instrument: InstrumentRow, day: string) {
  return instrument.calibrations.find(each => each.doneOn <= day && day <= each.goodUntil) ?? null
}
