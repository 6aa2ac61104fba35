import { acceptQuoteForm } from '#shared/schemas/customer'
import { findCustomerLink } from '#server/services/links/customer-links'
import { acceptQuote } from '#server/services/quotes/customer-acts'

export default defineOpenHandler({ body: acceptQuoteForm }, async ({ event, body }) => acceptQuote(await findCustomerLink(getRouterParam(event, 'token') ?? '', 'quote'), body))
