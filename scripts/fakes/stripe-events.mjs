import { createHmac } from 'node:crypto'

/** The header that proves who sent an event: HMAC-SHA256 over "<seconds>.<body>". */
export function signatureHeader(body, secret, seconds) {
  return `t=${seconds},v1=${createHmac('sha256', secret).update(`${seconds}.${body}`).digest('hex')}`
}

const RETRIES_MS = [0, 300, 1_500]

/** Keeps every event that was made, and delivers them to the product's webhook. */
export function createEvents({ webhookUrl, secret, nextId }) {
  const events = new Map()
  const deliveries = []

  /** One delivery; `secret` and `age` let a test send a forged or a stale one. */
  async function deliverOnce(event, { secret: with_ = secret, ageSeconds = 0 } = {}) {
    const body = JSON.stringify(event)
    const headers = { 'content-type': 'application/json', 'stripe-signature': signatureHeader(body, with_, Math.floor(Date.now() / 1000) - ageSeconds) }
    const status = await fetch(webhookUrl, { method: 'POST', headers, body, signal: AbortSignal.timeout(10_000) }).then(answer => answer.status, () => 0)
    deliveries.push({ event: event.id, type: event.type, status })
    return status
  }

  /** Tries again while the product does not answer 2xx, as the real sender does over hours. */
  async function deliver(event) {
    for (const wait of RETRIES_MS) {
      await new Promise(resolve => setTimeout(resolve, wait))
      const status = await deliverOnce(event)
      if (status >= 200 && status < 300) return status
    }
    return 0
  }

  function make(type, object) {
    const event = { id: nextId('evt'), object: 'event', api_version: null, created: Math.floor(Date.now() / 1000), data: { object }, livemode: false, pending_webhooks: 1, request: { id: null, idempotency_key: null }, type }
    events.set(event.id, event)
    return event
  }

  return { make, deliver, deliverOnce, find: id => events.get(id), list: () => [...events.values()], deliveries }
}
