/** One charge from plugging in to unplugging, half-hour by half-hour, over midnight where need be. Minutes are of the day. */
import { LEAST_CHARGE_A } from './least-charge'

export const SLOTS = 48
export const SLOT_MIN = 30
const DAY_MIN = SLOTS * SLOT_MIN

export interface Charge {
  house_A: readonly number[]
  limit_A: number
  charger_A: number
  U_V: number
  need_kWh: number | undefined
  plugIn: number
  unplug: number
  window: { from: number, to: number } | undefined
  /** How long current waits at each start of charging. */
  delay_min: number
}

export interface Charged {
  ev_A: number[]
  energy_kWh: number
  pausedSlots: number
  /** Minutes after plugging in at which the need is met; null where there is no need or it is not met. */
  readyAfter_min: number | null
}

export function toMinutes(clock: string): number {
  return Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3, 5))
}

/** A minute of this day or the next as a clock time; a part of a minute counts as the next whole one. */
export function toClock(minute: number): string {
  const whole = Math.ceil(minute - 1e-9) % DAY_MIN
  return `${String(Math.floor(whole / 60)).padStart(2, '0')}:${String(whole % 60).padStart(2, '0')}`
}

export function chargeThrough(charge: Charge): Charged {
  const ev_A = Array.from({ length: SLOTS }, () => 0)
  const paused = new Set<number>()
  const need_kWh = charge.need_kWh ?? Number.POSITIVE_INFINITY
  let energy_kWh = 0
  if (need_kWh === 0) return { ev_A, energy_kWh, pausedSlots: 0, readyAfter_min: 0 }
  for (const { start, end } of pieces(charge)) {
    const slot = Math.floor(start % DAY_MIN / SLOT_MIN)
    const free_A = Math.min(charge.charger_A, charge.limit_A - charge.house_A[slot]!)
    if (free_A < LEAST_CHARGE_A) {
      paused.add(slot)
      continue
    }
    const kW = free_A * charge.U_V / 1000
    ev_A[slot] = free_A
    const full_kWh = kW * (end - start) / 60
    if (energy_kWh + full_kWh >= need_kWh - 1e-12) {
      const used_min = (need_kWh - energy_kWh) / kW * 60
      return { ev_A, energy_kWh: need_kWh, pausedSlots: paused.size, readyAfter_min: start + used_min - charge.plugIn }
    }
    energy_kWh += full_kWh
  }
  return { ev_A, energy_kWh, pausedSlots: paused.size, readyAfter_min: null }
}

/** The times in which current may flow, cut at the half-hours, in order. */
function pieces({ plugIn, unplug, window, delay_min }: Charge): { start: number, end: number }[] {
  const leave = unplug > plugIn ? unplug : unplug + DAY_MIN
  const list: { start: number, end: number }[] = []
  for (const span of openSpans(plugIn, leave, window)) {
    let start = span.start + delay_min
    while (start < span.end) {
      const end = Math.min(span.end, (Math.floor(start / SLOT_MIN) + 1) * SLOT_MIN)
      list.push({ start, end })
      start = end
    }
  }
  return list
}

function openSpans(plugIn: number, leave: number, window: Charge['window']) {
  if (!window || window.from === window.to) return [{ start: plugIn, end: leave }]
  const length = (window.to - window.from + DAY_MIN) % DAY_MIN
  return [-1, 0, 1].map(days => window.from + days * DAY_MIN)
    .map(from => ({ start: Math.max(plugIn, from), end: Math.min(leave, from + length) }))
    .filter(span => span.end > span.start)
}
