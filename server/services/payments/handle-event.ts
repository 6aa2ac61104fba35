import { uuidv7 } from 'uuidv7'
import * as z from 'zod'
import type { PaymentEvent } from '../../adapters/payments'
import { changeAsFirm, type FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { touchJob } from '../../db/queries/jobs'
import { changeCheckout, insertPayment, keepOutsideEvent, lockCheckout, paidForQuote, refundedOf, type StoredCheckout } from '../../db/queries/payments'
import { queueMessage } from '../../db/queries/outbox'
import { findAddressee, handToOffice, lockQuote } from '../../db/queries/quotes'
import type { NeededLink } from '../links/customer-links'
import { DAYS_READABLE_AFTER } from '../quotes/send-quote'

const ours = z.object({ firmId: z.uuid(), checkoutId: z.uuid() })
const session = z.object({ id: z.string(), metadata: ours, payment_status: z.string(), amount_total: z.int(), currency: z.string(), payment_intent: z.string().nullish() })
const expired = z.object({ id: z.string(), metadata: ours })
const charge = z.object({ id: z.string(), metadata: ours, amount_refunded: z.int(), currency: z.string() })

export type EventOutcome = 'ignored' | 'repeated' | 'received' | 'odd' | 'closed' | 'given-back'

const PAID = new Set(['checkout.session.completed', 'checkout.session.async_payment_succeeded'])

/** Handles a verified event once, in one transaction with its own record. What is not ours or not known is ignored. */
export async function handlePaymentEvent(event: PaymentEvent, isLive: boolean): Promise<EventOutcome> {
  // A test event must never mark a real deposit as paid, nor the other way round.
  if (event.isLive !== isLive) return 'ignored'
  if (PAID.has(event.type)) return whenOurs(session, event, takePayment)
  if (event.type === 'checkout.session.expired') return whenOurs(expired, event, closeCheckout)
  if (event.type === 'charge.refunded') return whenOurs(charge, event, takeRefund)
  return 'ignored'
}

type Ours = { metadata: z.infer<typeof ours> }
type Act<T> = (tx: FirmTx, firmId: string, asked: StoredCheckout, object: T) => Promise<EventOutcome>

async function whenOurs<T extends Ours>(schema: z.ZodType<T>, event: PaymentEvent, act: Act<T>): Promise<EventOutcome> {
  const parsed = schema.safeParse(event.object)
  if (!parsed.success) return 'ignored'
  const { firmId, checkoutId } = parsed.data.metadata
  return changeAsFirm(firmId, async (tx) => {
    const asked = await lockCheckout(tx, firmId, checkoutId)
    if (!asked) return 'ignored'
    if (!await keepOutsideEvent(tx, firmId, { id: event.id, kind: event.type, content: parsed.data })) return 'repeated'
    return act(tx, firmId, asked, parsed.data)
  })
}

async function takePayment(tx: FirmTx, firmId: string, asked: StoredCheckout, paid: z.infer<typeof session>): Promise<EventOutcome> {
  if (paid.payment_status !== 'paid') return 'ignored'
  if (paid.amount_total !== asked.pence || paid.currency !== 'gbp' || (asked.outsideId !== null && asked.outsideId !== paid.id)) {
    await changeCheckout(tx, firmId, asked.id, { state: 'odd' })
    await handToOffice(tx, firmId, asked.jobId, 'A card payment does not fit what was asked for: look at it in the payment service')
    await touchJob(tx, firmId, asked.jobId)
    return 'odd'
  }
  const isNew = await insertPayment(tx, { firmId, id: uuidv7(), jobId: asked.jobId, quoteId: asked.quoteId, pence: asked.pence, way: 'card', outsideId: paid.payment_intent ?? paid.id })
  if (!isNew) return 'repeated'
  await changeCheckout(tx, firmId, asked.id, { state: 'paid', outsideId: paid.id, url: null })
  await tellCustomer(tx, firmId, asked)
  await recordEvent(tx, { type: 'payment-received', jobId: asked.jobId, detail: { quoteId: asked.quoteId, pence: asked.pence } })
  await touchJob(tx, firmId, asked.jobId)
  return 'received'
}

async function tellCustomer(tx: FirmTx, firmId: string, asked: StoredCheckout): Promise<void> {
  const quote = await lockQuote(tx, firmId, asked.quoteId)
  const to = await findAddressee(tx, firmId, asked.jobId)
  if (!to.email) return
  const paid = await paidForQuote(tx, firmId, quote.id)
  const needsLink: NeededLink = { kind: 'customer', purpose: 'quote', subjectId: quote.id, sentTo: to.email, days: DAYS_READABLE_AFTER }
  await queueMessage(tx, {
    firmId, jobId: asked.jobId, message: 'deposit-received', recipient: to.email, dedupeKey: `deposit-received:${asked.id}`,
    content: { customerName: to.name, shortAddress: to.shortAddress, quoteNumber: quote.number, paid_pence: asked.pence, balance_pence: quote.grossPence - paid, next: 'We will write to you with a day for the work.', needsLink },
  })
}

async function closeCheckout(tx: FirmTx, firmId: string, asked: StoredCheckout): Promise<EventOutcome> {
  // An expiry that arrives after the payment, or out of order, changes nothing.
  if (asked.state !== 'open') return 'ignored'
  await changeCheckout(tx, firmId, asked.id, { state: 'expired', url: null })
  return 'closed'
}

/** The service says how much of a charge was given back in all; only what is new of it is written. */
async function takeRefund(tx: FirmTx, firmId: string, asked: StoredCheckout, refunded: z.infer<typeof charge>): Promise<EventOutcome> {
  const more = refunded.amount_refunded - await refundedOf(tx, firmId, refunded.id)
  if (more <= 0 || refunded.currency !== 'gbp') return 'ignored'
  await insertPayment(tx, { firmId, id: uuidv7(), jobId: asked.jobId, quoteId: asked.quoteId, pence: -more, way: 'card-refund', outsideId: `${refunded.id}:${refunded.amount_refunded}` })
  await touchJob(tx, firmId, asked.jobId)
  await recordEvent(tx, { type: 'payment-received', jobId: asked.jobId, detail: { quoteId: asked.quoteId, pence: -more } })
  return 'given-back'
}
