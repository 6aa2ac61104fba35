import { and, desc, eq, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import { editionOn } from './edition'
import { RULES_VERSION } from '../../../shared/job/rules-version'
import { sealingGaps } from '../../../shared/schemas/sealed-record'
import { fourWords } from '../../../shared/seal/four-words'
import { londonDay } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { certificate, sealKey } from '../../db/schema/certificate'
import { firm } from '../../db/schema/firm'
import type { FirmContext } from '../firm-context'
import { hashRecord } from '../seal/hash-record'
import { openSealKey } from '../seal/seal-key'
import { signHash } from '../seal/sign-hash'
import { assembleSealedRecord } from './assemble-record'
import { loadJudged } from './load-judged'

const KIND = 'installation'
const SUBJECT = 'new-circuit'

/** Numbers, chains, hashes and signs the certificate of the job as it stands in this transaction. */
export async function sealCertificate(tx: FirmTx, ctx: FirmContext, jobId: string, keySecret: Uint8Array): Promise<{ certificateId: string, number: string, revision: number, words: string }> {
  // The counter's row is the lock of the firm's chain: whoever seals next waits here.
  const chainNumber = await nextNumber(tx, 'certificate-chain')
  const [previous] = await tx.select({ hash: certificate.hash }).from(certificate).where(eq(certificate.firmId, ctx.firmId)).orderBy(desc(certificate.chainNumber)).limit(1)
  const [replaced] = await tx.select().from(certificate).where(and(eq(certificate.firmId, ctx.firmId), eq(certificate.jobId, jobId), eq(certificate.kind, KIND), eq(certificate.subject, SUBJECT), eq(certificate.state, 'live'))).for('update')
  const [theFirm] = await tx.select().from(firm).where(eq(firm.id, ctx.firmId))
  const [key] = await tx.select().from(sealKey).where(and(eq(sealKey.firmId, ctx.firmId), sql`${sealKey.validTo} is null`)).limit(1)
  if (!theFirm || !key) throw problem('wrong-stage', 'The firm has no key to seal with. The principal can make one in Settings.')

  const { record, judgement, today } = await loadJudged(tx, ctx, jobId)
  const sealedAt = new Date()
  const year = londonDay(sealedAt.toISOString()).slice(0, 4)
  const number = replaced?.number ?? `${theFirm.certificatePrefix}-${year}-${String(await nextNumber(tx, `certificate-${year}`)).padStart(5, '0')}`
  const revision = replaced ? replaced.revision + 1 : 0
  const sealed = assembleSealedRecord({
    record, judgement, firm: theFirm, certificate: { number, revision, replaces: replaced ? { number: replaced.number, revision: replaced.revision, hash: replaced.hash, why: record.job.sideNote || 'corrected' } : undefined },
    previousHash: previous?.hash ?? null, sealedAt: sealedAt.toISOString(), edition: editionOn(today), ruleDataVersion: RULES_VERSION, signatures: record.signatures, draft: false,
  })
  const gaps = sealingGaps(sealed)
  if (gaps.length) throw problem('wrong-stage', 'The certificate still has gaps.', { reasons: gaps.map(gap => `${gap.message} (${gap.path.join(', ')})`) })

  const hash = hashRecord(sealed)
  const words = fourWords(hash).join(' ')
  const certificateId = uuidv7()
  if (replaced) await tx.update(certificate).set({ state: 'replaced' }).where(and(eq(certificate.firmId, ctx.firmId), eq(certificate.id, replaced.id)))
  await tx.insert(certificate).values({
    firmId: ctx.firmId, id: certificateId, jobId, kind: KIND, subject: SUBJECT, number, revision, replacesId: replaced?.id ?? null, record: sealed, hash, previousHash: previous?.hash ?? '',
    chainNumber, seal: signHash(hash, openSealKey({ publicKeyPem: key.publicKey, encryptedPrivateKey: key.encryptedPrivateKey }, keySecret)), sealKeyId: key.id, words, sealedAt,
  })
  return { certificateId, number, revision, words }
}

async function nextNumber(tx: FirmTx, name: string): Promise<number> {
  const { rows } = await tx.execute<{ n: number }>(sql`select next_number(${name}) as n`)
  return rows[0]!.n
}
