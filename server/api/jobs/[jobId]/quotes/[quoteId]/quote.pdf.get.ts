import { findMadePaper, readMadeFile } from '#server/services/links/read-made-paper'

export default defineJobHandler({ may: 'read-money' }, async ({ event, ctx }) => {
  const quoteId = uuidParam(event, 'quoteId')
  const bytes = await readMadeFile(await ctx.read(tx => findMadePaper(tx, ctx.firmId, 'quote', quoteId)))
  setResponseHeaders(event, { 'content-type': 'application/pdf', 'content-disposition': 'inline; filename="quote.pdf"' })
  return bytes
})
