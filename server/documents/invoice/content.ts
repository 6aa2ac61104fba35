import { formatDay } from '#shared/utils/dates'
import { formatPounds } from '#shared/utils/money'
import { textFact } from '../paper/said'
import { firmNotes, LINE_HEADS, lineRows, vatTotals, type FirmOnPaper, type MoneyLine, type MoneyWords, type VatRate } from '../quote/content'

/** All that the law asks of a VAT invoice (number, tax point, issue date, both parties, lines, VAT by rate, sums in sterling), and how to pay. */
export interface InvoiceContent {
  number: string
  /** The moment it was issued. */
  at: string
  issued: string
  taxPoint: string
  dueBy: string
  firm: FirmOnPaper
  customer: { name: string, address: string }
  premises: { address: string, shortAddress: string }
  lines: MoneyLine[]
  rates: VatRate[]
  net_pence: number
  vat_pence: number
  gross_pence: number
  /** Already received from the customer, and the grant: both are payments towards the full price, never a discount. */
  paid_pence: number
  grant_pence: number
  due_pence: number
  payUrl: string | null
  /** The invoice this one corrects, or null. */
  corrects: string | null
}

/** An invoice in words and rows. */
export function invoiceWords(invoice: InvoiceContent): MoneyWords {
  return {
    opening: {
      over: invoice.firm.name,
      title: invoice.firm.vatNumber ? 'VAT invoice' : 'Invoice',
      under: `${invoice.number}  ·  ${invoice.premises.shortAddress}  ·  issued ${formatDay(invoice.issued)}`,
      qr: invoice.payUrl,
      qrWords: invoice.payUrl && `Pay: ${invoice.payUrl}`,
    },
    parties: {
      title: 'Between',
      facts: [
        textFact('Firm', invoice.firm.name, firmNotes(invoice.firm)),
        textFact('Customer', invoice.customer.name, [invoice.customer.address]),
        textFact('Work at', invoice.premises.address),
        textFact('Tax point', formatDay(invoice.taxPoint)),
        textFact('Due by', formatDay(invoice.dueBy)),
        textFact('Corrects', invoice.corrects ?? 'Nothing: first issue'),
      ],
    },
    heads: LINE_HEADS,
    lines: lineRows(invoice.lines),
    totals: [
      ['Total before VAT', formatPounds(invoice.net_pence)],
      ...vatTotals(invoice.rates),
      ['Total VAT, in sterling', formatPounds(invoice.vat_pence)],
      ['Total with VAT', formatPounds(invoice.gross_pence)],
      ...(invoice.grant_pence ? [['Grant received for you', formatPounds(-invoice.grant_pence)] as [string, string]] : []),
      ...(invoice.paid_pence ? [['Already paid', formatPounds(-invoice.paid_pence)] as [string, string]] : []),
      ['To pay', formatPounds(invoice.due_pence)],
    ],
    paragraphs: [{ title: 'How to pay', sentences: [invoice.payUrl ? `On our own page: ${invoice.payUrl}. We never send bank details by e-mail.` : 'As agreed with us. We never send bank details by e-mail.'] }],
  }
}
