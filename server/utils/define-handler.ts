/**
 * The one way an API handler is made: session, then membership, then the job inside that firm, then permission, then
 * the body, then the act, then refusals as HTTP. Handlers hold no SQL, no rules and no `try`.
 */
import { createError, defineEventHandler, getRouterParam, readRawBody, setResponseHeader, type EventHandlerRequest, type H3Event } from 'h3'
import type * as z from 'zod'
import { mayDo, reachOf, whoMay, type Act } from '../../shared/job/permissions'
import { fieldProblems } from '../../shared/utils/field-problems'
import { problem, ProblemError, PROBLEM_STATUS } from '../../shared/utils/problem'
import { isDatabaseAway } from '../db/database-away'
import { findJob, type LockedJob } from '../db/queries/jobs'
import type { FirmContext } from '../services/firm-context'

const MOST_BODY_BYTES = 256 * 1024
const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/

type Body<S> = S extends z.ZodType ? z.infer<S> : undefined
interface Rules<S extends z.ZodType | undefined, Q extends z.ZodType | undefined> { may?: Act, body?: S, query?: Q }
interface Asked<S extends z.ZodType | undefined, Q extends z.ZodType | undefined> { event: H3Event, ctx: FirmContext, body: Body<S>, query: Body<Q> }

/** A handler for a signed-in person. */
export function defineFirmHandler<T, S extends z.ZodType | undefined = undefined, Q extends z.ZodType | undefined = undefined>(rules: Rules<S, Q>, act: (asked: Asked<S, Q>) => Promise<T> | T) {
  return defineEventHandler<EventHandlerRequest, Promise<T>>(event => answering(event, async () => {
    const ctx = await requireSignedIn(event)
    if (rules.may && !reachOf(ctx.person, rules.may)) throw notAllowed(rules.may)
    return act({ event, ctx, body: await readChecked<S>(event, rules.body), query: checkQuery<Q>(event, rules.query) })
  }))
}

/** A handler for one job of the signed-in person's firm; `[jobId]` is in its path. */
export function defineJobHandler<T, S extends z.ZodType | undefined = undefined, Q extends z.ZodType | undefined = undefined>(rules: Rules<S, Q> & { may: Act }, act: (asked: Asked<S, Q> & { job: LockedJob }) => Promise<T> | T) {
  return defineEventHandler<EventHandlerRequest, Promise<T>>(event => answering(event, async () => {
    const ctx = await requireSignedIn(event)
    const jobId = uuidParam(event, 'jobId')
    const job = await ctx.read(tx => findJob(tx, ctx.firmId, jobId, ctx.person.crewId))
    if (!job) throw problem('not-found', 'There is no such job.')
    if (!mayDo(ctx.person, rules.may, job.isOwn)) throw notAllowed(rules.may)
    return act({ event, ctx, job, body: await readChecked<S>(event, rules.body), query: checkQuery<Q>(event, rules.query) })
  }))
}

/** A handler anyone may call: customer links, the check page, sign-in. */
export function defineOpenHandler<T, S extends z.ZodType | undefined = undefined>(rules: { body?: S }, act: (asked: { event: H3Event, body: Body<S> }) => Promise<T> | T) {
  return defineEventHandler<EventHandlerRequest, Promise<T>>(event => answering(event, async () => act({ event, body: await readChecked<S>(event, rules.body) })))
}

/** An id in the path; anything that is no id is answered like an id that is not there. */
export function uuidParam(event: H3Event, name: string): string {
  const value = getRouterParam(event, name) ?? ''
  if (!UUID.test(value)) throw problem('not-found', 'There is nothing at this address.')
  return value
}

async function requireSignedIn(event: H3Event): Promise<FirmContext> {
  const ctx = await signedIn(event)
  if (!ctx) throw problem('not-signed-in', 'Sign in to go on. What you entered stays on this page.')
  return ctx
}

const notAllowed = (act: Act) => problem('not-allowed', `This is for ${whoMay(act)}.`)

async function readChecked<S extends z.ZodType | undefined>(event: H3Event, schema: S | undefined): Promise<Body<S>> {
  if (!schema) return undefined as Body<S>
  const raw = await readRawBody(event, 'utf8') ?? ''
  if (raw.length > MOST_BODY_BYTES) throw problem('too-large', 'That is more than one request may carry.')
  const parsed = schema.safeParse(parseJson(raw))
  if (!parsed.success) throw problem('check-answers', 'Some of what was entered needs another look.', { fields: fieldProblems(parsed.error) })
  return parsed.data as Body<S>
}

function parseJson(raw: string): unknown {
  try {
    return JSON.parse(raw, (key, value: unknown) => (key === '__proto__' ? undefined : value))
  }
  catch {
    throw problem('check-answers', 'The request could not be read.')
  }
}

function checkQuery<Q extends z.ZodType | undefined>(event: H3Event, schema: Q | undefined): Body<Q> {
  if (!schema) return undefined as Body<Q>
  const parsed = schema.safeParse(getQuery(event))
  if (!parsed.success) throw problem('check-answers', 'Some of the address needs another look.', { fields: fieldProblems(parsed.error) })
  return parsed.data as Body<Q>
}

async function answering<T>(event: H3Event, act: () => Promise<T>): Promise<T> {
  setResponseHeader(event, 'cache-control', 'no-store')
  try {
    return await act()
  }
  catch (error) {
    if (error instanceof ProblemError) throw createError({ statusCode: PROBLEM_STATUS[error.problem.code], statusMessage: error.problem.code, message: error.problem.message, data: error.problem })
    if (isDatabaseAway(error)) throw createError({ statusCode: 503, statusMessage: 'try-later', message: 'Try again in a moment.', data: { code: 'try-later', message: 'The server cannot reach its records just now. What you entered is still here: try again in a moment.' } })
    throw error
  }
}
