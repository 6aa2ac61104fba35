import { getFirm } from '#server/db/queries/people'

export default defineFirmHandler({ may: 'change-settings' }, ({ ctx }) => ctx.read(tx => getFirm(tx, ctx.firmId)))
