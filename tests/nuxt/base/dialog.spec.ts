import './signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, expect, it } from 'vitest'
import { nextTick } from 'vue'
import BaseDialog from '~/components/base/BaseDialog.vue'

let dialog: Awaited<ReturnType<typeof mountSuspended>> | undefined
const shown = () => document.querySelector('[role="dialog"]')
afterEach(() => {
  dialog?.unmount()
  dialog = undefined
})

it('is not there until it is opened, then carries its name and its question', async () => {
  dialog = await mountSuspended(BaseDialog, { props: { title: 'Move the visit?', description: 'The customer has the old time.' }, slots: { default: () => 'Tell them now?' } })
  expect(shown()).toBeNull()
  await dialog.setProps({ open: true })
  await nextTick()
  const sheet = shown()!
  expect(document.getElementById(sheet.getAttribute('aria-labelledby')!)!.textContent).toBe('Move the visit?')
  expect(document.getElementById(sheet.getAttribute('aria-describedby')!)!.textContent).toBe('The customer has the old time.')
  expect(sheet.textContent).toContain('Tell them now?')
})

it('tells the page when it is closed', async () => {
  dialog = await mountSuspended(BaseDialog, { props: { title: 'Move the visit?', open: true } })
  await nextTick()
  const close = [...shown()!.querySelectorAll('button')].find(button => button.textContent?.trim() === 'Close')!
  close.click()
  await nextTick()
  expect(dialog.emitted('update:open')).toEqual([[false]])
})
