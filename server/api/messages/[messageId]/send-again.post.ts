import { actForm } from '#shared/schemas/sign-off'
import { sendMessageAgain } from '#server/services/packs/send-message-again'

export default defineFirmHandler({ may: 'send-packs', body: actForm }, ({ event, ctx, body }) => sendMessageAgain(ctx, uuidParam(event, 'messageId'), body))
