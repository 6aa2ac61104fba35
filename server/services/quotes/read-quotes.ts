import { defaultTerms } from '../../../shared/pricing/quote-terms'
import type { QuoteBench } from '../../../shared/schemas/quote'
import { findJobLinks } from '../../db/queries/links'
import { countOddCheckouts, findInvoices, findPayments } from '../../db/queries/payments'
import { findFirm, findPrices, findQuotesOfJob } from '../../db/queries/quotes'
import type { FirmContext } from '../firm-context'

/** What the quote page of a job needs beside the job's record. */
export async function readQuoteBench(ctx: FirmContext, jobId: string): Promise<QuoteBench> {
  return ctx.read(async (tx) => {
    const firm = await findFirm(tx, ctx.firmId)
    const quotes = await findQuotesOfJob(tx, ctx.firmId, jobId)
    return {
      prices: await findPrices(tx, ctx.firmId),
      isVatRegistered: firm.vatNumber !== null,
      depositBp: firm.settings.depositBp,
      quoteDays: firm.settings.quoteDays,
      vatBp: firm.settings.vatBp,
      terms: defaultTerms(firm.name),
      links: await findJobLinks(tx, ctx.firmId, jobId),
      payments: await findPayments(tx, ctx.firmId, jobId),
      invoices: await findInvoices(tx, ctx.firmId, jobId),
      declined: Object.fromEntries(quotes.filter(quote => quote.declinedReason).map(quote => [quote.id, quote.declinedReason!])),
      oddCheckouts: await countOddCheckouts(tx, ctx.firmId, jobId),
    }
  })
}
