/** What anyone may learn of a certificate: whether it is genuine and current. Nothing private. */
import { and, eq } from 'drizzle-orm'
import type { CheckAsked, CheckOutcome } from '../../../shared/schemas/customer'
import { londonDay } from '../../../shared/utils/dates'
import { lookUp, readAsFirm, type FirmTx } from '../../db/firm-db'
import { findFirm } from '../../db/queries/quotes'
import { certificate, sealKey } from '../../db/schema/certificate'
import { verifySeal, type SealFault } from '../seal/verify-seal'

interface Found extends Record<string, unknown> { firm_id: string, id: string }
type Row = typeof certificate.$inferSelect

export async function checkCertificate(asked: CheckAsked): Promise<CheckOutcome> {
  const found = await find(asked)
  if (found.length > 1) return { state: 'which' }
  const [one] = found
  if (!one) return { state: 'not-ours' }
  return readAsFirm(one.firm_id, tx => outcomeOf(tx, one.firm_id, one.id))
}

async function find(asked: CheckAsked): Promise<Found[]> {
  if ('words' in asked) {
    const words = asked.words.toLowerCase().split(/[^a-z]+/).filter(Boolean)
    if (words.length !== 4) return []
    return lookUp<Found>('find-certificate-by-words', 'select * from find_certificate_by_words($1, $2)', [words.join(' '), numberOf(asked.number)])
  }
  const [id, hash] = 'id' in asked ? [asked.id, null] : [null, asked.sha256]
  return lookUp<Found>('find-certificate', 'select * from find_certificate($1::uuid, $2, $3)', [id, hash, hash])
}

/** The number without the letter of its revision, however it was typed; null where none was given. */
export const numberOf = (typed: string | undefined) => typed?.trim().toUpperCase().replace(/\s+[A-Z]{1,2}$/, '') || null

const FAULT_WORDS: Record<SealFault, string> = {
  'record-changed': 'The stored record no longer agrees with its seal.',
  'signature-wrong': 'The firm’s signature over it is not good.',
  'chain-broken': 'It does not stand in its place in the firm’s chain of certificates.',
}
const GOOD_WORDS: Record<SealFault, string> = {
  'record-changed': 'The hash of the stored record was worked out again just now and agrees with the seal.',
  'signature-wrong': 'The firm’s signature over it is good.',
  'chain-broken': 'It stands in its place in the firm’s chain of certificates.',
}

async function outcomeOf(tx: FirmTx, firmId: string, id: string): Promise<CheckOutcome> {
  const row = await findOne(tx, firmId, id)
  const [key] = row ? await tx.select({ publicKey: sealKey.publicKey }).from(sealKey).where(and(eq(sealKey.firmId, firmId), eq(sealKey.id, row.sealKeyId))) : []
  if (!row || !key) return { state: 'not-ours' }
  const [previous] = await tx.select({ hash: certificate.hash }).from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.chainNumber, row.chainNumber - 1)))
  const { faults } = verifySeal(row.record as { previousHash: string | null }, { hash: row.hash, signature: row.seal, publicKeyPem: key.publicKey }, previous?.hash ?? null)
  const latest = row.state === 'replaced' ? await latestOf(tx, firmId, row) : null
  return {
    state: faults.length ? 'damaged' : row.state === 'replaced' ? 'replaced' : 'current',
    number: row.number, revision: row.revision, kind: row.kind, sealedOn: londonDay(row.sealedAt.toISOString()), firmName: (await findFirm(tx, firmId)).name, words: row.words,
    replacedBy: latest && { number: latest.number, revision: latest.revision, sealedOn: londonDay(latest.sealedAt.toISOString()) },
    checks: (['record-changed', 'signature-wrong', 'chain-broken'] as const).map(fault => faults.includes(fault) ? FAULT_WORDS[fault] : GOOD_WORDS[fault]),
  }
}

async function findOne(tx: FirmTx, firmId: string, id: string): Promise<Row | null> {
  const [row] = await tx.select().from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.id, id)))
  return row ?? null
}

/** The certificate at the end of the line of replacements. */
async function latestOf(tx: FirmTx, firmId: string, row: Row): Promise<Row | null> {
  let last: Row | null = null
  for (let at: Row = row; ;) {
    const [next] = await tx.select().from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.replacesId, at.id)))
    if (!next || next.chainNumber <= at.chainNumber) return last
    last = next
    at = next
  }
}
