import { and, eq, sql } from 'drizzle-orm'
import type { FirmView, PeopleView } from '../../../shared/schemas/people'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../firm-db'
import { firm, membership } from '../schema/firm'

/** Everybody of the firm with roles, crew and qualifications, and the crews; in one statement. */
export async function listPeople(tx: FirmTx, firmId: string): Promise<PeopleView> {
  const { rows } = await tx.execute<{ view: PeopleView }>(sql`select json_build_object(
    'people', coalesce((select json_agg(json_build_object('id', p.id, 'name', p.name, 'email', p.email, 'roles', m.roles, 'active', m.active, 'crewId', m.crew_id, 'hasPassword', p.password_hash is not null,
        'lastSeenAt', (select max(s.last_seen_at) from sign_in_session s where s.firm_id = p.firm_id and s.person_id = p.id),
        'qualifications', coalesce((select json_agg(json_build_object('id', q.id, 'title', q.title, 'number', q.number, 'capacities', q.capacities, 'validTo', q.valid_to) order by q.title) from qualification q where q.firm_id = p.firm_id and q.person_id = p.id), '[]'::json)) order by m.active desc, p.name)
      from membership m join person p on p.firm_id = m.firm_id and p.id = m.person_id where m.firm_id = ${firmId}), '[]'::json),
    'crews', coalesce((select json_agg(json_build_object('id', c.id, 'name', c.name) order by c.position, c.name) from crew c where c.firm_id = ${firmId}), '[]'::json)) as view`)
  return rows[0]!.view
}

/** The membership with its row locked. */
export async function lockMembership(tx: FirmTx, firmId: string, personId: string): Promise<typeof membership.$inferSelect> {
  const [row] = await tx.select().from(membership).where(and(eq(membership.firmId, firmId), eq(membership.personId, personId))).for('update')
  if (!row) throw problem('not-found', 'There is no such person in your firm.')
  return row
}

/** How many principals can sign in, apart from one person. */
export async function countOtherPrincipals(tx: FirmTx, firmId: string, personId: string): Promise<number> {
  const [row] = await tx.select({ n: sql<number>`count(*)::int` }).from(membership).where(and(eq(membership.firmId, firmId), eq(membership.active, true), sql`${membership.roles} @> array['principal']`, sql`${membership.personId} <> ${personId}`))
  return row!.n
}

export async function getFirm(tx: FirmTx, firmId: string): Promise<FirmView> {
  const [row] = await tx.select().from(firm).where(eq(firm.id, firmId))
  if (!row) throw problem('not-found', 'There is no such firm.')
  const { name, address, telephone, email, scheme, registration, vatNumber, settings } = row
  return { name, address, telephone, email, scheme, registration, vatNumber: vatNumber ?? '', selfCountersign: settings.selfCountersign, depositPercent: settings.depositBp / 100, quoteDays: settings.quoteDays }
}
