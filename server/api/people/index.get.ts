import { listPeople } from '#server/db/queries/people'

export default defineFirmHandler({ may: 'manage-people' }, ({ ctx }) => ctx.read(tx => listPeople(tx, ctx.firmId)))
