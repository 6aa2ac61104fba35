import { and, eq, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { MovedVisit, NewVisit } from '../../../shared/schemas/job'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { crew } from '../../db/schema/firm'
import { job, visit } from '../../db/schema/job'
import type { FirmContext } from '../firm-context'

/** Books a visit; a survey or an installation moves the job along. */
export async function bookVisit(ctx: FirmContext, input: NewVisit): Promise<{ id: string }> {
  return ctx.once(input.mutationId, 'book-visit', input, async (tx) => {
    const locked = await lockJob(tx, ctx.firmId, input.jobId)
    await assertCrew(tx, ctx.firmId, input.crewId)
    const id = uuidv7()
    const { mutationId: _, ...values } = input
    await tx.insert(visit).values({ firmId: ctx.firmId, id, ...values })
    if (input.kind !== 'return') await moveJob(tx, ctx.firmId, locked, input.kind === 'survey' ? 'survey-booked' : 'install-booked')
    await setNextDay(tx, ctx.firmId, input.jobId)
    await touchJob(tx, ctx.firmId, input.jobId)
    await recordEvent(tx, { type: 'visit-booked', jobId: input.jobId, personId: ctx.person.id, detail: { visitId: id, kind: input.kind, day: input.day, half: input.half } })
    return { id }
  })
}

/** Moves a visit, or marks it done or cancelled; the story keeps where it was. */
export async function moveVisit(ctx: FirmContext, visitId: string, input: MovedVisit): Promise<{ version: number }> {
  return ctx.once(input.mutationId, 'move-visit', { visitId, ...input }, async (tx) => {
    const here = and(eq(visit.firmId, ctx.firmId), eq(visit.id, visitId))
    const [before] = await tx.select().from(visit).where(here).for('update')
    if (!before) throw problem('not-found', 'There is no such visit.')
    if (before.version !== input.baseVersion) throw problem('stale-copy', `Somebody moved this visit meanwhile: it is now on ${before.day}, ${before.half === 'am' ? 'morning' : 'afternoon'}.`)
    if (input.crewId) await assertCrew(tx, ctx.firmId, input.crewId)
    const { mutationId: _, baseVersion, ...changes } = input
    await tx.update(visit).set({ ...changes, version: baseVersion + 1 }).where(here)
    await setNextDay(tx, ctx.firmId, before.jobId)
    await touchJob(tx, ctx.firmId, before.jobId)
    await recordEvent(tx, { type: 'visit-changed', jobId: before.jobId, personId: ctx.person.id, detail: { visitId, was: { day: before.day, half: before.half, crewId: before.crewId, state: before.state }, now: changes } })
    return { version: baseVersion + 1 }
  })
}

async function assertCrew(tx: FirmTx, firmId: string, crewId: string): Promise<void> {
  const [found] = await tx.select({ id: crew.id }).from(crew).where(and(eq(crew.firmId, firmId), eq(crew.id, crewId)))
  if (!found) throw problem('check-answers', 'Choose one of the firm\'s crews.', { fields: { crewId: 'Choose a crew' } })
}

async function setNextDay(tx: FirmTx, firmId: string, jobId: string): Promise<void> {
  await tx.update(job).set({ nextDay: sql`(select min(v.day) from visit v where v.firm_id = ${firmId} and v.job_id = ${jobId} and v.state = 'booked' and v.removed_at is null)` }).where(and(eq(job.firmId, firmId), eq(job.id, jobId)))
}
