import { noticeSentForm } from '#shared/schemas/notice'
import { markNoticeSent } from '#server/services/notices/mark-notice-sent'

export default defineFirmHandler({ may: 'send-notices', body: noticeSentForm }, ({ event, ctx, body }) => markNoticeSent(ctx, uuidParam(event, 'noticeId'), body))
