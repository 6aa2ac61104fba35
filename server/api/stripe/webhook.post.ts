import { paymentService } from '#server/adapters/payments'
import { handlePaymentEvent } from '#server/services/payments/handle-event'
import { config } from '#server/utils/config'

const MOST_BYTES = 512 * 1024
const refused = () => createError({ statusCode: 400, statusMessage: 'not-genuine', data: { code: 'not-genuine', message: 'This event is not signed as it must be.' } })

export default defineOpenHandler({}, async ({ event }) => {
  const payments = paymentService(config().stripe)
  const signature = getRequestHeader(event, 'stripe-signature')
  if (!payments || !signature) throw refused()
  const raw = await readRawBody(event, false)
  const body = raw && raw.length <= MOST_BYTES ? await payments.readEvent(raw, signature) : null
  if (!body) throw refused()
  await handlePaymentEvent(body, payments.isLive)
  return { received: true }
})
