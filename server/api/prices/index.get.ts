import { findPrices } from '#server/db/queries/quotes'

export default defineFirmHandler({ may: 'read-money' }, ({ ctx }) => ctx.read(tx => findPrices(tx, ctx.firmId)))
