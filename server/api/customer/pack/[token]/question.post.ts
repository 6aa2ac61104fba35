import { askForm } from '#shared/schemas/customer'
import { findCustomerLink } from '#server/services/links/customer-links'
import { assertDoorOpen } from '#server/services/links/open-door'
import { askFirm } from '#server/services/quotes/customer-acts'

export default defineOpenHandler({ body: askForm }, async ({ event, body }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'pack')
  assertDoorOpen(link, name => getCookie(event, name))
  return askFirm(link, body)
})
