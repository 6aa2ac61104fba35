import { actForm } from '#shared/schemas/quote'
import { issueInvoice } from '#server/services/invoices/issue-invoice'

export default defineJobHandler({ may: 'send-quotes', body: actForm }, ({ ctx, job, body }) => issueInvoice(ctx, job.id, body.mutationId))
