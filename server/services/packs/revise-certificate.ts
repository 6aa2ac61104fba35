import { and, eq, isNull, sql } from 'drizzle-orm'
import type { ReviseForm } from '../../../shared/schemas/sign-off'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { certificate, signature } from '../../db/schema/certificate'
import { job as jobTable } from '../../db/schema/job'
import type { FirmContext } from '../firm-context'

/** Opens a new revision: the job returns to the site and is signed anew. The certificate stays in force until the new one is sealed. */
export async function reviseCertificate(ctx: FirmContext, jobId: string, input: ReviseForm): Promise<{ stage: string }> {
  return ctx.once(input.mutationId, 'revise-certificate', { jobId, ...input }, async (tx) => {
    const { firmId } = ctx
    const job = await lockJob(tx, firmId, jobId)
    const [live] = await tx.select({ id: certificate.id }).from(certificate).where(and(eq(certificate.firmId, firmId), eq(certificate.jobId, jobId), eq(certificate.state, 'live')))
    if (!live) throw problem('wrong-stage', 'There is no certificate in force to revise.')
    const stage = await moveJob(tx, firmId, job, 'revision-opened')
    if (stage === job.stage) throw problem('wrong-stage', 'A new revision is open already.')
    await tx.update(jobTable).set({ sideNote: input.reason }).where(and(eq(jobTable.firmId, firmId), eq(jobTable.id, jobId)))
    await tx.update(signature).set({ withdrawnAt: sql`now()` }).where(and(eq(signature.firmId, firmId), eq(signature.jobId, jobId), isNull(signature.withdrawnAt)))
    await touchJob(tx, firmId, jobId)
    await recordEvent(tx, { type: 'revision-opened', jobId, personId: ctx.person.id, detail: { certificateId: live.id } })
    return { stage }
  })
}
