/**
 * Civil days as `YYYY-MM-DD` text and moments as UTC instants. A day is never kept as a `Date`:
 * the arithmetic below counts whole days, so that no clock change and no time zone can move one.
 */
import { TZDate } from '@date-fns/tz'

/** A day of the calendar, `2026-12-01`. */
export type Day = string

/** Where every clock and every deadline of the product stands. */
export const LONDON = 'Europe/London'

const DAY_PATTERN = /^(\d{4})-(\d{2})-(\d{2})$/
const MS_PER_DAY = 86_400_000
const WEEKDAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'] as const
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const

export type Weekday = (typeof WEEKDAYS)[number]

/** Days since 1 January 1970; null where the text is no day of the calendar between 1900 and 2199. */
function dayNumber(text: string): number | null {
  const parts = DAY_PATTERN.exec(text)
  if (!parts) return null
  const [year, month, date] = [Number(parts[1]), Number(parts[2]), Number(parts[3])]
  if (year < 1900 || year > 2199) return null
  const days = Date.UTC(year, month - 1, date) / MS_PER_DAY
  return dayText(days) === text ? days : null
}

function dayText(days: number): Day {
  return new Date(days * MS_PER_DAY).toISOString().slice(0, 10)
}

function mustBeDay(text: Day): number {
  const days = dayNumber(text)
  if (days === null) throw new RangeError(`Not a day of the calendar: ${text}`)
  return days
}

/** Whether the text is a real day: `2027-02-29` is not. */
export function isDay(text: string): boolean {
  return dayNumber(text) !== null
}

/** The day so many days later (earlier where negative). */
export function addDays(day: Day, days: number): Day {
  return dayText(mustBeDay(day) + Math.trunc(days))
}

/** How many days from one to the other; negative where the second is the earlier. */
export function daysBetween(from: Day, to: Day): number {
  return mustBeDay(to) - mustBeDay(from)
}

/** Negative, zero or positive, as for sorting. */
export function compareDays(a: Day, b: Day): number {
  return Math.sign(mustBeDay(a) - mustBeDay(b))
}

export function weekdayOf(day: Day): Weekday {
  const sinceSunday = (((mustBeDay(day) + 4) % 7) + 7) % 7
  return WEEKDAYS[sinceSunday]!
}

export function isWeekend(day: Day): boolean {
  return weekdayOf(day) === 'Sat' || weekdayOf(day) === 'Sun'
}

/**
 * A day in words, as pages and papers print it.
 * @example '2027-03-02' -> 'Tue 2 Mar 2027'
 */
export function formatDay(day: Day): string {
  const [year, month, date] = day.split('-')
  return `${weekdayOf(day)} ${Number(date)} ${MONTHS[Number(month) - 1]} ${year}`
}

/**
 * The day it is in London at a moment.
 * @param instant an ISO 8601 instant or milliseconds since 1970
 * @example '2027-03-28T23:30:00Z' -> '2027-03-29', because British Summer Time has begun
 */
export function londonDay(instant: string | number): Day {
  const there = inLondon(instant)
  return `${there.getFullYear()}-${pad(there.getMonth() + 1)}-${pad(there.getDate())}`
}

/** The time of day in London at a moment, `16:05`. */
export function londonTime(instant: string | number): string {
  const there = inLondon(instant)
  return `${pad(there.getHours())}:${pad(there.getMinutes())}`
}

/** A moment in words, by the London clock: `Tue 2 Mar 2027, 16:05`. */
export function formatMoment(instant: string | number): string {
  return `${formatDay(londonDay(instant))}, ${londonTime(instant)}`
}

function inLondon(instant: string | number): TZDate {
  const moment = typeof instant === 'number' ? instant : Date.parse(instant)
  if (!Number.isFinite(moment)) throw new RangeError(`Not a moment: ${instant}`)
  return new TZDate(moment, LONDON)
}

const pad = (n: number) => String(n).padStart(2, '0')
