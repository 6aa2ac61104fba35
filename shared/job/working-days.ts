/**
 * How many working days lie between two days, in one nation: Monday to Friday without that nation's bank holidays.
 * The table covers 2026 to 2031 (`holidays.data.ts`); outside it only weekends are left out, and `holidaysKnown` says so.
 */
import { addDays, compareDays, isWeekend, type Day } from '../utils/dates'
import { BANK_HOLIDAYS, HOLIDAYS_FROM_YEAR, HOLIDAYS_TO_YEAR } from './holidays.data'

export type Nation = keyof typeof BANK_HOLIDAYS

/** The name of the bank holiday on that day, or null. */
export function holidayOn(day: Day, nation: Nation): string | null {
  return BANK_HOLIDAYS[nation].find(holiday => holiday.day === day)?.name ?? null
}

/** Whether the table covers the year of that day. */
export function holidaysKnown(day: Day): boolean {
  const year = Number(day.slice(0, 4))
  return year >= HOLIDAYS_FROM_YEAR && year <= HOLIDAYS_TO_YEAR
}

export function isWorkingDay(day: Day, nation: Nation): boolean {
  return !isWeekend(day) && holidayOn(day, nation) === null
}

/**
 * Working days after the first day, up to and including the last; negative where the last is the earlier.
 * @example Fri 2026-12-04 to Mon 2026-12-07, England -> 1
 */
export function workingDaysBetween(from: Day, to: Day, nation: Nation): number {
  if (compareDays(from, to) > 0) return -workingDaysBetween(to, from, nation) || 0
  let count = 0
  for (let day = from; day !== to;) {
    day = addDays(day, 1)
    if (isWorkingDay(day, nation)) count++
  }
  return count
}

/** The day itself where it is a working day, else the last working day before it: the day to act by. */
export function lastWorkingDayBy(day: Day, nation: Nation): Day {
  let candidate = day
  while (!isWorkingDay(candidate, nation)) candidate = addDays(candidate, -1)
  return candidate
}
