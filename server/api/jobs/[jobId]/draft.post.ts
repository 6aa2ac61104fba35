import { actForm } from '#shared/schemas/sign-off'
import { makeDraft } from '#server/services/packs/make-draft'

export default defineJobHandler({ may: 'read-jobs', body: actForm }, ({ ctx, job, body }) => makeDraft(ctx, job.id, body))
