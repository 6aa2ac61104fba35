import { listNotices } from '#server/db/queries/notices'

export default defineFirmHandler({ may: 'read-jobs' }, ({ ctx }) => ctx.read(tx => listNotices(tx, ctx.firmId)))
