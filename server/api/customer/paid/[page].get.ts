import { readPaymentOutcome } from '#server/services/payments/read-outcome'

export default defineOpenHandler({}, ({ event }) => readPaymentOutcome(getRouterParam(event, 'page') ?? ''))
