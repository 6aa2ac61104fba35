import { uuidv7 } from 'uuidv7'
import { lockJob } from '../../db/queries/jobs'
import { queuePaper } from '../../db/queries/papers'
import type { FirmContext } from '../firm-context'

/** Asks for the job's papers as they stand now. Each asking makes a draft of its own, since the record goes on changing. */
export async function makeDraft(ctx: FirmContext, jobId: string, input: { mutationId: string }): Promise<{ paperId: string }> {
  return ctx.once(input.mutationId, 'make-draft', { jobId }, async (tx) => {
    const job = await lockJob(tx, ctx.firmId, jobId)
    return { paperId: await queuePaper(tx, { firmId: ctx.firmId, jobId: job.id, kind: 'draft', sourceId: uuidv7() }) }
  })
}
