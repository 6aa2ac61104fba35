import { findCustomerLink, readByLink } from '#server/services/links/customer-links'
import { assertDoorOpen } from '#server/services/links/open-door'
import { findMadePaper, readMadeFile } from '#server/services/links/read-made-paper'
import { findStandingCertificate } from '#server/services/links/read-pack'

export default defineOpenHandler({}, async ({ event }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'pack')
  assertDoorOpen(link, name => getCookie(event, name))
  const bytes = await readMadeFile(await readByLink(link, async (tx) => {
    const row = await findStandingCertificate(tx, link.firmId, link.jobId)
    return row && findMadePaper(tx, link.firmId, 'pack', row.id)
  }))
  setResponseHeaders(event, { 'content-type': 'application/pdf', 'content-disposition': 'attachment; filename="pack.pdf"' })
  return bytes
})
