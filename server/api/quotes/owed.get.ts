import { londonDay } from '#shared/utils/dates'
import { findOwed } from '#server/db/queries/payments'

export default defineFirmHandler({ may: 'read-money' }, ({ ctx }) => ctx.read(tx => findOwed(tx, ctx.firmId, londonDay(Date.now()))))
