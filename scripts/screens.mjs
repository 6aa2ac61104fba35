// Takes the pictures of the README and the help pages from the running demo (`npm start` in another terminal) into public/help/.
import { mkdirSync } from 'node:fs'
import { chromium } from '@playwright/test'
import { demoSignIns } from './demo-sign-ins.mjs'
import { inRoot } from './lib/paths.mjs'
import { say } from './lib/say.mjs'

const base = process.env.SCREENS_URL ?? `http://127.0.0.1:${process.env.PORT ?? 3000}`
const mail = process.env.SCREENS_MAIL_URL ?? `http://127.0.0.1:${process.env.MAIL_PAGE_PORT ?? 3026}`
const folder = inRoot('public/help')
const TABLET = { width: 1180, height: 820 }
const PHONE = { width: 390, height: 844 }

const browser = await chromium.launch({ executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium', args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking', '--disable-component-update', '--disable-sync'] })

async function signedIn(role, viewport = TABLET) {
  const page = await (await browser.newContext({ viewport, locale: 'en-GB', reducedMotion: 'reduce' })).newPage()
  const { email, password } = demoSignIns.find(each => each.who.startsWith(role))
  await page.goto(`${base}/sign-in`)
  await page.waitForFunction(() => window.useNuxtApp?.().isHydrating === false)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.getByRole('heading', { level: 1, name: 'Today' }).waitFor()
  return page
}

async function take(page, name, path) {
  if (path) await page.goto(base + path, { waitUntil: 'networkidle' })
  await page.screenshot({ path: `${folder}/${name}.png` })
  say(`  ${name}.png`)
}

async function firstJob(page, stage) {
  const { lines } = await page.request.get(`${base}/api/jobs?stage=${stage}`).then(answer => answer.json())
  return lines[0]?.id
}

mkdirSync(folder, { recursive: true })
const office = await signedIn('Office', { width: 1280, height: 800 })
await take(office, 'today', '/')
await take(office, 'jobs', '/jobs')
await take(office, 'diary', '/diary')
const surveyed = await firstJob(office, 'surveyed')
await take(office, 'quote', `/jobs/${surveyed}/quote`)
await take(office, 'notices', '/notices')

const installer = await signedIn('Installer')
const onSite = await firstJob(installer, 'on-site')
for (const part of ['supply', 'cable', 'dead', 'live', 'leave']) await take(installer, part, `/jobs/${onSite}/${part}`)

const supervisor = await signedIn('Supervisor')
await take(supervisor, 'pairs', `/jobs/${await firstJob(supervisor, 'ready-to-check')}/pairs`)

const letters = await fetch(`${mail}/messages`).then(answer => answer.json()).catch(() => [])
const handedOver = []
const { lines } = await office.request.get(`${base}/api/jobs?stage=handed-over`).then(answer => answer.json())
for (const { id } of lines) handedOver.push(await office.request.get(`${base}/api/jobs/${id}/record`).then(answer => answer.json()))
const pack = letters.find(letter => /certificate/i.test(letter.subject) && handedOver.some(({ customer }) => letter.to.includes(customer.email)))
if (pack) {
  const { text } = await fetch(`${mail}/messages/${pack.id}`).then(answer => answer.json())
  const { premises } = handedOver.find(({ customer }) => pack.to.includes(customer.email))
  const customer = await (await browser.newContext({ viewport: PHONE, locale: 'en-GB' })).newPage()
  await customer.goto(/https?:\/\/\S+\/c\/pack\/\S+/.exec(text)[0], { waitUntil: 'networkidle' })
  await customer.getByLabel('Postcode').fill(premises.postcode)
  await customer.getByRole('button', { name: 'Open the pack' }).click()
  await customer.getByRole('heading', { name: 'Prove it' }).waitFor()
  await take(customer, 'pack')
}
else say('  No pack has been e-mailed yet: pack.png is left as it is.')
await browser.close()
