import { newInstrumentForm } from '#shared/schemas/instruments'
import { addInstrument } from '#server/services/instruments/add-instrument'

export default defineFirmHandler({ may: 'change-instruments', body: newInstrumentForm }, ({ ctx, body }) => addInstrument(ctx, body))
