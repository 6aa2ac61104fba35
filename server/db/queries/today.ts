import { sql, type SQL } from 'drizzle-orm'
import { CALIBRATION_NOTICE_DAYS, type TodayView } from '../../../shared/job/today'
import type { Role } from '../../../shared/types/firm'
import type { FirmTx } from '../firm-db'

interface Reader { id: string, roles: readonly Role[], crewId: string | null }

/** Working days a quote may lie with the customer before the office asks, and a job anywhere before the principal does; in calendar days. */
const QUOTE_RESTS_DAYS = 5
const JOB_RESTS_DAYS = 14

/** What waits for the reader, who is on site and who goes where next, in one statement. */
export async function findToday(tx: FirmTx, firmId: string, reader: Reader, today: string): Promise<TodayView> {
  const { rows } = await tx.execute<{ view: TodayView }>(sql`with here as (
      select j.id, j.ref, j.stage, j.stage_since, j.side_state, j.side_note, j.with_whom, c.name as customer, p.address, p.postcode, p.country
      from job j join customer c on c.firm_id = j.firm_id and c.id = j.customer_id join premises p on p.firm_id = j.firm_id and p.id = j.premises_id
      where j.firm_id = ${firmId} and j.stage <> 'closed' and j.side_state is distinct from 'cancelled')
    select json_build_object(
      'waiting', coalesce((select json_agg(w) from (${sql.join(waitingFor(firmId, reader, today), sql` union all `)}) w), '[]'::json),
      'onSite', coalesce((select json_agg(o order by o.crew) from (${onSite(firmId, today)}) o), '[]'::json),
      'coming', coalesce((select json_agg(v order by v.day, v.half, v.crew) from (${coming(firmId, reader, today)}) v), '[]'::json)) as view`)
  return rows[0]!.view
}

