import { countersignForm } from '#shared/schemas/sign-off'
import { countersignJob } from '#server/services/sign-off/countersign-job'
import { config } from '#server/utils/config'

export default defineJobHandler({ may: 'countersign', body: countersignForm }, ({ ctx, job, body }) => countersignJob(ctx, job.id, body, config().keySecret))
