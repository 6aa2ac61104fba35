/**
 * What energy does a breaker let through, and what conductor survives it?
 *
 * S = √(I²t) ÷ k
 *
 * @source BS EN 60898-1 Annex ZA; BS 7671 434.5.2
 * @example type B 32 A, 6 kA, class 3, k 115 -> 45 000 A²s, 1.845 mm²
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { energyClass } from './circuit-input'
import { DEVICE_WORDS } from './device-limits'
import { above, fields, oneOf } from './inputs'
import { findLetThrough } from './let-through-table'
import { computed, shown, step } from './working'

const input = fields({
  device: oneOf('the device', DEVICE_WORDS),
  In_A: above('the device\'s rating'),
  Icn_A: z.number('Give the breaking capacity in A as a number.').positive('Give the breaking capacity in A as a number above zero.').optional(),
  energyClass,
  k: above('k'),
})
export type LetThroughInput = z.infer<typeof input>
export interface LetThroughResult { I2t_A2s: number, S_min_mm2: number }

export function letThrough(given: LetThroughInput): Answer<LetThroughResult> {
  const { device, In_A, Icn_A, energyClass, k } = given
  const missing = (['device', 'In_A', 'Icn_A', 'energyClass', 'k'] as const).filter(key => given[key] === undefined)
  if (device === undefined || In_A === undefined || Icn_A === undefined || energyClass === undefined) return waiting(missing)
  const found = findLetThrough({ device, In_A, Icn_A, energyClass })
  if (!found) throw new CalculationInputError('device', `The table has no class ${energyClass} device of type ${device}, ${shown(In_A)} A and ${shown(Icn_A)} A breaking capacity. Use the maker's I²t.`)
  const { I2t_A2s, expression, source, confidence } = found
  const energy = step('I²t', expression, I2t_A2s, 'A²s', source, confidence)
  if (k === undefined) return waiting(missing, { result: { I2t_A2s }, working: [energy] })
  const S_min_mm2 = Math.sqrt(I2t_A2s) / k
  return answer({ result: { I2t_A2s, S_min_mm2 }, working: [energy, computed('S least', `√${shown(I2t_A2s)} ÷ ${shown(k)}`, S_min_mm2, 'mm²', 'BS 7671 434.5.2')] })
}

export const letThroughCalculation = defineCalculation({ name: 'let-through', purpose: 'The energy a breaker lets through, and the conductor that survives it.', input, run: letThrough })
