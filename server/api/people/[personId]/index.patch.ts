import { personChange } from '#shared/schemas/people'
import { changePerson } from '#server/services/people/change-person'

export default defineFirmHandler({ may: 'manage-people', body: personChange }, ({ event, ctx, body }) => changePerson(ctx, uuidParam(event, 'personId'), body))
