import { checkForm } from '#shared/schemas/customer'
import { checkCertificate } from '#server/services/links/check-certificate'

export default defineOpenHandler({ body: checkForm }, ({ body }) => checkCertificate(body))
