import { crewForm } from '#shared/schemas/people'
import { addCrew } from '#server/services/people/change-person'

export default defineFirmHandler({ may: 'manage-people', body: crewForm }, ({ ctx, body }) => addCrew(ctx, body))
