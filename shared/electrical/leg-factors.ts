/**
 * The factors that meet on one stretch of cable. A factor belongs where its circumstance is: ground figures only where
 * the cable is buried (method D), insulation not on top of a 101 or 103 rating, which holds it already.
 */
import { CalculationInputError } from '../utils/calculation'
import type { WorkingStep } from '../utils/answer'
import type { MethodWord } from './cables'
import { ambientFactor, depthFactor, groundFactor, groupingFactor, insulationFactor, isBelowGround, protectionFactor, soilFactor } from './rating-factors'
import type { Arrangement, FactorFound, InsulationTemperature, Laying } from './rating-factors'
import { shown, step } from './working'

export const FACTOR_SYMBOLS = ['Ca', 'Cg', 'Ci', 'Cs', 'Cd', 'Cf', 'Cc'] as const
export type FactorSymbol = (typeof FACTOR_SYMBOLS)[number]
export type Factors = Record<FactorSymbol, number>

export interface Surroundings {
  method?: MethodWord
  ambient_C?: number
  ground_C?: number
  circuits?: number
  arrangement?: Arrangement
  insulationLength_mm?: number
  depth_m?: number
  rho_Km_per_W?: number
  laying?: Laying
}

export interface LegFactors {
  factors: Factors
  /** All of them multiplied. */
  product: number
  steps: WorkingStep[]
  notes: string[]
}

interface Given extends Surroundings {
  insulation_C: InsulationTemperature
  /** Factors the person gave; each outranks what the surroundings would say. */
  given?: Partial<Factors>
  /** A semi-enclosed fuse brings Cf. */
  device?: string
  /** Where in the input this stretch sits, such as `legs.0.`. */
  path?: string
}

export function findLegFactors(leg: Given): LegFactors {
  const { given = {}, path = '' } = leg
  const buried = leg.method === 'D'
  const factors: Factors = { Ca: 1, Cg: 1, Ci: 1, Cs: 1, Cd: 1, Cf: 1, Cc: 1 }
  const steps: WorkingStep[] = []
  const notes: string[] = []

  const take = (symbol: FactorSymbol, look: () => FactorFound | null) => {
    const own = given[symbol]
    if (own !== undefined) {
      factors[symbol] = own
      if (own !== 1) steps.push(step(symbol, 'as given', own, '', 'given', 'given'))
      return
    }
    const found = look()
    if (!found) return
    factors[symbol] = found.factor
    steps.push(step(symbol, found.expression, found.factor, '', found.source, found.confidence))
    if (found.note) notes.push(found.note)
  }

  take('Ca', () => {
    if (buried) return leg.ground_C === undefined ? null : groundFactor(leg.ground_C, leg.insulation_C, `${path}ground_C`)
    return leg.ambient_C === undefined ? null : ambientFactor(leg.ambient_C, leg.insulation_C, `${path}ambient_C`)
  })
  take('Cg', () => grouping(leg, buried, path, notes))
  if (leg.method === '101' || leg.method === '103') {
    if ((given.Ci ?? 1) !== 1 || leg.insulationLength_mm) notes.push(`The rating of method ${leg.method} already holds the thermal insulation: no Ci is taken on top.`)
  }
  else take('Ci', () => leg.insulationLength_mm === undefined ? null : insulationFactor(leg.insulationLength_mm))
  const laying = leg.laying ?? layingOf(leg.arrangement)
  take('Cs', () => buried && leg.rho_Km_per_W !== undefined ? soilFactor(leg.rho_Km_per_W, laying, `${path}rho_Km_per_W`) : null)
  take('Cd', () => buried && leg.depth_m !== undefined ? depthFactor(leg.depth_m, laying, `${path}depth_m`) : null)
  take('Cf', () => leg.device === 'BS3036' ? protectionFactor('Cf') : null)
  take('Cc', () => null)

  if (buried && leg.ambient_C !== undefined) notes.push('A buried leg goes by the temperature of the ground: the air temperature is left out of it.')
  if (!buried && (leg.ground_C !== undefined || leg.rho_Km_per_W !== undefined || leg.depth_m !== undefined)) notes.push('Ground temperature, soil and depth count on a buried leg (method D) only: they are left out here.')
  return { factors, product: FACTOR_SYMBOLS.reduce((product, symbol) => product * factors[symbol], 1), steps, notes }
}

function grouping(leg: Given, buried: boolean, path: string, notes: string[]): FactorFound | null {
  if (leg.circuits === undefined) return null
  const arrangement = leg.arrangement ?? (buried ? 'buried-touching' : 'bunched')
  if (leg.circuits > 1) {
    if (isBelowGround(arrangement) !== buried) {
      throw new CalculationInputError(`${path}arrangement`, buried ? 'A buried leg (method D) needs an arrangement that begins with buried or ducts.' : `The arrangement ${arrangement} belongs to a buried leg (method D).`)
    }
    if (!leg.arrangement) notes.push(`No arrangement is given for the grouped circuits: ${arrangement} is taken, which takes off the most.`)
  }
  return groupingFactor(leg.circuits, arrangement, `${path}circuits`)
}

function layingOf(arrangement: Arrangement | undefined): Laying | undefined {
  if (!arrangement || !isBelowGround(arrangement)) return undefined
  return arrangement.startsWith('ducts') ? 'ducts' : 'direct'
}

/** The factors that are not 1, as they stand in a product: ` × 0.94 × 0.8`. */
export function showFactors(factors: Factors, sign = '×'): string {
  return FACTOR_SYMBOLS.filter(symbol => factors[symbol] !== 1).map(symbol => ` ${sign} ${shown(factors[symbol])}`).join('')
}
