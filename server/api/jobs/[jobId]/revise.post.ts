import { reviseForm } from '#shared/schemas/sign-off'
import { reviseCertificate } from '#server/services/packs/revise-certificate'

export default defineJobHandler({ may: 'revise-certificate', body: reviseForm }, ({ ctx, job, body }) => reviseCertificate(ctx, job.id, body))
