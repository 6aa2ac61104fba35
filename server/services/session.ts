/** The server's record of sign-ins. A cookie names a session; whether it still holds is asked here, at most a second late. */
import { createHash, randomBytes } from 'node:crypto'
import { and, eq, sql } from 'drizzle-orm'
import type { FirmSettings, Role } from '../../shared/types/firm'
import { changeAsFirm, lookUp } from '../db/firm-db'
import { recordEvent } from '../db/queries/events'
import { signInSession } from '../db/schema/firm'
import { firmContext, type FirmContext } from './firm-context'

const CACHE_MS = 900
const MOST_CACHED = 5_000
const HOURS = 12

interface SessionRow { firm_id: string, person_id: string, name: string, email: string, roles: Role[], crew_id: string | null, firm_name: string, settings: FirmSettings, last_seen_at: Date }
interface Cached { context: FirmContext | null, until: number }

const cache = new Map<string, Cached>()

/** The id the database knows a session by: the cookie's secret never stands in a row. */
export const sessionRowId = (secret: string) => createHash('sha256').update(secret).digest('hex')

/** The person and firm of a session, or null where it does not hold (revoked, expired, person switched off). */
export async function findSessionContext(secret: string, now = Date.now()): Promise<FirmContext | null> {
  const id = sessionRowId(secret)
  const cached = cache.get(id)
  if (cached && cached.until > now) return cached.context
  const [row] = await lookUp<SessionRow & Record<string, unknown>>('find-session', 'select * from find_session($1)', [id])
  const context = row ? toContext(row) : null
  if (cache.size >= MOST_CACHED) cache.clear()
  cache.set(id, { context, until: now + CACHE_MS })
  return context
}

function toContext(row: SessionRow): FirmContext {
  return firmContext(row.firm_id, { id: row.person_id, name: row.name, email: row.email, roles: row.roles, firmId: row.firm_id, firmName: row.firm_name, selfCountersign: row.settings.selfCountersign, crewId: row.crew_id })
}

/** Starts a session and gives the secret for the cookie. */
export async function startSession(firmId: string, personId: string, userAgent: string): Promise<string> {
  const secret = randomBytes(32).toString('base64url')
  await changeAsFirm(firmId, async (tx) => {
    await tx.insert(signInSession).values({ firmId, id: sessionRowId(secret), personId, userAgent: userAgent.slice(0, 300), expiresAt: sql`now() + make_interval(hours => ${HOURS})` as never })
    await recordEvent(tx, { type: 'signed-in', personId })
  })
  return secret
}

export async function endSession(ctx: FirmContext, secret: string): Promise<void> {
  await changeAsFirm(ctx.firmId, async (tx) => {
    await tx.update(signInSession).set({ revokedAt: sql`now()` }).where(and(eq(signInSession.firmId, ctx.firmId), eq(signInSession.id, sessionRowId(secret))))
    await recordEvent(tx, { type: 'signed-out', personId: ctx.person.id })
  })
  cache.delete(sessionRowId(secret))
}
