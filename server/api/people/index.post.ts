import { invitationForm } from '#shared/schemas/people'
import { invitePerson } from '#server/services/people/tokens'

export default defineFirmHandler({ may: 'manage-people', body: invitationForm }, ({ ctx, body }) => invitePerson(ctx, body))
