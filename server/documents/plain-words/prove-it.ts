import type { PrintedField } from '#shared/schemas/sealed-record/field'
import type { CertificateRecord } from '#shared/schemas/sealed-record'
import { fieldMark, fieldText, sentenceOf, type Mark } from '../paper/said'

export interface ProofRow { checked: string, found: string, mustBe: string, inShort: string, mark: Mark | null }

interface Check { checked: string, field: PrintedField, mustBe?: string, good: string }

/** What was tested, in one page of plain words; the figures and verdicts are the certificate's own. */
export function proveIt(record: CertificateRecord): ProofRow[] {
  return checksOf(record).map(({ checked, field, mustBe, good }) => ({
    checked,
    found: fieldText(field),
    mustBe: field.kind === 'not-applicable' ? 'N/A' : field.judgement?.limit ?? mustBe ?? 'no limit',
    inShort: inShort(field, good),
    mark: fieldMark(field),
  }))
}

function inShort(field: PrintedField, good: string): string {
  if (field.kind === 'not-applicable') return 'Does not apply here.'
  if (field.kind === 'limited') return 'Could not be measured; the reason is given.'
  if (field.kind === 'not-entered') return 'Not measured yet.'
  const verdict = field.judgement?.verdict
  if (verdict === 'outside') return 'Not as it must be.'
  if (verdict === 'waiting') return 'Cannot be told yet.'
  if (verdict === 'unexpected') return [good, sentenceOf(field.judgement)].filter(Boolean).join(' ')
  return good
}

function checksOf(record: CertificateRecord): Check[] {
  return record.kind === 'installation' ? installationChecks(record) : minorWorksChecks(record)
}

const GOOD = {
  source: 'The earth that comes with your supply is good.',
  polarity: 'Live and neutral are the right way round.',
  continuity: 'The earth wire is whole all the way to the charging point.',
  insulation: 'Nothing leaks through the insulation of the cable.',
  loop: 'If live touches metal, enough current flows to switch it off at once.',
  rcd: 'If current leaks to earth, it is cut off before it can do harm.',
  button: 'The test button works.',
}

function installationChecks(record: Extract<CertificateRecord, { kind: 'installation' }>): Check[] {
  const one = record.tests.circuits[0]
  const { supply } = record
  const ofSupply: Check[] = [
    { checked: 'Earth of the supply (Ze)', field: supply.loopImpedance, good: GOOD.source },
    { checked: 'Supply the right way round', field: supply.polarity, mustBe: 'confirmed', good: GOOD.polarity },
    { checked: 'Greatest fault current (Ipf)', field: supply.faultCurrent, good: 'The protective device can break the greatest current the supply can send.' },
  ]
  if (!one) return ofSupply
  return [
    ...ofSupply,
    { checked: `Earth wire (${one.continuityOf})`, field: one.continuity, good: GOOD.continuity },
    { checked: 'Insulation, live to earth', field: one.insulation.lineToEarth, good: GOOD.insulation },
    { checked: 'Insulation, neutral to earth', field: one.insulation.neutralToEarth, good: GOOD.insulation },
    { checked: 'Circuit the right way round', field: one.polarity, mustBe: 'correct', good: GOOD.polarity },
    { checked: 'Earth fault path (Zs)', field: one.zs, good: GOOD.loop },
    { checked: 'Leakage switch, time', field: one.rcdTime, good: GOOD.rcd },
    { checked: 'Leakage switch, smooth current', field: one.dcTrip, good: 'A leak that a vehicle can cause, and that would blind other switches, is cut off.' },
    { checked: 'Leakage switch, button', field: one.rcdButton, mustBe: 'trips', good: GOOD.button },
    { checked: 'Talks to a vehicle properly', field: one.functional.vehicleStates, mustBe: 'A, B and C in order', good: 'Current flows only when a vehicle asks for it.' },
    { checked: 'Stops when the earth wire is lost', field: one.functional.protectiveConductorFault, mustBe: 'stops', good: 'Without its earth it does not charge.' },
    { checked: 'Guards against a broken supply neutral', field: one.functional.openPen, mustBe: 'maker’s test passed', good: 'If the street cable breaks, the charging point cuts itself off.' },
    { checked: 'Keeps the house within its supply', field: one.functional.loadLimiter, mustBe: 'seen to limit', good: 'It slows the charge before the main fuse is overloaded.' },
    { checked: 'Waits a random time', field: one.functional.randomDelay, mustBe: 'on', good: 'The delay the law asks for is on.' },
    { checked: 'Can be switched off fully', field: one.functional.isolation, mustBe: 'isolates', good: 'The switch cuts off every live wire.' },
  ]
}

function minorWorksChecks(record: Extract<CertificateRecord, { kind: 'minor-works' }>): Check[] {
  const { results, supply } = record
  return [
    { checked: `Earth of the supply (${supply.impedanceAt})`, field: supply.impedance, good: GOOD.source },
    { checked: `Earth wire (${results.continuityOf})`, field: results.continuity, good: GOOD.continuity },
    { checked: 'Insulation, live to earth', field: results.insulation.lineToEarth, good: GOOD.insulation },
    { checked: 'Insulation, neutral to earth', field: results.insulation.neutralToEarth, good: GOOD.insulation },
    { checked: 'Circuit the right way round', field: results.polarity, mustBe: 'correct', good: GOOD.polarity },
    { checked: 'Earth fault path (Zs)', field: results.zs, good: GOOD.loop },
    { checked: 'Leakage switch, time', field: results.rcdTime, good: GOOD.rcd },
    { checked: 'Leakage switch, button', field: results.rcdButton, mustBe: 'trips', good: GOOD.button },
  ]
}
