import { parseForm, totalOf } from './stripe-form.mjs'

const now = () => Math.floor(Date.now() / 1000)

/** A refusal in the shape that the payment library turns into an error. */
export class Refused extends Error {
  constructor(status, type, message, code) {
    super(message)
    Object.assign(this, { status, body: { error: { type, message, code } } })
  }
}

/** Checkouts, payments and refunds held in memory. Card numbers never come here. */
export function createStore({ payAddress, nextId }) {
  const sessions = new Map()
  const payments = new Map()
  const refunds = new Map()
  const intentMetadata = new Map()
  const remembered = new Map()

  const get = (held, id, what) => held.get(id) ?? (() => {
    throw new Refused(404, 'invalid_request_error', `No such ${what}: '${id}'`, 'resource_missing')
  })()

  function addSession(form) {
    const amount = totalOf(form.line_items)
    if (!Number.isInteger(amount) || amount < 30) throw new Refused(400, 'invalid_request_error', 'The total must be a whole number of at least 30 pence', 'amount_too_small')
    const id = nextId('cs_test')
    const session = {
      id, object: 'checkout.session', mode: form.mode ?? 'payment', status: 'open', payment_status: 'unpaid', livemode: false, created: now(),
      expires_at: Number(form.expires_at ?? now() + 86_400), amount_subtotal: amount, amount_total: amount,
      currency: Object.values(form.line_items)[0].price_data.currency, client_reference_id: form.client_reference_id ?? null, customer_email: form.customer_email ?? null,
      metadata: form.metadata ?? {}, payment_intent: null, success_url: form.success_url ?? null, cancel_url: form.cancel_url ?? null, url: payAddress(id),
    }
    sessions.set(id, session)
    intentMetadata.set(id, form.payment_intent_data?.metadata ?? {})
    return session
  }

  /** The customer pays: the session completes and a payment exists. Paying twice changes nothing. */
  function pay(id) {
    const session = get(sessions, id, 'checkout.session')
    if (session.status !== 'open') return { session, isNew: false }
    const intent = { id: nextId('pi'), object: 'payment_intent', amount: session.amount_total, amount_received: session.amount_total, currency: session.currency, status: 'succeeded', livemode: false, created: now(), latest_charge: nextId('ch'), metadata: intentMetadata.get(id) }
    payments.set(intent.id, intent)
    Object.assign(session, { status: 'complete', payment_status: 'paid', payment_intent: intent.id, url: null })
    return { session, isNew: true }
  }

  function expire(id) {
    const session = get(sessions, id, 'checkout.session')
    if (session.status !== 'open') throw new Refused(400, 'invalid_request_error', 'Only an open checkout can be expired')
    return Object.assign(session, { status: 'expired', url: null })
  }

  function addRefund(form) {
    const intent = get(payments, form.payment_intent, 'payment_intent')
    const before = [...refunds.values()].filter(({ payment_intent: of }) => of === intent.id).reduce((sum, { amount }) => sum + amount, 0)
    const amount = Number(form.amount ?? intent.amount - before)
    if (before === intent.amount) throw new Refused(400, 'invalid_request_error', 'This payment has already been refunded', 'charge_already_refunded')
    if (!Number.isInteger(amount) || amount < 1 || before + amount > intent.amount) throw new Refused(400, 'invalid_request_error', 'A refund cannot be more than what is left of the payment')
    const refund = { id: nextId('re'), object: 'refund', amount, currency: intent.currency, payment_intent: intent.id, charge: intent.latest_charge, status: 'succeeded', reason: form.reason ?? null, created: now(), metadata: form.metadata ?? {} }
    refunds.set(refund.id, refund)
    const charge = { id: intent.latest_charge, object: 'charge', amount: intent.amount, amount_refunded: before + amount, refunded: before + amount === intent.amount, currency: intent.currency, payment_intent: intent.id, metadata: intent.metadata, livemode: false, created: intent.created }
    return { refund, charge }
  }

  /** Answers a repeated request with its first answer; the same key with another body is refused. */
  async function once(key, path, body, work) {
    if (!key) return { answer: await work(parseForm(body)), isRepeat: false }
    const seen = remembered.get(key)
    if (seen && seen.request !== path + body) throw new Refused(400, 'idempotency_error', 'This idempotency key was used for another request')
    if (seen) return { answer: await seen.answer, isRepeat: true }
    const answer = Promise.resolve().then(() => work(parseForm(body)))
    remembered.set(key, { request: path + body, answer })
    return { answer: await answer, isRepeat: false }
  }

  return {
    addSession, pay, expire, addRefund, once,
    getSession: id => get(sessions, id, 'checkout.session'),
    getPayment: id => get(payments, id, 'payment_intent'),
    listSessions: () => [...sessions.values()],
    listRefunds: () => [...refunds.values()],
  }
}
