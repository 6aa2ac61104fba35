import { actForm } from '#shared/schemas/sign-off'
import { prepareNetworkNotice } from '#server/services/notices/prepare-notice'

export default defineJobHandler({ may: 'send-notices', body: actForm }, ({ ctx, job, body }) => prepareNetworkNotice(ctx, job.id, body))
