/**
 * How large must a protective conductor be where nobody calculates it?
 *
 * up to 16 mm²: the line's size; up to 35: 16; above: half; of another material × k1 ÷ k2
 *
 * @source BS 7671 Table 54.7
 * @example line 10 mm², k1 143, k2 46 -> 31.09 mm², next size 35
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notBelow } from './compare'
import { above, fields } from './inputs'
import { nextStandardSize } from './standard-sizes'
import { tableProtectiveSizes } from './table-54-7'
import { computed, shown, step } from './working'

const input = fields({ line_mm2: above('the line conductor\'s size'), k1: above('k1'), k2: above('k2'), actual_mm2: above('the actual size') })
export type ProtectiveConductorInput = z.infer<typeof input>
export interface ProtectiveConductorResult { required_mm2: number, standard_mm2: number | null }

export function protectiveConductor({ line_mm2, k1, k2, actual_mm2 }: ProtectiveConductorInput): Answer<ProtectiveConductorResult> {
  const missing = [...line_mm2 === undefined ? ['line_mm2'] : [], ...k1 === undefined && k2 !== undefined ? ['k1'] : [], ...k2 === undefined && k1 !== undefined ? ['k2'] : []]
  if (line_mm2 === undefined || missing.length) return waiting(missing)
  const base = tableProtectiveSizes(line_mm2)
  const required_mm2 = k1 === undefined || k2 === undefined ? base.size_mm2 : base.size_mm2 * k1 / k2
  const standard_mm2 = nextStandardSize(required_mm2)
  const fits = actual_mm2 === undefined ? null : notBelow(actual_mm2, required_mm2)
  return answer({
    verdict: fits === null ? null : fits ? 'within' : 'outside',
    result: { required_mm2, standard_mm2 },
    working: [
      step('S by table', base.expression, base.size_mm2, 'mm²', 'Table 54.7', 'two sources'),
      ...k1 === undefined || k2 === undefined ? [] : [computed('S required', `${shown(base.size_mm2)} × ${shown(k1)} ÷ ${shown(k2)}`, required_mm2, 'mm²', 'Table 54.7')],
    ],
    reasons: fits === null ? [] : [`${shown(actual_mm2!)} mm² is ${fits ? 'at least' : 'less than'} the ${shown(required_mm2)} mm² of the table.`],
    notes: fits === false ? ['A smaller conductor may still do by calculation (adiabatic).'] : [],
  })
}

export const protectiveConductorCalculation = defineCalculation({ name: 'protective-conductor', purpose: 'The protective conductor by table, where it is not calculated.', input, run: protectiveConductor })
