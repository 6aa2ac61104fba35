import { and, eq, inArray, isNull, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import { CAPACITIES, CAPACITY_STATEMENTS, type SignForm } from '../../../shared/schemas/sign-off'
import { editionOn } from './edition'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { qualification } from '../../db/schema/firm'
import { signature } from '../../db/schema/certificate'
import type { FirmContext } from '../firm-context'
import { assertMaySign, loadJudged } from './load-judged'

/** Signs the job's work in one or more capacities; when all three stand, the job is ready to check. */
export async function signCapacities(ctx: FirmContext, jobId: string, input: SignForm): Promise<{ stage: string }> {
  return ctx.once(input.mutationId, 'sign-capacities', { jobId, ...input }, async (tx) => {
    const job = await lockJob(tx, ctx.firmId, jobId, ctx.person.crewId)
    if (job.stage !== 'on-site') throw problem('wrong-stage', job.stage === 'ready-to-check' ? 'This job is signed already and waits for a supervisor.' : 'This job is not on site, so there is nothing to sign yet.')
    const { record, judgement, today } = await loadJudged(tx, ctx, jobId)
    assertMaySign(record, judgement, today)
    await assertCompetent(tx, ctx, input.capacities, today)

    const standing = and(eq(signature.firmId, ctx.firmId), eq(signature.jobId, jobId), isNull(signature.withdrawnAt))
    await tx.update(signature).set({ withdrawnAt: sql`now()` }).where(and(standing, inArray(signature.capacity, input.capacities)))
    await tx.insert(signature).values(input.capacities.map(capacity => ({ firmId: ctx.firmId, id: uuidv7(), jobId, capacity, personId: ctx.person.id, nameShown: input.name, way: input.way, statement: CAPACITY_STATEMENTS[capacity], edition: editionOn(today), recordVersion: job.recordVersion })))
    for (const capacity of input.capacities) await recordEvent(tx, { type: 'capacity-signed', jobId, personId: ctx.person.id, detail: { capacity } })

    const signed = await tx.select({ capacity: signature.capacity }).from(signature).where(standing)
    const isComplete = CAPACITIES.every(capacity => signed.some(row => row.capacity === capacity))
    const stage = isComplete ? await moveJob(tx, ctx.firmId, job, 'capacities-signed') : job.stage
    await touchJob(tx, ctx.firmId, jobId)
    return { stage }
  })
}

/** A capacity is signed by a person whose competence for it is on file and valid on the day. */
async function assertCompetent(tx: FirmTx, ctx: FirmContext, capacities: readonly string[], today: string): Promise<void> {
  const rows = await tx.select({ capacities: qualification.capacities, validTo: qualification.validTo }).from(qualification).where(and(eq(qualification.firmId, ctx.firmId), eq(qualification.personId, ctx.person.id)))
  const valid = rows.filter(row => row.validTo === null || row.validTo >= today).flatMap(row => row.capacities)
  const missing = capacities.filter(capacity => !valid.includes(capacity))
  if (missing.length) throw problem('not-allowed', `Your qualification to sign as ${missing.join(' and ')} is not on file or has run out. The principal can add it under People.`)
}
