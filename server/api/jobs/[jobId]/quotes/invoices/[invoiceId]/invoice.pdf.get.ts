import { findMadePaper, readMadeFile } from '#server/services/links/read-made-paper'

export default defineJobHandler({ may: 'read-money' }, async ({ event, ctx }) => {
  const invoiceId = uuidParam(event, 'invoiceId')
  const bytes = await readMadeFile(await ctx.read(tx => findMadePaper(tx, ctx.firmId, 'invoice', invoiceId)))
  setResponseHeaders(event, { 'content-type': 'application/pdf', 'content-disposition': 'inline; filename="invoice.pdf"' })
  return bytes
})
