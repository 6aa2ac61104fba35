import { declineQuoteForm } from '#shared/schemas/customer'
import { findCustomerLink } from '#server/services/links/customer-links'
import { declineQuote } from '#server/services/quotes/customer-acts'

export default defineOpenHandler({ body: declineQuoteForm }, async ({ event, body }) => declineQuote(await findCustomerLink(getRouterParam(event, 'token') ?? '', 'quote'), body))
