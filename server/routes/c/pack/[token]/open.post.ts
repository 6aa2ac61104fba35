import { findCustomerLink } from '#server/services/links/customer-links'
import { openDoor } from '#server/utils/pack-door-cookie'
import { ProblemError } from '#shared/utils/problem'

/** The postcode as a plain form, for a browser that runs no scripts. */
export default defineOpenHandler({}, async ({ event }) => {
  const token = getRouterParam(event, 'token') ?? ''
  const form = new URLSearchParams((await readRawBody(event, 'utf8') ?? '').slice(0, 200))
  const link = await findCustomerLink(token, 'pack')
  const isOpen = await openDoor(event, link, form.get('postcode') ?? '').then(() => true, (error: unknown) => {
    if (error instanceof ProblemError) return false
    throw error
  })
  return sendRedirect(event, `/c/pack/${token}${isOpen ? '' : '?again=yes'}`, 303)
})
