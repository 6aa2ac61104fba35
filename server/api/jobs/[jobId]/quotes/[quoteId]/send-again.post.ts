import { actForm } from '#shared/schemas/quote'
import { sendQuoteAgain } from '#server/services/quotes/office-acts'

export default defineJobHandler({ may: 'send-quotes', body: actForm }, ({ event, ctx, job, body }) => sendQuoteAgain(ctx, job.id, uuidParam(event, 'quoteId'), body.mutationId))
