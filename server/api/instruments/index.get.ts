import { listInstruments } from '#server/db/queries/instruments'

export default defineFirmHandler({ may: 'read-jobs' }, ({ ctx }) => ctx.read(tx => listInstruments(tx, ctx.firmId)))
