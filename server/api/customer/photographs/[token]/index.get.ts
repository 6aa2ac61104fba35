import { findCustomerLink } from '#server/services/links/customer-links'
import { readCustomerShots } from '#server/services/links/customer-photographs'

export default defineOpenHandler({}, async ({ event }) => readCustomerShots(await findCustomerLink(getRouterParam(event, 'token') ?? '', 'photographs')))
