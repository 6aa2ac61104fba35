import { readQuoteBench } from '#server/services/quotes/read-quotes'

export default defineJobHandler({ may: 'read-money' }, ({ ctx, job }) => readQuoteBench(ctx, job.id))
