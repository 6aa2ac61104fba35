import { setResponseHeader } from 'h3'
import { endSession } from '#server/services/session'

export default defineFirmHandler({}, async ({ event, ctx }) => {
  const secret = await sessionSecret(event)
  if (secret) await endSession(ctx, secret)
  await clearUserSession(event)
  setResponseHeader(event, 'clear-site-data', '"cache"')
  return { done: true }
})
