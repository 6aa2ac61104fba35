import { quoteTotal } from '../../../shared/pricing/quote-total'
import type { CustomerQuote, CustomerQuoteState } from '../../../shared/schemas/customer'
import { compareDays, londonDay } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import { paidForQuote } from '../../db/queries/payments'
import { findAddressee, findFirm, findQuote, findQuoteLines, fullAddress, type StoredQuote } from '../../db/queries/quotes'
import { readByLink, type FoundLink } from '../links/customer-links'

/** How a quote stands for the customer on a day. */
export function stateOf(quote: Pick<StoredQuote, 'state' | 'expiresOn' | 'depositPence'>, paidPence: number, today: string): CustomerQuoteState {
  switch (quote.state) {
    case 'accepted': return quote.depositPence > 0 && paidPence >= quote.depositPence ? 'deposit-received' : 'accepted'
    case 'declined': return 'declined'
    case 'sent': return quote.expiresOn !== null && compareDays(quote.expiresOn, today) < 0 ? 'run-out' : 'open'
    case 'expired': return 'run-out'
    default: return 'replaced'
  }
}

/** The quote as its customer reads it. Reading changes nothing. */
export async function readCustomerQuote(link: FoundLink, takesCards: boolean): Promise<CustomerQuote> {
  return readByLink(link, async (tx) => {
    const quote = link.subjectId ? await findQuote(tx, link.firmId, link.subjectId) : null
    if (!quote || quote.state === 'draft') throw problem('not-found', 'There is no such quote.')
    const firm = await findFirm(tx, link.firmId)
    const to = await findAddressee(tx, link.firmId, quote.jobId)
    const lines = await findQuoteLines(tx, link.firmId, quote.id)
    const paidPence = await paidForQuote(tx, link.firmId, quote.id)
    const total = quoteTotal(lines, quote.vatPence !== 0, 0)
    const state = stateOf(quote, paidPence, londonDay(Date.now()))
    return {
      state,
      firm: { name: firm.name, telephone: firm.telephone, email: firm.email, address: firm.address, vatNumber: firm.vatNumber },
      customerName: to.name,
      address: fullAddress(to),
      number: quote.number,
      version: quote.version,
      expiresOn: quote.expiresOn ?? '',
      lines: lines.map(({ id, description, quantityThousandths, unit, unitNetPence, vatBp }, at) => ({ id, description, quantityThousandths, unit, unitNetPence, vatBp, netPence: total.lineNetPence[at]! })),
      rates: total.rates.map(({ vat_bp, net_pence, vat_pence }) => ({ vatBp: vat_bp, netPence: net_pence, vatPence: vat_pence })),
      netPence: quote.netPence,
      vatPence: quote.vatPence,
      grossPence: quote.grossPence,
      depositPence: quote.depositPence,
      paidPence,
      terms: quote.terms,
      acceptedAt: quote.acceptedAt?.toISOString() ?? null,
      acceptedName: quote.acceptedName,
      canPay: takesCards && (state === 'open' || state === 'accepted') && quote.depositPence - paidPence > 0,
    }
  })
}
