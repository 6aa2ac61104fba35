/** The job's calculations, each asked on what the record holds. */
import { circuitCalculation, type CircuitResult } from '../../electrical/circuit'
import { demandCalculation } from '../../electrical/demand'
import { supplyCalculation, type SupplyResult } from '../../electrical/supply'
import type { JobRecord, PartContent } from '../../types/record'
import { formatAmps } from '../../utils/figures'
import { earthingMethodCalculation } from '../rules/earthing-method'
import { mountingCalculation } from '../rules/mounting'
import { networkRouteCalculation } from '../rules/network-route'
import { numberOf, phasesOf, textOf, yesOf } from './facts'
import { fieldRef, readingRef } from './field-refs'
import { demandItems, type JobInputs } from './inputs-from-record'
import { judged, type Asked } from './judged'
import type { HouseDemand, Judged } from './types'

const survey = (field: string, words?: string) => fieldRef('survey', 'survey', field, words)
const designedRef = (field: string, words?: string) => fieldRef('circuit', 'designed', field, words)
const installedRef = (field: string, words?: string) => fieldRef('circuit', 'installed', field, words)

export function judgeDemand(record: JobRecord) {
  const { items, incomplete } = demandItems(record)
  const blanks = incomplete.map(key => fieldRef('appliance', key, 'I_A', 'an appliance\'s current or power'))
  const first = { page: 'supply' as const, field: 'appliance', words: 'the appliances in the dwelling' }
  // One appliance without a figure would make the sum too low: then there is no sum.
  return judged(demandCalculation, { title: 'What the house draws at most', input: incomplete.length ? {} : { items }, from: { items: blanks.length ? blanks : first } })
}

/** Both ways where both are known; the greater counts (our choice, on the safe side). */
export function houseDemand(record: JobRecord, allowances: number | undefined): HouseDemand {
  const recorded = numberOf(record.parts.recordedDemand.find(row => row.key === 'recorded')?.content ?? {}, 'max_A')
  const used = recorded === undefined ? allowances : allowances === undefined ? recorded : Math.max(recorded, allowances)
  const way = used === undefined ? null : used === recorded && used !== allowances ? 'recorded' as const : 'allowances' as const
  const both = recorded !== undefined && allowances !== undefined
  const words = used === undefined
    ? 'Enter the appliances or the recorded readings.'
    : way === 'recorded'
      ? `${formatAmps(used)} as recorded${both ? `; ${formatAmps(allowances)} by allowances, the greater counts` : ''}`
      : `${formatAmps(used)} by allowances${both ? `; ${formatAmps(recorded)} as recorded, the greater counts` : ''}`
  return { allowances_A: allowances ?? null, recorded_A: recorded ?? null, used_A: used ?? null, way, words }
}

export function judgeSupply(inputs: JobInputs, house: HouseDemand, demandWaitsFor: Judged<unknown>['waitsFor']): Judged<SupplyResult> {
  return judged(supplyCalculation, {
    title: 'Whether the main fuse carries the house and the charger',
    input: {
      fuse_A: numberOf(inputs.survey, 'cutout_A'), fuseKnown: inputs.fuseKnown, house_A: house.used_A, ev_A: inputs.ev_A,
      ...(inputs.limitState !== 'none' && { loadLimit_A: inputs.loadLimit_A, limiterTested: inputs.limiterTested }),
    },
    from: {
      fuse_A: survey('cutout_A', 'the main fuse\'s rating'), fuseKnown: survey('cutout_A', numberOf(inputs.survey, 'cutout_A') === undefined ? 'the main fuse\'s rating' : inputs.fuseKnown === 'assumed' ? 'the main fuse\'s rating, read or told: it is only assumed' : 'how the main fuse\'s rating is known'),
      house_A: demandWaitsFor, ev_A: designedRef('Ib_A', 'the charger\'s current'), limiterTested: readingRef('limiter'),
    },
  })
}

export function judgeRoute(record: JobRecord, inputs: JobInputs, supply: Partial<SupplyResult>, supplyWaitsFor: Judged<unknown>['waitsFor']) {
  const { survey: s, wanted } = inputs
  const isLimited = inputs.limitState === 'planned' || inputs.limitState === 'fitted'
  const seen = s.service_ok
  return judged(networkRouteCalculation, {
    title: 'Whether the network operator is asked first or told afterwards',
    input: {
      md_after_A: isLimited ? supply.demandIfLimited_A : supply.demandAfter_A,
      cutout_A: numberOf(s, 'cutout_A'), cutout_known: inputs.fuseKnown,
      looped: yesOf(s, 'looped'), service_ok: seen === 'sound' ? true : seen === 'unsafe' ? false : undefined, unmetered: yesOf(s, 'unmetered'),
      device_standard: yesOf(wanted, 'device_standard'), export_A: numberOf(wanted, 'export_A'), total_generation_kW: numberOf(s, 'generation_kW'),
      limiter: inputs.limitState, country: record.premises.country, phases: inputs.supplyPhases,
    },
    from: {
      md_after_A: supplyWaitsFor, cutout_A: survey('cutout_A'), cutout_known: survey('cutout_A', 'how the main fuse\'s rating is known'),
      looped: survey('looped', 'whether the supply is looped'), service_ok: survey('service_ok', 'how cut-out, meter and tails look'), unmetered: survey('unmetered', 'whether the supply is unmetered'),
      device_standard: fieldRef('wanted', 'wanted', 'device_standard', 'the maker\'s word on emission standards'), export_A: fieldRef('wanted', 'wanted', 'export_A', 'what the charger can export'),
      total_generation_kW: survey('generation_kW', 'generation and storage in all'), limiter: fieldRef('loadLimit', 'limit', 'state'),
    },
  })
}

