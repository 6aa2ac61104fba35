import { and, desc, eq } from 'drizzle-orm'
import type { CustomerPack } from '../../../shared/schemas/customer'
import { certificateRecord } from '../../../shared/schemas/sealed-record'
import { londonDay } from '../../../shared/utils/dates'
import { VERDICT_WORDS } from '../../../shared/utils/verdict'
import { problem } from '../../../shared/utils/problem'
import { changeAsFirm, type FirmTx } from '../../db/firm-db'
import { queueMessage } from '../../db/queries/outbox'
import { findAddressee, findFirm, shortAddress } from '../../db/queries/quotes'
import { certificate } from '../../db/schema/certificate'
import { liveWithIt } from '../../documents/plain-words/live-with-it'
import { proveIt, type ProofRow } from '../../documents/plain-words/prove-it'
import { packSurroundings } from '../papers/define-pack'
import { readByLink, type FoundLink, type NeededLink } from './customer-links'
import { findMadePaper } from './read-made-paper'

export const PACK_DAYS = 30

/** The certificate that stands for the job now: a link to a replaced one opens the one that replaced it. */
export async function findStandingCertificate(tx: FirmTx, firmId: string, jobId: string) {
  const [row] = await tx.select().from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.jobId, jobId), eq(certificate.state, 'live'))).orderBy(desc(certificate.sealedAt)).limit(1)
  return row ?? null
}

export async function readPack(link: FoundLink, isOpen: boolean): Promise<CustomerPack> {
  return readByLink(link, async (tx) => {
    const firm = await findFirm(tx, link.firmId)
    if (!isOpen) return { state: 'locked' as const, firmName: firm.name }
    const row = await findStandingCertificate(tx, link.firmId, link.jobId)
    if (!row) throw problem('not-found', 'There is no pack for this address yet.')
    const record = certificateRecord.parse(row.record)
    // The page carries no photographs, so none is read for it.
    const { liveWith, told } = await packSurroundings(tx, link.firmId, link.jobId, { ...record, photographs: [] })
    const to = await findAddressee(tx, link.firmId, link.jobId)
    return {
      state: 'open' as const,
      firmName: firm.name, firmTelephone: firm.telephone,
      address: shortAddress(to.address), finishedOn: londonDay(row.sealedAt.toISOString()),
      certificate: `${record.certificate.number} ${record.certificate.revision}`, fourWords: row.words.split(' '),
      replacedBy: record.certificate.replaces && `${record.certificate.replaces.number} ${record.certificate.replaces.revision}`,
      advice: liveWithIt(liveWith).map(({ title, lead, steps }) => ({ title, sentences: [lead, ...steps] })),
      proof: proveIt(record).map(toProof),
      told,
      hasPdf: await findMadePaper(tx, link.firmId, 'pack', row.id) !== null,
    }
  })
}

/** The mark's words already hold the verdict's own; the page adds those itself. */
function toProof({ mark, ...row }: ProofRow) {
  return { ...row, verdict: mark?.verdict ?? null, detail: mark ? mark.words.replace(VERDICT_WORDS[mark.verdict], '').replace(/^ · /, '') : '' }
}

/**
 * Sends a fresh link to the address held for a pack whose link ran out. Nobody is told whether anything was sent;
 * at most one a day for each link.
 */
export async function sendFreshPack(link: FoundLink, today: string): Promise<void> {
  await changeAsFirm(link.firmId, async (tx) => {
    const row = await findStandingCertificate(tx, link.firmId, link.jobId)
    const to = await findAddressee(tx, link.firmId, link.jobId)
    if (!row || !to.email) return
    const record = certificateRecord.parse(row.record)
    const made = await findMadePaper(tx, link.firmId, 'pack', row.id)
    const needsLink: NeededLink = { kind: 'customer', purpose: 'pack', subjectId: row.id, sentTo: to.email, days: PACK_DAYS }
    const { replaces } = record.certificate
    await queueMessage(tx, {
      firmId: link.firmId, jobId: link.jobId, message: 'pack-sent', recipient: to.email, dedupeKey: `pack-fresh:${link.linkId}:${today}`,
      ...(made && { waitsForPaper: made.id }),
      content: { customerName: to.name, shortAddress: to.shortAddress, certificate: `${record.certificate.number} ${record.certificate.revision}`, fourWords: row.words.split(' '), replaces: replaces && `${replaces.number} ${replaces.revision}: ${replaces.why}`, isPdfAttached: false, days: PACK_DAYS, needsLink },
    })
  })
}
