import * as z from 'zod'

export const signInForm = z.strictObject({
  email: z.email('Enter your e-mail address, like name@example.org').max(254),
  password: z.string().min(1, 'Enter your password').max(256, 'A password has at most 256 characters'),
})

/** Length is what counts; no rules about which characters. */
export const newPassword = z.string().min(12, 'Use at least 12 characters').max(256, 'Use at most 256 characters')

export const forgottenForm = z.strictObject({ email: z.email('Enter your e-mail address, like name@example.org').max(254) })
export const newPasswordForm = z.strictObject({ token: z.string().min(20).max(100), purpose: z.enum(['invitation', 'password-reset']), password: newPassword })
