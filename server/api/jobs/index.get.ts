import { jobListQuery } from '#shared/schemas/job'
import { listJobs } from '#server/services/jobs/list-jobs'

export default defineFirmHandler({ may: 'read-jobs', query: jobListQuery }, ({ ctx, query }) => listJobs(ctx, query))
