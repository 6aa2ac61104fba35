import { and, eq, sql } from 'drizzle-orm'
import { deliver, type Letter } from '../adapters/mail'
import { fileStore } from '../adapters/files'
import { changeAsFirm, type FirmTx } from '../db/firm-db'
import { recordEvent } from '../db/queries/events'
import { findJob, moveJob } from '../db/queries/jobs'
import { paper } from '../db/schema/certificate'
import { outboxMessage } from '../db/schema/message'
import { composeOutboxMessage, nextTrySeconds, GIVE_UP_AFTER_MS } from './compose'

const MOST_ATTACHED_BYTES = 4 * 1024 * 1024

/**
 * Sends one message. It is claimed, with its letter's link, in a transaction of its own before the mail server is
 * spoken to; if we die in between, the claim is found later and shown as unclear, never sent twice by itself.
 */
export async function sendMessage(firmId: string, id: string): Promise<void> {
  const letter = await changeAsFirm(firmId, tx => claim(tx, firmId, id))
  if (!letter) return
  const delivery = await deliver(letter)
  await changeAsFirm(firmId, async (tx) => {
    const here = and(eq(outboxMessage.firmId, firmId), eq(outboxMessage.id, id))
    const [row] = await tx.select().from(outboxMessage).where(here)
    if (!row) return
    if (delivery.came === 'taken') {
      await tx.update(outboxMessage).set({ state: 'sent', sentAt: sql`now()`, problem: null }).where(here)
      await afterSending(tx, row)
      return
    }
    const isGivenUp = delivery.came === 'refused' || (delivery.came === 'later' && row.madeAt.getTime() < Date.now() - GIVE_UP_AFTER_MS)
    const state = delivery.came === 'unclear' ? 'unclear' : isGivenUp ? 'failed' : 'queued'
    await tx.update(outboxMessage).set({ state, problem: delivery.why, claimedAt: null, nextTryAt: sql`now() + make_interval(secs => ${nextTrySeconds(row.attempts)})` as never }).where(here)
    if (state !== 'queued') await recordEvent(tx, { type: state === 'unclear' ? 'message-unclear' : 'message-failed', jobId: row.jobId, detail: { messageId: id, message: row.message } })
  })
}

/** A message that cannot even be written is set aside where the office sees it, so that it holds up no other. */
export async function setAside(firmId: string, id: string, why: string): Promise<void> {
  await changeAsFirm(firmId, async (tx) => {
    const [row] = await tx.update(outboxMessage).set({ state: 'failed', problem: why.slice(0, 300) }).where(and(eq(outboxMessage.firmId, firmId), eq(outboxMessage.id, id), eq(outboxMessage.state, 'queued'))).returning({ jobId: outboxMessage.jobId, message: outboxMessage.message })
    if (row) await recordEvent(tx, { type: 'message-failed', jobId: row.jobId, detail: { messageId: id, message: row.message } })
  })
}

async function claim(tx: FirmTx, firmId: string, id: string): Promise<Letter | null> {
  const [row] = await tx.update(outboxMessage).set({ state: 'claimed', claimedAt: sql`now()`, attempts: sql`${outboxMessage.attempts} + 1` }).where(and(eq(outboxMessage.firmId, firmId), eq(outboxMessage.id, id), eq(outboxMessage.state, 'queued'))).returning()
  if (!row) return null
  const attachment = row.waitsForPaper ? await readPaper(tx, firmId, row.waitsForPaper) : null
  const message = await composeOutboxMessage(tx, { ...row, content: row.waitsForPaper ? { ...row.content, isPdfAttached: attachment !== null } : row.content })
  return { to: row.recipient, ...message, messageId: row.messageId, attachments: attachment ? [attachment] : [] }
}

async function readPaper(tx: FirmTx, firmId: string, paperId: string) {
  const [row] = await tx.select({ kind: paper.kind, sha256: paper.sha256 }).from(paper).where(and(eq(paper.firmId, firmId), eq(paper.id, paperId)))
  const content = row?.sha256 ? await fileStore().get(row.sha256) : null
  return content && content.length <= MOST_ATTACHED_BYTES ? { filename: `${row!.kind}.pdf`, content, contentType: 'application/pdf' } : null
}

/** A pack that has gone hands the job over. */
async function afterSending(tx: FirmTx, row: typeof outboxMessage.$inferSelect): Promise<void> {
  if (row.message !== 'pack-sent' || !row.jobId) return
  const job = await findJob(tx, row.firmId, row.jobId)
  if (job) await moveJob(tx, row.firmId, job, 'pack-sent')
  await recordEvent(tx, { type: 'pack-sent', jobId: row.jobId, detail: { messageId: row.id } })
}

/** Claims that nobody finished (we died between the mail server's answer and our commit) are shown, not repeated. */
export async function markUnclear(firmId: string, id: string): Promise<void> {
  await changeAsFirm(firmId, async (tx) => {
    const [row] = await tx.update(outboxMessage).set({ state: 'unclear', problem: 'The conversation with the mail server was cut off: it may have gone.' }).where(and(eq(outboxMessage.firmId, firmId), eq(outboxMessage.id, id), eq(outboxMessage.state, 'claimed'))).returning({ jobId: outboxMessage.jobId, message: outboxMessage.message })
    if (row) await recordEvent(tx, { type: 'message-unclear', jobId: row.jobId, detail: { messageId: id, message: row.message } })
  })
}

