import { renderInvoice } from '#server/services/invoices/render-invoice'

export default defineJobHandler({ may: 'read-money' }, async ({ event, ctx, job }) => {
  const { bytes, name } = await renderInvoice(ctx, job.id, uuidParam(event, 'invoiceId'), () => useStorage('assets:fonts'))
  setResponseHeaders(event, { 'content-type': 'application/pdf', 'content-disposition': `inline; filename="${name}"` })
  return bytes
})
