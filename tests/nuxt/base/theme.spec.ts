import './signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { expect, it, vi } from 'vitest'
import BaseThemeButton from '~/components/base/BaseThemeButton.vue'

/** The button, brought round to Light. */
async function mountLight() {
  const button = await mountSuspended(BaseThemeButton)
  while (!button.text().includes('Now Light')) await button.get('button').trigger('click')
  return button
}

it('shows three words and which is in force', async () => {
  const button = await mountLight()
  expect(button.text()).toMatch(/Light.*Sun.*Dark.*Now Light/)
})

it('goes round with each press and remembers the choice in a cookie', async () => {
  const button = await mountLight()
  const seen: (string | undefined)[] = []
  for (let press = 0; press < 3; press++) {
    await button.get('button').trigger('click')
    seen.push(/Now (\w+)/.exec(button.text())?.[1])
  }
  expect(seen).toEqual(['Sun', 'Dark', 'Light'])
  await vi.waitFor(() => expect(document.cookie).toContain('theme=light'))
})
