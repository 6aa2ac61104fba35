import { randomUUID } from 'node:crypto'
import { setTimeout as pause } from 'node:timers/promises'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { ask, base, cookiesOf, nobody, secondBase, type Caller, type Reply } from '../support/http'
import { asOwner, forgetFailedSignIns } from '../support/served-database'
import { makeServedFirm, type ServedFirm } from '../support/served-firm'

let firm: ServedFirm
const atBoth = () => [base(), secondBase()]
const statuses = async (caller: Caller, route = 'GET /api/jobs') => Promise.all(atBoth().map(async at => (await ask(caller, route, { base: at })).status))

beforeAll(async () => {
  firm = await makeServedFirm()
})
afterAll(forgetFailedSignIns)

describe('a session that has ended', () => {
  let caller: Caller
  beforeEach(async () => {
    caller = await firm.signIn('guest')
    expect(await statuses(caller)).toEqual([200, 200])
  })

  /** What a process remembers of a session is at most a second old. */
  const aSecondLater = async () => {
    await pause(1_000)
    return statuses(caller)
  }

  it('by signing out is refused by the other process as well, and its old cookie opens nothing', async () => {
    const reply = await ask(caller, 'POST /api/auth/sign-out')
    expect([reply.status, reply.headers.get('clear-site-data')]).toEqual([200, '"cache"'])
    // The process that ended it knows at once.
    expect((await ask(caller, 'GET /api/jobs')).status).toBe(401)
    expect(await aSecondLater()).toEqual([401, 401])
    expect((await ask(caller, 'GET /api/me')).status).toBe(204)
    // Ended once, it stays so: nothing may wake it.
    expect((await ask(caller, 'POST /api/auth/sign-out')).status).toBe(401)
  })

  it('because it was revoked in the database is refused by both', async () => {
    await asOwner(firm.id, client => client.query('update sign_in_session set revoked_at = now() where person_id = $1', [firm.people.guest]))
    expect(await aSecondLater()).toEqual([401, 401])
  })

  it('because its hours are over is refused by both', async () => {
    await asOwner(firm.id, client => client.query('update sign_in_session set expires_at = now() where person_id = $1', [firm.people.guest]))
    expect(await aSecondLater()).toEqual([401, 401])
  })

  it('because the person got other roles is refused by both', async () => {
    const principal = await firm.signIn('principal')
    expect((await ask(principal, `PATCH /api/people/${firm.people.guest}`, { body: { mutationId: randomUUID(), roles: ['office', 'installer'] } })).status).toBe(200)
    expect(await aSecondLater()).toEqual([401, 401])
  })

  it('because the person was switched off is refused by both, and they cannot sign in again until switched on', async () => {
    const principal = await firm.signIn('principal')
    const setActive = (active: boolean) => ask(principal, `PATCH /api/people/${firm.people.guest}`, { body: { mutationId: randomUUID(), active }, base: secondBase() })
    expect((await setActive(false)).status).toBe(200)
    expect(await aSecondLater()).toEqual([401, 401])
    await expect(firm.signIn('guest')).rejects.toThrow('422')
    await setActive(true)
    expect(await statuses(await firm.signIn('guest'))).toEqual([200, 200])
  })
})

describe('a session', () => {
  it('travels in the cookie alone: the same seal in a header opens nothing', async () => {
    const { cookie } = await firm.signIn('office')
    const [name, seal] = cookie!.split(/=(.*)/)
    for (const header of [`x-${name}-session`, 'x-nuxt-session-session', 'x-session', 'authorization']) {
      expect([header, (await ask(nobody, 'GET /api/jobs', { headers: { [header]: header === 'authorization' ? `Bearer ${seal}` : seal } })).status]).toEqual([header, 401])
    }
  })

  it('is new at every sign-in, out of reach of scripts and of other sites', async () => {
    const before = await firm.signIn('office')
    const reply = await ask(before, 'POST /api/auth/sign-in', { body: { email: firm.emailOf('office'), password: 'a password for tests only' } })
    expect(cookiesOf(reply)).not.toBe(before.cookie)
    expect(reply.headers.getSetCookie().join()).toMatch(/^__Host-copperplate=[^;]+; .*HttpOnly.*Secure.*SameSite=Lax/i)
    expect(reply.text).not.toMatch(/sid|Fe26/)
  })

  it.each(['Fe26.2**', 'x', '', `Fe26.2*1*${'a'.repeat(400)}`])('is not opened by "%s" for a cookie', async (seal) => {
    expect((await ask({ name: 'forger', cookie: `__Host-copperplate=${seal}` }, 'GET /api/jobs')).status).toBe(401)
  })
})

describe('signing in', () => {
  beforeEach(forgetFailedSignIns)

  const tryTo = (email: string, password: string, at = base()) => ask(nobody, 'POST /api/auth/sign-in', { body: { email, password }, base: at })
  /** An answer repeats the address it was asked at; the two processes differ in that alone. */
  const seen = ({ status, text }: Reply) => ({ status, text: text.replace(secondBase(), base()) })

  it('answers a wrong password and an unknown account alike, to the byte', async () => {
    const [known, unknown] = [await tryTo(firm.emailOf('office'), 'wrong'), await tryTo(`nobody@${firm.id}.example`, 'wrong')]
    expect(seen(known)).toEqual(seen(unknown))
    expect(known.status).toBe(422)
    expect(known.headers.getSetCookie()).toEqual([])
  })

  it('closes after ten failures for known and unknown alike, in every process, even for the right password', async () => {
    const ends: ReturnType<typeof seen>[] = []
    for (const email of [firm.emailOf('guest'), `nobody@${firm.id}.example`]) {
      const tries = []
      for (let count = 0; count < 10; count++) tries.push(await tryTo(email, `wrong ${count}`, atBoth()[count % 2]))
      expect(tries.map(reply => reply.status)).toEqual(Array.from({ length: 10 }, () => 422))
      ends.push(...(await Promise.all(atBoth().map(at => tryTo(email, 'a password for tests only', at)))).map(seen))
    }
    expect(ends.map(end => end.status)).toEqual([429, 429, 429, 429])
    expect(JSON.parse(ends[0]!.text).data).toEqual({ code: 'too-many', message: 'Too many tries with a wrong password. Wait 15 minutes, or set a new password by e-mail.' })
    expect(new Set(ends.map(end => end.text)).size).toBe(1)
  }, 120_000)

  it('forgets earlier slips once it succeeds', async () => {
    for (let count = 0; count < 9; count++) await tryTo(firm.emailOf('supervisor'), 'wrong')
    await firm.signIn('supervisor')
    expect((await tryTo(firm.emailOf('supervisor'), 'wrong')).status).toBe(422)
    await expect(firm.signIn('supervisor')).resolves.toMatchObject({ name: 'supervisor' })
  })

  it('asks for a new password with one answer for everybody', async () => {
    const answers = await Promise.all([firm.emailOf('office'), `nobody@${firm.id}.example`].map(email => ask(nobody, 'POST /api/auth/forgotten', { body: { email } })))
    expect(answers.map(seen)).toEqual([{ status: 200, text: answers[0]!.text }, { status: 200, text: answers[0]!.text }])
  })
})
