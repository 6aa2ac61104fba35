import { newVisitForm } from '#shared/schemas/job'
import { bookVisit } from '#server/services/visits/book-visit'

export default defineFirmHandler({ may: 'book-visits', body: newVisitForm }, ({ ctx, body }) => bookVisit(ctx, body))
