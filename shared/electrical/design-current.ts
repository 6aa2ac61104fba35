/**
 * What current does a load draw?
 *
 * single-phase: Ib = P ÷ (U × power factor × efficiency); three-phase: the same with √3 × U (U between lines)
 *
 * @source definition of power; no table
 * @example 7.4 kW at 230 V -> 32.17 A
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { above, efficiency, fields, phases, powerFactor, U_V } from './inputs'
import { computed, shown } from './working'

const input = fields({ P_kW: above('the power in kW'), U_V, phases, powerFactor, efficiency })
export type DesignCurrentInput = z.infer<typeof input>
export interface DesignCurrentResult { Ib_A: number }

export function designCurrent({ P_kW, phases = 1, U_V = phases === 3 ? 400 : 230, powerFactor = 1, efficiency = 1 }: DesignCurrentInput): Answer<DesignCurrentResult> {
  if (P_kW === undefined) return waiting(['P_kW'])
  const volts = phases === 3 ? Math.sqrt(3) * U_V : U_V
  const Ib_A = P_kW * 1000 / (volts * powerFactor * efficiency)
  const rest = [powerFactor, efficiency].filter(each => each !== 1).map(each => ` × ${shown(each)}`).join('')
  const divisor = `${phases === 3 ? '√3 × ' : ''}${shown(U_V)}${rest}`
  return answer({
    result: { Ib_A },
    working: [computed('Ib', `${shown(P_kW)} × 1000 ÷ ${divisor.includes('×') ? `(${divisor})` : divisor}`, Ib_A, 'A')],
  })
}

export const designCurrentCalculation = defineCalculation({ name: 'design-current', purpose: 'The current a load draws, from its power.', input, run: designCurrent })
