import * as z from 'zod'
import { printedField as field, words } from './field'
import { commonParts, designPart, earthingMethodPart } from './parts'
import { inspectionsPart } from './inspections'
import { testSchedulePart } from './test-schedule'

const deviceFields = { standard: field, type: field, rating: field }

export const supplyPart = z.strictObject({
  earthing: field,
  earthingEvidence: field,
  liveConductors: field,
  nominalVoltage: field,
  frequency: field,
  faultCurrent: field,
  loopImpedance: field,
  polarity: field,
  device: z.strictObject(deviceFields),
  otherSources: field,
})

export const meansOfEarthingPart = z.strictObject({ means: field, electrodeType: field, electrodeLocation: field, electrodeResistance: field, electrodeMethod: field })

export const maximumDemandPart = z.strictObject({ demand: field, way: field, loadLimiter: field, loadLimit: field })

export const earthingConductorPart = z.strictObject({ material: field, size: field, continuity: field, connection: field })

export const bondingPart = z.strictObject({ material: field, size: field, continuity: field, water: field, gas: field, oil: field, steel: field, lightning: field, other: field })

export const mainSwitchPart = z.strictObject({ location: field, standard: field, type: field, poles: field, currentRating: field, voltageRating: field, setting: field, rcdCurrent: field, rcdDelay: field, rcdTime: field })

/** An installation certificate with its two schedules: every new circuit. */
export const installationRecord = z.strictObject({
  ...commonParts,
  kind: z.literal('installation'),
  installation: z.strictObject({
    /** One line for the foot of each page: `19 Hill Street, ZZ1 1ZZ`. */
    shortAddress: words,
    address: field,
    occupier: field,
    description: field,
    extent: field,
    notCovered: field,
    nature: z.enum(['new', 'addition', 'alteration']),
  }),
  nextInspection: z.strictObject({ interval: field, recommendedBy: field }),
  supply: supplyPart,
  meansOfEarthing: meansOfEarthingPart,
  maximumDemand: maximumDemandPart,
  earthingConductor: earthingConductorPart,
  bonding: bondingPart,
  mainSwitch: mainSwitchPart,
  existingInstallation: z.strictObject({ comments: field }),
  earthingMethod: earthingMethodPart,
  inspections: inspectionsPart,
  tests: testSchedulePart,
  design: designPart,
})
export type InstallationRecord = z.infer<typeof installationRecord>
