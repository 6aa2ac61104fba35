import { newJobForm } from '#shared/schemas/job'
import { addJob } from '#server/services/jobs/add-job'

export default defineFirmHandler({ may: 'change-enquiry', body: newJobForm }, ({ ctx, body }) => addJob(ctx, body))
