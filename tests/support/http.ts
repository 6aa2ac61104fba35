/** Asks the served build as a browser's page would, with the cookie carried by hand. */
import { inject } from 'vitest'

export interface Reply {
  status: number
  text: string
  headers: Headers
  /** The body as JSON. */
  json: <T = Record<string, unknown>>() => T
}

/** Somebody with a session, or nobody. */
export interface Caller { name: string, cookie: string | null }
export const nobody: Caller = { name: 'anonymous', cookie: null }

export interface Asked {
  /** Sent as JSON. */
  body?: unknown
  /** Sent as it is, instead of `body`. */
  raw?: string | Uint8Array
  /** Added to, or put in place of, what a page of ours would send; undefined takes one away. */
  headers?: Record<string, string | undefined>
  base?: string
}

export const base = () => inject('server').TEST_BASE_URL
export const secondBase = () => inject('server').TEST_SECOND_URL

/** `route` is method and path: `GET /api/jobs`. Redirects are answers, not followed. */
export async function ask(caller: Caller, route: string, { body, raw, headers = {}, base: at = base() }: Asked = {}): Promise<Reply> {
  const [method = 'GET', path = '/'] = route.split(' ')
  const isRead = method === 'GET' || method === 'HEAD'
  const all: Record<string, string | undefined> = { accept: 'application/json', ...(!isRead && { 'origin': new URL(at).origin, 'content-type': 'application/json' }), ...(caller.cookie && { cookie: caller.cookie }), ...headers }
  const sent = Object.entries(all).filter((entry): entry is [string, string] => entry[1] !== undefined)
  const answer = await fetch(`${at}${path}`, { method, headers: sent, redirect: 'manual', body: isRead ? undefined : raw as BodyInit ?? JSON.stringify(body ?? {}) })
  const text = await answer.text()
  return { status: answer.status, text, headers: answer.headers, json: <T>() => JSON.parse(text) as T }
}

/** The cookies of an answer as a request carries them. */
export const cookiesOf = (reply: Reply) => reply.headers.getSetCookie().map(line => line.split(';')[0]).join('; ')

export async function signIn(email: string, password: string, name = email): Promise<Caller> {
  const reply = await ask(nobody, 'POST /api/auth/sign-in', { body: { email, password } })
  if (reply.status !== 200) throw new Error(`${email} could not sign in: ${reply.status} ${reply.text}`)
  return { name, cookie: cookiesOf(reply) }
}
