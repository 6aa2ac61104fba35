/** How copper's resistance changes with temperature. @source On-Site Guide: 0.004 per °C from 20 °C (the guides' rounded figure) */
import { tableAlpha } from './tables/conductors.data'

const ALPHA = tableAlpha.rows[0]!.alpha

/** Resistance at this temperature over that at 20 °C. */
export function temperatureMultiplier(temperature_C: number): number {
  return 1 + ALPHA * (temperature_C - 20)
}

/** What takes a resistance read at ambient to one at the multiplier's temperature. */
export function temperatureRatio(multiplier: number, ambient_C: number): number {
  return multiplier / temperatureMultiplier(ambient_C)
}
