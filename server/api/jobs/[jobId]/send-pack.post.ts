import { actForm } from '#shared/schemas/sign-off'
import { sendPack } from '#server/services/packs/send-pack'

export default defineJobHandler({ may: 'send-packs', body: actForm }, ({ ctx, job, body }) => sendPack(ctx, job.id, body))
