import { quoteTotal } from '../../../shared/pricing/quote-total'
import type { FirmTx } from '../../db/firm-db'
import { findAddressee, findFirm, findQuote, findQuoteLines, fullAddress } from '../../db/queries/quotes'
import { quoteDefinition } from '../../documents/quote/layout'
import { config } from '../../utils/config'
import { firmOnPaper } from '../invoices/invoice-paper'

/** A sent quote as a paper. The customer's own link is in their mail alone: a paper may be handed on. */
export async function quotePaper(tx: FirmTx, { firmId, jobId, sourceId }: { firmId: string, jobId: string, sourceId: string }) {
  const quote = await findQuote(tx, firmId, sourceId)
  if (!quote || !quote.sentAt || !quote.expiresOn) throw new Error('The quote of this paper is not there')
  const [firm, to, lines] = [await findFirm(tx, firmId), await findAddressee(tx, firmId, jobId), await findQuoteLines(tx, firmId, quote.id)]
  const total = quoteTotal(lines, firm.vatNumber !== null, 0)
  return quoteDefinition({
    number: quote.number, at: quote.sentAt.toISOString(), validUntil: quote.expiresOn,
    firm: firmOnPaper(firm),
    customer: { name: to.name, address: fullAddress(to) },
    premises: { address: fullAddress(to), shortAddress: to.shortAddress },
    scope: 'The work listed below', notIncluded: [],
    lines: lines.map((line, at) => ({ description: line.description, quantity: line.quantityThousandths / 1000, unit: line.unit, unitNet_pence: line.unitNetPence, net_pence: total.lineNetPence[at]!, vat_bp: firm.vatNumber ? line.vatBp : 0 })),
    rates: total.rates.map(({ vat_bp, net_pence, vat_pence }) => ({ vat_bp, net_pence, vat_pence })),
    net_pence: quote.netPence, vat_pence: quote.vatPence, gross_pence: quote.grossPence, deposit_pence: quote.depositPence, grant_pence: 0,
    terms: quote.terms.split('\n').filter(line => line.trim()),
    acceptUrl: `${config().baseUrl}/c/quote`,
  })
}
