import { rmSync, writeFileSync } from 'node:fs'
import { whenStopped } from './children.mjs'
import { inData } from './paths.mjs'
import { seed } from './prepare.mjs'
import { appEnv, freePorts, startFakes, startWeb, startWorker, waitForAll } from './serve.mjs'
import { asTestNames, cleanEnv, testValues } from './test-databases.mjs'

/**
 * Seeds the served test database and starts stand-ins, a worker and two web processes on free ports.
 * Needs a finished build and migrated database. Answers the addresses that tests read.
 */
export async function serveForTests(addresses) {
  const { host, ports } = await freePorts()
  const fakes = { mail: true, stripe: true }
  const filesDir = inData('test-files')
  rmSync(filesDir, { recursive: true, force: true })
  rmSync(inData('test-mail'), { recursive: true, force: true })
  // The cookie as it is in earnest: Chromium takes a secure one from this machine itself over plain http.
  const base = { ...cleanEnv(), ...testValues(addresses), COPPERPLATE_SEED: 'demo', COPPERPLATE_COOKIE_SECURE: 'true' }
  const parts = { env: appEnv({ base, host, ports, fakes, filesDir }), ports, fakes, label: 'test' }
  await seed(parts.env)
  await startFakes(parts)
  const second = `http://127.0.0.1:${ports.secondWeb}`
  await waitForAll([startWorker(parts), startWeb(parts), startWeb({ ...parts, name: 'web-2', port: ports.secondWeb, baseUrl: second })])
  const served = {
    TEST_BASE_URL: parts.env.COPPERPLATE_BASE_URL, TEST_SECOND_URL: second,
    TEST_MAIL_URL: `http://127.0.0.1:${ports.mailPage}`, TEST_STRIPE_URL: `http://127.0.0.1:${ports.stripe}`,
    TEST_WORKER_URL: `http://127.0.0.1:${ports.worker}`, TEST_STRIPE_WEBHOOK_SECRET: parts.env.STRIPE_WEBHOOK_SECRET,
    ...asTestNames(addresses),
  }
  const file = inData('test-server.json')
  writeFileSync(file, JSON.stringify(served, null, 2), { mode: 0o600 })
  whenStopped(() => rmSync(file, { force: true }))
  return served
}
