import { postcodeForm } from '#shared/schemas/customer'
import { findCustomerLink } from '#server/services/links/customer-links'
import { openDoor } from '#server/utils/pack-door-cookie'

export default defineOpenHandler({ body: postcodeForm }, async ({ event, body }) => {
  await openDoor(event, await findCustomerLink(getRouterParam(event, 'token') ?? '', 'pack'), body.postcode)
  return { open: true }
})
