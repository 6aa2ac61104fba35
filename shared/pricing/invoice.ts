/**
 * What an invoice comes to, with its VAT table.
 *
 * A line's net is quantity × unit price to the nearest penny; VAT is worked once for each rate on the sum of its lines,
 * to the nearest penny; a half goes away from zero in both. The grant and the deposit are taken off the full price.
 *
 * @source rules COM-05 to COM-09
 * @example one line of £900.00 at 20 % -> £180.00 VAT, £1,080.00
 */
import * as z from 'zod'
import { fields } from '../electrical/inputs'
import { answer, waiting, type Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { formatPounds, shareOf, vatOn } from '../utils/money'
import { blankKeys, wholePence, yesOrNo } from '../job/rules/inputs'
import { because, ruleStep } from '../job/rules/rule'

const MOST_LINES = 500
const MOST_QUANTITY = 100_000
const MOST_UNIT_PENCE = 100_000_000
const WHOLE_RATE_BP = 10_000
/** A quantity is kept to four places, so that a line's net is worked in whole numbers. */
const QUANTITY_PARTS = 10_000
/** A simplified invoice may be given up to £250.00 with VAT (rule COM-07). */
const SIMPLIFIED_LIMIT_PENCE = 25_000

const line = fields({
  description: z.string('Enter what the line is for').trim().min(1, 'Enter what the line is for').max(500, 'Enter at most 500 characters'),
  quantity: z.number('Enter a quantity').min(0, 'Enter a quantity of 0 or more').max(MOST_QUANTITY, `Enter at most ${MOST_QUANTITY}`)
    .refine(hasFourPlaces, 'Enter a quantity with at most four decimal places'),
  unitNet_pence: z.number('Enter whole pence').int('Enter whole pence').min(-MOST_UNIT_PENCE, 'Enter at most 1 million pounds').max(MOST_UNIT_PENCE, 'Enter at most 1 million pounds').describe('Without VAT; below zero for a discount'),
  vat_bp: z.number('Enter the VAT rate in basis points, 2000 for 20 %').int('Enter whole basis points').min(0, 'Enter a rate of 0 or more').max(WHOLE_RATE_BP, 'Enter at most 10000, which is 100 %'),
})

const input = fields({
  lines: z.array(line).max(MOST_LINES, `Enter at most ${MOST_LINES} lines`).nullish(),
  deposit_pence: wholePence.nullish(),
  grant_pence: wholePence.nullish(),
  vatRegistered: yesOrNo.nullish(),
})
export type InvoiceInput = z.infer<typeof input>
export type InvoiceLine = z.infer<typeof line>

/** One row of the VAT table. */
export interface VatRow {
  vat_bp: number
  net_pence: number
  vat_pence: number
  gross_pence: number
}

export interface InvoiceResult {
  /** Net of each line, in the order given. */
  line_net_pence: number[]
  net_pence: number
  vat_pence: number
  gross_pence: number
  /** By rate, the highest first. */
  rates: VatRow[]
  /** What is left to pay; below zero where more was paid than is owed. */
  due_pence: number
  simplifiedAllowed: boolean
}

export function invoice(given: InvoiceInput): Answer<InvoiceResult> {
  const { lines, vatRegistered } = given
  if (!lines?.length || typeof vatRegistered !== 'boolean') return waiting(blankKeys({ lines: lines?.length ? lines : null, vatRegistered }))
  const line_net_pence = lines.map(lineNet)
  const rates = ratesOf(lines, line_net_pence, vatRegistered)
  const net_pence = sum(rates.map(row => row.net_pence))
  const vat_pence = sum(rates.map(row => row.vat_pence))
  const gross_pence = net_pence + vat_pence
  const due_pence = gross_pence - (given.deposit_pence ?? 0) - (given.grant_pence ?? 0)
  const simplifiedAllowed = vatRegistered && gross_pence <= SIMPLIFIED_LIMIT_PENCE
  return answer({
    result: { line_net_pence, net_pence, vat_pence, gross_pence, rates, due_pence, simplifiedAllowed },
    working: [
      ...rates.map(row => ruleStep('COM-06', { symbol: `VAT at ${row.vat_bp / 100} %`, expression: `${row.net_pence} × ${row.vat_bp} ÷ ${WHOLE_RATE_BP}, to the nearest penny, a half away from zero`, value: row.vat_pence, unit: 'p' })),
      ruleStep('COM-08', { symbol: 'due', expression: `${gross_pence} − ${given.deposit_pence ?? 0} − ${given.grant_pence ?? 0}`, value: due_pence, unit: 'p' }),
    ],
    reasons: [formReason(vatRegistered, simplifiedAllowed)],
    notes: notesFor(given, due_pence, vatRegistered),
  })
}

/** quantity × unit price in whole pence; exact, as the quantity is counted in ten-thousandths. */
function lineNet({ quantity, unitNet_pence }: InvoiceLine): number {
  return shareOf(unitNet_pence, Math.round(quantity * QUANTITY_PARTS), QUANTITY_PARTS)
}

function ratesOf(lines: readonly InvoiceLine[], nets: readonly number[], vatRegistered: boolean): VatRow[] {
  const netByRate = new Map<number, number>()
  lines.forEach((each, at) => {
    const rate = vatRegistered ? each.vat_bp : 0
    netByRate.set(rate, (netByRate.get(rate) ?? 0) + (nets[at] ?? 0))
  })
  return [...netByRate].sort(([a], [b]) => b - a).map(([vat_bp, net_pence]) => {
    const vat_pence = vatOn(net_pence, vat_bp)
    return { vat_bp, net_pence, vat_pence, gross_pence: net_pence + vat_pence }
  })
}

function formReason(vatRegistered: boolean, simplifiedAllowed: boolean): string {
  if (!vatRegistered) return because('COM-09', 'The firm is not registered for VAT: no VAT is charged and no VAT invoice is given.')
  return simplifiedAllowed
    ? because('COM-07', `The price with VAT is at most ${formatPounds(SIMPLIFIED_LIMIT_PENCE)}, so a simplified invoice is enough.`)
    : because('COM-06', `The price with VAT is more than ${formatPounds(SIMPLIFIED_LIMIT_PENCE)}, so the invoice carries every particular.`)
}

function notesFor(given: InvoiceInput, due_pence: number, vatRegistered: boolean): string[] {
  return [
    ...(given.grant_pence ? [because('COM-08', vatRegistered ? 'VAT is on the full price; the grant is taken off afterwards.' : 'The grant is taken off the full price.')] : []),
    ...(due_pence < 0 ? [`Deposit and grant come to ${formatPounds(-due_pence)} more than the price.`] : []),
  ]
}

function hasFourPlaces(quantity: number): boolean {
  return Math.abs(quantity * QUANTITY_PARTS - Math.round(quantity * QUANTITY_PARTS)) < 1e-5
}

const sum = (amounts: readonly number[]) => amounts.reduce((total, amount) => total + amount, 0)

export const invoiceCalculation = defineCalculation({
  name: 'invoice',
  purpose: 'Adds up an invoice with its VAT table, deposit and grant.',
  input,
  run: invoice,
})
