/** The whole record of one job in one statement: as many rows as it has, one round trip however many. */
import { getTableName, sql, type SQL } from 'drizzle-orm'
import { PART_NAMES, type Part } from '../../../shared/job/parts'
import type { JobRecord } from '../../../shared/types/record'
import type { FirmTx } from '../firm-db'
import { PART_TABLES } from './part-rows'

const STORY_LENGTH = 60

const list = (rows: SQL) => sql`coalesce((select json_agg(r) from (${rows}) r), '[]'::json)`

function partRows(part: Part, firmId: string, jobId: string): SQL {
  const table = sql.identifier(getTableName(PART_TABLES[part]))
  return list(sql`select key, position, content, stamps, version from ${table} where firm_id = ${firmId} and job_id = ${jobId} and removed_at is null order by position, made_at, key`)
}

/** The record as every page of the job reads it, or null where the firm has no such job. */
export async function findJobRecord(tx: FirmTx, firmId: string, jobId: string, crewId: string | null): Promise<JobRecord | null> {
  const here = sql`firm_id = ${firmId} and job_id = ${jobId}`
  const parts = sql.join(PART_NAMES.flatMap(part => [sql`${part}::text`, partRows(part, firmId, jobId)]), sql`, `)
  const { rows } = await tx.execute<{ record: JobRecord }>(sql`
    select json_build_object(
      'job', json_build_object('id', j.id, 'ref', j.ref, 'stage', j.stage, 'stageSince', j.stage_since, 'sideState', j.side_state, 'sideNote', j.side_note, 'note', j.note, 'withWhom', j.with_whom, 'nextDay', j.next_day, 'recordVersion', j.record_version),
      'isOwn', exists (select 1 from visit v where v.firm_id = j.firm_id and v.job_id = j.id and v.crew_id = ${crewId}::uuid and v.state <> 'cancelled'),
      'customer', (select json_build_object('id', c.id, 'name', c.name, 'email', c.email, 'telephone', c.telephone, 'version', c.version) from customer c where c.firm_id = j.firm_id and c.id = j.customer_id),
      'premises', (select json_build_object('id', p.id, 'address', p.address, 'town', p.town, 'postcode', p.postcode, 'country', p.country, 'mpan', p.mpan, 'occupier', p.occupier, 'tenure', p.tenure, 'parking', p.parking, 'version', p.version) from premises p where p.firm_id = j.firm_id and p.id = j.premises_id),
      'parts', json_build_object(${parts}),
      'readings', ${list(sql`select r.id, r.test, r.kind, r.shown, r.value, r.unit, r.resolution, r.reason, r.context, r.instrument_id as "instrumentId", r.person_id as "personId", r.typed_by as "typedBy", c.at as "confirmedAt", r.device_at as "deviceAt", r.server_at as "serverAt" from reading r left join reading_confirmation c on c.firm_id = r.firm_id and c.reading_id = r.id where r.firm_id = ${firmId} and r.job_id = ${jobId} order by r.server_at, r.id`)},
      'instruments', ${list(sql`select i.id, i.name, i.description, i.serial, i.functions, i.active, coalesce((select json_agg(json_build_object('doneOn', k.done_on, 'goodUntil', k.good_until, 'reference', k.reference) order by k.done_on) from calibration k where k.firm_id = i.firm_id and k.instrument_id = i.id), '[]'::json) as calibrations from instrument i where i.firm_id = ${firmId} order by i.name`)},
      'photographs', ${list(sql`select p.id, p.claim, p.sha256, f.thumb_sha256 as "thumbSha256", p.taken_at as "takenAt", p.person_id as "personId", p.server_at as "serverAt" from photograph p join stored_file f on f.firm_id = p.firm_id and f.sha256 = p.sha256 where p.firm_id = ${firmId} and p.job_id = ${jobId} and p.removed_at is null order by p.server_at`)},
      'queries', ${list(sql`select id, part, field, question, asked_by as "askedBy", asked_at as "askedAt", answer, answered_by as "answeredBy", answered_at as "answeredAt" from field_query where ${here} order by asked_at`)},
      'signatures', ${list(sql`select id, capacity, person_id as "personId", name_shown as "nameShown", way, statement, edition, at from signature where ${here} and withdrawn_at is null order by at`)},
      'visits', ${list(sql`select v.id, v.kind, v.day, v.half, v.crew_id as "crewId", w.name as "crewName", v.hours, v.state, v.note, v.version from visit v join crew w on w.firm_id = v.firm_id and w.id = v.crew_id where v.firm_id = ${firmId} and v.job_id = ${jobId} and v.removed_at is null order by v.day, v.half`)},
      'certificates', ${list(sql`select id, kind, number, revision, state, hash, words, sealed_at as "sealedAt", replaces_id as "replacesId" from certificate where ${here} order by sealed_at`)},
      'notices', ${list(sql`select n.id, n.kind, n.recipient, n.route, n.reasons, n.last_day as "lastDay", n.state, n.sent_on as "sentOn", n.sent_how as "sentHow", n.reference, coalesce((select json_agg(json_build_object('outcome', y.outcome, 'note', y.note, 'repliedOn', y.replied_on) order by y.at) from notice_reply y where y.firm_id = n.firm_id and y.notice_id = n.id), '[]'::json) as replies from notice n where n.firm_id = ${firmId} and n.job_id = ${jobId} order by n.made_at`)},
      'quotes', ${list(sql`select q.id, q.number, q.state, q.expires_on as "expiresOn", q.net_pence as "netPence", q.vat_pence as "vatPence", q.gross_pence as "grossPence", q.deposit_pence as "depositPence", q.sent_at as "sentAt", q.accepted_at as "acceptedAt", q.accepted_name as "acceptedName", q.version, coalesce((select json_agg(json_build_object('id', l.id, 'position', l.position, 'description', l.description, 'quantityThousandths', l.quantity_thousandths, 'unit', l.unit, 'unitNetPence', l.unit_net_pence, 'vatBp', l.vat_bp) order by l.position, l.id) from quote_line l where l.firm_id = q.firm_id and l.quote_id = q.id), '[]'::json) as lines from quote q where q.firm_id = ${firmId} and q.job_id = ${jobId} order by q.made_at desc`)},
      'messages', ${list(sql`select id, message, recipient, state, problem, made_at as "madeAt", sent_at as "sentAt" from outbox_message where ${here} order by made_at desc`)},
      'papers', ${list(sql`select id, kind, source_id as "sourceId", state, sha256, pages from paper where ${here} order by made_at desc`)},
      'story', ${list(sql`select number, type, person_id as "personId", at, detail from audit_event where ${here} order by number desc limit ${STORY_LENGTH}`)},
      'people', ${list(sql`select p.id, p.name, m.roles, coalesce((select json_agg(json_build_object('title', q.title, 'number', q.number, 'capacities', q.capacities, 'validTo', q.valid_to)) from qualification q where q.firm_id = p.firm_id and q.person_id = p.id), '[]'::json) as qualifications from person p join membership m on m.firm_id = p.firm_id and m.person_id = p.id where p.firm_id = ${firmId} order by p.name`)}
    ) as record
    from job j where j.firm_id = ${firmId} and j.id = ${jobId}`)
  return rows[0]?.record ?? null
}
