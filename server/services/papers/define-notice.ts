import { and, eq } from 'drizzle-orm'
import { judgeJob } from '../../../shared/job/judge/judge-job'
import { londonDay } from '../../../shared/utils/dates'
import { findJobRecord } from '../../db/queries/job-record'
import { firm } from '../../db/schema/firm'
import { notice } from '../../db/schema/notice'
import { noticeDefinition } from '../../documents/notice/layout'
import { noticeContent } from '../notices/notice-content'
import type { DefinePaper } from '../../worker/make-paper'

/** The network operator's data sheet. */
export const defineNotice: DefinePaper = async (tx, { firmId, jobId, sourceId }) => {
  const [row] = await tx.select().from(notice).where(and(eq(notice.firmId, firmId), eq(notice.id, sourceId)))
  const record = await findJobRecord(tx, firmId, jobId, null)
  const [theFirm] = await tx.select().from(firm).where(eq(firm.id, firmId))
  if (!row || !record || !theFirm) throw new Error('The notice of this sheet is not there')
  const day = londonDay(row.madeAt.toISOString())
  return noticeDefinition(noticeContent({ record, judgement: judgeJob(record, day), firm: theFirm, notice: row }))
}
