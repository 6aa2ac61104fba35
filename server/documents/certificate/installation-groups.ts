import type { InstallationRecord } from '#shared/schemas/sealed-record/installation'
import { fact, textFact, type FactGroup } from '../paper/said'

const NATURE: Record<InstallationRecord['installation']['nature'], string> = { new: 'New installation', addition: 'Addition to an existing installation', alteration: 'Alteration of an existing installation' }

/** The facts of an installation certificate, in the order in which they are read. */
export function installationGroups(record: InstallationRecord): FactGroup[] {
  return [whereGroup(record), supplyGroup(record), earthingGroup(record), demandGroup(record), conductorGroup(record), bondingGroup(record), mainSwitchGroup(record), otherGroup(record)]
}

function whereGroup({ client, installation }: InstallationRecord): FactGroup {
  return {
    title: 'Client and installation',
    facts: [
      textFact('Client', client.name, [client.address]),
      fact('Address of the installation', installation.address),
      fact('Occupier', installation.occupier),
      fact('The installation', installation.description),
      textFact('This work is', NATURE[installation.nature]),
      fact('Extent of the work covered', installation.extent),
      fact('Expressly not covered', installation.notCovered),
    ],
  }
}

function supplyGroup({ supply }: InstallationRecord): FactGroup {
  return {
    title: 'Supply',
    facts: [
      fact('Earthing arrangement', supply.earthing),
      fact('Evidence', supply.earthingEvidence),
      fact('Live conductors', supply.liveConductors),
      fact('Nominal voltage U / U0', supply.nominalVoltage),
      fact('Frequency', supply.frequency),
      fact('Supply polarity', supply.polarity),
      fact('Prospective fault current Ipf', supply.faultCurrent),
      fact('External loop impedance Ze', supply.loopImpedance),
      fact('Supply device: standard', supply.device.standard),
      fact('Supply device: type', supply.device.type),
      fact('Supply device: rating', supply.device.rating),
      fact('Other sources of supply', supply.otherSources),
    ],
  }
}

function earthingGroup({ meansOfEarthing: earth, earthingMethod }: InstallationRecord): FactGroup {
  return {
    title: 'Means of earthing',
    facts: [
      fact('Means of earthing', earth.means),
      fact('Electrode type', earth.electrodeType),
      fact('Electrode location', earth.electrodeLocation),
      fact('Electrode resistance', earth.electrodeResistance),
      fact('Method of measurement', earth.electrodeMethod),
      fact('Earthing method for charging', earthingMethod.method),
      { label: 'Why this method', said: { text: earthingMethod.why.shown, notes: earthingMethod.rule ? [earthingMethod.rule] : [], mark: null } },
    ],
  }
}

function demandGroup({ maximumDemand: demand }: InstallationRecord): FactGroup {
  return {
    title: 'Maximum demand',
    facts: [fact('Maximum demand', demand.demand), fact('Found by', demand.way), fact('Load limiter', demand.loadLimiter), fact('Load limit set to', demand.loadLimit)],
  }
}

function conductorGroup({ earthingConductor: earth }: InstallationRecord): FactGroup {
  return {
    title: 'Earthing conductor',
    facts: [fact('Material', earth.material), fact('Size', earth.size), fact('Continuity', earth.continuity), fact('Connection', earth.connection)],
  }
}

function bondingGroup({ bonding }: InstallationRecord): FactGroup {
  return {
    title: 'Main bonding',
    facts: [
      fact('Material', bonding.material),
      fact('Size', bonding.size),
      fact('Continuity', bonding.continuity),
      fact('To water', bonding.water),
      fact('To gas', bonding.gas),
      fact('To oil', bonding.oil),
      fact('To structural steel', bonding.steel),
      fact('To lightning protection', bonding.lightning),
      fact('To anything else', bonding.other),
    ],
  }
}

function mainSwitchGroup({ mainSwitch }: InstallationRecord): FactGroup {
  return {
    title: 'Main switch',
    facts: [
      fact('Location', mainSwitch.location),
      fact('Standard', mainSwitch.standard),
      fact('Type', mainSwitch.type),
      fact('Poles', mainSwitch.poles),
      fact('Current rating', mainSwitch.currentRating),
      fact('Voltage rating', mainSwitch.voltageRating),
      fact('Fuse or setting', mainSwitch.setting),
      fact('Residual current IΔn', mainSwitch.rcdCurrent),
      fact('Residual-current delay', mainSwitch.rcdDelay),
      fact('Residual-current trip time', mainSwitch.rcdTime),
    ],
  }
}

function otherGroup({ existingInstallation, nextInspection }: InstallationRecord): FactGroup {
  return {
    title: 'Existing installation, next inspection',
    facts: [
      fact('Seen and not worked on', existingInstallation.comments),
      fact('Next inspection after', nextInspection.interval),
      fact('Recommended by', nextInspection.recommendedBy),
    ],
  }
}
