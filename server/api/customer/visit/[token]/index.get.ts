import { findCustomerLink } from '#server/services/links/customer-links'
import { readCustomerVisit } from '#server/services/links/customer-visit'

export default defineOpenHandler({}, async ({ event }) => readCustomerVisit(await findCustomerLink(getRouterParam(event, 'token') ?? '', 'visit')))
