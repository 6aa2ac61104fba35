import { signForm } from '#shared/schemas/sign-off'
import { signCapacities } from '#server/services/sign-off/sign-capacities'

export default defineJobHandler({ may: 'sign-capacities', body: signForm }, ({ ctx, job, body }) => signCapacities(ctx, job.id, body))
