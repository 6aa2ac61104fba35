/** `/api/**` is closed unless its path stands here; what is open checks its own token, signature or nothing private. */
import { createError, defineEventHandler } from 'h3'

const OPEN = ['/api/health', '/api/auth/sign-in', '/api/auth/forgotten', '/api/auth/new-password', '/api/me', '/api/stripe/webhook']
const OPEN_BELOW = ['/api/customer/', '/api/check/']
/** Routes that the session module brings along: a session ends at our own sign-out, and who is signed in is said by `/api/me`. */
const SHUT_BELOW = '/api/_auth/'

export default defineEventHandler(async (event) => {
  const path = event.path.split('?')[0]!
  if (path.startsWith(SHUT_BELOW)) throw createError({ statusCode: 404, statusMessage: 'not-found', data: { code: 'not-found', message: 'There is nothing at this address.' } })
  if (!path.startsWith('/api/') || OPEN.includes(path) || OPEN_BELOW.some(start => path.startsWith(start))) return
  if (!await signedIn(event)) throw createError({ statusCode: 401, statusMessage: 'not-signed-in', data: { code: 'not-signed-in', message: 'Sign in to go on. What you entered stays on this page.' } })
})
