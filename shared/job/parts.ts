/** The parts of a job's record that are filled in field by field: their fields, who may change them and when. */
import { applianceFields, circuitFields, consentFields, departureFields, earthingFields, equipmentFields, handoverFields, inspectionFields, legFields, loadLimitFields, promiseFields, putBackFields, recordedDemandFields, statementFields, unexpectedFields, wantedFields } from './fields/work'
import { surveyFields } from './fields/survey'
import type { Fields } from './fields/field'
import type { Act } from './permissions'

interface PartSpec {
  fields: Fields
  may: Act
  /** The only keys it takes, where there is one row of each kind; otherwise the sender makes the key. */
  slots?: readonly string[]
  /** Sealed with the work: not to be changed once the capacities have signed. */
  isWork: boolean
}

export const PARTS = {
  wanted: { fields: wantedFields, may: 'change-enquiry', slots: ['wanted'], isWork: false },
  consent: { fields: consentFields, may: 'change-enquiry', isWork: false },
  survey: { fields: surveyFields, may: 'answer-survey', slots: ['survey'], isWork: true },
  appliance: { fields: applianceFields, may: 'answer-survey', isWork: true },
  recordedDemand: { fields: recordedDemandFields, may: 'answer-survey', slots: ['recorded'], isWork: true },
  leg: { fields: legFields, may: 'draft-design', isWork: true },
  circuit: { fields: circuitFields, may: 'draft-design', slots: ['designed', 'installed'], isWork: true },
  earthing: { fields: earthingFields, may: 'draft-design', slots: ['earthing'], isWork: true },
  departure: { fields: departureFields, may: 'draft-design', isWork: true },
  equipment: { fields: equipmentFields, may: 'record-work', slots: ['charger', 'isolator', 'surge-device', 'electrode', 'limiter'], isWork: true },
  loadLimit: { fields: loadLimitFields, may: 'draft-design', slots: ['limit'], isWork: true },
  putBack: { fields: putBackFields, may: 'record-work', isWork: true },
  inspection: { fields: inspectionFields, may: 'record-work', isWork: true },
  unexpected: { fields: unexpectedFields, may: 'record-work', isWork: true },
  statement: { fields: statementFields, may: 'record-work', slots: ['statement'], isWork: true },
  handover: { fields: handoverFields, may: 'record-work', slots: ['handover'], isWork: false },
  promise: { fields: promiseFields, may: 'send-notices', isWork: false },
} as const satisfies Record<string, PartSpec>

export type Part = keyof typeof PARTS
export const PART_NAMES = Object.keys(PARTS) as Part[]

export function partSpec(part: Part): PartSpec {
  return PARTS[part]
}

/** Fields that only a measurement can give; the office, working from photographs and talk, may not say "measured". */
export function measuredHows(fields: Record<string, unknown>): string[] {
  return Object.entries(fields).filter(([key, value]) => key.endsWith('_how') && value === 'measured').map(([key]) => key)
}
