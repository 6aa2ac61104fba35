import { expect, it } from 'vitest'
import { VERDICTS } from '../../../shared/utils/verdict'
import { areasFor, isInArea, AREAS } from '../../../app/utils/areas'
import { clockTime } from '../../../app/utils/clock-time'
import { helpFor } from '../../../app/utils/error-help'
import { fillMark, stateWords, type StepState } from '../../../app/utils/run'
import { edgeOf, speak } from '../../../app/utils/verdict-look'

it('gives every verdict an edge of its own', () => {
  expect(new Set(VERDICTS.map(edgeOf)).size).toBe(VERDICTS.length)
})

it.each([
  ['within', '0.79\u2009Ω inside', 'within limit, 0.79 ohms inside'],
  ['outside', 'by 0.12 Ω', 'outside limit, by 0.12 ohms'],
  ['unexpected', '1.8 × design', 'unexpected, 1.8 times design'],
  ['waiting', 'needs the cable’s length', 'cannot tell yet, needs the cable’s length'],
  ['limited', 'board locked', 'limited, reason: board locked'],
  ['not-applicable', undefined, 'not applicable'],
  ['not-entered', undefined, 'not entered'],
  ['within', '32 A under 40 A, 6 mm² over 18 m, 5 ms, 30 mA, 1.2 MΩ', 'within limit, 32 amps under 40 amps, 6 square millimetres over 18 metres, 5 milliseconds, 30 milliamps, 1.2 megohms'],
] as const)('says %s with "%s"', (verdict, detail, said) => {
  expect(speak(verdict, detail)).toBe(said)
})

it.each([
  ['not-started', 4, 4, 'dashed', 'Not started'], ['started', 4, 4, 'outline', 'Started, 4 left'], ['started', 1, 4, 'half', 'Started, 1 left'],
  ['ready', 0, 4, 'full', 'Ready'], ['checked', 0, 4, 'barred', 'Checked'], ['not-needed', 0, 0, 'none', 'Not needed'],
] as [StepState, number, number, string, string][])('a part that is %s with %d of %d left is drawn %s and called %s', (state, left, total, mark, words) => {
  expect(fillMark({ state, left, total })).toBe(mark)
  expect(stateWords({ state, left })).toBe(words)
})

it('shows areas by role', () => {
  expect(areasFor(['installer']).map(area => area.word)).toEqual(['Today', 'Diary', 'Jobs', 'Kit'])
  expect(areasFor(['principal', 'supervisor'])).toHaveLength(AREAS.length)
  expect(areasFor(['office']).map(area => area.word)).not.toContain('Countersign')
})

it('knows which area a path lies in', () => {
  const jobs = AREAS.find(area => area.word === 'Jobs')!
  expect(['/jobs', '/jobs/7/cable', '/jobsworth'].map(path => isInArea(path, jobs))).toEqual([true, true, false])
})

it('tells the time of London in winter and summer', () => {
  expect(clockTime('2027-03-02T14:02:00Z')).toBe('14:02')
  expect(clockTime('2027-07-02T14:02:00Z')).toBe('15:02')
  expect(clockTime('soon')).toBe('at an unknown time')
})

it.each([404, 410, 403, 401, 429, 503, 500, 418])('has a way on for status %d', (status) => {
  const help = helpFor(status)
  expect(help.title.length).toBeGreaterThan(10)
  expect(help.next).toMatch(/\.$/)
  expect(`${help.title} ${help.happened} ${help.next}`).not.toMatch(/error|stack|!/i)
})
