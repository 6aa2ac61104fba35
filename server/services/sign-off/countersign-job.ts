import { and, eq, isNull } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import { CAPACITY_STATEMENTS, type CountersignForm } from '../../../shared/schemas/sign-off'
import { editionOn } from './edition'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { queuePaper } from '../../db/queries/papers'
import { signature } from '../../db/schema/certificate'
import { fieldQuery } from '../../db/schema/job'
import type { FirmContext } from '../firm-context'
import { prepareNotice } from '../notices/prepare-notice'
import { assertMaySign, loadJudged } from './load-judged'
import { sealCertificate } from './seal-certificate'

export interface SealedView { certificateId: string, number: string, revision: number, words: string }

/** The fourth act: checked for the firm. In the same transaction the certificate is numbered and sealed, and what follows is prepared. */
export async function countersignJob(ctx: FirmContext, jobId: string, input: CountersignForm, keySecret: Uint8Array): Promise<SealedView> {
  return ctx.once(input.mutationId, 'countersign', { jobId, ...input }, async (tx) => {
    const job = await lockJob(tx, ctx.firmId, jobId, ctx.person.crewId)
    if (job.stage !== 'ready-to-check') throw problem('wrong-stage', 'Only a job that is ready to check can be countersigned.')
    await assertNoOpenQuery(tx, ctx.firmId, jobId)
    const isOwnWork = await assertMayCountersign(tx, ctx, jobId)
    const { record, judgement, today } = await loadJudged(tx, ctx, jobId)
    assertMaySign(record, judgement, today)

    await tx.insert(signature).values({ firmId: ctx.firmId, id: uuidv7(), jobId, capacity: 'supervisor', personId: ctx.person.id, nameShown: input.name, way: isOwnWork ? 'self-countersigned' : 'typed', statement: CAPACITY_STATEMENTS.supervisor, edition: editionOn(today), recordVersion: job.recordVersion })
    const sealed = await sealCertificate(tx, ctx, jobId, keySecret)
    await moveJob(tx, ctx.firmId, job, 'countersigned')
    await queuePaper(tx, { firmId: ctx.firmId, jobId, kind: 'pack', sourceId: sealed.certificateId })
    await prepareNotice(tx, ctx, record, judgement, today)
    await touchJob(tx, ctx.firmId, jobId)
    await recordEvent(tx, { type: 'countersigned', jobId, personId: ctx.person.id, detail: { certificateId: sealed.certificateId, number: sealed.number, selfCountersigned: isOwnWork, opened: input.opened } })
    return sealed
  })
}

async function assertNoOpenQuery(tx: FirmTx, firmId: string, jobId: string): Promise<void> {
  const open = await tx.select({ id: fieldQuery.id }).from(fieldQuery).where(and(eq(fieldQuery.firmId, firmId), eq(fieldQuery.jobId, jobId), isNull(fieldQuery.answer)))
  if (open.length) throw problem('wrong-stage', `${open.length === 1 ? 'One remark has' : `${open.length} remarks have`} no answer yet.`)
}

/** Never own work, unless the firm switched that on. Gives whether it is own work. */
async function assertMayCountersign(tx: FirmTx, ctx: FirmContext, jobId: string): Promise<boolean> {
  const signers = await tx.select({ personId: signature.personId }).from(signature).where(and(eq(signature.firmId, ctx.firmId), eq(signature.jobId, jobId), isNull(signature.withdrawnAt)))
  const isOwnWork = signers.some(signer => signer.personId === ctx.person.id)
  if (isOwnWork && !ctx.person.selfCountersign) throw problem('not-allowed', 'You signed this work yourself. Another supervisor countersigns it.')
  return isOwnWork
}
