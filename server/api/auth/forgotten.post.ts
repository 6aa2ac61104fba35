import { forgottenForm } from '#shared/schemas/sign-in'
import { sendPasswordReset } from '#server/services/people/tokens'

export default defineOpenHandler({ body: forgottenForm }, async ({ body }) => {
  await sendPasswordReset(body.email)
  return { done: true }
})
