import { diaryQuery } from '#shared/schemas/job'
import { addDays } from '#shared/utils/dates'
import { findDiary } from '#server/db/queries/diary'

export default defineFirmHandler({ may: 'read-jobs', query: diaryQuery }, ({ ctx, query }) => ctx.read(tx => findDiary(tx, ctx.firmId, query.from, addDays(query.from, query.days))))
