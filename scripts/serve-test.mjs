// Serves the build for tests and keeps running: `npx vitest --project api` and Playwright then find it by themselves.
import { ensureBuild } from './lib/build.mjs'
import { adopt, isStopping, stopAll, stopOnSignals, sweepLeftovers } from './lib/children.mjs'
import { alone } from './lib/lock.mjs'
import { checkNode, ensurePackages } from './lib/packages.mjs'
import { say, sayFailure, step } from './lib/say.mjs'
import { serveForTests } from './lib/serve-tests.mjs'
import { DATABASES, freshTestDatabases, migrateTest } from './lib/test-databases.mjs'

async function serveUntilStopped() {
  checkNode()
  await sweepLeftovers()
  await step('packages', () => ensurePackages({ onStart: adopt }))
  let addresses
  await step('database', async () => {
    const fresh = await freshTestDatabases([DATABASES.test])
    addresses = fresh.addresses[DATABASES.test]
    return fresh.words
  })
  await step('migrations', () => migrateTest(addresses))
  await step('build', () => ensureBuild({ onStart: adopt }))
  let served
  await step('serve', async () => {
    served = await serveForTests(addresses)
  })
  for (const [name, value] of Object.entries(served)) say(`${name}=${value}`)
  say('\nCtrl-C stops it.')
  await new Promise(() => {})
}

stopOnSignals(() => say('\nStopping …'))
alone('test-run', serveUntilStopped, { patienceMs: 0 }).catch(async (error) => {
  if (isStopping()) return
  sayFailure(error)
  process.exitCode = 1
  await stopAll()
  process.exit()
})
