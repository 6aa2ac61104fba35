import { and, eq } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { Judgement } from '../../../shared/job/judge/types'
import type { JobRecord } from '../../../shared/types/record'
import { addDays } from '../../../shared/utils/dates'
import type { FirmTx } from '../../db/firm-db'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { lockJob, touchJob } from '../../db/queries/jobs'
import { queuePaper } from '../../db/queries/papers'
import { notice } from '../../db/schema/notice'
import type { FirmContext } from '../firm-context'
import { loadJudged } from '../sign-off/load-judged'

/** Days after the work within which the network operator is told of a charger (rule DNO-02). */
const TELL_AFTER_DAYS = 28
/** Days after completion within which building control is told, in England and Wales (rule DOC-10). */
const BUILDING_CONTROL_DAYS = 30

/** Makes the notices that sealed work owes, each once per job: to the network operator and, where the country has it, to building control. */
export async function prepareNotice(tx: FirmTx, ctx: FirmContext, record: JobRecord, judgement: Judgement, today: string): Promise<void> {
  const completed = record.parts.statement.find(row => row.key === 'statement')?.content.completed_on
  const day = typeof completed === 'string' ? completed : today
  const route = judgement.route.answer
  await prepare(tx, ctx, record, { kind: 'network-operator', recipient: 'Network operator', route: route.result.route ?? 'contact', reasons: route.reasons, lastDay: addDays(day, route.result.deadlineDays ?? TELL_AFTER_DAYS) })
  if (record.premises.country === 'England' || record.premises.country === 'Wales') {
    await prepare(tx, ctx, record, { kind: 'building-control', recipient: 'Building control, through the scheme', route: 'tell-after', reasons: ['DOC-10: The work is notifiable; the scheme tells building control.'], lastDay: addDays(day, BUILDING_CONTROL_DAYS) })
  }
}

/** Prepares the question or notice to the network operator before the work, where the route asks for one first. */
export async function prepareNetworkNotice(ctx: FirmContext, jobId: string, input: { mutationId: string }): Promise<{ prepared: boolean }> {
  return ctx.once(input.mutationId, 'prepare-notice', { jobId }, async (tx) => {
    await lockJob(tx, ctx.firmId, jobId)
    const { record, judgement, today } = await loadJudged(tx, ctx, jobId)
    const route = judgement.route.answer
    if (!route.result.route) throw problem('wrong-stage', 'The way to the network operator cannot be told yet: Supply says what is missing.', { reasons: judgement.route.waitsFor.map(ref => `Waits for ${ref.words}.`) })
    const isAfter = route.result.route === 'tell-after'
    await prepare(tx, ctx, record, { kind: 'network-operator', recipient: 'Network operator', route: route.result.route, reasons: route.reasons, lastDay: isAfter ? addDays(today, route.result.deadlineDays ?? TELL_AFTER_DAYS) : null })
    await touchJob(tx, ctx.firmId, jobId)
    return { prepared: true }
  })
}

async function prepare(tx: FirmTx, ctx: FirmContext, record: JobRecord, owed: { kind: string, recipient: string, route: string, reasons: string[], lastDay: string | null }): Promise<void> {
  const [standing] = await tx.select({ id: notice.id }).from(notice).where(and(eq(notice.firmId, ctx.firmId), eq(notice.jobId, record.job.id), eq(notice.kind, owed.kind)))
  if (standing) return
  const id = uuidv7()
  await tx.insert(notice).values({ firmId: ctx.firmId, id, jobId: record.job.id, ...owed, content: {} })
  if (owed.kind === 'network-operator') await queuePaper(tx, { firmId: ctx.firmId, jobId: record.job.id, kind: 'notice', sourceId: id })
  await recordEvent(tx, { type: 'notice-prepared', jobId: record.job.id, personId: ctx.person.id, detail: { kind: owed.kind, lastDay: owed.lastDay } })
}
