/**
 * One real job all the way, as four people and the customer: enquiry, survey, supply, circuit, quote, payment, installation,
 * dead and live tests, signatures, countersignature, pack by e-mail, customer's page, check page, notice.
 * The house, the figures and the people are invented.
 */
import { execFileSync } from 'node:child_process'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { expect, test, type Browser, type Page } from '@playwright/test'
import sharp from 'sharp'
import { SHOTS } from '#shared/job/shots.data'
import { testSpec } from '#shared/job/tests.data'
import { circuitCalculation } from '#shared/electrical/circuit'
import { runCalculation } from '#shared/utils/calculation'
import { londonDay } from '#shared/utils/dates'
import { jobRecord, READINGS } from '../support/build/job-record'
import { fillField, fillRow, open, whenSent } from './pages/fields'
import { attachmentOf, letterTo, linkIn } from './pages/mail'
import { signIn } from './pages/sign-in'
import { pickInstruments, takeReadings } from './pages/tests-sheet'

test.describe.configure({ mode: 'serial', timeout: 150_000 })

const CUSTOMER = { name: 'Ada Fernsby', email: `ada.fernsby.${Date.now()}@homes.example`, telephone: '01632 960 417', address: '27 Lantern Row', town: 'Quillham', postcode: 'UX4 9ZT' }
const sample = jobRecord()
const content = (part: keyof typeof sample.parts, key: string) => sample.parts[part].find(row => row.key === key)!.content as Record<string, string | number>
const day = londonDay(Date.now())

let jobId = ''
const people: Record<string, Page> = {}

async function as(browser: Browser, role: 'Office' | 'Installer' | 'Supervisor'): Promise<Page> {
  if (!people[role]) {
    people[role] = await (await browser.newContext({ viewport: role === 'Installer' ? { width: 1180, height: 820 } : { width: 1280, height: 800 } })).newPage()
    await signIn(people[role], role)
  }
  return people[role]
}

const go = (page: Page, part: string) => open(page, `/jobs/${jobId}/${part}`)

async function takeMustShots(page: Page, part: string): Promise<void> {
  const picture = await sharp({ create: { width: 900, height: 700, channels: 3, background: '#8a8f86' } }).withExif({ IFD0: { Copyright: 'walk' } }).jpeg().toBuffer()
  for (const shot of SHOTS.filter(each => each.page === part && each.isMust)) {
    const input = page.getByLabel(`Picture: ${shot.label}`, { exact: true })
    if (!await input.count()) continue
    await input.setInputFiles({ name: 'picture.jpg', mimeType: 'image/jpeg', buffer: picture })
    await expect(page.getByRole('button', { name: `Retake: ${shot.label}` })).toBeVisible()
  }
}

