/** Judges one size of a circuit's cable by every rule, in the order in which an electrician asks. */
import type { Basis } from './circuit-basis'
import { CABLES, conductorMohmPerM, findDrop, findRating, ownProtectiveConductor } from './cables'
import type { Found } from './cables'
import { notAbove, notBelow } from './compare'
import { shown } from './working'

export interface SizeResult {
  S_mm2: number
  /** The protective conductor that goes with it. */
  cpc_mm2: number
  /** Of the leg that carries least. */
  Iz_A: number
  /** From the origin, with what is lost upstream. */
  volt_drop_V: number
  percent: number
  /** Hot. */
  R1R2_ohm: number
  /** null while Ze (TT: the electrode) is missing. */
  Zs_ohm: number | null
  /** Least protective conductor at the far end. */
  adiabatic_mm2: number | null
  /** Least protective conductor by the device's let-through, where that is known. */
  nearEnd_mm2: number | null
  verdict: 'within' | 'outside' | 'waiting'
  firstReason: string | null
}

export interface JudgedSize extends SizeResult {
  reasons: string[]
  ratings: Found[]
  drop: Found
  legIz_A: number[]
  /** Index of the leg that carries least. */
  binding: number
  mohm_per_m: number
  If_A: number | null
}

export function judgeSize(basis: Basis, S_mm2: number): JudgedSize {
  const ratings = basis.legs.map(leg => findRating(basis.rated, S_mm2, leg.method, basis.phases)!)
  const legIz_A = basis.legs.map((leg, index) => ratings[index]!.value * leg.product)
  const binding = legIz_A.indexOf(Math.min(...legIz_A))
  const drop = findDrop(basis.cable, S_mm2, singleMethod(basis), basis.phases)!
  const volt_drop_V = basis.upstream_V + drop.value * basis.Ib_A * basis.length_m / 1000
  const cpc_mm2 = basis.cpc_mm2 ?? ownProtectiveConductor(basis.cable, S_mm2) ?? S_mm2
  const { flexible } = CABLES[basis.cable]
  const mohm_per_m = conductorMohmPerM(S_mm2, flexible, 'S_mm2') + conductorMohmPerM(cpc_mm2, flexible, 'cpc_mm2')
  const R1R2_ohm = mohm_per_m * basis.length_m * basis.multiplier / 1000
  const Zs_ohm = basis.outside_ohm === undefined ? null : basis.outside_ohm + R1R2_ohm
  const If_A = Zs_ohm === null || Zs_ohm === 0 ? null : basis.U0_V / Zs_ohm
  const adiabatic_mm2 = If_A === null ? null : If_A * Math.sqrt(basis.t_s) / basis.k.k
  const nearEnd_mm2 = basis.letThrough ? Math.sqrt(basis.letThrough.I2t_A2s) / basis.k.k : null
  const figures = { S_mm2, cpc_mm2, Iz_A: legIz_A[binding]!, volt_drop_V, percent: 100 * volt_drop_V / basis.U_V, R1R2_ohm, Zs_ohm, adiabatic_mm2, nearEnd_mm2 }
  const reasons = reasonsAgainst(basis, figures, binding)
  return {
    ...figures,
    verdict: reasons.length ? 'outside' : basis.missing.length ? 'waiting' : 'within',
    firstReason: reasons[0] ?? null,
    reasons, ratings, drop, legIz_A, binding, mohm_per_m, If_A,
  }
}

/** Single-core cable drops less clipped than in conduit in the largest sizes: the lower figure only where every leg is clipped. */
export function singleMethod(basis: Basis) {
  return basis.legs.every(leg => leg.method === 'C') ? 'C' as const : 'B' as const
}

function reasonsAgainst(basis: Basis, size: Omit<SizeResult, 'verdict' | 'firstReason'>, binding: number): string[] {
  const reasons: string[] = []
  if (!notAbove(basis.Ib_A, basis.In_A)) reasons.push(`The load draws ${shown(basis.Ib_A)} A, more than the device's ${shown(basis.In_A)} A.`)
  if (!notBelow(size.Iz_A, basis.In_A)) reasons.push(`${legWords(basis, binding)} carries ${shown(size.Iz_A)} A, less than the device's ${shown(basis.In_A)} A.`)
  if (!notAbove(size.volt_drop_V, basis.limit_V)) reasons.push(`EAR-27: the volt drop is ${shown(size.volt_drop_V)} V, more than ${shown(basis.limit_V)} V.`)
  if (size.Zs_ohm !== null && basis.ZsMax_ohm !== undefined && !notAbove(size.Zs_ohm, basis.ZsMax_ohm)) {
    reasons.push(`${basis.system === 'TT' ? 'EAR-09' : 'TST-08'}: Zs is ${shown(size.Zs_ohm)} Ω, more than ${shown(basis.ZsMax_ohm)} Ω.`)
  }
  if (size.adiabatic_mm2 !== null && !notAbove(size.adiabatic_mm2, size.cpc_mm2)) reasons.push(`The protective conductor is ${shown(size.cpc_mm2)} mm²; a fault at the far end needs ${shown(size.adiabatic_mm2)} mm².`)
  if (size.nearEnd_mm2 !== null && !notAbove(size.nearEnd_mm2, size.cpc_mm2)) reasons.push(`The protective conductor is ${shown(size.cpc_mm2)} mm²; a fault at the near end needs ${shown(size.nearEnd_mm2)} mm².`)
  return reasons
}

export function legWords(basis: Basis, index: number): string {
  const { method } = basis.legs[index]!
  return `Leg ${index + 1}${method ? ` (method ${method})` : ''}`
}
