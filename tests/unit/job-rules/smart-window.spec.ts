import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { smartWindow, type ChargingWindow } from '#shared/job/rules/smart-window'

const judged = (days: ChargingWindow['days'], from: string, to: string, randomDelay_s = 600) => smartWindow({ windows: [{ days, from, to }], randomDelay_s })

describe('smart-window', () => {
  it.each([
    ['the night', 'every-day', '22:00', '08:00', []],
    ['one minute into the morning', 'every-day', '22:00', '08:01', [['08:00', '08:01']]],
    ['between the peaks', 'weekday', '11:00', '16:00', []],
    ['one minute into the evening', 'weekday', '11:00', '16:01', [['16:00', '16:01']]],
    ['the last minute of the evening', 'weekday', '21:59', '23:00', [['21:59', '22:00']]],
    ['both peaks', 'mon', '07:00', '23:00', [['08:00', '11:00'], ['16:00', '22:00']]],
    ['the whole day', 'every-day', '00:00', '24:00', [['08:00', '11:00'], ['16:00', '22:00']]],
    ['a weekend', 'weekend', '08:00', '22:00', []],
    ['a weekend that runs into Monday', 'weekend', '23:00', '09:00', [['08:00', '09:00']]],
    ['a Friday night that ends on Saturday', 'fri', '22:00', '11:00', []],
    ['a Sunday night that ends on Monday', 'sun', '22:00', '10:00', [['08:00', '10:00']]],
  ] as const)('%s', (_, days, from, to, expected) => {
    const { verdict, result } = judged(days, from, to)
    expect(result.overlaps).toEqual(expected.map(([start, end]) => ({ window: 0, from: start, to: end })))
    expect(verdict).toBe(expected.length ? 'outside' : 'within')
  })

  it.each([[0, 'outside'], [1, 'within'], [600, 'within'], [1800, 'within'], [1801, 'outside']] as const)('a delay of %d s is %s', (delay, verdict) => {
    expect(judged('every-day', '00:00', '07:00', delay).verdict).toBe(verdict)
  })

  it('counts windows from 0', () => {
    const { result } = smartWindow({ windows: [{ days: 'sat', from: '09:00', to: '10:00' }, { days: 'tue', from: '09:00', to: '10:00' }], randomDelay_s: 600 })
    expect(result.overlaps).toEqual([{ window: 1, from: '09:00', to: '10:00' }])
  })

  it('looks at a window that ends closer to a peak than the delay', () => {
    const close = (to: string) => judged('weekday', '12:00', to).notes.some(note => note.includes('less than the random delay'))
    expect([close('15:50'), close('15:51'), close('16:00')]).toEqual([false, true, true])
  })

  it('waits for windows and delay, but not to say that a window is outside', () => {
    expect(smartWindow({}).missing).toEqual(['windows', 'randomDelay_s'])
    expect(smartWindow({ windows: [{ days: 'mon', from: '09:00', to: '10:00' }] })).toMatchObject({ verdict: 'outside', missing: ['randomDelay_s'] })
  })

  it('finds the same as counting minute by minute through the week', () => {
    const time = fc.integer({ min: 0, max: 1439 })
    const clock = (minutes: number) => `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`
    fc.assert(fc.property(fc.constantFrom('mon', 'fri', 'sat', 'sun'), time, time, (days, from, to) => {
      const first = { mon: 0, fri: 4, sat: 5, sun: 6 }[days]
      const length = to > from ? to - from : to + 1440 - from
      const meets = Array.from({ length }, (__, at) => from + at).some((minute) => {
        const weekday = (first + Math.floor(minute / 1440)) % 7 < 5
        const hour = (minute % 1440) / 60
        return weekday && ((hour >= 8 && hour < 11) || (hour >= 16 && hour < 22))
      })
      expect(judged(days, clock(from), clock(to)).verdict).toBe(meets ? 'outside' : 'within')
    }), { numRuns: 200 })
  })
})
