import { mutationBatch, type MutationOutcome } from '#shared/job/mutations'
import { applyMutation } from '#server/services/record/apply-mutation'

/** The one door for what a job contains: each item is a transaction of its own, in order, with its own outcome. */
export default defineFirmHandler({ may: 'read-jobs', body: mutationBatch }, async ({ ctx, body }): Promise<{ outcomes: MutationOutcome[] }> => {
  const outcomes: MutationOutcome[] = []
  for (const mutation of body.items) outcomes.push(await applyMutation(ctx, mutation))
  return { outcomes }
})
