import { getRequestHeader } from 'h3'
import { signInForm } from '#shared/schemas/sign-in'
import { signIn } from '#server/services/people/sign-in'

export default defineOpenHandler({ body: signInForm }, async ({ event, body }) => {
  const sid = await signIn({ ...body, address: event.node.req.socket.remoteAddress ?? '', userAgent: getRequestHeader(event, 'user-agent') ?? '' }, passwordHashing)
  await replaceUserSession(event, { secure: { sid } })
  return { done: true }
})
