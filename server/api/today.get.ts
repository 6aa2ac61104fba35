import { findToday } from '#server/db/queries/today'
import { londonDay } from '#shared/utils/dates'

/** What waits for the signed-in person. */
export default defineFirmHandler({ may: 'read-jobs' }, ({ ctx }) => ctx.read(tx => findToday(tx, ctx.firmId, ctx.person, londonDay(Date.now()))))