export function judgeEarthing(inputs: JobInputs) {
  const { arrangement } = inputs
  return judged(earthingMethodCalculation, {
    title: 'Whether the earthing method suits the supply and the charger',
    input: {
      supply: arrangement === 'TN-C-S' ? 'PME' : arrangement, phases: inputs.supplyPhases, outdoors: yesOf(inputs.survey, 'outdoors'),
      method: textOf(inputs.earthing, 'method'), chargerPhases: phasesOf(inputs.installed, 'phases') ?? phasesOf(inputs.wanted, 'phases'),
    },
    from: {
      supply: survey('earthing', inputs.survey.earthing_how === 'assumed' ? 'the earthing arrangement, which is only assumed' : 'the earthing arrangement'), phases: survey('supply_phases', 'the phases of the supply'),
      outdoors: survey('outdoors', 'whether the vehicle charges out of doors'), method: fieldRef('earthing', 'earthing', 'method', 'the earthing method'), chargerPhases: designedRef('phases', 'the charger\'s phases'),
    },
  })
}

export function judgeMounting(inputs: JobInputs) {
  return judged(mountingCalculation, {
    title: 'Whether the outlet is at a height that the rules allow',
    input: { lowest_m: numberOf(inputs.charger, 'height_m'), kind: 'socket' },
    from: { lowest_m: fieldRef('equipment', 'charger', 'height_m', 'the charger\'s lowest height') },
  })
}

/** The circuit as designed: with every size compared, and at the chosen size alone. */
export function judgeDesigned(inputs: JobInputs): { designed: Judged<CircuitResult>, chosen: Judged<CircuitResult> } {
  const asked = circuitAsked(inputs, inputs.designed, { Ib_A: inputs.designedEv_A, legs: inputs.legs, title: 'The circuit as designed', ref: designedRef })
  const designed = judged(circuitCalculation, asked)
  const S_mm2 = numberOf(inputs.designed, 'S_mm2')
  if (S_mm2 === undefined) return { designed, chosen: designed }
  return { designed, chosen: judged(circuitCalculation, { ...asked, input: { ...asked.input, S_mm2, ...cpc(inputs.designed) } }) }
}

/** The circuit as installed at its own size. A run found longer than drawn stretches every leg in proportion (our convention). */
export function judgeInstalled(inputs: JobInputs, fallback_mm2: number | undefined): Judged<CircuitResult> {
  const stretch = inputs.fitted_m !== undefined && inputs.designed_m ? inputs.fitted_m / inputs.designed_m : 1
  const legs = stretch === 1 ? inputs.legs : inputs.legs.map(leg => ({ ...leg, ...(typeof leg.L_m === 'number' && { L_m: leg.L_m * stretch }) }))
  const asked = circuitAsked(inputs, inputs.installed, { Ib_A: inputs.ev_A, legs, title: 'The circuit as installed', ref: installedRef })
  return judged(circuitCalculation, { ...asked, input: { ...asked.input, S_mm2: numberOf(inputs.installed, 'S_mm2') ?? fallback_mm2, ...cpc(inputs.installed) } })
}

const cpc = (content: PartContent) => ({ cpc_mm2: numberOf(content, 'cpc_mm2') })

interface CircuitFrom { Ib_A: number | undefined, legs: Record<string, unknown>[], title: string, ref: typeof designedRef }

function circuitAsked(inputs: JobInputs, content: PartContent, { Ib_A, legs, title, ref }: CircuitFrom): Asked {
  const { system } = inputs.facts
  const outside = system === 'TT' ? { RA_ohm: inputs.RA_ohm ?? numberOf(inputs.earthing, 'RA_max_ohm') } : { Ze_ohm: inputs.Ze?.value }
  return {
    title,
    input: {
      Ib_A, device: textOf(content, 'device'), In_A: numberOf(content, 'In_A'), phases: inputs.circuitPhases, cable: textOf(content, 'cable'), terminals_C: numberOf(content, 'terminals_C'),
      legs: legs.length ? legs : undefined, system, ...outside, IdeltaN_A: system === 'TT' ? inputs.IdeltaN_A : undefined,
      Ipf_kA: inputs.Ipf_kA || undefined, device_kA: numberOf(content, 'device_kA'), energyClass: numberOf(content, 'energyClass'),
    },
    from: {
      Ib_A: ref('Ib_A', 'the design current'), In_A: ref('In_A', 'the device\'s rating'), device: ref('device', 'the protective device'), cable: ref('cable', 'the cable'), S_mm2: ref('S_mm2', 'the size of the line conductor'),
      cpc_mm2: ref('cpc_mm2', 'the size of the protective conductor'), phases: ref('phases'), legs: { page: 'cable', field: 'leg', words: 'the legs of the route, each with its way of fixing and its length' },
      Ze_ohm: inputs.survey.earthing === undefined ? survey('earthing', 'the earthing arrangement, or Ze') : readingRef('Ze'),
      ...legRefs(inputs.legKeys), RA_ohm: readingRef('RA'), IdeltaN_A: ref('rcd_IdeltaN_mA', 'the rated residual current'),
    },
  }
}

/** Leads from a leg's missing figure to that leg. */
function legRefs(keys: readonly string[]): Asked['from'] {
  return Object.fromEntries(keys.flatMap((key, index) => [
    [`legs.${index}.method`, fieldRef('leg', key, 'method', `the way of fixing of leg ${index + 1}`)],
    [`legs.${index}.L_m`, fieldRef('leg', key, 'L_m', `the length of leg ${index + 1}`)],
  ]))
}
