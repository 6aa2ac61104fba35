import { findJobRecord } from '#server/db/queries/job-record'
import { problem } from '#shared/utils/problem'

export default defineFirmHandler({ may: 'read-jobs' }, async ({ event, ctx }) => {
  const jobId = uuidParam(event, 'jobId')
  const record = await ctx.read(tx => findJobRecord(tx, ctx.firmId, jobId, ctx.person.crewId))
  if (!record) throw problem('not-found', 'There is no such job.')
  return record
})
