import { qualificationForm } from '#shared/schemas/people'
import { addQualification } from '#server/services/people/change-person'

export default defineFirmHandler({ may: 'manage-people', body: qualificationForm }, ({ event, ctx, body }) => addQualification(ctx, uuidParam(event, 'personId'), body))
