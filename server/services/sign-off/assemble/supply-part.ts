/** The supply and everything that stands between it and the new circuit. */
import { contentOf, numberOf, phasesOf, textOf } from '../../../../shared/job/judge/facts'
import { limited, notApplicable, notEntered, textField, type PrintedField } from '../../../../shared/schemas/sealed-record/field'
import type { InstallationRecord } from '../../../../shared/schemas/sealed-record/installation'
import { formatFigure, formatNumber } from '../../../../shared/utils/figures'
import { composed, reading, recorded, verified } from './fields'
import type { AssembleInput } from './input'

const survey = (input: AssembleInput, field: string, rest?: Partial<PrintedField>) => recorded(input, 'survey', 'survey', field, rest)
const LINE_V = { 1: 230, 3: 400 } as const
const FUSE_KINDS: Record<string, string> = { 'BS88-3': 'Cartridge fuse', 'BS1361': 'Cartridge fuse', 'BS88-2': 'Cartridge fuse', 'BS3036': 'Semi-enclosed fuse' }

export function supplyPart(input: AssembleInput): InstallationRecord['supply'] {
  const content = contentOf(input.record, 'survey', 'survey')
  const phases = phasesOf(content, 'supply_phases')
  const U0 = numberOf(content, 'nominal_V')
  const standard = textOf(content, 'cutout_standard')
  const unseen = limited('cannot be seen; part of the network operator\'s cut-out')
  return {
    earthing: survey(input, 'earthing'),
    earthingEvidence: survey(input, 'earthing_evidence'),
    liveConductors: phases === undefined ? notEntered() : textField(`${phases} line, 1 neutral, a.c.`),
    nominalVoltage: U0 === undefined || phases === undefined ? notEntered() : textField(`${phases === 1 ? U0 : LINE_V[3]} / ${U0}`, { unit: 'V' }),
    frequency: survey(input, 'frequency_Hz'),
    faultCurrent: reading(input, 'Ipf'),
    loopImpedance: reading(input, 'Ze'),
    polarity: reading(input, 'supply-polarity'),
    device: {
      standard: standard === 'cannot-see' ? unseen : survey(input, 'cutout_standard'),
      type: standard === undefined ? notEntered() : standard === 'cannot-see' ? unseen : composed(FUSE_KINDS[standard]),
      rating: survey(input, 'cutout_A'),
    },
    otherSources: survey(input, 'other_sources'),
  }
}

export function meansOfEarthingPart(input: AssembleInput): InstallationRecord['meansOfEarthing'] {
  const content = contentOf(input.record, 'survey', 'survey')
  const electrode = contentOf(input.record, 'equipment', 'electrode')
  const needs = input.judgement.readings.RA.applies
  const isOwnSupply = content.earthing === 'TT'
  const means = content.earthing === undefined ? notEntered() : textField(!needs ? 'Distributor\'s facility' : isOwnSupply ? 'Installation\'s own electrode' : 'Distributor\'s facility; electrode for the charging circuit')
  if (!needs) {
    const none = notApplicable('the distributor\'s earth is used')
    return { means, electrodeType: none, electrodeLocation: none, electrodeResistance: none, electrodeMethod: none }
  }
  const instrument = input.record.instruments.find(each => each.id === input.judgement.readings.RA.counted?.instrumentId)
  return {
    means,
    electrodeType: composed(textOf(electrode, 'description') ?? textOf(content, 'electrode_type')),
    electrodeLocation: composed(textOf(electrode, 'location') ?? textOf(content, 'electrode_location')),
    electrodeResistance: reading(input, 'RA'),
    electrodeMethod: composed(instrument && (instrument.functions.includes('electrode') ? 'Electrode tester' : 'Loop tester')),
  }
}

export function maximumDemandPart(input: AssembleInput): InstallationRecord['maximumDemand'] {
  const { supply, houseDemand, capacity } = input.judgement
  const limit = contentOf(input.record, 'loadLimit', 'limit')
  const fuse_A = numberOf(contentOf(input.record, 'survey', 'survey'), 'cutout_A')
  const demand_A = supply.answer.result.demandAfter_A
  const isLimited = limit.state !== undefined && limit.state !== 'none'
  const verdict = supply.answer.verdict ?? 'waiting'
  return {
    demand: demand_A === undefined
      ? notEntered()
      : textField(formatNumber(demand_A, 1), { value: demand_A, unit: 'A', howKnown: 'calculated', judgement: { verdict, ...(fuse_A !== undefined && { limit: `≤ ${formatFigure(fuse_A, 'A')}` }), margin: capacity.words } }),
    way: houseDemand.way === null ? notEntered() : textField(`House ${houseDemand.words}; charging point in full${isLimited ? ', held by the load limiter' : ''}`),
    loadLimiter: textField(!isLimited ? 'Without load limiter' : supply.input.limiterTested === true ? 'With load limiter, tested' : 'With load limiter, not yet tested'),
    loadLimit: isLimited ? recorded(input, 'loadLimit', 'limit', 'set_A') : notApplicable('no load limiter'),
  }
}

export function conductorParts(input: AssembleInput): Pick<InstallationRecord, 'earthingConductor' | 'bonding'> {
  const content = contentOf(input.record, 'survey', 'survey')
  const bonds = ['water', 'gas', 'oil', 'steel', 'lightning', 'other'] as const
  const isAllAbsent = bonds.every(each => content[`bond_${each}`] === 'not-present')
  const none = notApplicable('no service to bond')
  const bond = (each: typeof bonds[number]): PrintedField => {
    const found = survey(input, `bond_${each}`)
    if (content[`bond_${each}`] === 'not-present') return notApplicable('not present')
    return content[`bond_${each}`] === 'missing' ? { ...found, judgement: { verdict: 'outside' } } : found
  }
  return {
    earthingConductor: { material: survey(input, 'earthing_conductor_material'), size: survey(input, 'earthing_conductor_mm2'), continuity: verified(input, 'earthing_conductor_verified'), connection: verified(input, 'earthing_conductor_verified') },
    bonding: {
      material: isAllAbsent ? none : survey(input, 'bonding_material'), size: isAllAbsent ? none : survey(input, 'bonding_mm2'), continuity: isAllAbsent ? none : verified(input, 'bonding_verified'),
      water: bond('water'), gas: bond('gas'), oil: bond('oil'), steel: bond('steel'), lightning: bond('lightning'), other: bond('other'),
    },
  }
}

export function mainSwitchPart(input: AssembleInput): InstallationRecord['mainSwitch'] {
  const { main_switch_rcd: said } = contentOf(input.record, 'survey', 'survey')
  const none = notApplicable('the main switch is no residual-current device')
  const rcd = (field: string) => (said === 'no' ? none : survey(input, field))
  return {
    location: survey(input, 'main_switch_location'),
    standard: survey(input, 'main_switch_standard'),
    type: said === undefined || said === null ? notEntered() : textField(said === 'yes' ? 'Residual-current device' : 'Switch without residual-current part'),
    poles: survey(input, 'main_switch_poles'),
    currentRating: survey(input, 'main_switch_A'),
    voltageRating: survey(input, 'main_switch_V'),
    setting: notApplicable('no fuse or setting in the switch'),
    rcdCurrent: rcd('main_switch_IdeltaN_mA'), rcdDelay: rcd('main_switch_delay_ms'), rcdTime: rcd('main_switch_ms'),
  }
}
