/**
 * How low must an electrode be, to keep a PME earth at a safe voltage when the combined conductor breaks?
 *
 * RA ≤ touch × U0 ÷ (I × (Cmax × U0 − touch))
 *
 * @source BS 7671 Annex A722, from memory; I is the maximum demand (three-phase: the neutral current)
 * @example 60 A -> 1.47 Ω; 32 A -> 2.75 Ω: seldom attainable
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { above, fields, U0_V } from './inputs'
import { shown, step } from './working'

const input = fields({ I_A: above('the current'), U0_V, Cmax: above('Cmax'), touch_V: above('the touch voltage') })
export type PenElectrodeInput = z.infer<typeof input>
export interface PenElectrodeResult { RA_max_ohm: number }

export function penElectrode({ I_A, U0_V = 230, Cmax = 1.1, touch_V = 70 }: PenElectrodeInput): Answer<PenElectrodeResult> {
  if (I_A === undefined) return waiting(['I_A'])
  const rest_V = Cmax * U0_V - touch_V
  if (rest_V <= 0) throw new CalculationInputError('touch_V', 'The touch voltage must be below the supply\'s voltage.')
  const RA_max_ohm = touch_V * U0_V / (I_A * rest_V)
  return answer({
    result: { RA_max_ohm },
    working: [step('RA max', `${shown(touch_V)} × ${shown(U0_V)} ÷ (${shown(I_A)} × (${shown(Cmax)} × ${shown(U0_V)} − ${shown(touch_V)}))`, RA_max_ohm, 'Ω', 'BS 7671 Annex A722', 'from memory')],
    notes: ['EAR-03: an electrode this low is seldom attained at a house.'],
  })
}

export const penElectrodeCalculation = defineCalculation({ name: 'pen-electrode', purpose: 'The electrode that keeps a PME earth safe when the combined conductor breaks.', input, run: penElectrode })
