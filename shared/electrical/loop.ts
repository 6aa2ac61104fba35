/**
 * What is the earth fault loop impedance at the end of the circuit?
 *
 * Zs = Ze + R1+R2, the latter given or by sizes, length and multiplier
 *
 * @source BS 7671 411.4; IEC 60228
 * @example Ze 0.35 Ω, 6 mm² with 2.5 mm², 18 m, × 1.2 -> 0.576584 Ω
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { conductorResistance } from './conductor-resistance'
import { above, anyNumber, fields, fromZero } from './inputs'
import { computed, shown } from './working'

const input = fields({
  Ze_ohm: fromZero('Ze'),
  R1R2_ohm: fromZero('R1+R2'),
  line_mm2: above('the line conductor\'s size'),
  cpc_mm2: above('the protective conductor\'s size'),
  L_m: fromZero('the length'),
  multiplier: above('the multiplier'),
  temperature_C: anyNumber('the temperature'),
})
export type LoopInput = z.infer<typeof input>
export interface LoopResult { R1R2_ohm: number, Zs_ohm: number }

export function loop(given: LoopInput): Answer<LoopResult> {
  const { Ze_ohm, line_mm2, cpc_mm2, L_m, multiplier, temperature_C } = given
  const missing: string[] = Ze_ohm === undefined ? ['Ze_ohm'] : []
  if (given.R1R2_ohm === undefined) {
    const cable = { line_mm2, cpc_mm2, L_m }
    const left = Object.entries(cable).filter(([, value]) => value === undefined).map(([key]) => key)
    missing.push(...left.length === 3 ? ['R1R2_ohm'] : left)
  }
  if (Ze_ohm === undefined || missing.length) return waiting(missing)
  const cable = given.R1R2_ohm === undefined ? conductorResistance({ line_mm2, cpc_mm2, L_m, multiplier, temperature_C }) : null
  const R1R2_ohm = given.R1R2_ohm ?? cable!.result.R1R2_ohm!
  const Zs_ohm = Ze_ohm + R1R2_ohm
  return answer({ result: { R1R2_ohm, Zs_ohm }, working: [...cable?.working ?? [], computed('Zs', `${shown(Ze_ohm)} + ${shown(R1R2_ohm)}`, Zs_ohm, 'Ω', 'Ze + R1+R2')] })
}

export const loopCalculation = defineCalculation({ name: 'loop', purpose: 'The earth fault loop impedance at the end of a circuit.', input, run: loop })
