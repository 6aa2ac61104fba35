import { MUTATION_KINDS, type Mutation, type MutationOutcome } from '../../../shared/job/mutations'
import { mayDo, whoMay, type Act } from '../../../shared/job/permissions'
import { mayChangeWork } from '../../../shared/job/stages'
import { problem, ProblemError } from '../../../shared/utils/problem'
import { fieldProblems } from '../../../shared/utils/field-problems'
import { changeAsFirm, type FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob, type LockedJob } from '../../db/queries/jobs'
import { applierOf } from '../../mutations/registry'
import { claimMutation, storeOutcome, type FirmContext } from '../firm-context'

/** Applies one mutation in a transaction of its own and gives its outcome; a repeat gives the stored one. */
export async function applyMutation(ctx: FirmContext, mutation: Mutation): Promise<MutationOutcome> {
  try {
    return await changeAsFirm(ctx.firmId, tx => applyOnce(tx, ctx, mutation))
  }
  catch (error) {
    if (error instanceof ProblemError) return { id: mutation.id, status: 'refused', problem: error.problem }
    throw error
  }
}

async function applyOnce(tx: FirmTx, ctx: FirmContext, mutation: Mutation): Promise<MutationOutcome> {
  const { id, kind, jobId, payload } = mutation
  const spec = Object.hasOwn(MUTATION_KINDS, kind) ? MUTATION_KINDS[kind] : undefined
  const apply = spec && applierOf(kind)
  if (!spec || !apply) throw problem('check-answers', `This application does not know the change "${kind}". Reload the page to get the newest version.`)

  const stored = await claimMutation<MutationOutcome>(tx, { firmId: ctx.firmId, id, kind, jobId, personId: ctx.person.id, content: { jobId, payload } })
  if (stored) return stored.outcome.status === 'applied' ? { ...stored.outcome, status: 'repeated' } : stored.outcome

  const job = await lockJob(tx, ctx.firmId, jobId, ctx.person.crewId)
  assertMay(ctx, job, kind === 'add-reading' ? ['take-readings', 'transcribe-readings'] : [spec.may])
  if (spec.isWork && !mayChangeWork(job.stage)) throw problem('wrong-stage', 'This work has been signed. A supervisor can send it back; then it can be changed.')
  if (job.sideState === 'cancelled' && kind !== 'change-job') throw problem('wrong-stage', 'This job is cancelled. The office can take it up again.')
  const parsed = spec.payload.safeParse(payload)
  if (!parsed.success) throw problem('check-answers', 'Some of what was entered needs another look.', { fields: fieldProblems(parsed.error) })

  const applied = await apply({ tx, ctx, job, mutation, payload: parsed.data as never })
  const outcome: MutationOutcome = 'stale' in applied
    ? { id, status: 'stale', ...applied.stale }
    : { id, status: 'applied', recordVersion: await touchJob(tx, ctx.firmId, jobId), row: applied.row }
  if (!('stale' in applied)) {
    await recordEvent(tx, { type: applied.event, jobId, personId: ctx.person.id, detail: applied.detail })
    if (applied.moves) await moveJob(tx, ctx.firmId, job, applied.moves)
  }
  await storeOutcome(tx, ctx.firmId, id, outcome)
  return outcome
}

function assertMay(ctx: FirmContext, job: LockedJob, acts: Act[]): void {
  if (acts.some(act => mayDo(ctx.person, act, job.isOwn))) return
  throw problem('not-allowed', `This can be changed by ${whoMay(acts[0]!)}.`)
}
