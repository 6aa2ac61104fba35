import { describe, expect, it } from 'vitest'
import { createBehaviour } from '../../../scripts/fakes/mail-behaviour.mjs'
import { signatureHeader } from '../../../scripts/fakes/stripe-events.mjs'
import { parseForm, totalOf } from '../../../scripts/fakes/stripe-form.mjs'
import { createStore } from '../../../scripts/fakes/stripe-store.mjs'
import Stripe from 'stripe'

function openStore() {
  let n = 0
  return createStore({ nextId: (prefix: string) => `${prefix}_${++n}`, payAddress: (id: string) => `http://pay/${id}` })
}
const lines = 'line_items[0][quantity]=2&line_items[0][price_data][unit_amount]=1250&line_items[0][price_data][currency]=gbp'

describe('the mail stand-in\'s behaviour', () => {
  it('takes messages until told otherwise, and forgets a rule that is used up', () => {
    const behaviour = createBehaviour()
    expect(behaviour.take(['a@b.example'])).toBe('accept')
    behaviour.set({ mode: 'reject-4xx', recipient: 'A@b.example', count: 1 })
    expect(behaviour.take(['other@b.example'])).toBe('accept')
    expect(behaviour.take(['a@B.example'])).toBe('reject-4xx')
    expect(behaviour.take(['a@b.example'])).toBe('accept')
  })

  it('refuses a mode that it does not know', () => {
    expect(() => createBehaviour().set({ mode: 'explode' })).toThrow('mode is one of')
  })
})

describe('the payment stand-in', () => {
  it('reads nested forms and sums their lines', () => {
    const form = parseForm(`${lines}&line_items[1][price_data][unit_amount]=5&metadata[quote]=q`)
    expect(totalOf(form.line_items)).toBe(2505)
    expect(form.metadata).toEqual({ quote: 'q' })
  })

  it('signs events as the payment library checks them', async () => {
    const body = JSON.stringify({ id: 'evt_1', object: 'event', type: 'checkout.session.completed' })
    const header = signatureHeader(body, 'whsec_local', Math.floor(Date.now() / 1000))
    const { webhooks } = new Stripe('sk_test_local')
    expect((await webhooks.constructEventAsync(body, header, 'whsec_local')).id).toBe('evt_1')
    await expect(webhooks.constructEventAsync(body, header, 'whsec_other')).rejects.toThrow()
  })

  it('answers a repeated request with its first answer and refuses the key for another', async () => {
    const store = openStore()
    const first = await store.once('key', 'session', lines, store.addSession)
    const second = await store.once('key', 'session', lines, store.addSession)
    expect(second).toEqual({ answer: first.answer, isRepeat: true })
    await expect(store.once('key', 'session', `${lines}1`, store.addSession)).rejects.toThrow('idempotency key')
    expect(store.listSessions()).toHaveLength(1)
  })

  it('takes one payment for a checkout and never gives back more than was paid', async () => {
    const store = openStore()
    const { answer: session } = await store.once('key', 'session', lines, store.addSession)
    expect(store.pay(session.id)).toMatchObject({ isNew: true, session: { payment_status: 'paid', amount_total: 2500 } })
    expect(store.pay(session.id).isNew).toBe(false)
    const payment = session.payment_intent
    expect(store.addRefund({ payment_intent: payment, amount: '2000' }).charge).toMatchObject({ amount_refunded: 2000, refunded: false })
    expect(() => store.addRefund({ payment_intent: payment, amount: '501' })).toThrow('more than what is left')
    expect(store.addRefund({ payment_intent: payment }).charge).toMatchObject({ amount_refunded: 2500, refunded: true })
  })
})
