import { noticeReplyForm } from '#shared/schemas/notice'
import { recordNoticeReply } from '#server/services/notices/record-notice-reply'

export default defineFirmHandler({ may: 'send-notices', body: noticeReplyForm }, ({ event, ctx, body }) => recordNoticeReply(ctx, uuidParam(event, 'noticeId'), body))
