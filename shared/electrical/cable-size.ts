/**
 * Which size of cable carries the device's rating in its surroundings?
 *
 * It ≥ In ÷ (Ca × Cg × Ci × Cs × Cd × Cf × Cc); Iz = It × the same factors
 *
 * @source BS 7671 433.1 and Appendix 4, clause 5
 * @example 32 A, singles in an insulated wall (A), 35 °C -> at least 34.04 A: 10 mm² (46 A); 6 mm² has 34 A and is outside
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { assertCableUse, CABLE_WORDS, CABLES, findRating, notMade, ratedAs, sizesOf } from './cables'
import type { Found } from './cables'
import { surroundings, terminals_C } from './circuit-input'
import { notAbove, notBelow } from './compare'
import { above, factorGiven, fields, oneOf, phases, size_mm2 } from './inputs'
import { FACTOR_SYMBOLS, findLegFactors, showFactors } from './leg-factors'
import type { Factors } from './leg-factors'
import { computed, shown, step } from './working'

const input = fields({
  In_A: above('the device\'s rating'),
  Ib_A: above('the design current'),
  cable: oneOf('the cable', CABLE_WORDS),
  phases, terminals_C, S_mm2: size_mm2, ...surroundings,
  Ca: factorGiven('Ca'), Cg: factorGiven('Cg'), Ci: factorGiven('Ci'), Cf: factorGiven('Cf'), Cc: factorGiven('Cc'), Cs: factorGiven('Cs'), Cd: factorGiven('Cd'),
})
export type CableSizeInput = z.infer<typeof input>
export interface CableSizeRow { S_mm2: number, It_A: number, Iz_A: number, verdict: 'within' | 'outside' }
export interface CableSizeResult {
  It_min_A: number
  /** The smallest size that is within (or the one asked about); null where none is. */
  S_mm2: number | null
  It_A: number | null
  Iz_A: number | null
  sizes: CableSizeRow[]
  factors: Factors
}

export function cableSize(given: CableSizeInput): Answer<CableSizeResult> {
  const { In_A, Ib_A, cable, phases = 1, method, terminals_C = 70 } = given
  const needsMethod = cable === undefined || !CABLES[cable].flexible
  const missing = Object.entries({ In_A, cable, ...needsMethod && { method } }).filter(([, value]) => value === undefined).map(([key]) => key)
  if (In_A === undefined || cable === undefined || missing.length) return waiting(missing)
  const rated = ratedAs(cable, terminals_C)
  assertCableUse(rated, method, phases)
  const own = Object.fromEntries(FACTOR_SYMBOLS.flatMap(symbol => given[symbol] === undefined ? [] : [[symbol, given[symbol]]])) as Partial<Factors>
  const leg = findLegFactors({ ...given, insulation_C: CABLES[rated].insulation_C, given: own })
  const It_min_A = In_A / leg.product

  const found = sizesOf(rated).flatMap((S_mm2) => {
    const It = findRating(rated, S_mm2, method, phases)
    return It ? [{ S_mm2, It }] : []
  })
  const considered = given.S_mm2 === undefined ? found : found.filter(each => each.S_mm2 === given.S_mm2)
  if (!considered.length) throw notMade('S_mm2', given.S_mm2!, found.map(each => each.S_mm2))
  const deviceFits = Ib_A === undefined || notAbove(Ib_A, In_A)
  const sizes = considered.map(({ S_mm2, It }): CableSizeRow => {
    const Iz_A = It.value * leg.product
    return { S_mm2, It_A: It.value, Iz_A, verdict: deviceFits && notBelow(Iz_A, In_A) ? 'within' : 'outside' }
  })
  const index = given.S_mm2 === undefined ? sizes.findIndex(each => each.verdict === 'within') : 0
  const best = sizes[index]
  return answer({
    verdict: best?.verdict ?? 'outside',
    result: { It_min_A, S_mm2: best?.S_mm2 ?? null, It_A: best?.It_A ?? null, Iz_A: best?.Iz_A ?? null, sizes, factors: leg.factors },
    working: [
      ...leg.steps,
      computed('It least', `${shown(In_A)}${showFactors(leg.factors, '÷')}`, It_min_A, 'A', 'BS 7671 Appendix 4'),
      ...best ? showSize(best, considered[index]!.It, leg.factors, method) : [],
    ],
    reasons: reasonsFor(given, best, sizes.at(-1)!, deviceFits),
    notes: rated === cable ? leg.notes : [`The cable is rated as ${CABLES[rated].insulation_C} °C cable, because its terminals stand 70 °C.`, ...leg.notes],
  })
}

function showSize(size: CableSizeRow, It: Found, factors: Factors, method: string | undefined) {
  return [
    step('It', `${size.S_mm2} mm²${method ? `, method ${method}` : ''}`, It.value, 'A', It.source, It.confidence),
    computed('Iz', `${shown(It.value)}${showFactors(factors)}`, size.Iz_A, 'A', 'BS 7671 Appendix 4'),
  ]
}

function reasonsFor({ In_A, Ib_A }: CableSizeInput, best: CableSizeRow | undefined, largest: CableSizeRow, deviceFits: boolean): string[] {
  if (!deviceFits) return [`The load draws ${shown(Ib_A!)} A, more than the device's ${shown(In_A!)} A.`]
  if (!best) return [`No size of this cable carries enough: ${largest.S_mm2} mm² carries ${shown(largest.Iz_A)} A, less than the device's ${shown(In_A!)} A.`]
  return [`${best.S_mm2} mm² carries ${shown(best.Iz_A)} A, ${best.verdict === 'within' ? 'at least' : 'less than'} the device's ${shown(In_A!)} A.`]
}

export const cableSizeCalculation = defineCalculation({ name: 'cable-size', purpose: 'Which size of cable carries the device\'s rating in its surroundings.', input, run: cableSize })
