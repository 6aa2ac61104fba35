import { actForm } from '#shared/schemas/quote'
import { skipQuote } from '#server/services/quotes/office-acts'

export default defineJobHandler({ may: 'send-quotes', body: actForm }, ({ ctx, job, body }) => skipQuote(ctx, job.id, body.mutationId))
