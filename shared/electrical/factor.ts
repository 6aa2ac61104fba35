/**
 * What does one circumstance take off a cable's rating?
 *
 * @source BS 7671 Appendix 4, tables 4B1 to 4C3 and 52.2, as in tables/rating-factors.data.ts
 * @example Ca, air at 35 °C, insulation for 70 °C -> 0.94 (Table 4B1)
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { surroundings } from './circuit-input'
import { fields, oneOf } from './inputs'
import { FACTOR_SYMBOLS } from './leg-factors'
import { ambientFactor, depthFactor, groundFactor, groupingFactor, INSULATION_TEMPERATURES, insulationFactor, protectionFactor, soilFactor } from './rating-factors'
import type { FactorFound } from './rating-factors'
import { step } from './working'

const { ambient_C, ground_C, circuits, arrangement, insulationLength_mm, depth_m, rho_Km_per_W, laying } = surroundings
const input = fields({
  symbol: oneOf('the factor', FACTOR_SYMBOLS),
  insulation_C: z.literal(INSULATION_TEMPERATURES, 'Give the insulation\'s temperature as 60, 70 or 90.').optional(),
  ambient_C, ground_C, circuits, arrangement, insulationLength_mm, depth_m, rho_Km_per_W, laying,
})
export type FactorInput = z.infer<typeof input>
export interface FactorResult { factor: number, table: string }

export function factor(given: FactorInput): Answer<FactorResult> {
  const found = find(given)
  if (Array.isArray(found)) return waiting(found)
  return answer({
    result: { factor: found.factor, table: found.table },
    working: [step(given.symbol!, found.expression, found.factor, '', found.source, found.confidence)],
    notes: found.note ? [found.note] : [],
  })
}

/** The factor, or the keys it waits for. */
function find({ symbol, insulation_C = 70, ambient_C, ground_C, circuits, arrangement, insulationLength_mm, depth_m, rho_Km_per_W, laying }: FactorInput): FactorFound | string[] {
  switch (symbol) {
    case undefined: return ['symbol']
    case 'Ca':
      if (ambient_C !== undefined) return ambientFactor(ambient_C, insulation_C)
      return ground_C === undefined ? ['ambient_C'] : groundFactor(ground_C, insulation_C)
    case 'Cg':
      if (circuits === undefined || arrangement === undefined) return [...circuits === undefined ? ['circuits'] : [], ...arrangement === undefined ? ['arrangement'] : []]
      return groupingFactor(circuits, arrangement)
    case 'Ci': return insulationLength_mm === undefined ? ['insulationLength_mm'] : insulationFactor(insulationLength_mm)
    case 'Cs': return rho_Km_per_W === undefined ? ['rho_Km_per_W'] : soilFactor(rho_Km_per_W, laying)
    case 'Cd': return depth_m === undefined ? ['depth_m'] : depthFactor(depth_m, laying)
    case 'Cf':
    case 'Cc': return protectionFactor(symbol)
    default: return symbol satisfies never
  }
}

export const factorCalculation = defineCalculation({ name: 'factor', purpose: 'What one circumstance takes off a cable\'s rating.', input, run: factor })
