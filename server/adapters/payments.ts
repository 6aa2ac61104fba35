/** Card payments on the service's own hosted page: no card number ever reaches us. */
import Stripe from 'stripe'
import type { Config } from '../utils/config'

export interface CheckoutAsked {
  firmId: string
  checkoutId: string
  /** Whole pence, from our own rows. */
  pence: number
  description: string
  email: string | null
  /** `{CHECKOUT_SESSION_ID}` in it is filled in by the service. */
  successUrl: string
  cancelUrl: string
}

/** What we read of a verified event; everything else in it is ignored. */
export interface PaymentEvent { id: string, type: string, isLive: boolean, object: Record<string, unknown> }

export interface PaymentService {
  isLive: boolean
  /** Asks for a payment page. Repeating it for the same checkout gives the same page. */
  askCheckout(asked: CheckoutAsked): Promise<{ outsideId: string, url: string }>
  /** @returns null where the signature does not fit the bytes, or is older than the tolerance */
  readEvent(body: Buffer, signature: string): Promise<PaymentEvent | null>
}

const TOLERANCE_S = 300
const TIMEOUT_MS = 10_000

export function stripePayments(settings: NonNullable<Config['stripe']>): PaymentService {
  const stripe = new Stripe(settings.secretKey, {
    maxNetworkRetries: 2, timeout: TIMEOUT_MS, telemetry: false, protocol: settings.protocol,
    ...(settings.host && { host: settings.host }), ...(settings.port && { port: settings.port }),
  })
  return {
    isLive: settings.secretKey.includes('_live_'),
    async askCheckout({ firmId, checkoutId, pence, description, email, successUrl, cancelUrl }) {
      const metadata = { firmId, checkoutId }
      const session = await stripe.checkout.sessions.create({
        mode: 'payment',
        line_items: [{ quantity: 1, price_data: { currency: 'gbp', unit_amount: pence, product_data: { name: description } } }],
        client_reference_id: checkoutId, metadata, payment_intent_data: { metadata },
        ...(email && { customer_email: email }), success_url: successUrl, cancel_url: cancelUrl,
      }, { idempotencyKey: `checkout:${checkoutId}` })
      if (!session.url) throw new Error('The payment service gave no page')
      return { outsideId: session.id, url: session.url }
    },
    async readEvent(body, signature) {
      try {
        const event = await stripe.webhooks.constructEventAsync(body, signature, settings.webhookSecret, TOLERANCE_S)
        return { id: event.id, type: event.type, isLive: event.livemode, object: event.data.object as unknown as Record<string, unknown> }
      }
      // Whatever is wrong with it (a header in no known form throws a plain error), it is not genuine.
      catch {
        return null
      }
    },
  }
}

let held: { settings: NonNullable<Config['stripe']>, service: PaymentService } | undefined

/** The configured service, or null where the firm's server takes no card payments. */
export function paymentService(settings: Config['stripe']): PaymentService | null {
  if (!settings) return null
  if (held?.settings !== settings) held = { settings, service: stripePayments(settings) }
  return held.service
}
