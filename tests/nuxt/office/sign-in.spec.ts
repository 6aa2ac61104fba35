import '../base/signed-in'
import { mountSuspended, registerEndpoint } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import { createError, readBody } from 'h3'
import { describe, expect, it } from 'vitest'
import PeopleSignInForm from '~/components/people/PeopleSignInForm.vue'

const refused = { code: 'check-answers', message: 'They do not fit together.', fields: { password: 'E-mail address and password do not fit together' } }
const asked: Record<string, string>[] = []
registerEndpoint('/api/auth/sign-in', { method: 'POST', handler: async (event) => {
  const body = await readBody<Record<string, string>>(event)
  asked.push(body)
  if (body.password !== 'four unrelated words here') throw createError({ statusCode: 422, data: refused })
  return { done: true }
} })

const fill = async (password: string) => {
  const form = await mountSuspended(PeopleSignInForm)
  await form.get('#sign-in-email').setValue('rowan@example.test')
  await form.get('#sign-in-password').setValue(password)
  await form.get('form').trigger('submit')
  await flushPromises()
  return form
}
describe('signing in', () => {
  it('says what is missing beside its field and asks the server nothing', async () => {
    const form = await mountSuspended(PeopleSignInForm)
    await form.get('form').trigger('submit')
    expect(form.text()).toContain('Enter your e-mail address.')
    expect(form.text()).toContain('Enter your password.')
    expect(asked).toHaveLength(0)
  })

  it('loses nothing typed when they do not fit, and says so beside the field', async () => {
    const form = await fill('wrong')
    await expect.poll(() => form.text()).toContain('do not fit together')
    expect(form.get<HTMLInputElement>('#sign-in-email').element.value).toBe('rowan@example.test')
    expect(form.get<HTMLInputElement>('#sign-in-password').element.value).toBe('wrong')
    expect(form.get('#sign-in-password').attributes('aria-invalid')).toBe('true')
    expect(form.emitted('signedIn')).toBeUndefined()
  })

  it('tells its page when they fit', async () => {
    const form = await fill('four unrelated words here')
    await expect.poll(() => form.emitted('signedIn')?.length).toBe(1)
  })
})
