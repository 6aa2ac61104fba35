/**
 * What does the charger draw through a day behind a load limit, and when is the vehicle ready?
 *
 * In each half-hour the vehicle is plugged in: min(charger, limit − house); below 6 A it pauses.
 * `ev_A` is the current while it flows; a half-hour only partly used still shows it in full and counts its energy for the time used.
 *
 * @source the load-limit rule of `supply`; IEC 61851-1 (least 6 A)
 * @example house 10 A all day, limit 40 A, charger 32 A -> 30 A
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { chargeThrough, SLOTS, SLOT_MIN, toClock, toMinutes } from './charge-through'
import { above, clockTime, fields, fromZero, oneOf, U_V } from './inputs'
import { PROFILE_COLUMNS, profile_kW, profileYear_kWh } from './profile-scale'
import { computed, shown, step } from './working'

const halfHours = (what: string) => z.array(z.number(`Give ${what} as numbers.`).nonnegative(`Give ${what} as numbers not below zero.`), `Give ${what} as a list.`).length(SLOTS, `Give ${what} for 48 half-hours from midnight.`).optional()
const input = fields({
  house_kW: halfHours('the house\'s kW'),
  house_A: halfHours('the house\'s currents'),
  profile: oneOf('the profile', PROFILE_COLUMNS),
  annual_kWh: above('the year\'s energy'),
  limit_A: above('the load limit'),
  charger_A: above('the charger\'s rating'),
  U_V,
  plugIn: clockTime('the time of plugging in').optional(),
  unplug: clockTime('the time of unplugging').optional(),
  need_kWh: fromZero('the energy needed'),
  window: fields({ from: clockTime('the window\'s start'), to: clockTime('the window\'s end') }).optional(),
  randomDelay_s: fromZero('the random delay'),
})
export type DayInput = z.infer<typeof input>

export interface DayResult {
  /** 48 half-hours from midnight. */
  ev_A: number[]
  total_A: number[]
  house_kWh: number
  energy_kWh: number
  /** When the energy needed is in, `07:05`; null where none is asked for or it is not reached. */
  readyAt: string | null
  /** Half-hours in which the vehicle would charge but the house leaves less than 6 A. */
  pausedSlots: number
  unlimited: { peak_A: number }
}

export function day(given: DayInput): Answer<DayResult> {
  const { limit_A, charger_A, U_V = 230, plugIn, unplug, need_kWh, window, randomDelay_s = 0 } = given
  const house_A = houseCurrents(given, U_V)
  const missing = Object.entries({ house_kW: house_A ?? undefined, limit_A, charger_A, plugIn, unplug }).filter(([, value]) => value === undefined).map(([key]) => key)
  if (!house_A || limit_A === undefined || charger_A === undefined || plugIn === undefined || unplug === undefined) return waiting(missing)

  const times = { plugIn: toMinutes(plugIn), unplug: toMinutes(unplug), window: window && { from: toMinutes(window.from), to: toMinutes(window.to) }, delay_min: randomDelay_s / 60 }
  const charge = (limit: number) => chargeThrough({ house_A, limit_A: limit, charger_A, U_V, need_kWh, ...times })
  const limited = charge(limit_A)
  const unlimited = charge(Number.MAX_VALUE)
  const total_A = house_A.map((house, slot) => house + limited.ev_A[slot]!)
  const house_kWh = house_A.reduce((sum, house) => sum + house * U_V / 1000 * SLOT_MIN / 60, 0)
  const readyAt = limited.readyAfter_min === null ? null : toClock(times.plugIn + limited.readyAfter_min)
  const peak_A = Math.max(...house_A.map((house, slot) => house + unlimited.ev_A[slot]!))
  return answer({
    result: { ev_A: limited.ev_A, total_A, house_kWh, energy_kWh: limited.energy_kWh, readyAt, pausedSlots: limited.pausedSlots, unlimited: { peak_A } },
    working: [
      computed('house', `Σ house A × ${shown(U_V)} ÷ 1000 × 0.5`, house_kWh, 'kWh'),
      step('vehicle', `Σ min(${shown(charger_A)}, ${shown(limit_A)} − house A), 0 below 6 A, × ${shown(U_V)} ÷ 1000 × hours`, limited.energy_kWh, 'kWh', 'load limit; IEC 61851-1 (least 6 A)', 'two sources'),
      computed('peak without a limit', `max(house A + ${shown(charger_A)} while charging)`, peak_A, 'A'),
    ],
    notes: notesOn(given, house_A, limit_A, readyAt, limited.energy_kWh),
  })
}

function houseCurrents({ house_A, house_kW, profile, annual_kWh }: DayInput, U_V: number): number[] | null {
  if (house_A) return house_A
  if (house_kW) return house_kW.map(kW => kW * 1000 / U_V)
  if (!profile) return null
  const scale = annual_kWh === undefined ? 1 : annual_kWh / profileYear_kWh()
  return profile_kW(profile).map(kW => kW * scale * 1000 / U_V)
}

function notesOn({ house_A, house_kW, profile, annual_kWh, need_kWh }: DayInput, currents: number[], limit_A: number, readyAt: string | null, energy_kWh: number): string[] {
  const notes: string[] = []
  if (profile && !house_A && !house_kW) notes.push('The house is an average of many homes (Elexon Profile Class 1): one home peaks many times higher.')
  if (profile && annual_kWh !== undefined && !house_A && !house_kW) notes.push('The scaling takes the lengths of the profile\'s seasons from memory.')
  if (currents.some(house => house > limit_A)) notes.push('In some half-hours the house alone draws more than the limit: a limiter cannot shed the house.')
  if (need_kWh !== undefined && readyAt === null) notes.push(`By the time of unplugging ${energy_kWh.toFixed(1)} kWh of ${shown(need_kWh)} kWh are in.`)
  return notes
}

export const dayCalculation = defineCalculation({ name: 'day', purpose: 'What the charger draws through a day behind a load limit, and when the vehicle is ready.', input, run: day })
