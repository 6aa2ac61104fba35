import type { TDocumentDefinitions } from 'pdfmake/interfaces'
import { definePaper } from '../paper/define-paper'
import { moneyPages } from '../quote/layout'
import { invoiceWords, type InvoiceContent } from './content'

export function invoiceDefinition(invoice: InvoiceContent): TDocumentDefinitions {
  return definePaper({
    title: `Invoice ${invoice.number}, ${invoice.premises.shortAddress}`,
    firm: invoice.firm.name,
    orientation: 'portrait',
    foot: { number: invoice.number, shortAddress: invoice.premises.shortAddress, fourWords: null, replaces: null },
    isDraft: false,
    at: invoice.at,
    pages: moneyPages(invoiceWords(invoice)),
  })
}
