/**
 * What current flows in a fault, or what impedance stands behind a current?
 *
 * Ipf = U0 ÷ Z
 *
 * @source Ohm's law
 * @example 230 V, 0.09 Ω -> 2555.6 A
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { above, fields, U0_V } from './inputs'
import { computed, shown, step } from './working'

const input = fields({ U0_V, Z_ohm: above('the impedance'), Ipf_A: above('the fault current') })
export type FaultCurrentInput = z.infer<typeof input>
export interface FaultCurrentResult { Ipf_A: number, Z_ohm: number }

export function faultCurrent({ U0_V = 230, Z_ohm, Ipf_A }: FaultCurrentInput): Answer<FaultCurrentResult> {
  if (Z_ohm !== undefined && Ipf_A !== undefined) throw new CalculationInputError('Z_ohm', 'Give the impedance or the fault current, not both.')
  if (Z_ohm !== undefined) {
    const current_A = U0_V / Z_ohm
    return answer({ result: { Ipf_A: current_A, Z_ohm }, working: [computed('Ipf', `${shown(U0_V)} ÷ ${shown(Z_ohm)}`, current_A, 'A')] })
  }
  if (Ipf_A === undefined) return waiting(['Z_ohm'])
  const impedance_ohm = U0_V / Ipf_A
  return answer({ result: { Ipf_A, Z_ohm: impedance_ohm }, working: [step('Ipf', 'as given', Ipf_A, 'A', 'given', 'given'), computed('Z', `${shown(U0_V)} ÷ ${shown(Ipf_A)}`, impedance_ohm, 'Ω')] })
}

export const faultCurrentCalculation = defineCalculation({ name: 'fault-current', purpose: 'Fault current from impedance, or the other way round.', input, run: faultCurrent })
