import { and, eq } from 'drizzle-orm'
import type { NoticeSent } from '../../../shared/schemas/notice'
import { formatDay, londonDay } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { touchJob } from '../../db/queries/jobs'
import { lockNotice } from '../../db/queries/notices'
import { notice } from '../../db/schema/notice'
import type { FirmContext } from '../firm-context'

/** Keeps the proof that a notice went out. It can be put right until the reply is in; the story keeps what stood before. */
export async function markNoticeSent(ctx: FirmContext, noticeId: string, input: NoticeSent): Promise<{ state: 'sent' }> {
  return ctx.once(input.mutationId, 'notice-sent', { noticeId, ...input }, async (tx) => {
    const before = await lockNotice(tx, ctx.firmId, noticeId)
    if (before.state === 'answered') throw problem('wrong-stage', 'The reply to this notice is in already, so how it was sent stands as it is.')
    if (input.sentOn > londonDay(Date.now())) throw problem('check-answers', 'A notice cannot have been sent on a day that is still to come.', { fields: { sentOn: `Enter the day it was sent; ${formatDay(input.sentOn)} is still to come` } })
    await tx.update(notice).set({ state: 'sent', sentOn: input.sentOn, sentHow: input.how, sentBy: ctx.person.id, reference: input.reference }).where(and(eq(notice.firmId, ctx.firmId), eq(notice.id, noticeId)))
    await touchJob(tx, ctx.firmId, before.jobId)
    await recordEvent(tx, { type: 'notice-sent', jobId: before.jobId, personId: ctx.person.id, detail: { noticeId, kind: before.kind, how: input.how, sentOn: input.sentOn, was: before.sentOn } })
    return { state: 'sent' as const }
  })
}