test('the office takes the enquiry in one line and books the survey', async ({ browser }) => {
  const page = await as(browser, 'Office')
  await open(page, '/jobs/new')
  await page.getByLabel('What the customer says').fill(`${CUSTOMER.name}, ${CUSTOMER.address}, ${CUSTOMER.town} ${CUSTOMER.postcode}, ${CUSTOMER.telephone}, ${CUSTOMER.email}, wants 7.4 kW, parks on the drive`)
  await expect(page.locator('#intake-postcode')).toHaveValue(CUSTOMER.postcode)
  for (const [field, value] of Object.entries(CUSTOMER)) {
    const input = page.locator(`#intake-${field}`)
    if (await input.count() && await input.inputValue() !== value) await input.fill(value)
  }
  await page.getByRole('button', { name: 'Make the job' }).click()
  await expect(page.getByRole('heading', { name: /is made/ })).toBeVisible()
  await page.getByRole('link', { name: /open job/i }).click()
  await page.waitForURL(/\/jobs\/[0-9a-f-]{36}\//)
  jobId = /jobs\/([0-9a-f-]{36})/.exec(page.url())![1]!
  await book(page, 'survey')
})

async function book(page: Page, kind: 'survey' | 'install'): Promise<void> {
  await go(page, 'visits')
  await page.locator(`label:has(input[value="${kind}"])`).click()
  await page.getByRole('button', { name: 'Tomorrow' }).click()
  await page.locator('label', { hasText: /^Crew A/ }).click()
  await page.getByRole('button', { name: /^Book / }).click()
  await expect(page.getByText('Crew A').first()).toBeVisible()
  await expect(page.getByRole('button', { name: 'Mark done' }).first()).toBeVisible()
}

test('the installer surveys supply, board and point, with photographs', async ({ browser }) => {
  const page = await as(browser, 'Installer')
  const survey = content('survey', 'survey')
  await go(page, 'supply')
  const supply = ['earthing', 'earthing_how', 'earthing_evidence', 'supply_phases', 'cutout_A', 'cutout_A_how', 'cutout_standard', 'service_ok', 'looped', 'asbestos', 'unmetered', 'nominal_V', 'frequency_Hz', 'tails_mm2']
  await fillRow(page, 'survey.survey', Object.fromEntries(supply.map(field => [field, survey[field]])))
  await page.getByRole('checkbox', { name: 'None' }).check()
  await page.getByRole('button', { name: '+ Other fixed appliance' }).click()
  await page.locator('[id^="appliance."][id$=".I_A"]').fill('20')
  await page.locator('[id^="appliance."][id$=".I_A"]').blur()
  await takeMustShots(page, 'supply')
  await whenSent(page)

  await go(page, 'board')
  const board = ['board_name', 'board_location', 'board_conditional_kA', 'main_switch_location', 'main_switch_standard', 'main_switch_poles', 'main_switch_A', 'main_switch_V', 'main_switch_rcd', 'upstream_rcd', 'spd', 'spd_type', 'earthing_conductor_material', 'earthing_conductor_mm2', 'earthing_conductor_verified', 'bonding_material', 'bonding_mm2', 'bonding_verified', 'bond_water', 'bond_gas', 'bond_oil', 'bond_steel', 'bond_lightning', 'bond_other', 'existing_comments']
  await fillRow(page, 'survey.survey', Object.fromEntries(board.map(field => [field, survey[field]])))
  const designed = content('circuit', 'designed')
  const device = ['number', 'description', 'points', 'device', 'device_standard', 'In_A', 'device_kA', 'energyClass', 'rcd_where', 'rcd_standard', 'rcd_type', 'rcd_IdeltaN_mA', 'rcd_A', 'dc_where']
  await fillRow(page, 'circuit.designed', Object.fromEntries(device.map(field => [field, designed[field]])))
  await whenSent(page)

  await go(page, 'point')
  await fillRow(page, 'survey.survey', { position: 'Garage wall', outdoors: 'yes', other_earths: 'no', private_parking: 'yes' })
  await page.getByRole('button', { name: 'Finish the survey' }).click()
  await whenSent(page)
})

test('the circuit is designed: every size compared, and the page says what the engine says', async ({ browser }) => {
  const page = await as(browser, 'Installer')
  await go(page, 'cable')
  const designed = content('circuit', 'designed')
  await fillRow(page, 'circuit.designed', Object.fromEntries(['cable', 'phases', 'Ib_A', 'terminals_C', 'S_mm2', 'cpc_mm2'].map(field => [field, designed[field]])))
  await page.getByRole('button', { name: 'Add a leg' }).click()
  for (const [field, value] of [['method', 'C'], ['L_m', 18], ['ambient_C', 30], ['name', 'Along the wall']] as const) {
    const address = await page.locator(`[id^="leg."][id$=".${field}"]`).getAttribute('id')
    await fillField(page, address!, value)
  }
  await whenSent(page)
  const answer = runCalculation(circuitCalculation, { Ib_A: 32, device: 'B', In_A: 40, phases: 1, cable: 'swa-90', terminals_C: 70, legs: [{ method: 'C', L_m: 18, ambient_C: 30 }], Ze_ohm: 0.35, cpc_mm2: 6 }) as { result: { S_mm2: number } }
  await expect(page.getByText(`${answer.result.S_mm2}\u2009mm² is the smallest that is within`)).toBeVisible()
})

test('the office sends the quote; the customer accepts and pays the deposit', async ({ browser }) => {
  const page = await as(browser, 'Office')
  await go(page, 'enquiry')
  await fillRow(page, 'wanted.wanted', { rating_kW: 7.36, phases: '1', outlet: 'socket', device_standard: 'yes', export_A: 0 })
  await whenSent(page)
  await go(page, 'quote')
  for (const line of await page.getByLabel(/^Line \d+, quantity$/).all()) if (!await line.inputValue()) await line.fill('1')
  for (const price of await page.getByLabel(/price each before VAT/).all()) if (!await price.inputValue()) await price.fill('100')
  await page.getByRole('button', { name: /^Send/ }).first().click()
  await expect(page.getByText(/is on its way/)).toBeVisible()

  const letter = await letterTo(CUSTOMER.email, /quote/i)
  const customer = await (await browser.newContext({ viewport: { width: 390, height: 844 } })).newPage()
  await open(customer, linkIn(letter))
  await customer.getByRole('checkbox', { name: /I have read the terms/ }).check()
  await customer.getByLabel('Your full name').fill(CUSTOMER.name)
  await customer.getByRole('button', { name: /Accept/ }).click()
  await customer.getByRole('button', { name: /^Pay £/ }).click()
  await expect(customer.getByText(/deposit has been received|has been received/i).first()).toBeVisible({ timeout: 30_000 })
  await letterTo(CUSTOMER.email, /deposit/i)
  await page.reload()
  await expect(page.getByText(/Received £/)).toBeVisible()
})

test('the installation is booked, recorded and tested dead', async ({ browser }) => {
  await book(await as(browser, 'Office'), 'install')
  const page = await as(browser, 'Installer')
  await go(page, 'supply')
  await pickInstruments(page)
  await takeReadings(page, READINGS.filter(([key]) => testSpec(key).page === 'supply'))
  await go(page, 'point')
  await fillRow(page, 'earthing.earthing', content('earthing', 'earthing'))
  await fillRow(page, 'equipment.charger', content('equipment', 'charger'))
  await fillRow(page, 'loadLimit.limit', { state: 'none' })
  await takeMustShots(page, 'point')
  await go(page, 'board')
  await takeMustShots(page, 'board')
  await go(page, 'cable')
  await fillRow(page, 'circuit.installed', { L_m: 18, S_mm2: 6, cpc_mm2: 6 })
  await takeMustShots(page, 'cable')
  await whenSent(page)
  await go(page, 'dead')
  await pickInstruments(page)
  await takeReadings(page, READINGS.filter(([key]) => testSpec(key).page === 'dead'))
  await whenSent(page)
})

test('live tests stay locked until what kills when left off is back on', async ({ browser }) => {
  const page = await as(browser, 'Installer')
  await go(page, 'live')
  await expect(page.getByText(/Locked/).first()).toBeVisible()
  for (const box of await page.locator('input[type=checkbox][id^="putBack."]').all()) await box.check()
  await expect(page.getByText(/^Locked/)).toHaveCount(0)
  await pickInstruments(page)
  await takeReadings(page, READINGS.filter(([key]) => testSpec(key).page === 'live'))
  await takeMustShots(page, 'live')
  await whenSent(page)
})

test('the installer answers what is left and signs in all three capacities', async ({ browser }) => {
  const page = await as(browser, 'Installer')
  await go(page, 'leave')
  await fillRow(page, 'statement.statement', { ...content('statement', 'statement'), completed_on: day })
  for (const row of sample.parts.inspection) {
    await page.locator(`input[name="inspection-${row.key}"][value="${String(row.content.outcome)}"]`).check({ force: true })
    if (row.content.reason) await fillField(page, `inspection.${row.key}.reason`, String(row.content.reason))
  }
  for (const box of await page.locator('input[type=checkbox][id^="putBack."]').all()) await box.check()
  await takeMustShots(page, 'leave')
  await whenSent(page)
  await expect(page.getByText(/Stops you finishing\s*0/)).toBeVisible()
  for (const word of [/Design/, /Construct/, /Inspect/]) await page.getByRole('group', { name: 'Sign as' }).getByRole('checkbox', { name: word }).check()
  await page.getByRole('checkbox', { name: /I have read each statement/ }).check()
  await page.getByLabel('Your name as it shall be printed').fill('Tomasz Wilk')
  await page.getByRole('button', { name: /^Sign as/ }).click()
  await expect(page.getByText('Signed, and ready to check')).toBeVisible()
})

test('the supervisor opens what is odd, countersigns, and the certificate is sealed', async ({ browser }) => {
  const page = await as(browser, 'Supervisor')
  await open(page, '/countersign')
  await page.getByRole('link', { name: new RegExp(CUSTOMER.address) }).first().click()
  await page.waitForURL(/pairs/)
  await expect(page.getByRole('button', { name: /^Open it/ }).first()).toBeVisible()
  for (let at = 0; at < 40; at++) {
    const next = page.getByRole('button', { name: /^(Open it|Accept)\b/ }).first()
    if (!await next.isVisible().catch(() => false)) break
    await next.click()
  }
  await page.locator('#countersign-declared').check()
  await page.getByLabel('Your name as it shall be printed').fill('Rhiannon Pryce')
  await page.getByRole('button', { name: 'Countersign', exact: true }).click()
  await expect(page.getByText('Countersigned').first()).toBeVisible({ timeout: 20_000 })
  await go(page, 'leave')
  await expect(page.getByRole('heading', { name: 'Certificate' })).toBeVisible()
  await expect(page.getByText('In force', { exact: true })).toBeVisible()
})

test('the pack goes by e-mail, opens for the customer, and proves itself', async ({ browser }) => {
  const page = await as(browser, 'Office')
  await go(page, 'leave')
  await page.getByRole('button', { name: 'Send the pack' }).click()
  const letter = await letterTo(CUSTOMER.email, /certificate/i, 120)
  const bytes = await attachmentOf(letter, 0)
  const file = join(mkdtempSync(join(tmpdir(), 'pack-')), 'pack.pdf')
  writeFileSync(file, bytes)
  const text = execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' })
  for (const [key, shown] of READINGS) if (testSpec(key).answer === 'figure') expect(text, `${key} on paper`).toContain(shown.replace('>', ''))
  for (const sign of ['Ω', '≤', '≥', 'mm²']) expect(text).toContain(sign)
  // The design's figures on paper are the engine's own.
  const { result } = runCalculation(circuitCalculation, { Ib_A: 32, device: 'B', In_A: 40, phases: 1, cable: 'swa-90', terminals_C: 70, legs: [{ method: 'C', L_m: 18, ambient_C: 30 }], Ze_ohm: 0.21, cpc_mm2: 6, S_mm2: 6 }) as { result: { sizes: { percent: number, Zs_ohm: number }[] } }
  for (const figure of [result.sizes[0]!.percent, result.sizes[0]!.Zs_ohm]) expect(text).toContain(figure.toPrecision(4))
  expect(text).toContain(CUSTOMER.address)
  expect(text).not.toContain(CUSTOMER.telephone)

  const customer = await (await browser.newContext({ viewport: { width: 390, height: 844 } })).newPage()
  await open(customer, linkIn(letter))
  await customer.getByLabel('Postcode').fill(CUSTOMER.postcode.toLowerCase())
  await customer.getByRole('button', { name: 'Open the pack' }).click()
  await expect(customer.getByRole('heading', { name: 'Prove it' })).toBeVisible()
  await expect(customer.getByText(/0\.33/).first()).toBeVisible()

  await open(customer, '/check')
  await customer.locator('#check-file').setInputFiles({ name: 'pack.pdf', mimeType: 'application/pdf', buffer: bytes })
  await expect(customer.getByText('Genuine and current')).toBeVisible()
  const changed = Buffer.from(bytes)
  changed[changed.length - 20]! ^= 1
  await customer.locator('#check-file').setInputFiles({ name: 'changed.pdf', mimeType: 'application/pdf', buffer: changed })
  await expect(customer.getByText('Not ours')).toBeVisible()

  await page.reload()
  await expect(page.getByText('Handed over').first()).toBeVisible()
})

test('the network operator\'s notice has its route, its day and its sheet, and is marked as sent', async ({ browser }) => {
  const page = await as(browser, 'Office')
  await go(page, 'notices')
  await expect(page.getByText(/DNO-02/).first()).toBeVisible()
  const sheet = page.getByRole('link', { name: /data sheet/i })
  await expect(sheet).toBeVisible()
  const paper = await page.request.get((await sheet.getAttribute('href'))!)
  expect(paper.headers()['content-type']).toBe('application/pdf')
  await page.getByRole('button', { name: 'Mark as sent' }).first().click()
  const card = page.getByRole('article').first()
  await card.locator('label:has(input[type=radio])').first().click()
  await card.getByLabel(/reference/i).fill('REF-417')
  await card.getByRole('button', { name: /sent/i }).first().click()
  await expect(page.getByText('REF-417')).toBeVisible()
})
