/** Links that let a person set a password: 32 random bytes in the mail, only their SHA-256 in the database, one use. */
import { createHash, randomBytes } from 'node:crypto'
import { and, eq, isNull, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import { formatMoment } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import { changeAsFirm, lookUp, type FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { queueMessage } from '../../db/queries/outbox'
import { outboxMessage } from '../../db/schema/message'
import { crew, membership, person, personToken, signInSession } from '../../db/schema/firm'
import type { FirmContext } from '../firm-context'
import { inTurn } from './password-work'
import type { PasswordHashing } from './sign-in'

type Purpose = 'invitation' | 'password-reset'
const MOST_RESETS_A_DAY = 5
const HOURS: Record<Purpose, number> = { 'invitation': 24 * 7, 'password-reset': 1 }

export const tokenHash = (token: string) => createHash('sha256').update(token).digest('hex')
export const newToken = () => randomBytes(32).toString('base64url')

/** Makes a token when its letter is written; only the letter ever holds it. */
export async function makePersonToken(tx: FirmTx, firmId: string, personId: string, purpose: Purpose): Promise<string> {
  const token = newToken()
  await tx.insert(personToken).values({ firmId, id: uuidv7(), personId, purpose, tokenHash: tokenHash(token), expiresAt: sql`now() + make_interval(hours => ${HOURS[purpose]})` as never })
  return token
}

/** Makes the person with the roles given and sends the invitation. */
export async function invitePerson(ctx: FirmContext, input: { mutationId: string, name: string, email: string, roles: string[], crewId?: string | null }): Promise<{ id: string }> {
  return ctx.once(input.mutationId, 'invite-person', input, async (tx) => {
    const [taken] = await tx.execute<{ person_id: string }>(sql`select person_id from find_person_by_email(${input.email})`).then(result => result.rows)
    if (taken) throw problem('check-answers', 'Somebody already signs in with that e-mail address.', { fields: { email: 'Somebody already signs in with this address' } })
    if (input.crewId && !(await tx.select({ id: crew.id }).from(crew).where(and(eq(crew.firmId, ctx.firmId), eq(crew.id, input.crewId)))).length) throw problem('check-answers', 'Choose one of the firm\'s crews.', { fields: { crewId: 'Choose a crew' } })
    const id = uuidv7()
    await tx.insert(person).values({ firmId: ctx.firmId, id, name: input.name, email: input.email })
    await tx.insert(membership).values({ firmId: ctx.firmId, personId: id, roles: input.roles, crewId: input.crewId ?? null })
    const until = formatMoment(Date.now() + HOURS.invitation * 3_600_000)
    await queueMessage(tx, { firmId: ctx.firmId, message: 'invitation', recipient: input.email, dedupeKey: `invitation:${id}`, content: { name: input.name, invitedBy: ctx.person.name, roles: input.roles, until, needsLink: { kind: 'person', purpose: 'invitation', personId: id } } })
    await recordEvent(tx, { type: 'person-invited', personId: ctx.person.id, detail: { invited: id } })
    return { id }
  })
}

/** Sends a link to set a new password, where the address belongs to somebody; says nothing either way. */
export async function sendPasswordReset(email: string): Promise<void> {
  const [found] = await lookUp<{ firm_id: string, person_id: string, name: string }>('find-person-by-email', 'select * from find_person_by_email($1)', [email])
  if (!found) return
  await changeAsFirm(found.firm_id, async (tx) => {
    const recent = await tx.select({ id: outboxMessage.id }).from(outboxMessage).where(and(eq(outboxMessage.firmId, found.firm_id), eq(outboxMessage.message, 'password-reset'), eq(outboxMessage.recipient, email), sql`${outboxMessage.madeAt} > now() - interval '1 day'`))
    if (recent.length >= MOST_RESETS_A_DAY) return
    const until = formatMoment(Date.now() + HOURS['password-reset'] * 3_600_000)
    await queueMessage(tx, { firmId: found.firm_id, message: 'password-reset', recipient: email, dedupeKey: `password-reset:${uuidv7()}`, content: { name: found.name, until, needsLink: { kind: 'person', purpose: 'password-reset', personId: found.person_id } } })
  })
}

/** Uses the link: sets the password and ends every session of the person. */
export async function setPassword(input: { token: string, purpose: Purpose, password: string }, hashing: PasswordHashing): Promise<void> {
  const [found] = await lookUp<{ firm_id: string, id: string, person_id: string }>('find-person-token', 'select * from find_person_token($1, $2)', [tokenHash(input.token), input.purpose])
  if (!found) throw problem('check-answers', 'This link has been used or has run out. Ask for a new one.')
  const passwordHash = await inTurn(() => hashing.hash(input.password))
  await changeAsFirm(found.firm_id, async (tx) => {
    const used = await tx.update(personToken).set({ usedAt: sql`now()` }).where(and(eq(personToken.firmId, found.firm_id), eq(personToken.id, found.id), isNull(personToken.usedAt))).returning({ id: personToken.id })
    if (!used.length) throw problem('check-answers', 'This link has been used or has run out. Ask for a new one.')
    await tx.update(person).set({ passwordHash }).where(and(eq(person.firmId, found.firm_id), eq(person.id, found.person_id)))
    await tx.update(signInSession).set({ revokedAt: sql`now()` }).where(and(eq(signInSession.firmId, found.firm_id), eq(signInSession.personId, found.person_id), isNull(signInSession.revokedAt)))
    await recordEvent(tx, { type: 'password-changed', personId: found.person_id })
  })
}
