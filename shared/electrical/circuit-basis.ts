/** What a circuit's sizes are judged on: everything that does not change from size to size. */
import { CalculationInputError } from '../utils/calculation'
import type { WorkingStep } from '../utils/answer'
import { findK } from './adiabatic-k'
import type { KFound } from './adiabatic-k'
import { assertCableUse, CABLES, findDrop, findRating, notMade, ratedAs, sizesOf } from './cables'
import type { CableWord, MethodWord, Phases } from './cables'
import type { CircuitInput } from './circuit-input'
import { designCurrent } from './design-current'
import { findDeviceLimit } from './device-limits'
import type { DeviceLimit } from './device-limits'
import { findLegFactors } from './leg-factors'
import type { LegFactors } from './leg-factors'
import { findLetThrough, TABULATED_ICN } from './let-through-table'
import type { LetThrough } from './let-through-table'
import { exactRow } from './lookup'
import { table60228 } from './tables/conductors.data'

export interface Leg extends LegFactors { method: MethodWord | undefined, L_m: number }

export interface Basis {
  Ib_A: number
  IbSteps: WorkingStep[]
  In_A: number
  phases: Phases
  cable: CableWord
  /** The cable whose table rates it, given its terminals. */
  rated: CableWord
  legs: Leg[]
  length_m: number
  U_V: number
  U0_V: number
  limit_V: number
  upstream_V: number
  /** From 20 °C to the conductor at work. */
  multiplier: number
  cpc_mm2: number | undefined
  system: 'TN' | 'TT'
  /** Ze, or in TT the electrode. */
  outside_ohm: number | undefined
  /** The largest Zs allowed; undefined while something for it is missing. */
  ZsMax_ohm: number | undefined
  overcurrent: DeviceLimit | undefined
  IdeltaN_A: number | undefined
  /** What the adiabatic check at the far end takes. */
  t_s: number
  k: KFound
  letThrough: LetThrough | undefined
  sizes: number[]
  missing: string[]
  notes: string[]
}

/** TN: the fault lasts by convention 0.1 s for a device that acts at once; TT: the residual current device has 0.2 s. */
const FAR_END_TIME_S = { TN: 0.1, TT: 0.2 } as const
const DISCONNECTION_TIME_S = 0.4
const TOUCH_V = 50

/** The keys without which no size can be judged at all. */
export function missingAtAll(input: CircuitInput): string[] {
  const missing: string[] = []
  if (input.Ib_A === undefined && input.P_kW === undefined) missing.push('Ib_A')
  if (input.In_A === undefined) missing.push('In_A')
  if (input.cable === undefined) missing.push('cable')
  if (!input.legs?.length) missing.push('legs')
  input.legs?.forEach((leg, index) => {
    if (leg.method === undefined && input.cable && !CABLES[input.cable].flexible) missing.push(`legs.${index}.method`)
    if (leg.L_m === undefined) missing.push(`legs.${index}.L_m`)
  })
  return missing
}

export function circuitBasis(input: CircuitInput): Basis {
  const { phases = 1, U_V = phases === 3 ? 400 : 230, U0_V = 230, Cmin = 0.95, terminals_C = 70, system = 'TN', limit_percent = 5 } = input
  const cable = input.cable!
  const rated = ratedAs(cable, terminals_C)
  const notes: string[] = []
  if (rated !== cable) notes.push(`The cable is rated as ${CABLES[rated].insulation_C} °C cable, because its terminals stand 70 °C.`)
  const power = input.Ib_A === undefined ? designCurrent({ P_kW: input.P_kW, U_V, phases, powerFactor: input.powerFactor }) : null
  const legs = input.legs!.map((leg, index) => toLeg(input, leg, index, rated, phases))
  if (legs.some(leg => leg.method === 'D') && input.Cc === undefined) notes.push('A buried circuit sized by method D may need Cc 0.9 (BS 7671 Appendix 4): it is taken only where it is given.')
  if (input.Cc !== undefined && input.Cc !== 1 && !legs.some(leg => leg.method === 'D')) notes.push('Cc counts on a buried leg (method D) only: it is left out here.')

  const overcurrent = findOvercurrent(input, system, { Cmin, U0_V })
  const loop = system === 'TT'
    ? { outside_ohm: input.RA_ohm, ZsMax_ohm: input.IdeltaN_A === undefined ? undefined : TOUCH_V / input.IdeltaN_A }
    : { outside_ohm: input.Ze_ohm, ZsMax_ohm: overcurrent?.ZsMax_ohm }
  const needed = system === 'TT' ? { RA_ohm: input.RA_ohm, IdeltaN_A: input.IdeltaN_A } : { device: input.device, Ze_ohm: input.Ze_ohm }
  const near = findNearEnd(input)
  notes.push(...near.notes, ...overcurrent?.notes ?? [], ...legs.flatMap(leg => leg.notes))

  return {
    Ib_A: input.Ib_A ?? power!.result.Ib_A!,
    IbSteps: power?.working ?? [],
    In_A: input.In_A!, phases, cable, rated, legs,
    length_m: legs.reduce((sum, leg) => sum + leg.L_m, 0),
    U_V, U0_V, limit_V: U_V * limit_percent / 100, upstream_V: input.upstreamDrop_V ?? 0,
    multiplier: terminals_C === 90 && CABLES[cable].insulation_C === 90 ? 1.28 : 1.2,
    cpc_mm2: input.cpc_mm2, system, ...loop, overcurrent, IdeltaN_A: input.IdeltaN_A,
    t_s: FAR_END_TIME_S[system],
    k: findK({ material: 'copper', insulation: CABLES[cable].insulation, arrangement: 'in-cable' }),
    letThrough: near.letThrough,
    sizes: usableSizes(input, rated, legs, phases, notes),
    missing: Object.entries(needed).filter(([, value]) => value === undefined).map(([key]) => key),
    notes: [...new Set(notes)],
  }
}

