import { newPasswordForm } from '#shared/schemas/sign-in'
import { setPassword } from '#server/services/people/tokens'

export default defineOpenHandler({ body: newPasswordForm }, async ({ body }) => {
  await setPassword(body, passwordHashing)
  return { done: true }
})
