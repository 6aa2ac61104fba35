/**
 * What does the table give for one size of cable?
 *
 * @source BS 7671 Appendix 4, as in tables/current-carrying.data.ts and tables/volt-drop.data.ts
 * @example twin and earth 10 mm², method 100 -> 45 A, 4.4 mV/A/m, 4 mm² protective conductor
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { assertCableUse, CABLE_WORDS, CABLES, findDrop, findRating, METHOD_WORDS, notMade, ownProtectiveConductor, sizesOf } from './cables'
import { fields, oneOf, phases, size_mm2 } from './inputs'
import { step } from './working'

const input = fields({ cable: oneOf('the cable', CABLE_WORDS), S_mm2: size_mm2, method: oneOf('the method', METHOD_WORDS), phases })
export type RatingInput = z.infer<typeof input>
export interface RatingResult {
  It_A: number
  /** null where the table of volt drops ends before this size. */
  mV_per_A_m: number | null
  /** Twin and earth only. */
  cpc_mm2?: number
  table: string
}

export function rating({ cable, S_mm2, method, phases = 1 }: RatingInput): Answer<RatingResult> {
  const needsMethod = cable === undefined || !CABLES[cable].flexible
  const missing = Object.entries({ cable, S_mm2, ...needsMethod && { method } }).filter(([, value]) => value === undefined).map(([key]) => key)
  if (cable === undefined || S_mm2 === undefined || missing.length) return waiting(missing)
  assertCableUse(cable, method, phases)
  const It = findRating(cable, S_mm2, method, phases)
  if (!It) throw notMade('S_mm2', S_mm2, sizesOf(cable))
  const drop = findDrop(cable, S_mm2, method, phases)
  const cpc_mm2 = ownProtectiveConductor(cable, S_mm2)
  const what = `${S_mm2} mm²${method ? `, method ${method}` : ''}, ${phases === 1 ? 'single-phase' : 'three-phase'}`
  return answer({
    result: { It_A: It.value, mV_per_A_m: drop?.value ?? null, ...cpc_mm2 !== null && { cpc_mm2 }, table: It.table },
    working: [
      step('It', what, It.value, 'A', It.source, It.confidence),
      ...drop ? [step('mV/A/m', what, drop.value, 'mV/A/m', drop.source, drop.confidence)] : [],
    ],
    notes: drop ? [] : ['The table of volt drops ends before this size.'],
  })
}

export const ratingCalculation = defineCalculation({ name: 'rating', purpose: 'What the tables give for one size of cable.', input, run: rating })
