/** `/api/**` is closed unless its path stands here; what is open checks its own token, signature or nothing private. */
import { createError, defineEventHandler } from 'h3'

const OPEN = ['/api/health', '/api/auth/sign-in', '/api/auth/forgotten', '/api/auth/new-password', '/api/me', '/api/stripe/webhook']
const OPEN_BELOW = ['/api/customer/', '/api/check/']

export default defineEventHandler(async (event) => {
  const path = event.path.split('?')[0]!
  if (!path.startsWith('/api/') || OPEN.includes(path) || OPEN_BELOW.some(start => path.startsWith(start))) return
  if (!await signedIn(event)) throw createError({ statusCode: 401, statusMessage: 'not-signed-in', data: { code: 'not-signed-in', message: 'Sign in to go on. What you entered stays on this page.' } })
})
