import { postcodeForm } from '#shared/schemas/customer'
import { findCustomerLink } from '#server/services/links/customer-links'
import { openDoor } from '#server/services/links/open-door'

export default defineOpenHandler({ body: postcodeForm }, async ({ event, body }) => {
  const { name, value, options } = await openDoor(await findCustomerLink(getRouterParam(event, 'token') ?? '', 'pack'), body.postcode)
  setCookie(event, name, value, options)
  return { open: true }
})
