import { sendBackForm } from '#shared/schemas/sign-off'
import { sendBack } from '#server/services/sign-off/send-back'
import { config } from '#server/utils/config'

export default defineJobHandler({ may: 'send-back', body: sendBackForm }, ({ ctx, job, body }) => sendBack(ctx, job.id, body, config().baseUrl))
