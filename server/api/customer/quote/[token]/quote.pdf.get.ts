import { findCustomerLink, readByLink } from '#server/services/links/customer-links'
import { findMadePaper, readMadeFile } from '#server/services/links/read-made-paper'

export default defineOpenHandler({}, async ({ event }) => {
  const link = await findCustomerLink(getRouterParam(event, 'token') ?? '', 'quote')
  const bytes = await readMadeFile(await readByLink(link, tx => findMadePaper(tx, link.firmId, 'quote', link.subjectId!)))
  setResponseHeaders(event, { 'content-type': 'application/pdf', 'content-disposition': 'attachment; filename="quote.pdf"' })
  return bytes
})
