/** What the office sends about a quote, a price or an invoice, and what the pages get back. */
import * as z from 'zod'

const id = z.uuid('Give the id its sender made')
/** £1 million either way: beyond it a figure is a slip. */
const MOST_PENCE = 100_000_000
const MOST_LINES = 60

const pricePence = z.int('Enter a price in pounds and pence, such as 84.00').min(-MOST_PENCE, 'Enter at most 1 million pounds').max(MOST_PENCE, 'Enter at most 1 million pounds')
const vatBp = z.int('Choose a VAT rate').min(0, 'Choose a VAT rate').max(10_000, 'A VAT rate is at most 100 %')
const unitWord = z.string('Enter a unit, such as each, m or hour').trim().min(1, 'Enter a unit, such as each, m or hour').max(20, 'Use at most 20 characters')

export const quoteLineForm = z.strictObject({
  description: z.string('Say what the line is for').trim().min(1, 'Say what the line is for').max(300, 'Use at most 300 characters'),
  /** Thousandths, so that 7.5 m of cable is a whole number. */
  quantityThousandths: z.int('Enter a quantity above 0, with at most three decimal places').min(1, 'Enter a quantity above 0').max(100_000_000, 'Enter at most 100,000'),
  unit: unitWord,
  unitNetPence: pricePence,
  vatBp,
})
export type QuoteLineForm = z.infer<typeof quoteLineForm>

export const sendQuoteForm = z.strictObject({
  mutationId: id,
  lines: z.array(quoteLineForm).min(1, 'Add at least one line').max(MOST_LINES, `A quote has at most ${MOST_LINES} lines`),
  /** The last day on which it can be accepted. */
  expiresOn: z.iso.date('Choose the last day the quote stands'),
  terms: z.string().trim().min(1, 'Write the terms the customer agrees to').max(8000, 'Use at most 8,000 characters'),
})
export type SendQuote = z.infer<typeof sendQuoteForm>

/** An act on a job or quote that needs nothing but to happen once. */
export const actForm = z.strictObject({ mutationId: id })
export type ActForm = z.infer<typeof actForm>

export const withdrawLinkForm = z.strictObject({ mutationId: id, linkId: id })
export type WithdrawLink = z.infer<typeof withdrawLinkForm>

export const priceForm = z.strictObject({
  mutationId: id,
  /** Left out for a new one. */
  id: id.optional(),
  code: z.string('Enter a short code').trim().toUpperCase().regex(/^[A-Z0-9][A-Z0-9-]{0,39}$/, 'Use letters, figures and hyphens, such as CABLE-6-SWA'),
  description: z.string('Say what it is').trim().min(1, 'Say what it is').max(300, 'Use at most 300 characters'),
  unit: unitWord,
  netPence: pricePence,
  vatBp,
  active: z.boolean().default(true),
})
export type PriceForm = z.infer<typeof priceForm>

export interface PriceItem { id: string, code: string, description: string, unit: string, netPence: number, vatBp: number, active: boolean }

/** How money stands with one quote, in one word for the page. */
export interface PaymentView { id: string, quoteId: string | null, pence: number, way: string, at: string }
export interface InvoiceView { id: string, number: string, kind: string, state: string, grossPence: number, duePence: number, issuedOn: string }
export interface LinkLine { id: string, purpose: string, subjectId: string | null, sentTo: string, madeAt: string, expiresAt: string | null, withdrawnAt: string | null, openedAt: string | null }

/** What the quote page of a job needs beside the record. */
export interface QuoteBench {
  prices: PriceItem[]
  isVatRegistered: boolean
  depositBp: number
  quoteDays: number
  vatBp: number
  terms: string
  links: LinkLine[]
  payments: PaymentView[]
  invoices: InvoiceView[]
  /** Why each declined quote was declined, by quote id. */
  declined: Record<string, string>
  /** Payments whose amount or currency did not fit what was asked for: to be looked at by hand. */
  oddCheckouts: number
}

/** One job's money in a list: whose turn it is and how much stands out. */
export interface OwedLine {
  jobId: string
  ref: string
  customer: string
  address: string
  kind: 'quote-waiting' | 'quote-run-out' | 'deposit-unpaid' | 'deposit-paid' | 'balance-due' | 'to-invoice'
  number: string
  pence: number
  since: string
  /** The day by which something is due or runs out. */
  day: string | null
}
