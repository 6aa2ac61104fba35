import { customerActForm } from '#shared/schemas/customer'
import { paymentService } from '#server/adapters/payments'
import { findCustomerLink } from '#server/services/links/customer-links'
import { askDeposit } from '#server/services/payments/ask-deposit'
import { config } from '#server/utils/config'

export default defineOpenHandler({ body: customerActForm }, async ({ event, body }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'quote')
  return askDeposit(link, body.mutationId, paymentService(config().stripe), config().baseUrl)
})
