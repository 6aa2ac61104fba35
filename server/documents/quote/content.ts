import { formatDay } from '#shared/utils/dates'
import { formatNumber } from '#shared/utils/figures'
import { formatPounds } from '#shared/utils/money'
import { textFact, type FactGroup } from '../paper/said'
import type { OpeningContent } from '../paper/opening'

/** A firm as its money papers name it. */
export interface FirmOnPaper { name: string, address: string, telephone: string, email: string, vatNumber: string | null, companyNumber: string | null }

export interface MoneyLine { description: string, quantity: number, unit: string, unitNet_pence: number, net_pence: number, vat_bp: number }

/** One row of the VAT table: all lines at one rate together. */
export interface VatRate { vat_bp: number, net_pence: number, vat_pence: number }

/** All that a quote is printed from; the sums are worked elsewhere and only written here. */
export interface QuoteContent {
  number: string
  /** The moment the quote was made. */
  at: string
  validUntil: string
  firm: FirmOnPaper
  customer: { name: string, address: string }
  premises: { address: string, shortAddress: string }
  scope: string
  notIncluded: string[]
  lines: MoneyLine[]
  rates: VatRate[]
  net_pence: number
  vat_pence: number
  gross_pence: number
  deposit_pence: number
  grant_pence: number
  terms: string[]
  /** The address at which the customer reads and accepts it. */
  acceptUrl: string
}

export interface MoneyWords { opening: OpeningContent, heads: string[], lines: string[][], totals: [string, string][], parties: FactGroup, paragraphs: { title: string, sentences: string[] }[] }

export const LINE_HEADS = ['What', 'Quantity', 'Each, before VAT', 'VAT rate', 'Before VAT']

export const percentOf = (bp: number) => `${formatNumber(bp / 100)}\u202f%`

export function lineRows(lines: MoneyLine[]): string[][] {
  return lines.map(line => [line.description, `${formatNumber(line.quantity)} ${line.unit}`.trim(), formatPounds(line.unitNet_pence), percentOf(line.vat_bp), formatPounds(line.net_pence)])
}

export function vatTotals(rates: VatRate[]): [string, string][] {
  return rates.map(rate => [`VAT at ${percentOf(rate.vat_bp)} on ${formatPounds(rate.net_pence)}`, formatPounds(rate.vat_pence)])
}

export function firmNotes(firm: FirmOnPaper): string[] {
  return [firm.address, `telephone ${firm.telephone}`, firm.email, firm.vatNumber ? `VAT number ${firm.vatNumber}` : 'Not registered for VAT', ...(firm.companyNumber ? [`Company number ${firm.companyNumber}`] : [])]
}

/** A quote in words and rows. */
export function quoteWords(quote: QuoteContent): MoneyWords {
  return {
    opening: { over: quote.firm.name, title: 'Quote', under: `${quote.number}  ·  ${quote.premises.shortAddress}  ·  stands until ${formatDay(quote.validUntil)}`, qr: quote.acceptUrl, qrWords: `Read and accept: ${quote.acceptUrl}` },
    parties: { title: 'Between', facts: [textFact('Firm', quote.firm.name, firmNotes(quote.firm)), textFact('Customer', quote.customer.name, [quote.customer.address]), textFact('Work at', quote.premises.address), textFact('Work', quote.scope)] },
    heads: LINE_HEADS,
    lines: lineRows(quote.lines),
    totals: [
      ['Before VAT', formatPounds(quote.net_pence)],
      ...vatTotals(quote.rates),
      ['Price with VAT', formatPounds(quote.gross_pence)],
      ...(quote.grant_pence ? [['Grant, paid to us for you', formatPounds(-quote.grant_pence)] as [string, string]] : []),
      ['Deposit on acceptance', formatPounds(quote.deposit_pence)],
    ],
    paragraphs: [
      { title: 'Not included', sentences: quote.notIncluded.length ? quote.notIncluded : ['Nothing is left out of the work described.'] },
      { title: 'Terms', sentences: quote.terms },
    ],
  }
}
