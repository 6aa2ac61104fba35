import { and, eq, isNull, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { SendBackForm } from '../../../shared/schemas/sign-off'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { queueMessage } from '../../db/queries/outbox'
import { signature } from '../../db/schema/certificate'
import { premises } from '../../db/schema/customer'
import { person } from '../../db/schema/firm'
import { fieldQuery } from '../../db/schema/job'
import type { FirmContext } from '../firm-context'

/** Returns a job to the site with remarks on fields. The signatures given are withdrawn: what changes must be signed again. */
export async function sendBack(ctx: FirmContext, jobId: string, input: SendBackForm, baseUrl: string): Promise<{ stage: string }> {
  return ctx.once(input.mutationId, 'send-back', { jobId, ...input }, async (tx) => {
    const job = await lockJob(tx, ctx.firmId, jobId, ctx.person.crewId)
    if (job.stage !== 'ready-to-check') throw problem('wrong-stage', 'Only a job that is ready to check can be sent back.')
    const signers = await tx.select({ personId: signature.personId, name: person.name, email: person.email }).from(signature)
      .innerJoin(person, and(eq(person.firmId, signature.firmId), eq(person.id, signature.personId)))
      .where(and(eq(signature.firmId, ctx.firmId), eq(signature.jobId, jobId), isNull(signature.withdrawnAt)))
    await tx.insert(fieldQuery).values(input.queries.map(query => ({ firmId: ctx.firmId, id: uuidv7(), jobId, ...query, askedBy: ctx.person.id })))
    await tx.update(signature).set({ withdrawnAt: sql`now()` }).where(and(eq(signature.firmId, ctx.firmId), eq(signature.jobId, jobId), isNull(signature.withdrawnAt)))
    const [place] = await tx.select({ address: premises.address }).from(premises).where(and(eq(premises.firmId, ctx.firmId), eq(premises.id, job.premisesId)))
    const shortAddress = place?.address.split(',')[0] ?? job.ref
    const stage = await moveJob(tx, ctx.firmId, job, 'sent-back', 'sent-back')
    const recipients = new Map(signers.map(signer => [signer.email, signer.name]))
    for (const [email, name] of recipients) {
      await queueMessage(tx, { firmId: ctx.firmId, jobId, message: 'sent-back', recipient: email, dedupeKey: `sent-back:${input.mutationId}:${email}`, content: { name, sentBackBy: ctx.person.name, shortAddress, remarks: input.queries.map(query => ({ field: query.part, remark: query.question })), dueBy: null, url: `${baseUrl}/jobs/${jobId}/leave` } })
    }
    await touchJob(tx, ctx.firmId, jobId)
    await recordEvent(tx, { type: 'sent-back', jobId, personId: ctx.person.id, detail: { queries: input.queries.length } })
    return { stage }
  })
}
