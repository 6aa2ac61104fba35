import { invitationForm } from '#shared/schemas/people'
import { invitePerson } from '#server/services/people/tokens'
import { config } from '#server/utils/config'

export default defineFirmHandler({ may: 'manage-people', body: invitationForm }, ({ ctx, body }) => invitePerson(ctx, body, config().baseUrl))
