import { INSPECTIONS } from '#shared/job/inspections.data'
import { PART_NAMES, type Part } from '#shared/job/parts'
import { putBackItems } from '#shared/job/put-back'
import { SHOTS } from '#shared/job/shots.data'
import { testSpec, type TestKey } from '#shared/job/tests.data'
import type { FieldValue } from '#shared/job/fields/field'
import type { InstrumentRow, JobRecord, PartRow, PhotographRow, ReadingRow, SignatureRow } from '#shared/types/record'

/** An invented house, firm and circuit; every figure is made up but fits the others. The work was done on WORK_DAY. */
export const WORK_DAY = '2027-03-02'
export const TESTER = 'p-tester'
export const SUPERVISOR = 'p-supervisor'
const AT = `${WORK_DAY}T10:00:00Z`

type Content = Record<string, FieldValue>

export const partRow = (key: string, content: Content, position = 0): PartRow => ({
  key, position, content, version: 1,
  stamps: Object.fromEntries(Object.keys(content).map(field => [field, { v: 1, by: TESTER, at: AT }])),
})

let made = 0
/** A reading as the pad would send it; the figure is kept as shown. */
export function reading(test: TestKey, shown: string, rest: Partial<ReadingRow> = {}): ReadingRow {
  const spec = testSpec(test)
  const isSeen = spec.answer === 'seen'
  const value = isSeen ? null : Number(shown.replace('>', ''))
  const at = `${WORK_DAY}T11:${String(made % 60).padStart(2, '0')}:00Z`
  made += 1
  return {
    id: `r-${made}`, test, kind: isSeen ? 'seen' : shown.startsWith('>') ? 'over-range' : 'value', shown, value, unit: spec.unit,
    resolution: isSeen ? null : 10 ** -(shown.split('.')[1]?.length ?? 0), reason: '', context: {}, instrumentId: spec.instrument === null ? null : spec.instrument === 'vehicle-adapter' ? 'i-adapter' : 'i-tester',
    personId: TESTER, typedBy: null, confirmedAt: null, deviceAt: at, serverAt: at, ...rest,
  }
}

export const instruments = (): InstrumentRow[] => [
  { id: 'i-tester', name: 'Tester 2', description: 'Multifunction installation tester', serial: 'MFT-0042', functions: ['continuity', 'insulation', 'loop', 'rcd', 'electrode'], active: true, calibrations: [{ doneOn: '2026-09-14', goodUntil: '2027-09-14', reference: 'C-1' }] },
  { id: 'i-adapter', name: 'Adapter 1', description: 'Vehicle simulator, socket type 2', serial: 'VA-0007', functions: ['vehicle-adapter'], active: true, calibrations: [{ doneOn: '2026-06-30', goodUntil: '2027-06-30', reference: 'C-2' }] },
]

const survey = (): Content => ({
  earthing: 'TN-C-S', earthing_how: 'read', earthing_evidence: 'Earthing conductor on the neutral block of the cut-out', supply_phases: '1', nominal_V: 230, frequency_Hz: 50,
  cutout_A: 100, cutout_A_how: 'told', cutout_standard: 'BS88-3', service_ok: 'sound', looped: 'no', asbestos: 'no', unmetered: 'no', tails_mm2: 25, other_sources: ['none'], generation_kW: 0,
  board_name: 'Main board', board_location: 'Hall cupboard', board_conditional_kA: 16, main_switch_location: 'In the board', main_switch_standard: 'BS EN 60947-3 switch-disconnector', main_switch_poles: 2, main_switch_A: 100, main_switch_V: 230, main_switch_rcd: 'no', upstream_rcd: 'none',
  spd: 'fitted', spd_type: 'Type 2, indicator shows ready', earthing_conductor_material: 'copper', earthing_conductor_mm2: 16, earthing_conductor_verified: 'yes', bonding_material: 'copper', bonding_mm2: 10, bonding_verified: 'yes',
  bond_water: 'yes', bond_gas: 'yes', bond_oil: 'not-present', bond_steel: 'not-present', bond_lightning: 'not-present', bond_other: 'not-present', existing_comments: 'No comments', outdoors: 'yes', other_earths: 'no',
})

const designed = (): Content => ({
  number: '9', description: 'Vehicle charging point, garage wall', points: 1, Ib_A: 32, phases: '1', device: 'B', device_standard: 'BS EN 61009', In_A: 40, device_kA: 6, energyClass: 3, cable: 'swa-90', terminals_C: 70, S_mm2: 6, cpc_mm2: 6,
  rcd_where: 'board', rcd_standard: 'BS EN 61009', rcd_type: 'A', rcd_IdeltaN_mA: 30, rcd_A: 40, dc_where: 'charger',
})

