import type { Page } from '@playwright/test'
import { expect } from '@playwright/test'
import { demoSignIns } from '../../support/demo-sign-ins'
import { open } from './fields'

/** Signs in as one of the demo's roles and lands on Today. */
export async function signIn(page: Page, role: 'Office' | 'Installer' | 'Supervisor' | 'Principal'): Promise<void> {
  const who = demoSignIns.find(each => each.who.startsWith(role))!
  await open(page, '/sign-in')
  await page.getByLabel('E-mail address').fill(who.email)
  await page.getByLabel('Password', { exact: true }).fill(who.password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Today' })).toBeVisible({ timeout: 20_000 })
}
