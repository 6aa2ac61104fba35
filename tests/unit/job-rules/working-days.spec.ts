import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { BANK_HOLIDAYS } from '#shared/job/holidays.data'
import { holidayOn, holidaysKnown, isWorkingDay, lastWorkingDayBy, workingDaysBetween } from '#shared/job/working-days'
import { addDays, isDay, isWeekend } from '#shared/utils/dates'

describe('working days', () => {
  it.each([
    ['2026-12-01', '2026-12-01', 'England', 0],
    ['2026-12-04', '2026-12-07', 'England', 1],
    // Christmas Day on a Friday, Boxing Day moved to the Monday.
    ['2026-12-24', '2026-12-29', 'England', 1],
    ['2026-12-31', '2027-01-05', 'England', 2],
    ['2026-12-31', '2027-01-05', 'Scotland', 1],
    ['2027-03-16', '2027-03-18', 'Northern Ireland', 1],
    ['2027-03-16', '2027-03-18', 'Wales', 2],
    ['2026-12-07', '2026-12-04', 'England', -1],
  ] as const)('%s to %s in %s: %d', (from, to, nation, count) => {
    expect(workingDaysBetween(from, to, nation)).toBe(count)
  })

  it('knows each nation\'s own days', () => {
    expect(holidayOn('2027-03-29', 'England')).toBe('Easter Monday')
    expect(holidayOn('2027-03-29', 'Scotland')).toBeNull()
    expect(isWorkingDay('2026-11-30', 'Scotland')).toBe(false)
    expect(isWorkingDay('2026-11-30', 'England')).toBe(true)
  })

  it('goes back to the last working day', () => {
    expect(lastWorkingDayBy('2027-03-29', 'England')).toBe('2027-03-25')
    expect(lastWorkingDayBy('2027-03-24', 'England')).toBe('2027-03-24')
  })

  it('says which years it knows', () => {
    expect([holidaysKnown('2025-12-31'), holidaysKnown('2026-01-01'), holidaysKnown('2031-12-31'), holidaysKnown('2032-01-01')]).toEqual([false, true, true, false])
  })

  it.each(Object.entries(BANK_HOLIDAYS))('%s: real days in order, none on a weekend, eight or more a year', (_, holidays) => {
    const days = holidays.map(holiday => holiday.day)
    expect(days.every(isDay)).toBe(true)
    expect(days.some(isWeekend)).toBe(false)
    expect([...new Set(days)].sort()).toEqual(days)
    for (const year of [2026, 2027, 2028, 2029, 2030, 2031]) expect(days.filter(day => day.startsWith(String(year))).length).toBeGreaterThanOrEqual(8)
  })

  it('adds up: from a to b and on to c is from a to c', () => {
    const step = fc.integer({ min: 0, max: 60 })
    fc.assert(fc.property(fc.integer({ min: 0, max: 1500 }), step, step, (start, first, second) => {
      const a = addDays('2026-06-01', start)
      const b = addDays(a, first)
      const c = addDays(b, second)
      expect(workingDaysBetween(a, b, 'Scotland') + workingDaysBetween(b, c, 'Scotland')).toBe(workingDaysBetween(a, c, 'Scotland'))
    }), { numRuns: 60 })
  })
})
