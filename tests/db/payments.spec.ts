import { randomUUID } from 'node:crypto'
import fc from 'fast-check'
import Stripe from 'stripe'
import { beforeAll, describe, expect, it } from 'vitest'
import { stripePayments, type PaymentEvent } from '#server/adapters/payments'
import { askDeposit } from '#server/services/payments/ask-deposit'
import { handlePaymentEvent } from '#server/services/payments/handle-event'
import { readPaymentOutcome } from '#server/services/payments/read-outcome'
import { readCustomerQuote } from '#server/services/quotes/customer-quote'
import { acceptQuote } from '#server/services/quotes/customer-acts'
import { withdrawQuote } from '#server/services/quotes/office-acts'
import { inFirm, makeFirm, type TestFirm } from '../support/build/firm'
import { countRows, DEPOSIT, fakePayments, makeSentQuote, messagesOf } from '../support/build/quote'
import '../support/db-setup'

const BASE = 'http://127.0.0.1:3000'
let firm: TestFirm
beforeAll(async () => {
  firm = await makeFirm()
})

const refusal = async (act: Promise<unknown>) => act.then(() => null, (error: { problem?: { code: string, message: string } }) => error.problem ?? null)

/** A quote that was accepted, with its payment page asked for. */
async function makeAsked() {
  const quote = await makeSentQuote(firm)
  await acceptQuote(quote.link, { mutationId: randomUUID(), version: 1, agreed: true, startEarly: false, name: 'Ada Test' })
  const payments = fakePayments()
  await askDeposit(quote.link, randomUUID(), payments, BASE)
  const { checkoutId } = payments.asked[0]!
  return { ...quote, payments, checkoutId, sessionId: `cs_test_${checkoutId}` }
}
type Asked = Awaited<ReturnType<typeof makeAsked>>

function completed({ checkoutId, sessionId }: Asked, object: Record<string, unknown> = {}, event: Partial<PaymentEvent> = {}): PaymentEvent {
  return { id: `evt_${randomUUID()}`, type: 'checkout.session.completed', isLive: false, object: { id: sessionId, metadata: { firmId: firm.id, checkoutId }, payment_status: 'paid', amount_total: DEPOSIT, currency: 'gbp', payment_intent: `pi_${checkoutId}`, ...object }, ...event }
}
const refunded = ({ checkoutId }: Asked, amount: number): PaymentEvent => ({ id: `evt_${randomUUID()}`, type: 'charge.refunded', isLive: false, object: { id: `ch_${checkoutId}`, metadata: { firmId: firm.id, checkoutId }, amount_refunded: amount, currency: 'gbp' } })
const expired = ({ checkoutId, sessionId }: Asked): PaymentEvent => ({ id: `evt_${randomUUID()}`, type: 'checkout.session.expired', isLive: false, object: { id: sessionId, metadata: { firmId: firm.id, checkoutId } } })
const paidFor = async (asked: Asked) => (await readCustomerQuote(asked.link, true)).paidPence

describe('asking for a deposit', () => {
  it('asks for our own amount, hands no link over, and opens the same page again', async () => {
    const asked = await makeAsked()
    expect(asked.payments.asked[0]).toMatchObject({ pence: DEPOSIT, firmId: firm.id })
    expect(JSON.stringify(asked.payments.asked)).not.toContain(asked.token)
    expect(await askDeposit(asked.link, randomUUID(), asked.payments, BASE)).toEqual({ url: `https://pay.example/${asked.checkoutId}` })
    expect(asked.payments.asked).toHaveLength(1)
    expect(await countRows(firm, 'checkout', 'quote_id = $1', [asked.quoteId])).toBe(1)
  })
  it('is refused before acceptance and without a payment service', async () => {
    const { link } = await makeSentQuote(firm)
    expect(await refusal(askDeposit(link, randomUUID(), fakePayments(), BASE))).toMatchObject({ code: 'wrong-stage' })
    expect(await refusal(askDeposit(link, randomUUID(), null, BASE))).toMatchObject({ code: 'try-later' })
  })
  it('keeps the acceptance where the service is away, and tries the same checkout again', async () => {
    const quote = await makeSentQuote(firm)
    await acceptQuote(quote.link, { mutationId: randomUUID(), version: 1, agreed: true, startEarly: false, name: 'Ada Test' })
    const away = fakePayments('away')
    expect(await refusal(askDeposit(quote.link, randomUUID(), away, BASE))).toMatchObject({ code: 'try-later' })
    const back = fakePayments()
    await askDeposit(quote.link, randomUUID(), back, BASE)
    expect(back.asked[0]!.checkoutId).toBe(away.asked[0]!.checkoutId)
  })
})