/** Single-phase, TN-C-S, 100 A fuse: 20 A of house, 32 A of charger, 18 m of 6 mm² clipped. Nothing stops signing it. */
function parts(): Record<Part, PartRow[]> {
  const empty = Object.fromEntries(PART_NAMES.map(part => [part, []])) as unknown as Record<Part, PartRow[]>
  return {
    ...empty,
    wanted: [partRow('wanted', { rating_kW: 7.36, phases: '1', outlet: 'socket', device_standard: 'yes', export_A: 0 })],
    survey: [partRow('survey', survey())],
    appliance: [partRow('house', { name: 'Fixed appliances', use: 'fixed', I_A: 20 })],
    leg: [partRow('l-1', { name: 'Along the wall', method: 'C', L_m: 18, ambient_C: 30 })],
    circuit: [partRow('designed', designed()), partRow('installed', { device: 'B', In_A: 40, cable: 'swa-90', S_mm2: 6, cpc_mm2: 6, L_m: 18 })],
    earthing: [partRow('earthing', { method: 'iv', reason: 'Single-phase house on TN-C-S, vehicle parked out of doors', device: 'Built into the charger' })],
    equipment: [partRow('charger', { description: 'Charging point, 7.4 kW, socket', standard: 'BS EN IEC 61851-1', rating_A: 32, serial: 'INV-3391', serial_again: 'INV-3391', firmware: '1.0', location: 'Garage wall', height_m: 0.9, labels: 'yes' })],
    loadLimit: [partRow('limit', { state: 'none' })],
    statement: [partRow('statement', { nature: 'addition', description: 'One new circuit from the board in the hall to a charging point on the garage wall', not_covered: 'All other circuits', exceptions: 'None', next_inspection_years: 10, completed_on: WORK_DAY })],
    inspection: INSPECTIONS.map(item => partRow(item.key, ['5', '12', '13.8', '14'].includes(item.key) ? { outcome: 'not-applicable', reason: item.notApplicableReason ?? 'Nothing of the kind' } : { outcome: 'satisfactory' })),
  }
}

/** R1+R2 of 2 × 3.08 mΩ/m over 18 m is 0.11 Ω; Zs is Ze 0.21 Ω more. */
export const READINGS: readonly [TestKey, string][] = [
  ['supply-polarity', 'correct'], ['Ze', '0.21'], ['Ipf', '1.10'], ['R1R2', '0.11'], ['R1Rn', '0.11'], ['IR-live-earth', '>999'], ['IR-neutral-earth', '412'], ['IR-line-neutral', '>999'], ['polarity', 'correct'],
  ['Zs-board', '0.21'], ['Ipf-board', '1.10'], ['Zs', '0.33'], ['RCD-time', '24'], ['RCD-dc', '1.8'], ['RCD-button', 'correct'], ['vehicle-states', 'correct'], ['PE-fault', 'correct'], ['open-PEN', 'correct'], ['delay-restored', 'correct'], ['isolation', 'correct'],
]

export function photograph(claim: string): PhotographRow {
  return { id: `f-${claim}`, claim, sha256: '1'.repeat(64), thumbSha256: null, takenAt: AT, personId: TESTER, serverAt: AT }
}

/** A complete job that may be signed; whatever is handed in replaces that piece whole. */
export function jobRecord(overrides: Partial<JobRecord> = {}): JobRecord {
  const base: JobRecord = {
    job: { id: 'j-1', ref: 'J-1042', stage: 'on-site', stageSince: AT, sideState: null, sideNote: '', note: '', withWhom: 'installer', nextDay: null, recordVersion: 1 },
    isOwn: true,
    customer: { id: 'c-1', name: 'A. Sample', email: 'a.sample@example.org', telephone: '', version: 1 },
    premises: { id: 's-1', address: '19 Hill Street', town: 'Exampleton', postcode: 'ZZ1 1ZZ', country: 'England', mpan: '1200000000000', occupier: '', tenure: 'owner', parking: 'Drive', version: 1 },
    parts: parts(),
    readings: READINGS.map(([test, shown]) => reading(test, shown)),
    instruments: instruments(),
    photographs: SHOTS.map(shot => photograph(shot.claim)),
    queries: [], signatures: [], visits: [], certificates: [], notices: [], quotes: [], messages: [], papers: [], story: [],
    people: [{ id: TESTER, name: 'R. Invented', roles: ['installer'], qualifications: [] }, { id: SUPERVISOR, name: 'S. Fictional', roles: ['supervisor'], qualifications: [] }],
    ...overrides,
  }
  // What has to be put back follows from the rest of the record.
  return overrides.parts?.putBack?.length ? base : { ...base, parts: { ...base.parts, putBack: putBackItems(base).map(item => partRow(item.key, { done: 'yes' })) } }
}

