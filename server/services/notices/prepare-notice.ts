import { and, eq } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { Judgement } from '../../../shared/job/judge/types'
import type { JobRecord } from '../../../shared/types/record'
import { addDays } from '../../../shared/utils/dates'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { queuePaper } from '../../db/queries/papers'
import { notice } from '../../db/schema/notice'
import type { FirmContext } from '../firm-context'

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

async function prepare(tx: FirmTx, ctx: FirmContext, record: JobRecord, owed: { kind: string, recipient: string, route: string, reasons: string[], lastDay: string }): Promise<void> {
  const [standing] = await tx.select({ id: notice.id }).from(notice).where(and(eq(notice.firmId, ctx.firmId), eq(notice.jobId, record.job.id), eq(notice.kind, owed.kind)))
  if (standing) return
  const id = uuidv7()
  await tx.insert(notice).values({ firmId: ctx.firmId, id, jobId: record.job.id, ...owed, content: {} })
  if (owed.kind === 'network-operator') await queuePaper(tx, { firmId: ctx.firmId, jobId: record.job.id, kind: 'notice', sourceId: id })
  await recordEvent(tx, { type: 'notice-prepared', jobId: record.job.id, personId: ctx.person.id, detail: { kind: owed.kind, lastDay: owed.lastDay } })
}
