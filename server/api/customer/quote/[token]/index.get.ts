import { paymentService } from '#server/adapters/payments'
import { findCustomerLink } from '#server/services/links/customer-links'
import { readCustomerQuote } from '#server/services/quotes/customer-quote'
import { config } from '#server/utils/config'

export default defineOpenHandler({}, async ({ event }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'quote')
  return readCustomerQuote(link, paymentService(config().stripe) !== null)
})
