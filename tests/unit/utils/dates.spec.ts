import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addDays, compareDays, daysBetween, formatDay, formatMoment, isDay, isWeekend, londonDay, londonTime, weekdayOf } from '#shared/utils/dates'

describe('days', () => {
  it.each([
    ['2026-12-01', true], ['2028-02-29', true], ['2027-02-29', false], ['2026-13-01', false], ['2026-00-10', false], ['2026-1-1', false],
    ['2026-04-31', false], ['', false], ['0000-01-01', false], ['2026-12-01T00:00', false],
  ])('%j is a day: %s', (text, expected) => {
    expect(isDay(text)).toBe(expected)
  })

  it.each([
    ['2026-12-01', 28, '2026-12-29'], ['2026-12-31', 1, '2027-01-01'], ['2028-02-28', 1, '2028-02-29'], ['2027-03-28', 1, '2027-03-29'],
    ['2026-10-25', -1, '2026-10-24'], ['2026-12-01', 0, '2026-12-01'],
  ])('%s and %d days is %s', (day, days, expected) => {
    expect(addDays(day, days)).toBe(expected)
  })

  it('writes a day in words', () => {
    expect(formatDay('2027-03-02')).toBe('Tue 2 Mar 2027')
    expect(weekdayOf('1969-12-31')).toBe('Wed')
    expect([isWeekend('2026-12-05'), isWeekend('2026-12-06'), isWeekend('2026-12-07')]).toEqual([true, true, false])
  })

  it('refuses what is no day', () => {
    expect(() => addDays('2027-02-29', 1)).toThrow('Not a day')
  })

  it('goes there and back, and orders as text does', () => {
    const anyDay = fc.integer({ min: 0, max: 80_000 }).map(days => addDays('1950-01-01', days))
    fc.assert(fc.property(anyDay, anyDay, fc.integer({ min: -3000, max: 3000 }), (a, b, days) => {
      expect(addDays(addDays(a, days), -days)).toBe(a)
      expect(daysBetween(a, addDays(a, days))).toBe(days)
      expect(addDays(a, daysBetween(a, b))).toBe(b)
      expect(compareDays(a, b)).toBe(a < b ? -1 : a > b ? 1 : 0)
    }))
  })
})

describe('London', () => {
  it.each([
    ['2027-01-15T23:30:00Z', '2027-01-15', '23:30'],
    ['2027-03-28T00:59:59Z', '2027-03-28', '00:59'],
    ['2027-03-28T01:00:00Z', '2027-03-28', '02:00'],
    ['2027-03-28T23:30:00Z', '2027-03-29', '00:30'],
    ['2026-10-25T00:30:00Z', '2026-10-25', '01:30'],
    ['2026-10-25T01:30:00Z', '2026-10-25', '01:30'],
  ])('%s is %s at %s', (instant, day, time) => {
    expect([londonDay(instant), londonTime(instant)]).toEqual([day, time])
    expect(londonDay(Date.parse(instant))).toBe(day)
  })

  it('writes a moment in words', () => {
    expect(formatMoment('2027-03-02T16:05:00Z')).toBe('Tue 2 Mar 2027, 16:05')
  })

  it('refuses what is no moment', () => {
    expect(() => londonDay('soon')).toThrow('Not a moment')
  })
})
