import { findCustomerLink } from '#server/services/links/customer-links'
import { openDoor } from '#server/services/links/open-door'
import { ProblemError } from '#shared/utils/problem'

/** The postcode as a plain form, for a browser that runs no scripts. */
export default defineOpenHandler({}, async ({ event }) => {
  const token = getRouterParam(event, 'token') ?? ''
  const form = new URLSearchParams((await readRawBody(event, 'utf8') ?? '').slice(0, 200))
  const link = await findCustomerLink(token, 'pack')
  const cookie = await openDoor(link, form.get('postcode') ?? '').catch((error: unknown) => {
    if (error instanceof ProblemError) return null
    throw error
  })
  if (cookie) setCookie(event, cookie.name, cookie.value, cookie.options)
  return sendRedirect(event, `/c/pack/${token}${cookie ? '' : '?again=yes'}`, 303)
})
