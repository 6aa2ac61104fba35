/** Reads the sealed cookie once per value: unsealing is the dearest part of a request. */
import { createHash } from 'node:crypto'
import { getCookie, type H3Event } from 'h3'
import { findSessionContext } from '../services/session'
import type { FirmContext } from '../services/firm-context'

const MOST = 5_000
const HOLD_MS = 60_000
const unsealed = new Map<string, { secret: string, until: number }>()

/** The secret in the request's cookie, or null. Only ids are sealed in it. */
export async function sessionSecret(event: H3Event): Promise<string | null> {
  // Without the event: with it the whole configuration is read from the environment anew for every request.
  const name = useRuntimeConfig().session.name as string
  const cookie = getCookie(event, name)
  if (!cookie) return null
  const key = createHash('sha256').update(cookie).digest('base64')
  const known = unsealed.get(key)
  if (known && known.until > Date.now()) return known.secret
  const session = await getUserSession(event)
  const secret = session.secure?.sid
  if (!secret) return null
  if (unsealed.size >= MOST) unsealed.clear()
  unsealed.set(key, { secret, until: Date.now() + HOLD_MS })
  return secret
}

/** Who is signed in, or null. Asked once per request. */
export async function signedIn(event: H3Event): Promise<FirmContext | null> {
  if (event.context.firm === undefined) {
    const secret = await sessionSecret(event)
    event.context.firm = secret ? await findSessionContext(secret) : null
  }
  return event.context.firm as FirmContext | null
}
