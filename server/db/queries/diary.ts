import { sql } from 'drizzle-orm'
import type { Diary } from '../../../shared/schemas/job'
import type { FirmTx } from '../firm-db'

/** Crews and their visits from one day to before another, in one statement. */
export async function findDiary(tx: FirmTx, firmId: string, from: string, before: string): Promise<Diary> {
  const { rows } = await tx.execute<{ diary: Diary }>(sql`select json_build_object(
    'crews', coalesce((select json_agg(json_build_object('id', c.id, 'name', c.name, 'people', coalesce((select json_agg(p.name order by p.name) from membership m join person p on p.firm_id = m.firm_id and p.id = m.person_id where m.firm_id = c.firm_id and m.crew_id = c.id and m.active), '[]'::json)) order by c.position, c.name) from crew c where c.firm_id = ${firmId}), '[]'::json),
    'visits', coalesce((select json_agg(json_build_object('id', v.id, 'jobId', v.job_id, 'ref', j.ref, 'kind', v.kind, 'day', v.day, 'half', v.half, 'crewId', v.crew_id, 'hours', v.hours, 'state', v.state, 'note', v.note, 'version', v.version, 'customer', cu.name, 'postcode', pr.postcode, 'address', pr.address, 'stage', j.stage) order by v.day, v.half)
      from visit v join job j on j.firm_id = v.firm_id and j.id = v.job_id join customer cu on cu.firm_id = j.firm_id and cu.id = j.customer_id join premises pr on pr.firm_id = j.firm_id and pr.id = j.premises_id
      where v.firm_id = ${firmId} and v.day >= ${from}::date and v.day < ${before}::date and v.removed_at is null and v.state <> 'cancelled'), '[]'::json)) as diary`)
  return rows[0]!.diary
}
