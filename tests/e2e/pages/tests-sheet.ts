import type { Page } from '@playwright/test'
import { expect } from '@playwright/test'
import { testSpec, type TestKey } from '#shared/job/tests.data'

/** Picks, for each use, the first instrument that is in calibration. */
export async function pickInstruments(page: Page): Promise<void> {
  const panel = page.getByRole('group').filter({ has: page.locator('input[type=radio]') }).and(page.locator('section:has(> * :text("Instruments")) fieldset'))
  for (const use of await panel.all()) await use.locator('label:has(input:not([disabled]))').first().click()
}

/** Keys figures on the pad and presses Correct, in meter order. */
export async function takeReadings(page: Page, readings: readonly (readonly [TestKey, string])[]): Promise<void> {
  for (const [test, shown] of readings) {
    const row = page.locator(`[id="reading.${test}"]`)
    if (testSpec(test).answer === 'seen') {
      await row.getByRole('button', { name: /^Correct/ }).click()
    }
    else {
      await row.getByRole('button', { name: /^(Key|Test again)/ }).click()
      const pad = page.getByRole('dialog')
      await pad.getByRole('group', { name: /^Reading in/ }).focus()
      for (const key of shown) await page.keyboard.press(key)
      await page.keyboard.press('Enter')
      await expect(pad.getByText(new RegExp(`Kept:`)).first()).toBeVisible()
      await pad.getByRole('button', { name: 'Close' }).click()
      await expect(pad).toHaveCount(0)
    }
    await expect(row.getByText('Within limit').first()).toBeVisible()
  }
}
