/**
 * What current flows in the neutral of an unevenly loaded three-phase supply?
 *
 * IN = √((IL1 − (IL2 + IL3) ÷ 2)² + (√3 ÷ 2 × (IL2 − IL3))²)
 *
 * @source BS 7671 Annex A722 (it prints 0.866 for √3 ÷ 2); loads at one power factor
 * @example 60, 40 and 20 A -> 34.64 A
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { fields } from './inputs'
import { shown, step } from './working'

const input = fields({
  IL_A: z.array(z.number('Give the three line currents as numbers.').nonnegative('Give the three line currents as numbers not below zero.'), 'Give the three line currents as a list.').length(3, 'Give three line currents.').optional(),
})
export type PenThreePhaseInput = z.infer<typeof input>
export interface PenThreePhaseResult { IN_A: number }

export function penThreePhase({ IL_A }: PenThreePhaseInput): Answer<PenThreePhaseResult> {
  if (!IL_A) return waiting(['IL_A'])
  const [first, second, third] = IL_A as [number, number, number]
  const IN_A = Math.hypot(first - (second + third) / 2, Math.sqrt(3) / 2 * (second - third))
  const [a, b, c] = [first, second, third].map(shown)
  return answer({
    result: { IN_A },
    working: [step('IN', `√((${a} − (${b} + ${c}) ÷ 2)² + (√3 ÷ 2 × (${b} − ${c}))²)`, IN_A, 'A', 'BS 7671 Annex A722', 'one source')],
  })
}

export const penThreePhaseCalculation = defineCalculation({ name: 'pen-three-phase', purpose: 'The neutral current of an unevenly loaded three-phase supply.', input, run: penThreePhase })
