import * as z from 'zod'
import { findCustomerLink } from '#server/services/links/customer-links'
import { keepCustomerPhotograph } from '#server/services/links/customer-photographs'
import { MOST_PHOTOGRAPH_BYTES } from '#server/services/photographs/keep-file'
import { readBytes } from '#server/utils/read-bytes'
import { problem } from '#shared/utils/problem'

/** The bytes are the body; the id that makes the act happen once travels in the address. */
export default defineOpenHandler({}, async ({ event }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'photographs')
  const mutationId = z.uuid().safeParse(getQuery(event).mutationId)
  if (!mutationId.success) throw problem('check-answers', 'The request could not be read.')
  return keepCustomerPhotograph(link, getRouterParam(event, 'claim') ?? '', mutationId.data, await readBytes(event, MOST_PHOTOGRAPH_BYTES))
})
