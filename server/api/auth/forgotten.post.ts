import { forgottenForm } from '#shared/schemas/sign-in'
import { sendPasswordReset } from '#server/services/people/tokens'
import { config } from '#server/utils/config'

export default defineOpenHandler({ body: forgottenForm }, async ({ body }) => {
  await sendPasswordReset(body.email, config().baseUrl)
  return { done: true }
})
