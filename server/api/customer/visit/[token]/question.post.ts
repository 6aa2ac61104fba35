import { askForm } from '#shared/schemas/customer'
import { findCustomerLink } from '#server/services/links/customer-links'
import { askFirm } from '#server/services/quotes/customer-acts'

export default defineOpenHandler({ body: askForm }, async ({ event, body }) => askFirm(await findCustomerLink(getRouterParam(event, 'token') ?? '', 'visit'), body))
