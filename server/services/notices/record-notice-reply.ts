import { and, eq } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { NoticeReply } from '../../../shared/schemas/notice'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { touchJob } from '../../db/queries/jobs'
import { lockNotice } from '../../db/queries/notices'
import { notice, noticeReply } from '../../db/schema/notice'
import type { FirmContext } from '../firm-context'

/** Keeps a reply. A question back leaves the notice waiting for its answer; everything else answers it. */
export async function recordNoticeReply(ctx: FirmContext, noticeId: string, input: NoticeReply): Promise<{ state: 'sent' | 'answered' }> {
  return ctx.once(input.mutationId, 'notice-reply', { noticeId, ...input }, async (tx) => {
    const before = await lockNotice(tx, ctx.firmId, noticeId)
    if (before.state === 'to-prepare') throw problem('wrong-stage', 'This notice has not been marked as sent. Mark that first, then its reply.')
    if (before.sentOn && input.repliedOn < before.sentOn) throw problem('check-answers', 'A reply cannot be older than the notice.', { fields: { repliedOn: 'Enter a day on or after the day it was sent' } })
    const state = input.outcome === 'question' ? 'sent' as const : 'answered' as const
    await tx.insert(noticeReply).values({ firmId: ctx.firmId, id: uuidv7(), noticeId, outcome: input.outcome, note: input.note, repliedOn: input.repliedOn })
    await tx.update(notice).set({ state }).where(and(eq(notice.firmId, ctx.firmId), eq(notice.id, noticeId)))
    await touchJob(tx, ctx.firmId, before.jobId)
    await recordEvent(tx, { type: 'notice-answered', jobId: before.jobId, personId: ctx.person.id, detail: { noticeId, kind: before.kind, outcome: input.outcome } })
    return { state }
  })
}
