import type { Page } from '@playwright/test'
import { expect } from '@playwright/test'

type Value = string | number | readonly string[]

/** Fills a field of a job's record by its address, whatever control draws it. */
export async function fillField(page: Page, address: string, value: Value): Promise<void> {
  const control = page.locator(`[id="${address}"]`)
  const tag = await control.evaluate(element => element.tagName)
  if (tag === 'SELECT') await control.selectOption(String(value))
  else if (tag === 'INPUT' || tag === 'TEXTAREA') {
    await control.fill(String(value))
    await control.blur()
  }
  else if (/^\d{4}-\d\d-\d\d$/.test(String(value))) {
    const [year, month, day] = String(value).split('-')
    await control.getByLabel('Day').fill(day!)
    await control.getByLabel('Month').fill(month!)
    await control.getByLabel('Year').fill(year!)
    await control.getByLabel('Year').blur()
  }
  else await control.locator(`label:has(input[value="${String(value)}"])`).click()
}

/** Fills several fields of one row. */
export async function fillRow(page: Page, row: string, fields: Record<string, Value | null | undefined>): Promise<void> {
  for (const [field, value] of Object.entries(fields)) {
    if (value !== null && value !== undefined) await fillField(page, `${row}.${field}`, value)
  }
}

/** Waits until all that was entered has reached the server. */
export async function whenSent(page: Page): Promise<void> {
  await expect(page.getByText(/Sent \d\d:\d\d/).first()).toBeVisible()
  await expect(page.getByText(/not sent yet/)).toHaveCount(0)
}

/** Waits until the page answers to presses. */
export async function whenAwake(page: Page): Promise<void> {
  await page.waitForFunction(() => (window as unknown as { useNuxtApp?: () => { isHydrating: boolean } }).useNuxtApp?.().isHydrating === false)
}

export async function open(page: Page, path: string): Promise<void> {
  await page.goto(path)
  await whenAwake(page)
}
