import { mountSuspended } from '@nuxt/test-utils/runtime'
import { expect, it } from 'vitest'
import '../base/signed-in'
import PeopleSignInForm from '~/components/people/PeopleSignInForm.vue'

it('awake, the button sends the form', async () => {
  const form = await mountSuspended(PeopleSignInForm)
  expect(form.get('button').attributes('type')).toBe('submit')
  expect(form.get('form').attributes('method')).toBe('post')
})
