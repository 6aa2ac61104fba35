import { expect, it } from 'vitest'
import { addDays, dayFromParts, partsOfDay } from '../../../app/utils/day-parts'

it('splits a day for the boxes and reads it back', () => {
  expect(partsOfDay('2027-03-02')).toEqual({ day: '2', month: '3', year: '2027' })
  expect(dayFromParts({ day: '2', month: '3', year: '2027' })).toEqual({ day: '2027-03-02' })
  expect(dayFromParts({ day: '02', month: '03', year: '27' })).toEqual({ day: '2027-03-02' })
})

it.each([
  [{ day: '', month: '', year: '' }, undefined],
  [{ day: '2', month: '', year: '' }, 'Add the month and the year.'],
  [{ day: '31', month: '4', year: '2027' }, 'There is no such day. Look at the day and the month again.'],
  [{ day: '29', month: '2', year: '2027' }, 'There is no such day. Look at the day and the month again.'],
  [{ day: 'two', month: '3', year: '2027' }, 'Use figures, for example 9 3 2027.'],
])('%j gives no day', (parts, problem) => {
  expect(dayFromParts(parts)).toMatchObject({ day: null })
  expect(dayFromParts(parts).problem).toBe(problem)
})

it('counts civil days over a change of the clocks', () => {
  expect(addDays('2027-03-27', 2)).toBe('2027-03-29')
  expect(addDays('2028-02-28', 1)).toBe('2028-02-29')
})