function waitingFor(firmId: string, { id: personId, roles, crewId }: Reader, today: string): SQL[] {
  const is = (...wanted: Role[]) => wanted.some(role => roles.includes(role))
  const found: SQL[] = [sql`select ${'call'} as kind, h.id, h.id as "jobId", h.ref, h.customer, h.address, h.postcode, h.country, h.stage_since as since, null::date as due, '' as detail from here h where false`]
  const atStage = (kind: string, where: SQL, detail: SQL = sql`''`) => found.push(sql`select ${kind}, h.id, h.id, h.ref, h.customer, h.address, h.postcode, h.country, h.stage_since, null::date, ${detail} from here h where ${where}`)

  if (is('office')) {
    atStage('call', sql`h.stage = 'enquiry' and h.side_state is null`)
    atStage('make-quote', sql`h.stage = 'surveyed' and h.side_state is null`)
    atStage('ask-about-quote', sql`h.stage = 'quoted' and h.side_state is null and h.stage_since < now() - make_interval(days => ${QUOTE_RESTS_DAYS})`)
    atStage('book-install', sql`h.stage = 'accepted' and h.side_state is null`)
    atStage('send-pack', sql`h.stage = 'countersigned'`)
    atStage('waiting-on', sql`h.side_state = 'waiting'`, sql`h.side_note`)
    found.push(sql`select case o.state when 'failed' then 'message-failed' else 'message-unclear' end, o.id, o.job_id, coalesce(h.ref, ''), coalesce(h.customer, ''), coalesce(h.address, ''), coalesce(h.postcode, ''), coalesce(h.country, 'England'), o.made_at, null::date, replace(o.message, '-', ' ') || ' to ' || o.recipient from outbox_message o left join here h on h.id = o.job_id where o.firm_id = ${firmId} and o.state in ('failed', 'unclear')`)
  }
  if (is('office', 'principal')) {
    found.push(sql`select 'notice', n.id, h.id, h.ref, h.customer, h.address, h.postcode, h.country, n.made_at, n.last_day, n.recipient from notice n join here h on h.id = n.job_id where n.firm_id = ${firmId} and n.state = 'to-prepare' and (${is('office')} or n.last_day < ${today}::date)`)
    found.push(sql`select 'calibrate', i.id, null::uuid, '', '', '', '', 'England', null::timestamptz, max(k.good_until), i.name from instrument i join calibration k on k.firm_id = i.firm_id and k.instrument_id = i.id where i.firm_id = ${firmId} and i.active group by i.id, i.name having max(k.good_until) <= ${today}::date + ${CALIBRATION_NOTICE_DAYS}::int`)
  }
  if (is('installer', 'supervisor') && crewId) {
    const own = sql`exists (select 1 from visit v where v.firm_id = ${firmId} and v.job_id = h.id and v.crew_id = ${crewId}::uuid and v.state <> 'cancelled')`
    found.push(sql`select 'visit', v.id, h.id, h.ref, h.customer, h.address, h.postcode, h.country, null::timestamptz, v.day, v.kind || ' ' || v.half from visit v join here h on h.id = v.job_id where v.firm_id = ${firmId} and v.crew_id = ${crewId}::uuid and v.state = 'booked' and v.removed_at is null and v.day between ${today}::date and ${today}::date + 1`)
    atStage('sent-back', sql`h.stage = 'on-site' and h.side_state = 'sent-back' and ${own}`, sql`(select count(*)::text from field_query q where q.firm_id = ${firmId} and q.job_id = h.id and q.answered_at is null)`)
    atStage('finish-work', sql`h.stage = 'on-site' and h.side_state is null and ${own}`)
  }
  if (is('installer', 'supervisor')) {
    found.push(sql`select 'confirm-readings', h.id, h.id, h.ref, h.customer, h.address, h.postcode, h.country, min(r.server_at), null::date, count(*)::text from reading r join here h on h.id = r.job_id left join reading_confirmation k on k.firm_id = r.firm_id and k.reading_id = r.id where r.firm_id = ${firmId} and r.person_id = ${personId}::uuid and r.typed_by is not null and k.reading_id is null group by h.id, h.ref, h.customer, h.address, h.postcode, h.country`)
  }
  if (is('supervisor')) atStage('check', sql`h.stage = 'ready-to-check'`)
  if (is('principal')) atStage('held-up', sql`h.stage not in ('quoted', 'survey-booked', 'install-booked', 'handed-over') and h.side_state is null and h.stage_since < now() - make_interval(days => ${JOB_RESTS_DAYS})`, sql`h.with_whom`)
  return found
}

/** Today's visits and whatever else stands at "On site", with how far the readings are. */
const onSite = (firmId: string, today: string) => sql`select distinct on (h.id) h.id as "jobId", c.name as crew, h.address, h.postcode, v.kind, v.day,
    (select count(*) from reading r where r.firm_id = ${firmId} and r.job_id = h.id)::int as readings, (select max(r.server_at) from reading r where r.firm_id = ${firmId} and r.job_id = h.id) as "lastAt"
  from here h join visit v on v.firm_id = ${firmId} and v.job_id = h.id and v.state = 'booked' and v.removed_at is null and v.day <= ${today}::date join crew c on c.firm_id = v.firm_id and c.id = v.crew_id
  where v.day = ${today}::date or h.stage = 'on-site' order by h.id, v.day desc, v.half`

/** The next visits: everybody's for those who book them, one's own crew's for the others. */
const coming = (firmId: string, { roles, crewId }: Reader, today: string) => sql`select v.id as "visitId", h.id as "jobId", v.day, v.half, c.name as crew, v.kind, h.customer, h.address, h.postcode
  from visit v join here h on h.id = v.job_id join crew c on c.firm_id = v.firm_id and c.id = v.crew_id
  where v.firm_id = ${firmId} and v.state = 'booked' and v.removed_at is null and v.day > ${today}::date and v.day <= ${today}::date + 5
    and (${roles.some(role => role === 'office' || role === 'principal' || role === 'supervisor')} or v.crew_id = ${crewId}::uuid) order by v.day, v.half limit 30`
