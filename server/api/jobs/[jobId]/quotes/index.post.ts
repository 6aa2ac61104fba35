import { sendQuoteForm } from '#shared/schemas/quote'
import { sendQuote } from '#server/services/quotes/send-quote'

export default defineJobHandler({ may: 'send-quotes', body: sendQuoteForm }, ({ ctx, job, body }) => sendQuote(ctx, job.id, body))
