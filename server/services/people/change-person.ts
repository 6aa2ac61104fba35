import { and, eq, isNull, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { NewQualification, PersonChange } from '../../../shared/schemas/people'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { countOtherPrincipals, lockMembership } from '../../db/queries/people'
import { crew, membership, qualification, signInSession } from '../../db/schema/firm'
import type { FirmContext } from '../firm-context'

/** Changes somebody's roles or crew, or switches them off or on. Every session of theirs ends when roles change or they are switched off. */
export async function changePerson(ctx: FirmContext, personId: string, input: PersonChange): Promise<{ done: true }> {
  return ctx.once(input.mutationId, 'change-person', { personId, ...input }, async (tx) => {
    const before = await lockMembership(tx, ctx.firmId, personId)
    const { mutationId: _, ...changes } = input
    const after = { roles: changes.roles ?? before.roles, active: changes.active ?? before.active }
    if (personId === ctx.person.id && changes.active === false) throw problem('check-answers', 'You cannot switch yourself off. Another principal can.')
    if (!(after.active && after.roles.includes('principal')) && !await countOtherPrincipals(tx, ctx.firmId, personId)) throw problem('check-answers', 'The firm needs at least one principal who can sign in. Give somebody else that role first.', { fields: { roles: 'The firm needs at least one principal' } })
    if (changes.crewId && !(await tx.select({ id: crew.id }).from(crew).where(and(eq(crew.firmId, ctx.firmId), eq(crew.id, changes.crewId)))).length) throw problem('check-answers', 'Choose one of the firm\'s crews.', { fields: { crewId: 'Choose a crew' } })
    await tx.update(membership).set({ active: after.active, ...changes }).where(and(eq(membership.firmId, ctx.firmId), eq(membership.personId, personId)))
    const mustSignInAgain = changes.active === false || (changes.roles !== undefined && personId !== ctx.person.id)
    if (mustSignInAgain) await tx.update(signInSession).set({ revokedAt: sql`now()` }).where(and(eq(signInSession.firmId, ctx.firmId), eq(signInSession.personId, personId), isNull(signInSession.revokedAt)))
    await recordEvent(tx, { type: 'person-changed', personId: ctx.person.id, detail: { changed: personId, was: { roles: before.roles, crewId: before.crewId, active: before.active }, now: changes } })
    return { done: true as const }
  })
}

/** Puts a qualification on file: what a person may sign for rests on it. */
export async function addQualification(ctx: FirmContext, personId: string, input: NewQualification): Promise<{ id: string }> {
  return ctx.once(input.mutationId, 'add-qualification', { personId, ...input }, async (tx) => {
    await lockMembership(tx, ctx.firmId, personId)
    const { mutationId: _, ...values } = input
    const id = uuidv7()
    await tx.insert(qualification).values({ firmId: ctx.firmId, id, personId, ...values })
    await recordEvent(tx, { type: 'person-changed', personId: ctx.person.id, detail: { changed: personId, qualification: id, capacities: values.capacities, validTo: values.validTo } })
    return { id }
  })
}

export async function addCrew(ctx: FirmContext, input: { mutationId: string, name: string }): Promise<{ id: string }> {
  return ctx.once(input.mutationId, 'add-crew', input, async (tx) => {
    const id = uuidv7()
    const made = await tx.insert(crew).values({ firmId: ctx.firmId, id, name: input.name, position: sql`(select coalesce(max(c.position), 0) + 1 from crew c where c.firm_id = ${ctx.firmId})` as never }).onConflictDoNothing().returning({ id: crew.id })
    if (!made.length) throw problem('check-answers', 'There is a crew of that name already.', { fields: { name: 'There is a crew of that name already' } })
    await recordEvent(tx, { type: 'settings-changed', personId: ctx.person.id, detail: { crew: id } })
    return { id }
  })
}
