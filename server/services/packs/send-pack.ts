import { and, eq } from 'drizzle-orm'
import { certificateName } from '../../../shared/job/certificate-name'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { lockJob, touchJob } from '../../db/queries/jobs'
import { queueMessage } from '../../db/queries/outbox'
import { queuePaper } from '../../db/queries/papers'
import { findAddressee } from '../../db/queries/quotes'
import { certificate } from '../../db/schema/certificate'
import { outboxMessage } from '../../db/schema/message'
import type { PackSentInput } from '../../messages/pack-sent'
import type { FirmContext } from '../firm-context'
import type { NeededLink } from '../links/customer-links'

/** How long the pack's link opens; afterwards its page sends a fresh one to the address held. */
const DAYS_OPEN = 30

/** Sends the customer the pack of the certificate in force. The message waits in the outbox until the pack itself is made. */
export async function sendPack(ctx: FirmContext, jobId: string, input: { mutationId: string }): Promise<{ sentTo: string }> {
  return ctx.once(input.mutationId, 'send-pack', { jobId }, async (tx) => {
    const { firmId } = ctx
    const job = await lockJob(tx, firmId, jobId)
    if (!['countersigned', 'handed-over', 'closed'].includes(job.stage)) throw problem('wrong-stage', 'There is no pack to send until a supervisor has countersigned.')
    const live = await findLive(tx, firmId, jobId)
    const to = await findAddressee(tx, firmId, jobId)
    if (!to.email.trim()) throw problem('check-answers', 'This customer has no e-mail address to send to. Enter one on the enquiry page.', { fields: { email: 'Enter the customer’s e-mail address on the enquiry page' } })

    const dedupeKey = `pack:${live.id}:${to.email}`
    const [earlier] = await tx.select({ id: outboxMessage.id }).from(outboxMessage).where(and(eq(outboxMessage.firmId, firmId), eq(outboxMessage.dedupeKey, dedupeKey)))
    if (earlier) throw problem('wrong-stage', 'This pack is on its way to that address already. It stands in the list of messages, where it can be sent again.')
    const paperId = await queuePaper(tx, { firmId, jobId, kind: 'pack', sourceId: live.id })
    const content: Omit<PackSentInput, 'from' | 'url'> = {
      customerName: to.name, shortAddress: to.shortAddress, certificate: certificateName(live), fourWords: live.words.split(' '), replaces: await replacedName(tx, firmId, live.replacesId), isPdfAttached: true, days: DAYS_OPEN,
    }
    const needsLink: NeededLink = { kind: 'customer', purpose: 'pack', subjectId: live.id, sentTo: to.email, days: DAYS_OPEN }
    await queueMessage(tx, { firmId, jobId, message: 'pack-sent', recipient: to.email, dedupeKey, content: { ...content, needsLink }, waitsForPaper: paperId })
    await touchJob(tx, firmId, jobId)
    return { sentTo: to.email }
  })
}

async function findLive(tx: FirmTx, firmId: string, jobId: string) {
  const [row] = await tx.select({ id: certificate.id, number: certificate.number, revision: certificate.revision, words: certificate.words, replacesId: certificate.replacesId }).from(certificate)
    .where(and(eq(certificate.firmId, firmId), eq(certificate.jobId, jobId), eq(certificate.state, 'live'))).limit(1)
  if (!row) throw problem('wrong-stage', 'There is no certificate in force for this job.')
  return row
}

async function replacedName(tx: FirmTx, firmId: string, id: string | null): Promise<string | null> {
  if (!id) return null
  const [row] = await tx.select({ number: certificate.number, revision: certificate.revision }).from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.id, id)))
  return row ? certificateName(row) : null
}
