/** Quotes, links and payment events for tests: made through the product's own services. */
import { randomUUID } from 'node:crypto'
import type { PaymentService } from '#server/adapters/payments'
import { changeAsFirm } from '#server/db/firm-db'
import { findCustomerLink, makeCustomerLink, type FoundLink, type LinkPurpose } from '#server/services/links/customer-links'
import { sendQuote } from '#server/services/quotes/send-quote'
import type { SendQuote } from '#shared/schemas/quote'
import { addDays, londonDay } from '#shared/utils/dates'
import { inFirm, makeJob, send, type TestFirm } from './firm'

export const today = () => londonDay(Date.now())

/** One line of £900.00; the test firm charges no VAT and asks for 25 %: £225.00. */
export const quoteForm = (rest: Partial<SendQuote> = {}): SendQuote => ({
  mutationId: randomUUID(), expiresOn: addDays(today(), 14), terms: 'Agreed as written.',
  lines: [{ description: 'Charger fitted', quantityThousandths: 1000, unit: 'each', unitNetPence: 90_000, vatBp: 2000 }], ...rest,
})
export const DEPOSIT = 22_500

/** A job whose customer can be written to. */
export async function makeQuotableJob(firm: TestFirm): Promise<string> {
  const jobId = await makeJob(firm)
  const outcome = await send(firm.people.office, 'change-customer', jobId, { fields: { email: 'ada@customer.example' } })
  if (outcome.status !== 'applied') throw new Error(JSON.stringify(outcome))
  return jobId
}

export const makeLink = (firm: TestFirm, jobId: string, purpose: LinkPurpose, subjectId: string | null, days: number | null = 30) =>
  changeAsFirm(firm.id, tx => makeCustomerLink(tx, { firmId: firm.id, jobId, purpose, subjectId, sentTo: 'ada@customer.example', days }))

/** A job with a quote that was sent, and the customer's link to it. */
export async function makeSentQuote(firm: TestFirm): Promise<{ jobId: string, quoteId: string, token: string, link: FoundLink }> {
  const jobId = await makeQuotableJob(firm)
  const { id: quoteId } = await sendQuote(firm.people.office, jobId, quoteForm())
  const token = await makeLink(firm, jobId, 'quote', quoteId)
  return { jobId, quoteId, token, link: await findCustomerLink(token, 'quote') }
}

export const countRows = async (firm: TestFirm, table: 'payment' | 'outside_event' | 'audit_event' | 'checkout', where = 'true', values: unknown[] = []) =>
  (await inFirm<{ n: number }>(firm.id, `select count(*)::int as n from ${table} where ${where}`, values))[0]!.n

export const messagesOf = (firm: TestFirm, jobId: string) => inFirm<{ message: string, recipient: string, content: Record<string, unknown> }>(firm.id, 'select message, recipient, content from outbox_message where job_id = $1 order by made_at, id', [jobId])

/** A payment service that remembers what it was asked and answers at once, or not at all. */
export function fakePayments(answer: 'page' | 'away' = 'page'): PaymentService & { asked: Parameters<PaymentService['askCheckout']>[0][] } {
  const asked: Parameters<PaymentService['askCheckout']>[0][] = []
  return {
    asked, isLive: false,
    async askCheckout(given) {
      asked.push(given)
      if (answer === 'away') throw new Error('no answer')
      return { outsideId: `cs_test_${given.checkoutId}`, url: `https://pay.example/${given.checkoutId}` }
    },
    readEvent: async () => null,
  }
}
