import * as z from 'zod'
import { fieldsOf } from './sealed-record/fields-of'
import { installationRecord } from './sealed-record/installation'
import { minorWorksRecord } from './sealed-record/minor-works'
import type { Capacity } from './sealed-record/parts'

/**
 * The shape of one certificate, sealed or still a draft (format 1).
 * Strict throughout: a key that is not named here is refused rather than dropped, because dropping one would change the hash.
 * It holds no money, no telephone or e-mail of the customer, no internal notes and no PDF.
 */
export const certificateRecord = z.discriminatedUnion('kind', [installationRecord, minorWorksRecord])
export type CertificateRecord = z.infer<typeof certificateRecord>

/** What may be sealed: a certificate record without a gap, an outside figure or a missing signature. */
export const sealedRecord = certificateRecord.superRefine((record, context) => {
  for (const gap of sealingGaps(record)) context.addIssue({ code: 'custom', path: gap.path, message: gap.message })
})
export type SealedRecord = z.infer<typeof sealedRecord>

export interface SealingGap { path: (string | number)[], message: string }

/** Everything in a record that stops a seal, as sentences with the path of the field; empty when it may be sealed. */
export function sealingGaps(record: CertificateRecord): SealingGap[] {
  return [...fieldGaps(record), ...inspectionGaps(record), ...signatureGaps(record)]
}

const NEEDED: Record<CertificateRecord['kind'], Capacity[]> = {
  'installation': ['design', 'construction', 'inspection-and-test', 'checked-for-the-firm'],
  'minor-works': ['minor-works', 'checked-for-the-firm'],
}

function fieldGaps(record: CertificateRecord): SealingGap[] {
  return fieldsOf(record).flatMap(({ path, field }) => {
    const verdict = field.judgement?.verdict
    if (field.kind === 'not-entered') return [{ path, message: 'Not entered' }]
    if (verdict === 'outside') return [{ path, message: 'Outside limit' }]
    if (verdict === 'waiting') return [{ path, message: 'Cannot tell yet' }]
    if (verdict === 'unexpected' && !field.judgement?.sentence) return [{ path, message: 'An Unexpected figure needs its sentence' }]
    // On a new circuit nothing limits a test: LIM stands only against parts that were there before.
    if (field.kind === 'limited' && record.kind === 'installation' && path[0] === 'tests' && path[1] === 'circuits') return [{ path, message: 'LIM cannot stand on a new circuit' }]
    return []
  })
}

function inspectionGaps(record: CertificateRecord): SealingGap[] {
  if (record.kind !== 'installation') return []
  return record.inspections.items.flatMap((item, index) => item.outcome === 'unsatisfactory' || item.outcome === 'not-entered'
    ? [{ path: ['inspections', 'items', index], message: `${item.number} ${item.words}: ${item.outcome === 'not-entered' ? 'not entered' : 'unsatisfactory'}` }]
    : [])
}

function signatureGaps(record: CertificateRecord): SealingGap[] {
  const signed = new Set(record.signatures.flatMap(one => one.capacities))
  return NEEDED[record.kind].filter(capacity => !signed.has(capacity)).map(capacity => ({ path: ['signatures'], message: `No signature: ${capacity.replaceAll('-', ' ')}` }))
}
