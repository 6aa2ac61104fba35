/**
 * What did the house draw at most, by a record of its meter?
 *
 * current of an interval = energy × 60 ÷ interval × 1000 ÷ U
 *
 * @source BS 7671 311.1: recorded over a representative period; an instantaneous reading is not a maximum demand
 * @example 0.46 kWh in half an hour at 230 V -> 0.92 kW -> 4 A
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { above, fields, U_V } from './inputs'
import { shown, step } from './working'

const at = z.string('Give the time of each reading, such as 2026-01-15T16:30.').regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d(\.\d+)?)?(Z|[+-]\d\d:\d\d)?$/, 'Give the time of each reading, such as 2026-01-15T16:30.')
const size = z.number('Give each reading as a number.').nonnegative('Give each reading as a number not below zero.')
const reading = z.union([fields({ at, A: size }), fields({ at, kWh: size })], 'Give each reading a time and either A or kWh, not below zero.')
const input = fields({
  readings: z.array(reading, 'Give the readings as a list.').max(100_000, 'At most 100,000 readings.').optional(),
  interval_min: above('the interval in minutes').refine(minutes => minutes === undefined || minutes <= 1440, 'Give an interval of at most a day.'),
  U_V,
  percentile: z.number('Give the percentile as a number.').gt(0, 'Give a percentile above 0 and up to 100.').max(100, 'Give a percentile above 0 and up to 100.').optional(),
})
export type RecordedDemandInput = z.infer<typeof input>

export interface RecordedDemandResult {
  max_A: number
  /** When, as it was given. */
  at: string
  /** Different calendar days with a reading. */
  days: number
  /** Readings there are over readings there would be between the first and the last: 0 to 1. */
  completeness: number
  /** The current that this share of the readings keeps within. */
  percentile_A?: number
  notes: string[]
}

/** Four weeks hold every day of the week several times: our own measure of representative. */
const REPRESENTATIVE_DAYS = 28
const NEARLY_COMPLETE = 0.95
const WINTER_MONTHS = ['11', '12', '01', '02']

export function recordedDemand({ readings, interval_min = 30, U_V = 230, percentile }: RecordedDemandInput): Answer<RecordedDemandResult> {
  if (!readings?.length) return waiting(['readings'])
  const currents = readings.map(each => 'A' in each ? each.A : each.kWh * 60 / interval_min * 1000 / U_V)
  const minutes = readings.map((each, index) => minuteOf(each.at, index))
  const days = new Set(readings.map(each => each.at.slice(0, 10)))
  const max_A = greatest(currents)
  const peak = readings[currents.indexOf(max_A)]!
  const completeness = completenessOf(minutes, interval_min)
  const notes = notesOn(days, completeness, interval_min)
  return answer({
    result: { max_A, at: peak.at, days: days.size, completeness, ...percentile !== undefined && { percentile_A: nearestRank(currents, percentile) }, notes },
    working: [step('max', 'A' in peak ? `the greatest of ${readings.length} readings` : `${shown(peak.kWh)} × 60 ÷ ${shown(interval_min)} × 1000 ÷ ${shown(U_V)}`, max_A, 'A', `record of ${days.size} ${days.size === 1 ? 'day' : 'days'}`, 'given')],
    notes,
  })
}

/** Minutes since 1970; without an offset the clock is taken as it stands. */
function minuteOf(text: string, index: number): number {
  const [, year, month, day, hour, minute, sign, offsetHours, offsetMinutes] = /^(\d{4})-(\d\d)-(\d\d)T(\d\d):(\d\d)(?:[:\d.]*)(?:Z|([+-])(\d\d):(\d\d))?$/.exec(text)!
  const instant = Date.UTC(Number(year), Number(month) - 1, Number(day), Number(hour), Number(minute))
  if (!new Date(instant).toISOString().startsWith(text.slice(0, 16))) throw new CalculationInputError(`readings.${index}.at`, `${text} is not a time on the calendar.`)
  const offset = sign ? Number(offsetHours) * 60 + Number(offsetMinutes) : 0
  return instant / 60_000 - (sign === '-' ? -offset : offset)
}

function greatest(list: readonly number[]): number {
  return list.reduce((most, each) => each > most ? each : most, 0)
}

function completenessOf(minutes: readonly number[], interval_min: number): number {
  const distinct = new Set(minutes)
  let first = minutes[0]!
  let last = first
  for (const minute of distinct) {
    if (minute < first) first = minute
    if (minute > last) last = minute
  }
  return Math.min(1, distinct.size / (Math.round((last - first) / interval_min) + 1))
}

function nearestRank(list: readonly number[], percentile: number): number {
  const sorted = [...list].sort((a, b) => a - b)
  return sorted[Math.ceil(percentile / 100 * sorted.length) - 1]!
}

function notesOn(days: ReadonlySet<string>, completeness: number, interval_min: number): string[] {
  const notes: string[] = []
  if (days.size < REPRESENTATIVE_DAYS) notes.push(`The record covers ${days.size} ${days.size === 1 ? 'day' : 'days'}: too short to be representative. Four weeks or more, some of it in winter, is better.`)
  if (![...days].some(day => WINTER_MONTHS.includes(day.slice(5, 7)))) notes.push('The record holds no day from November to February, when most homes draw most.')
  if (completeness < NEARLY_COMPLETE) notes.push(`The record has gaps: ${Math.floor(completeness * 100)} % of its readings are there.`)
  if (interval_min > 1) notes.push(`Each figure is an average over ${shown(interval_min)} minutes: shorter peaks are higher.`)
  return notes
}

export const recordedDemandCalculation = defineCalculation({ name: 'recorded-demand', purpose: 'A house\'s maximum demand by a record of its meter.', input, run: recordedDemand })
