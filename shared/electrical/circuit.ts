/**
 * Which size of cable does the whole circuit need, and what binds it?
 *
 * each leg: Iz = It × factors ≥ In;  drop = mV/A/m × Ib × total length ÷ 1000 within the limit;  Zs = Ze + R1+R2 (hot)
 * within the device's overcurrent limit (TT: 50 V ÷ IΔn);  protective conductor ≥ If × √t ÷ k
 *
 * @source BS 7671 Appendix 4, chapters 41 and 54; tables as named in each step
 * @example 32 A, type B, 6 mm² twin and earth clipped over 18 m, Ze 0.35 Ω -> 4.2048 V, Zs 0.5766 Ω, within
 */
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { circuitBasis, missingAtAll } from './circuit-basis'
import type { Basis } from './circuit-basis'
import { circuitInput } from './circuit-input'
import type { CircuitInput } from './circuit-input'
import { judgeSize } from './circuit-sizes'
import type { JudgedSize, SizeResult } from './circuit-sizes'
import { circuitWorking } from './circuit-working'
import type { MethodWord } from './cables'
import type { Factors } from './leg-factors'

export interface CircuitLeg {
  method: MethodWord | null
  L_m: number
  It_A: number
  factors: Factors
  Iz_A: number
  /** What this leg loses. */
  volt_drop_V: number
  /** How long this leg may be while the others stay as they are. */
  maxLength_m: number
  /** Whether this leg carries least. */
  binding: boolean
}

export interface CircuitResult {
  Ib_A: number
  sizes: SizeResult[]
  /** The smallest size that is within; null where none is. */
  S_mm2: number | null
  /** The size whose legs and working are shown: the one asked for, else the smallest within, else the largest made. */
  shown_mm2: number
  legs: CircuitLeg[]
  /** Index into `legs`. */
  bindingLeg: number
  /** Longest whole route at the size shown, and what sets it. */
  maxLength_m: number
  maxLengthBy: 'volt drop' | 'loop impedance'
  limit_V: number
  ZsMax_ohm: number | null
}

export function circuit(input: CircuitInput): Answer<CircuitResult> {
  const missing = missingAtAll(input)
  if (missing.length) return waiting(missing)
  const basis = circuitBasis(input)
  const judged = basis.sizes.map(size => judgeSize(basis, size))
  const best = judged.find(size => size.verdict === 'within')
  const pending = judged.find(size => size.verdict === 'waiting')
  const show = best ?? pending ?? judged.at(-1)!
  const result: CircuitResult = {
    Ib_A: basis.Ib_A,
    sizes: judged.map(toSizeResult),
    S_mm2: best?.S_mm2 ?? null,
    shown_mm2: show.S_mm2,
    ...legsOf(basis, show),
    limit_V: basis.limit_V,
    ZsMax_ohm: basis.ZsMax_ohm ?? null,
  }
  const rest = { result, working: circuitWorking(basis, show), notes: basis.notes }
  if (show.verdict === 'waiting') return waiting(basis.missing, rest)
  return answer({ verdict: show.verdict, ...rest, reasons: reasonsOf(input, judged, show) })
}

function reasonsOf(input: CircuitInput, judged: JudgedSize[], show: JudgedSize): string[] {
  if (show.verdict === 'within') return [`${show.S_mm2} mm² is ${input.S_mm2 === undefined ? 'the smallest size ' : ''}within every limit.`]
  if (input.S_mm2 !== undefined || judged.length === 1) return show.reasons
  return ['No size of this cable is within every limit.', ...show.reasons]
}

function toSizeResult({ S_mm2, cpc_mm2, Iz_A, volt_drop_V, percent, R1R2_ohm, Zs_ohm, adiabatic_mm2, nearEnd_mm2, verdict, firstReason }: JudgedSize): SizeResult {
  return { S_mm2, cpc_mm2, Iz_A, volt_drop_V, percent, R1R2_ohm, Zs_ohm, adiabatic_mm2, nearEnd_mm2, verdict, firstReason }
}

function legsOf(basis: Basis, size: JudgedSize) {
  const byDrop_m = (basis.limit_V - basis.upstream_V) * 1000 / (size.drop.value * basis.Ib_A)
  const byLoop_m = basis.ZsMax_ohm === undefined || basis.outside_ohm === undefined
    ? Number.POSITIVE_INFINITY
    : (basis.ZsMax_ohm - basis.outside_ohm) * 1000 / (size.mohm_per_m * basis.multiplier)
  const maxLength_m = Math.max(0, Math.min(byDrop_m, byLoop_m))
  return {
    legs: basis.legs.map((leg, index): CircuitLeg => ({
      method: leg.method ?? null,
      L_m: leg.L_m,
      It_A: size.ratings[index]!.value,
      factors: leg.factors,
      Iz_A: size.legIz_A[index]!,
      volt_drop_V: size.drop.value * basis.Ib_A * leg.L_m / 1000,
      maxLength_m: Math.max(0, maxLength_m - (basis.length_m - leg.L_m)),
      binding: index === size.binding,
    })),
    bindingLeg: size.binding,
    maxLength_m,
    maxLengthBy: byLoop_m < byDrop_m ? 'loop impedance' as const : 'volt drop' as const,
  }
}

export const circuitCalculation = defineCalculation({ name: 'circuit', purpose: 'Every size of a cable judged on the whole circuit: capacity, volt drop, loop impedance, protective conductor.', input: circuitInput, run: circuit })
