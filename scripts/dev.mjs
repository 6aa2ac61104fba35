// `npm run dev`: as `npm start`, but one process that rebuilds as files change and does web and worker both.
import { adopt, isStopping, startChild, stopAll, stopOnSignals, sweepLeftovers } from './lib/children.mjs'
import { personalEnv } from './lib/env.mjs'
import { checkNode, ensurePackages } from './lib/packages.mjs'
import { inData, inRoot } from './lib/paths.mjs'
import { listDemoSignIns, runScript, seed, startDatabase, withPersonal } from './lib/prepare.mjs'
import { say, sayFailure, step } from './lib/say.mjs'
import { appEnv, chooseFakes, portsFromEnv, startFakes, withoutOwner } from './lib/serve.mjs'

async function dev() {
  checkNode()
  const personal = { COPPERPLATE_SEED: 'demo', ...personalEnv() }
  const fakes = chooseFakes(personal)
  await sweepLeftovers()
  const { host, ports } = await portsFromEnv(personal, fakes)
  await step('packages', () => ensurePackages({ onStart: adopt }))
  const database = await startDatabase(personal)
  const base = withPersonal(database.values, personal)
  const env = { ...appEnv({ base, host, ports, fakes, filesDir: inData('files') }), NODE_ENV: 'development', COPPERPLATE_ROLE: 'both' }
  await step('migrations', () => runScript('migrate.mjs', env))
  await step('invented firm', () => seed(env))
  await step('stand-ins', () => startFakes({ env, ports, fakes, label: 'dev' }))
  if (fakes.mail) say(`Messages it sends are at http://127.0.0.1:${ports.mailPage}`)
  for (const { who, email, password } of await listDemoSignIns()) say(`  ${who.padEnd(28)} ${email.padEnd(34)} ${password}`)
  const nuxt = startChild({ name: 'dev-nuxt', args: [inRoot('node_modules/nuxt/bin/nuxt.mjs'), 'dev', '--port', String(ports.web), '--host', host], env: withoutOwner(env), show: true })
  throw new Error(await nuxt.died)
}

stopOnSignals(() => say('\nStopping …'))
dev().catch(async (error) => {
  // Once a stop was asked for, what ends is no failure.
  if (isStopping()) return
  sayFailure(error)
  process.exitCode = 1
  await stopAll()
  process.exit()
})
