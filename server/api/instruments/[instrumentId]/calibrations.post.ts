import { calibrationForm } from '#shared/schemas/instruments'
import { recordCalibration } from '#server/services/instruments/change-instrument'

export default defineFirmHandler({ may: 'change-instruments', body: calibrationForm }, ({ event, ctx, body }) => recordCalibration(ctx, uuidParam(event, 'instrumentId'), body))
