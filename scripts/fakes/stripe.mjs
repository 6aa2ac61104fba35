// Stand-in for Stripe: the few calls that the product makes, a pay page with no card fields, and signed events.
import { randomBytes } from 'node:crypto'
import { escapeHtml, html, json, page, redirect, serve } from './http.mjs'
import { createEvents } from './stripe-events.mjs'
import { createStore, Refused } from './stripe-store.mjs'

const port = Number(process.env.STRIPE_FAKE_PORT ?? 3027)
const secretKey = process.env.STRIPE_SECRET_KEY
const nextId = prefix => `${prefix}_${randomBytes(12).toString('hex')}`
const store = createStore({ nextId, payAddress: id => `http://127.0.0.1:${port}/pay/${id}` })
const events = createEvents({ nextId, webhookUrl: process.env.STRIPE_WEBHOOK_URL ?? 'http://127.0.0.1:3000/api/stripe/webhook', secret: process.env.STRIPE_WEBHOOK_SECRET ?? '' })
let failures = 0

/** A call of the payment library: key checked, refusals in its own shape, scripted failures first. */
function call(work) {
  return async (request) => {
    if (failures > 0) {
      failures--
      return json({ error: { type: 'api_error', message: 'The stand-in was told to fail' } }, 500)
    }
    const given = /^Bearer (.+)$/.exec(request.headers.authorization ?? '')?.[1]
    if (!given || (secretKey && given !== secretKey)) return json({ error: { type: 'invalid_request_error', message: 'Invalid API Key provided' } }, 401)
    try {
      return await work(request)
    }
    catch (error) {
      if (error instanceof Refused) return json(error.body, error.status)
      throw error
    }
  }
}

const post = (path, work) => call(async ({ headers, body }) => {
  const { answer, isRepeat } = await store.once(headers['idempotency-key'], path, body, work)
  return json(answer, 200, isRepeat ? { 'idempotent-replayed': 'true' } : {})
})

const pounds = ({ amount_total: amount, currency }) => `${currency === 'gbp' ? '£' : `${currency} `}${(amount / 100).toFixed(2)}`

function payPage(session) {
  if (session.status !== 'open') return page('This payment is closed', `<p>It is ${escapeHtml(session.status)}.</p>`)
  return page('Stand-in for the card page', `<p>No card is asked for and no money moves. Amount: <strong>${escapeHtml(pounds(session))}</strong></p>
<form method="post" action="/pay/${session.id}"><button name="choice" value="pay">Pay ${escapeHtml(pounds(session))}</button><button name="choice" value="cancel">Cancel</button></form>`)
}

/** The product learns of the payment before the customer is back, as it usually does. */
async function complete(id) {
  const { session, isNew } = store.pay(id)
  if (isNew) await events.deliver(events.make('checkout.session.completed', { ...session }))
  return session
}

async function choose({ params: [id], body }) {
  const session = store.getSession(id)
  if (new URLSearchParams(body).get('choice') !== 'pay') return redirect(session.cancel_url ?? session.success_url ?? '/')
  await complete(id)
  return redirect((session.success_url ?? '/').replaceAll('{CHECKOUT_SESSION_ID}', id))
}

async function refund(form) {
  const { refund: made, charge } = store.addRefund(form)
  // Not awaited: the product must cope with hearing of its own refund at any moment.
  events.deliver(events.make('charge.refunded', charge))
  return made
}

async function replay({ params: [id], body }) {
  const event = events.find(id)
  if (!event) return json({ error: { message: 'There is no such event' } }, 404)
  return json({ status: await events.deliverOnce(event, body ? JSON.parse(body) : {}) })
}

/** Sends any event, signed as the body says: `{ type, object, secret?, ageSeconds? }`. */
async function sendAny({ body }) {
  const { type, object, ...how } = JSON.parse(body)
  const event = events.make(type, object)
  return json({ id: event.id, status: await events.deliverOnce(event, how) })
}

serve(port, [
  ['POST', /^\/v1\/checkout\/sessions$/, post('session', form => store.addSession(form))],
  ['GET', /^\/v1\/checkout\/sessions\/(\w+)$/, call(({ params: [id] }) => json(store.getSession(id)))],
  ['POST', /^\/v1\/checkout\/sessions\/(\w+)\/expire$/, call(({ params: [id] }) => json(store.expire(id)))],
  ['POST', /^\/v1\/refunds$/, post('refund', refund)],
  ['GET', /^\/v1\/payment_intents\/(\w+)$/, call(({ params: [id] }) => json(store.getPayment(id)))],
  ['GET', /^\/pay\/(\w+)$/, ({ params: [id] }) => html(payPage(store.getSession(id)))],
  ['POST', /^\/pay\/(\w+)$/, choose],
  ['GET', /^\/health$/, () => json({ well: true })],
  ['GET', /^\/sessions$/, () => json(store.listSessions())],
  ['GET', /^\/refunds$/, () => json(store.listRefunds())],
  ['POST', /^\/sessions\/(\w+)\/pay$/, async ({ params: [id] }) => json(await complete(id))],
  ['GET', /^\/events$/, () => json(events.list())],
  ['GET', /^\/deliveries$/, () => json(events.deliveries)],
  ['POST', /^\/events$/, sendAny],
  ['POST', /^\/events\/(\w+)\/replay$/, replay],
  ['POST', /^\/fail$/, ({ body }) => {
    failures = Number(JSON.parse(body).count)
    return json({ failures })
  }],
])
