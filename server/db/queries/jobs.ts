import { and, eq, sql } from 'drizzle-orm'
import { stageAfter, STAGE_WORDS, type Stage, type StageEvent } from '../../../shared/job/stages'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../firm-db'
import { job, visit } from '../schema/job'

export interface LockedJob {
  id: string
  ref: string
  customerId: string
  premisesId: string
  stage: Stage
  sideState: string | null
  recordVersion: number
  /** Whether the given crew is on one of its visits. */
  isOwn: boolean
}

/** In a select from one table Drizzle writes bare column names, which inside the subquery would mean the visit's own: so they are spelled out. */
const columns = (crewId: string | null) => ({
  id: job.id, ref: job.ref, customerId: job.customerId, premisesId: job.premisesId, stage: job.stage, sideState: job.sideState, recordVersion: job.recordVersion,
  isOwn: sql<boolean>`exists (select 1 from ${visit} v where v.firm_id = job.firm_id and v.job_id = job.id and v.crew_id = ${crewId}::uuid and v.state <> 'cancelled')`,
})

/** The job, or null where there is none of that id in the firm (another firm's is not there either). */
export async function findJob(tx: FirmTx, firmId: string, jobId: string, crewId: string | null = null): Promise<LockedJob | null> {
  const [row] = await tx.select(columns(crewId)).from(job).where(and(eq(job.firmId, firmId), eq(job.id, jobId)))
  return row ?? null
}

/** The job with its row locked until the transaction ends: guards are judged on this copy. */
export async function lockJob(tx: FirmTx, firmId: string, jobId: string, crewId: string | null = null): Promise<LockedJob> {
  const [row] = await tx.select(columns(crewId)).from(job).where(and(eq(job.firmId, firmId), eq(job.id, jobId))).for('update')
  if (!row) throw problem('not-found', 'There is no such job.')
  return row
}

/** Notes that the record changed; gives its new version. */
export async function touchJob(tx: FirmTx, firmId: string, jobId: string): Promise<number> {
  const [row] = await tx.update(job).set({ recordVersion: sql`${job.recordVersion} + 1`, changedAt: sql`now()` }).where(and(eq(job.firmId, firmId), eq(job.id, jobId))).returning({ recordVersion: job.recordVersion })
  return row!.recordVersion
}

/** A revision's reason stands in the side note until its certificate is sealed. */
const KEEPS_NOTE = new Set<StageEvent>(['revision-opened', 'capacities-signed', 'sent-back'])

/** Moves the job where the event moves it; gives the stage it is in afterwards. */
export async function moveJob(tx: FirmTx, firmId: string, locked: Pick<LockedJob, 'id' | 'stage'>, event: StageEvent, sideState: 'sent-back' | null = null): Promise<Stage> {
  const next = stageAfter(locked.stage, event)
  if (!next) return locked.stage
  await tx.update(job).set({ stage: next, stageSince: sql`now()`, withWhom: STAGE_WORDS[next].withWhom, sideState, ...(KEEPS_NOTE.has(event) ? {} : { sideNote: '' }) }).where(and(eq(job.firmId, firmId), eq(job.id, locked.id)))
  return next
}
