// `npm start`: from a clean checkout to a running Copperplate. Ctrl-C stops all that it started.
import { adopt, isStopping, stopAll, stopOnSignals, sweepLeftovers } from './lib/children.mjs'
import { personalEnv } from './lib/env.mjs'
import { ensureBuild } from './lib/build.mjs'
import { checkNode, ensurePackages } from './lib/packages.mjs'
import { inData } from './lib/paths.mjs'
import { listDemoSignIns, runScript, seed, startDatabase, withPersonal } from './lib/prepare.mjs'
import { say, sayFailure, step } from './lib/say.mjs'
import { appEnv, chooseFakes, portsFromEnv, startFakes, startWeb, startWorker, waitForAll } from './lib/serve.mjs'

async function sayWhere({ env, ports, fakes }) {
  say(`\nCopperplate is at ${env.COPPERPLATE_BASE_URL}`)
  if (fakes.mail) say(`Messages it sends are at http://127.0.0.1:${ports.mailPage}`)
  if (fakes.stripe) say(`Card payments go to a stand-in at http://127.0.0.1:${ports.stripe}`)
  const people = env.COPPERPLATE_SEED === 'demo' ? await listDemoSignIns() : []
  if (people.length > 0) say('\nInvented people to sign in as:')
  for (const { who, email, password } of people) say(`  ${who.padEnd(28)} ${email.padEnd(34)} ${password}`)
  say('\nCtrl-C stops it.')
}

async function start() {
  checkNode()
  const personal = { COPPERPLATE_SEED: 'demo', ...personalEnv() }
  const fakes = chooseFakes(personal)
  await sweepLeftovers()
  const { host, ports } = await portsFromEnv(personal, fakes)
  say('Starting Copperplate')
  await step('packages', () => ensurePackages({ onStart: adopt }))
  let values
  await step('database', async () => {
    const database = await startDatabase(personal)
    values = withPersonal(database.values, personal)
    return database.words
  })
  const env = appEnv({ base: values, host, ports, fakes, filesDir: inData('files') })
  await step('migrations', () => runScript('migrate.mjs', env))
  await step('invented firm', () => seed(env))
  await step('build', () => ensureBuild({ onStart: adopt }))
  const parts = { env, ports, fakes, label: 'start' }
  await step('stand-ins', () => startFakes(parts))
  const running = [startWorker(parts), startWeb(parts)]
  await step('worker and web', () => waitForAll(running))
  await sayWhere(parts)
  const sentence = await Promise.race(running.map(({ child }) => child.died))
  throw new Error(sentence)
}

stopOnSignals(() => say('\nStopping …'))
start().catch(async (error) => {
  // Once a stop was asked for, what ends is no failure.
  if (isStopping()) return
  sayFailure(error)
  process.exitCode = 1
  await stopAll()
  process.exit()
})
