/**
 * How many volts are lost along the stages of a circuit, and whether that is within the limit.
 *
 * drop = Σ table value (mV per amp per metre) × current × length ÷ 1000, or current × (R1+Rn) × temperature multiplier
 *
 * @source BS 7671 525 and Appendix 4; tables as in tables/volt-drop.data.ts
 * @example 7.3 mV/A/m, 32 A, 18 m -> 4.2048 V, 1.83 % of 230 V
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer, WorkingStep } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { assertCableUse, CABLE_WORDS, findDrop, METHOD_WORDS, notMade, sizesOf } from './cables'
import type { Phases } from './cables'
import { notAbove } from './compare'
import { above, fields, fromZero, oneOf, phases, size_mm2, U_V } from './inputs'
import { computed, shown, step } from './working'
import type { Cited } from './working'

const stage = fields({
  I_A: fromZero('the current'),
  L_m: fromZero('the length'),
  mV_per_A_m: above('the volt drop in mV/A/m'),
  cable: oneOf('the cable', CABLE_WORDS),
  S_mm2: size_mm2,
  method: oneOf('the method', METHOD_WORDS),
  R1Rn_ohm: fromZero('R1+Rn'),
  temperatureMultiplier: above('the temperature multiplier'),
})
const input = fields({
  stages: z.array(stage, 'Give the stages as a list.').max(100, 'At most 100 stages.').optional(),
  U_V, phases,
  use: oneOf('the use', ['lighting', 'other']),
  limit_percent: above('the limit in percent'),
  limit_V: above('the limit in volts'),
})
type Stage = z.infer<typeof stage>
export type VoltDropInput = z.infer<typeof input>

export interface VoltDropResult {
  stage_V: number[]
  total_V: number
  percent: number
  limit_V: number
  /** Of one stage with a length: how long it might be. */
  maxLength_m?: number
  /** Of one stage with a length: the most mV/A/m that would do. */
  required_mV_per_A_m?: number
}

const LIMIT_PERCENT = { lighting: 3, other: 5 } as const

/** How one stage's volts come about: mV/A/m over a length, or a resistance. */
type Way = { kind: 'table', I_A: number, L_m: number, mV: number, cited: Cited } | { kind: 'resistance', I_A: number, ohm: number, multiplier: number, phases: Phases }

export function voltDrop({ stages, phases = 1, U_V = phases === 3 ? 400 : 230, use = 'other', limit_percent = LIMIT_PERCENT[use], limit_V = U_V * limit_percent / 100 }: VoltDropInput): Answer<VoltDropResult> {
  if (!stages?.length) return waiting(['stages'])
  const missing = stages.flatMap((each, index) => missingOf(each).map(key => `stages.${index}.${key}`))
  if (missing.length) return waiting(missing)
  const ways = stages.map((each, index) => wayOf(each, phases, `stages.${index}.`))
  const stage_V = ways.map(stageVolts)
  const total_V = stage_V.reduce((sum, volts) => sum + volts, 0)
  const percent = 100 * total_V / U_V
  const fits = notAbove(total_V, limit_V)
  const rule = use === 'other' ? 'EAR-27: ' : ''
  return answer({
    verdict: fits ? 'within' : 'outside',
    result: { stage_V, total_V, percent, limit_V, ...ways.length === 1 && roomOf(ways[0]!, limit_V) },
    working: [
      ...ways.flatMap((way, index) => showStage(way, stage_V[index]!, ways.length > 1 ? ` (stage ${index + 1})` : '')),
      ...ways.length > 1 ? [computed('volt drop', stage_V.map(shown).join(' + '), total_V, 'V')] : [],
      computed('volt drop', `100 × ${shown(total_V)} ÷ ${shown(U_V)}`, percent, '%'),
    ],
    reasons: [`${rule}${shown(total_V)} V is ${fits ? 'within' : 'more than'} ${shown(limit_V)} V.`],
    notes: stages.some(each => each.R1Rn_ohm !== undefined && each.temperatureMultiplier === undefined) ? ['A measured R1+Rn is taken as cold as it was read: at work the conductors are warmer and lose more. Give the temperature multiplier.'] : [],
  })
}

function missingOf({ I_A, L_m, mV_per_A_m, cable, S_mm2, R1Rn_ohm }: Stage): string[] {
  const missing = I_A === undefined ? ['I_A'] : []
  if (R1Rn_ohm !== undefined) return missing
  if (L_m === undefined) missing.push('L_m')
  if (mV_per_A_m === undefined && cable === undefined) missing.push('mV_per_A_m')
  else if (mV_per_A_m === undefined && S_mm2 === undefined) missing.push('S_mm2')
  return missing
}

function wayOf({ I_A, L_m, mV_per_A_m, cable, S_mm2, method, R1Rn_ohm, temperatureMultiplier = 1 }: Stage, phases: Phases, path: string): Way {
  if (mV_per_A_m !== undefined) return { kind: 'table', I_A: I_A!, L_m: givenLength(L_m, path), mV: mV_per_A_m, cited: { source: 'given', confidence: 'given' } }
  if (cable === undefined || S_mm2 === undefined) return { kind: 'resistance', I_A: I_A!, ohm: R1Rn_ohm!, multiplier: temperatureMultiplier, phases }
  assertCableUse(cable, method, phases, `${path}method`)
  const drop = findDrop(cable, S_mm2, method, phases)
  if (drop) return { kind: 'table', I_A: I_A!, L_m: givenLength(L_m, path), mV: drop.value, cited: drop }
  if (!sizesOf(cable).includes(S_mm2)) throw notMade(`${path}S_mm2`, S_mm2, sizesOf(cable))
  throw new CalculationInputError(`${path}S_mm2`, `The table of volt drops has no ${S_mm2} mm² of this cable. Give mV_per_A_m, from the maker's figures.`)
}

function givenLength(L_m: number | undefined, path: string): number {
  if (L_m === undefined) throw new CalculationInputError(`${path}L_m`, 'Give the length, or R1+Rn alone.')
  return L_m
}

/** A loop of line and neutral loses I × R; between the lines of a balanced three-phase circuit it is √3 ÷ 2 of that. */
function stageVolts(way: Way): number {
  if (way.kind === 'table') return way.mV * way.I_A * way.L_m / 1000
  return way.I_A * way.ohm * way.multiplier * (way.phases === 3 ? Math.sqrt(3) / 2 : 1)
}

function roomOf(way: Way, limit_V: number): Partial<VoltDropResult> {
  if (way.kind !== 'table' || way.I_A === 0) return {}
  return { maxLength_m: limit_V * 1000 / (way.mV * way.I_A), ...way.L_m > 0 && { required_mV_per_A_m: limit_V * 1000 / (way.I_A * way.L_m) } }
}

function showStage(way: Way, volts: number, where: string): WorkingStep[] {
  if (way.kind === 'resistance') return [computed(`volt drop${where}`, `${shown(way.I_A)} × ${shown(way.ohm)} × ${shown(way.multiplier)}${way.phases === 3 ? ' × √3 ÷ 2' : ''}`, volts, 'V')]
  return [
    step(`mV/A/m${where}`, way.cited.confidence === 'given' ? 'as given' : 'by size', way.mV, 'mV/A/m', way.cited.source, way.cited.confidence),
    computed(`volt drop${where}`, `${shown(way.mV)} × ${shown(way.I_A)} × ${shown(way.L_m)} ÷ 1000`, volts, 'V', 'BS 7671 Appendix 4'),
  ]
}

export const voltDropCalculation = defineCalculation({ name: 'volt-drop', purpose: 'The volts lost along a circuit, and whether that is within the limit.', input, run: voltDrop })
