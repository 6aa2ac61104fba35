import { findCustomerLink } from '#server/services/links/customer-links'
import { isDoorOpen } from '#server/services/links/open-door'
import { readPack } from '#server/services/links/read-pack'

export default defineOpenHandler({}, async ({ event }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'pack')
  return readPack(link, isDoorOpen(link, name => getCookie(event, name)))
})