describe('an event of the payment service', () => {
  it('counts once, however often it comes, and tells the customer', async () => {
    const asked = await makeAsked()
    const event = completed(asked)
    expect(await readPaymentOutcome(asked.sessionId)).toEqual({ state: 'waiting', firmName: 'Test Fitters Ltd' })
    const outcomes = await Promise.all(Array.from({ length: 5 }, () => handlePaymentEvent(event, false)))
    expect(outcomes.toSorted()).toEqual(['received', 'repeated', 'repeated', 'repeated', 'repeated'])
    expect(await handlePaymentEvent(completed(asked), false)).toBe('repeated')
    expect(await paidFor(asked)).toBe(DEPOSIT)
    expect(await readPaymentOutcome(asked.sessionId)).toMatchObject({ state: 'received' })
    expect((await readCustomerQuote(asked.link, true))).toMatchObject({ state: 'deposit-received', canPay: false })
    expect((await messagesOf(firm, asked.jobId)).filter(mail => mail.message === 'deposit-received')).toMatchObject([{ content: { paid_pence: DEPOSIT, balance_pence: 67_500 } }])
    expect(await refusal(askDeposit(asked.link, randomUUID(), asked.payments, BASE))).toMatchObject({ code: 'wrong-stage' })
    expect(await refusal(withdrawQuote(firm.people.office, asked.jobId, asked.quoteId, randomUUID()))).toMatchObject({ code: 'wrong-stage' })
  })
  it('credits nothing where amount, currency or page is another, and hands the job to the office', async () => {
    for (const object of [{ amount_total: 1 }, { amount_total: DEPOSIT + 1 }, { currency: 'eur' }, { id: 'cs_test_another' }]) {
      const asked = await makeAsked()
      expect(await handlePaymentEvent(completed(asked, object), false)).toBe('odd')
      expect(await paidFor(asked)).toBe(0)
      expect(await inFirm(firm.id, 'select with_whom, side_note from job where id = $1', [asked.jobId])).toMatchObject([{ with_whom: 'office', side_note: expect.stringContaining('does not fit') }])
    }
  })
  it('is ignored where it is not paid yet, of another mode, of another firm or of no known kind', async () => {
    const asked = await makeAsked()
    const stranger = completed(asked, { metadata: { firmId: randomUUID(), checkoutId: asked.checkoutId } })
    for (const event of [completed(asked, { payment_status: 'unpaid' }), completed(asked, {}, { isLive: true }), stranger, completed(asked, { metadata: {} }), completed(asked, {}, { type: 'customer.created' })]) expect(await handlePaymentEvent(event, false)).toBe('ignored')
    expect(await paidFor(asked)).toBe(0)
  })
  it('leaves the same ledger in whatever order and number the events come', async () => {
    await fc.assert(fc.asyncProperty(fc.integer(), fc.integer({ min: 1, max: DEPOSIT }), async (seed, part) => {
      const asked = await makeAsked()
      const events = [completed(asked), expired(asked), refunded(asked, part), refunded(asked, DEPOSIT)]
      const order = fc.sample(fc.array(fc.constantFrom(...events), { minLength: 4, maxLength: 8 }), { seed, numRuns: 1 })[0]!
      for (const event of [...order, ...events]) await handlePaymentEvent(event, false)
      expect(await paidFor(asked)).toBe(0)
      expect(await countRows(firm, 'payment', 'quote_id = $1 and pence > 0', [asked.quoteId])).toBe(1)
    }), { numRuns: 3 })
  }, 120_000)
})

describe('the signature of an event', () => {
  const SECRET = 'whsec_for_this_test_only'
  const payments = stripePayments({ secretKey: 'sk_test_for_this_test_only', webhookSecret: SECRET, protocol: 'https' })
  const stripe = new Stripe('sk_test_for_this_test_only')
  const payload = JSON.stringify({ id: 'evt_1', object: 'event', type: 'checkout.session.completed', livemode: false, data: { object: { id: 'cs_1' } } })
  const header = (rest: { secret?: string, timestamp?: number } = {}) => stripe.webhooks.generateTestHeaderStringAsync({ payload, secret: SECRET, ...rest })
  const seconds = () => Math.floor(Date.now() / 1000)

  it('is taken where it fits', async () => {
    expect(await payments.readEvent(Buffer.from(payload), await header())).toEqual({ id: 'evt_1', type: 'checkout.session.completed', isLive: false, object: { id: 'cs_1' } })
  })
  it('is refused under another secret, over other bytes, too old, or in no known form', async () => {
    expect(await payments.readEvent(Buffer.from(payload), await header({ secret: 'whsec_another' }))).toBeNull()
    expect(await payments.readEvent(Buffer.from(payload.replace('cs_1', 'cs_2')), await header())).toBeNull()
    expect(await payments.readEvent(Buffer.from(payload), await header({ timestamp: seconds() - 301 }))).toBeNull()
    for (const forged of ['', 'x', 't=1,v1=', `t=${seconds()},v1=${'0'.repeat(64)}`]) expect(await payments.readEvent(Buffer.from(payload), forged)).toBeNull()
  })
})
