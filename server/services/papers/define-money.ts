import { quotePaper } from '../quotes/quote-paper'
import { invoicePaper } from '../invoices/invoice-paper'
import type { DefinePaper } from '../../worker/make-paper'

/** A quote and an invoice as papers. */
export const defineQuote: DefinePaper = quotePaper
export const defineInvoice: DefinePaper = invoicePaper
