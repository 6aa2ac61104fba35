import { movedVisitForm } from '#shared/schemas/job'
import { moveVisit } from '#server/services/visits/book-visit'

export default defineFirmHandler({ may: 'book-visits', body: movedVisitForm }, ({ event, ctx, body }) => moveVisit(ctx, uuidParam(event, 'visitId'), body))
