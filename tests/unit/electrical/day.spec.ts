import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { DayResult } from '#shared/electrical/day'
import { profileYear_kWh } from '#shared/electrical/profile-scale'
import type { RecordedDemandResult } from '#shared/electrical/recorded-demand'
import { answerTo, issuesOf } from './asking'

const flat = (amps: number) => Array.from({ length: 48 }, () => amps)
const night = { limit_A: 60, charger_A: 32, plugIn: '18:00', unplug: '07:00' }
const day = (input: object) => answerTo<DayResult>('day', { ...night, ...input }).result

describe('a day behind a load limit', () => {
  it('charges from plugging in to unplugging, over midnight', () => {
    const { ev_A, energy_kWh, readyAt } = day({ house_A: flat(10) })
    expect(ev_A.map(amps => amps > 0 ? 1 : 0).join('')).toBe('1'.repeat(14) + '0'.repeat(22) + '1'.repeat(12))
    expect(energy_kWh).toBeCloseTo(32 * 0.23 * 13, 9)
    expect(readyAt).toBeNull()
  })

  it('gives what the limit leaves, and pauses below 6 A', () => {
    const house_A = flat(10)
    house_A[36] = 40
    house_A[37] = 54
    house_A[38] = 54.5
    house_A[39] = 70
    const { ev_A, total_A, pausedSlots, unlimited } = day({ house_A })
    expect(ev_A.slice(36, 40)).toEqual([20, 6, 0, 0])
    expect(pausedSlots).toBe(2)
    expect(total_A[39]).toBe(70)
    expect(unlimited.peak_A).toBe(102)
  })

  it('stops when the need is met, and says when', () => {
    const { energy_kWh, readyAt } = day({ house_A: flat(10), need_kWh: 7.36 })
    expect(energy_kWh).toBeCloseTo(7.36, 12)
    expect(readyAt).toBe('19:00')
    expect(day({ house_A: flat(10), need_kWh: 7.36, randomDelay_s: 600 }).readyAt).toBe('19:10')
    expect(day({ house_A: flat(10), need_kWh: 7.36, window: { from: '23:30', to: '05:30' } }).readyAt).toBe('00:30')
    expect(day({ house_A: flat(10), need_kWh: 500 }).readyAt).toBeNull()
  })

  it('scales a profile to a year\'s energy', () => {
    const printed = day({ profile: 'Wtr_Wd' }).house_kWh
    expect(day({ profile: 'Wtr_Wd', annual_kWh: profileYear_kWh() }).house_kWh).toBeCloseTo(printed, 9)
    expect(day({ profile: 'Wtr_Wd', annual_kWh: profileYear_kWh() / 2 }).house_kWh).toBeCloseTo(printed / 2, 9)
  })

  it('never lifts the total over the limit unless the house does, nor charges below 6 A', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 0, max: 90, noNaN: true }), { minLength: 48, maxLength: 48 }), fc.double({ min: 6, max: 80, noNaN: true }), (house_A, charger_A) => {
      const { ev_A, total_A } = day({ house_A, charger_A })
      ev_A.forEach((amps, slot) => {
        expect(amps === 0 || amps >= 6).toBe(true)
        expect(total_A[slot]!).toBeLessThanOrEqual(Math.max(house_A[slot]!, 60) + 1e-9)
      })
    }))
  })

  it('wants 48 half-hours', () => {
    expect(issuesOf('day', { ...night, house_A: [1, 2] })[0]!.path).toBe('house_A')
  })
})

describe('a recorded demand', () => {
  const record = (input: object) => answerTo<RecordedDemandResult>('recorded-demand', input)
  const hours = (days: number) => Array.from({ length: days * 48 }, (_each, index) => ({ at: new Date(Date.UTC(2026, 0, 1) + index * 1_800_000).toISOString().slice(0, 16), A: index % 48 }))

  it('is the greatest reading, with its time', () => {
    expect(record({ readings: hours(1) }).result).toMatchObject({ max_A: 47, at: '2026-01-01T23:30', days: 1, completeness: 1 })
  })

  it('says when the record is too short, and when it is long enough', () => {
    expect(record({ readings: hours(27) }).notes.join(' ')).toContain('too short')
    expect(record({ readings: hours(28) }).notes.join(' ')).not.toContain('too short')
  })

  it('counts gaps against the time between first and last', () => {
    const { result, notes } = record({ readings: hours(2).filter((_each, index) => index % 2 === 0 || index === 95) })
    expect(result.completeness).toBeCloseTo(49 / 96, 12)
    expect(notes.join(' ')).toContain('gaps')
  })

  it('gives a percentile by nearest rank', () => {
    expect(record({ readings: hours(1), percentile: 50 }).result.percentile_A).toBe(23)
    expect(record({ readings: hours(1), percentile: 100 }).result.percentile_A).toBe(47)
  })

  it('reads offsets and refuses days that are not on the calendar', () => {
    expect(record({ readings: [{ at: '2026-01-01T00:00Z', A: 1 }, { at: '2026-01-01T01:30+01:00', A: 2 }] }).result.completeness).toBe(1)
    expect(issuesOf('recorded-demand', { readings: [{ at: '2026-02-29T00:00', A: 1 }] })[0]!.path).toBe('readings.0.at')
  })
})