function toLeg(input: CircuitInput, leg: NonNullable<CircuitInput['legs']>[number], index: number, rated: CableWord, phases: Phases): Leg {
  const path = `legs.${index}.`
  assertCableUse(rated, leg.method, phases, `${path}method`)
  const given = leg.method === 'D' && input.Cc !== undefined ? { Cc: input.Cc } : {}
  return { method: leg.method, L_m: leg.L_m!, ...findLegFactors({ ...leg, insulation_C: CABLES[rated].insulation_C, device: input.device, given, path }) }
}

/** In TT the overcurrent limit is information only, so a rating the table lacks is no reason to refuse. */
function findOvercurrent({ device, In_A }: CircuitInput, system: 'TN' | 'TT', rest: { Cmin: number, U0_V: number }): DeviceLimit | undefined {
  if (device === undefined) return undefined
  try {
    return findDeviceLimit({ device, In_A: In_A!, time_s: DISCONNECTION_TIME_S, ...rest })
  }
  catch (error) {
    if (system === 'TT' && error instanceof CalculationInputError) return undefined
    throw error
  }
}

function findNearEnd({ device, In_A, Ipf_kA, device_kA, energyClass }: CircuitInput): { letThrough?: LetThrough, notes: string[] } {
  const notes: string[] = []
  if (Ipf_kA !== undefined && device_kA !== undefined && device_kA < Ipf_kA) notes.push(`TST-10: the device breaks ${device_kA} kA and the fault current is ${Ipf_kA} kA. Judge its breaking capacity together with the consumer unit's conditional rating.`)
  if (Ipf_kA === undefined || energyClass === undefined || device === undefined) {
    return { notes: [...notes, 'The protective conductor was not checked at the near end, where a fault is cleared in under 0.1 s: that takes the fault current and the device\'s energy class.'] }
  }
  const Icn_A = device_kA === undefined ? TABULATED_ICN.find(each => each >= Ipf_kA * 1000) : device_kA * 1000
  const letThrough = Icn_A === undefined ? null : findLetThrough({ device, In_A: In_A!, Icn_A, energyClass })
  if (!letThrough) return { notes: [...notes, 'The protective conductor was not checked at the near end: the table of let-through energies has no such device. Use the maker\'s figure.'] }
  if (device_kA === undefined) notes.push(`The device's breaking capacity is not given: the let-through of a ${Icn_A} A device is taken.`)
  return { letThrough, notes }
}

/** Sizes that have a rating on every leg, a volt drop and a resistance; those without a volt drop in the tables are named. */
function usableSizes(input: CircuitInput, rated: CableWord, legs: Leg[], phases: Phases, notes: string[]): number[] {
  const cable = input.cable!
  const sizes = sizesOf(rated).filter(size => legs.every(leg => findRating(rated, size, leg.method, phases)) && exactRow(table60228.rows, 'size_mm2', size))
  const usable = sizes.filter(size => findDrop(cable, size, undefined, phases))
  if (input.S_mm2 !== undefined) {
    if (!usable.includes(input.S_mm2)) throw notMade('S_mm2', input.S_mm2, usable)
    return [input.S_mm2]
  }
  if (usable.length < sizes.length && CABLES[cable].flexible) notes.push(`The table of volt drops ends at ${usable.at(-1)} mm² for this cable: larger sizes are left out.`)
  return usable
}
