import { and, eq, sql } from 'drizzle-orm'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { touchJob } from '../../db/queries/jobs'
import { outboxMessage } from '../../db/schema/message'
import type { FirmContext } from '../firm-context'

/** Puts a message back into the outbox under the same Message-ID, so that a mailbox that has it already may know it again. */
export async function sendMessageAgain(ctx: FirmContext, messageId: string, input: { mutationId: string }): Promise<{ state: 'queued' }> {
  return ctx.once(input.mutationId, 'send-message-again', { messageId }, async (tx) => {
    const here = and(eq(outboxMessage.firmId, ctx.firmId), eq(outboxMessage.id, messageId))
    const [row] = await tx.select({ state: outboxMessage.state, jobId: outboxMessage.jobId }).from(outboxMessage).where(here).for('update')
    if (!row) throw problem('not-found', 'There is no such message.')
    if (row.state === 'queued' || row.state === 'claimed') throw problem('wrong-stage', 'This message is on its way already.')
    // The seventy-two hours of trying begin anew.
    await tx.update(outboxMessage).set({ state: 'queued', attempts: 0, problem: null, claimedAt: null, nextTryAt: sql`now()`, madeAt: sql`now()` }).where(here)
    if (row.jobId) await touchJob(tx, ctx.firmId, row.jobId)
    await recordEvent(tx, { type: 'message-sent-again', jobId: row.jobId, personId: ctx.person.id, detail: { messageId } })
    return { state: 'queued' as const }
  })
}
