import { actForm } from '#shared/schemas/quote'
import { withdrawQuote } from '#server/services/quotes/office-acts'

export default defineJobHandler({ may: 'send-quotes', body: actForm }, ({ event, ctx, job, body }) => withdrawQuote(ctx, job.id, uuidParam(event, 'quoteId'), body.mutationId))
