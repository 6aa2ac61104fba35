import * as z from 'zod'
import { REPLY_OUTCOMES, SENT_WAYS } from '../job/notices'

/** That a notice went out: how, when, and under which reference of theirs. */
export const noticeSentForm = z.strictObject({
  mutationId: z.uuid(),
  how: z.enum(SENT_WAYS, 'Choose how it was sent'),
  sentOn: z.iso.date('Enter the day it was sent'),
  reference: z.string().trim().max(120, 'Use at most 120 characters').default(''),
})
export type NoticeSent = z.infer<typeof noticeSentForm>

export const noticeReplyForm = z.strictObject({
  mutationId: z.uuid(),
  outcome: z.enum(REPLY_OUTCOMES, 'Choose what they answered'),
  repliedOn: z.iso.date('Enter the day of the reply'),
  note: z.string().trim().max(2000, 'Use at most 2,000 characters').default(''),
})
export type NoticeReply = z.infer<typeof noticeReplyForm>
