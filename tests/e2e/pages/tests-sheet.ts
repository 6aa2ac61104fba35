import type { Page } from '@playwright/test'
import { expect } from '@playwright/test'
import { testSpec, type TestKey } from '#shared/job/tests.data'

/** Picks, for each use, the first instrument that is in calibration. */
export async function pickInstruments(page: Page): Promise<void> {
  const unchosen = page.locator('section:has(> * :text("Instruments")) fieldset:not(:has(input:checked))')
  // The panel folds by itself once each use has its instrument.
  for (let left = await unchosen.count(); left > 0; left = await unchosen.count()) await unchosen.first().locator('label:has(input:not([disabled]))').first().click()
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
      await expect(row.getByText('Within limit').first()).toBeVisible()
      // The pad goes on to the next reading by itself, and closes after the last.
      await page.keyboard.press('Escape')
      await expect(pad).toHaveCount(0)
    }
    await expect(row.getByText('Within limit').first()).toBeVisible()
  }
}
