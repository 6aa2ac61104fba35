import { instrumentChange } from '#shared/schemas/instruments'
import { switchInstrument } from '#server/services/instruments/change-instrument'

export default defineFirmHandler({ may: 'change-instruments', body: instrumentChange }, ({ event, ctx, body }) => switchInstrument(ctx, uuidParam(event, 'instrumentId'), body))
