import { and, eq, sql } from 'drizzle-orm'
import type { NoticeLine } from '../../../shared/job/notices'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../firm-db'
import { notice } from '../schema/notice'

/** The firm's notices, those still to send first by their last day, with job, data sheet and replies; in one statement. */
export async function listNotices(tx: FirmTx, firmId: string): Promise<NoticeLine[]> {
  const { rows } = await tx.execute<{ lines: NoticeLine[] }>(sql`select coalesce(json_agg(line order by line.state = 'to-prepare' desc, line."lastDay" nulls last, line.id desc), '[]'::json) as lines from (
    select n.id, n.job_id as "jobId", j.ref, n.kind, n.recipient, n.reasons, n.last_day as "lastDay", n.state, n.sent_on as "sentOn", n.sent_how as "sentHow", n.reference, c.name as customer, p.address, p.postcode, p.country,
      a.id as "paperId", a.state as "paperState",
      coalesce((select json_agg(json_build_object('outcome', y.outcome, 'note', y.note, 'repliedOn', y.replied_on) order by y.at) from notice_reply y where y.firm_id = n.firm_id and y.notice_id = n.id), '[]'::json) as replies
    from notice n join job j on j.firm_id = n.firm_id and j.id = n.job_id join customer c on c.firm_id = j.firm_id and c.id = j.customer_id join premises p on p.firm_id = j.firm_id and p.id = j.premises_id
      left join paper a on a.firm_id = n.firm_id and a.kind = 'notice' and a.source_id = n.id
    where n.firm_id = ${firmId} order by n.state = 'to-prepare' desc, n.last_day nulls last, n.id desc limit 200) line`)
  return rows[0]!.lines
}

/** The notice with its row locked. */
export async function lockNotice(tx: FirmTx, firmId: string, noticeId: string): Promise<typeof notice.$inferSelect> {
  const [row] = await tx.select().from(notice).where(and(eq(notice.firmId, firmId), eq(notice.id, noticeId))).for('update')
  if (!row) throw problem('not-found', 'There is no such notice.')
  return row
}