/** The record with some fields of one row changed; null empties a field. */
export function withFields(record: JobRecord, part: Part, key: string, fields: Content): JobRecord {
  const rows = record.parts[part]
  const row = rows.find(each => each.key === key) ?? partRow(key, {})
  const changed = { ...row, content: { ...row.content, ...fields } }
  return { ...record, parts: { ...record.parts, [part]: [...rows.filter(each => each.key !== key), changed] } }
}

/** The record with another reading appended, as a later moment writes it. */
export function withReading(record: JobRecord, test: TestKey, shown: string, rest: Partial<ReadingRow> = {}): JobRecord {
  const at = `${WORK_DAY}T14:${String(record.readings.length % 60).padStart(2, '0')}:00Z`
  return { ...record, readings: [...record.readings, reading(test, shown, { deviceAt: at, serverAt: at, ...rest })] }
}

export const withoutReading = (record: JobRecord, ...tests: TestKey[]): JobRecord => ({ ...record, readings: record.readings.filter(row => !tests.includes(row.test)) })

/** All put-back items of the record as it now stands, done. */
export const allPutBack = (record: JobRecord): JobRecord => ({ ...record, parts: { ...record.parts, putBack: putBackItems(record).map(item => partRow(item.key, { done: 'yes' })) } })

/** TT: an electrode of its own for house and charger. */
export function ttJob(): JobRecord {
  let record = withFields(jobRecord(), 'survey', 'survey', { earthing: 'TT' })
  record = withFields(record, 'earthing', 'earthing', { method: 'TT', reason: 'The supply is TT', device: null })
  record = withFields(record, 'equipment', 'electrode', { description: 'Rod', location: 'By the garage door' })
  record = withFields(record, 'inspection', '13.7', { outcome: 'not-applicable', reason: 'No open-PEN device' })
  record = withoutReading(record, 'Ze', 'Zs', 'Zs-board', 'open-PEN')
  record = { ...record, readings: [...record.readings, reading('Ze', '82.0'), reading('RA', '82.0'), reading('Zs', '82.1'), reading('Zs-board', '82.0')] }
  return allPutBack(record)
}

/** Three-phase supply, circuit and charger, on TN-S so that no open-PEN method is needed. */
export function threePhaseJob(): JobRecord {
  let record = withFields(jobRecord(), 'survey', 'survey', { supply_phases: '3', earthing: 'TN-S', main_switch_poles: 4, main_switch_V: 400 })
  record = withFields(record, 'wanted', 'wanted', { rating_kW: 22, phases: '3' })
  record = withFields(record, 'circuit', 'designed', { phases: '3' })
  record = withFields(record, 'earthing', 'earthing', { method: 'none', reason: 'TN-S, confirmed by the network operator', device: null })
  record = withFields(record, 'inspection', '13.7', { outcome: 'not-applicable', reason: 'No open-PEN device' })
  record = withoutReading(record, 'open-PEN')
  return allPutBack({ ...record, readings: [...record.readings, reading('IR-line-line', '>999'), reading('phase-sequence', 'correct')] })
}

/** The three capacities signed in one act and, where asked, the supervisor's check. */
export function signatures(withSupervisor = true): SignatureRow[] {
  const sign = (capacity: SignatureRow['capacity'], personId: string, nameShown: string, at: string): SignatureRow =>
    ({ id: `g-${capacity}`, capacity, personId, nameShown, way: 'typed', statement: `I answer for it as ${capacity}.`, edition: 'BS 7671:2018+A4:2026', at })
  const three = (['designer', 'constructor', 'inspector'] as const).map(capacity => sign(capacity, TESTER, 'R. Invented', `${WORK_DAY}T15:40:00Z`))
  return withSupervisor ? [...three, sign('supervisor', SUPERVISOR, 'S. Fictional', '2027-03-03T09:05:00Z')] : three
}
