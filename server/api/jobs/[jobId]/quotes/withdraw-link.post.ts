import { withdrawLinkForm } from '#shared/schemas/quote'
import { takeBackLink } from '#server/services/quotes/office-acts'

export default defineJobHandler({ may: 'send-quotes', body: withdrawLinkForm }, ({ ctx, job, body }) => takeBackLink(ctx, job.id, body))
