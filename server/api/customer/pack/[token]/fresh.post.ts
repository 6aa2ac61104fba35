import { customerActForm } from '#shared/schemas/customer'
import { londonDay } from '#shared/utils/dates'
import { findSpentLink } from '#server/services/links/customer-links'
import { sendFreshPack } from '#server/services/links/read-pack'

export default defineOpenHandler({ body: customerActForm }, async ({ event }) => {
  const link = await findSpentLink(getRouterParam(event, 'token') ?? '', 'pack')
  if (link) await sendFreshPack(link, londonDay(Date.now()))
  return { asked: true }
})
