// `npm test`: checks everything on databases of its own and closes with one line of sums.
// --no-browser leaves the browser out; --only=unit,db runs those stages alone.
import { installPackages } from './lib/apt.mjs'
import { ensureBuild } from './lib/build.mjs'
import { adopt, isStopping, stopAll, stopOnSignals, sweepLeftovers } from './lib/children.mjs'
import { counted, countWords, sumOf } from './lib/counts.mjs'
import { alone } from './lib/lock.mjs'
import { checkNode, ensurePackages } from './lib/packages.mjs'
import { isThere } from './lib/run.mjs'
import { Mendable, say, sayFailure, sayStep, step } from './lib/say.mjs'
import { serveForTests } from './lib/serve-tests.mjs'
import { runCheck, runPlaywright, runVitest } from './lib/stages.mjs'
import { asTestNames, cleanEnv, DATABASES, freshTestDatabases, migrateTest } from './lib/test-databases.mjs'

const STAGES = ['types', 'lint', 'unit', 'db', 'nuxt', 'build', 'api', 'e2e']

/** Programs of the machine that some stages need, with the Debian package of each. */
const PROGRAMS = [
  { program: 'chromium', name: 'chromium', stages: ['e2e'] },
  { program: 'pdftotext', name: 'poppler-utils', stages: ['unit', 'db', 'api', 'e2e'] },
  { program: 'qpdf', name: 'qpdf', stages: ['unit', 'db', 'api', 'e2e'] },
]

function readWishes(args) {
  const only = args.find(arg => arg.startsWith('--only='))?.slice('--only='.length).split(',')
  const unknown = only?.filter(name => !STAGES.includes(name)) ?? []
  if (unknown.length > 0) throw new Mendable(`There is no stage ${unknown.join(', ')}`, `choose from ${STAGES.join(', ')}`)
  const wished = only ?? STAGES
  return new Set(args.includes('--no-browser') ? wished.filter(name => name !== 'e2e') : wished)
}

async function ensurePrograms(stages) {
  const missing = PROGRAMS.filter(({ program, stages: of }) => of.some(name => stages.has(name)) && !isThere(program)).map(({ name }) => name)
  if (missing.length === 0) return 'all here'
  await installPackages(`The tests need ${missing.join(', ')}, which this machine lacks`, missing)
  return `installed ${missing.join(', ')}`
}

const results = []

/** Runs one stage, prints its line, shows its output when something failed, and goes on. */
async function stage(name, work) {
  const began = performance.now()
  const result = await work().catch(error => ({ ...counted(0, 1), output: error instanceof Mendable ? `${error.detail}\n${error.message}` : error.stack }))
  results.push(result)
  if (isStopping()) return result
  sayStep(name, result.words ?? countWords(result), performance.now() - began)
  if (result.failed > 0) say(`\n${result.output.trimEnd()}\n`)
  return result
}

async function setUp(stages) {
  say('Testing Copperplate')
  await step('packages', () => ensurePackages({ onStart: adopt }))
  await step('programs', () => ensurePrograms(stages))
  const wanted = [stages.has('db') && DATABASES.testDb, (stages.has('api') || stages.has('e2e')) && DATABASES.test].filter(Boolean)
  if (wanted.length === 0) return {}
  let addresses
  await step('database', async () => {
    const fresh = await freshTestDatabases(wanted)
    addresses = fresh.addresses
    return fresh.words
  })
  for (const name of wanted) await step('migrations', () => migrateTest(addresses[name]))
  return addresses
}

/** Stages against one served build. Whatever keeps it from standing fails each of them once. */
async function testServed(stages, addresses, env) {
  const needsServer = stages.has('api') || stages.has('e2e')
  if (!needsServer && !stages.has('build')) return
  const build = await stage('build', async () => ({ ...counted(1, 0), words: await ensureBuild({ onStart: adopt }) }))
  if (!needsServer) return
  let served
  if (build.failed === 0) {
    const serve = await stage('serve', async () => {
      served = await serveForTests(addresses[DATABASES.test])
      return { ...counted(0, 0), words: 'worker, two web processes, stand-ins' }
    })
    if (serve.failed > 0) served = undefined
  }
  const orNotRun = work => () => served ? work({ ...env, ...served }) : Promise.resolve({ ...counted(0, 1), output: 'Not run: nothing to run it against.' })
  if (stages.has('api')) await stage('api', orNotRun(given => runVitest('api', ['tests/api', 'tests/security', 'tests/reliability'], given)))
  if (stages.has('e2e')) await stage('e2e', orNotRun(runPlaywright))
}

async function testAll() {
  checkNode()
  const stages = readWishes(process.argv.slice(2))
  await sweepLeftovers()
  const addresses = await setUp(stages)
  const env = { ...cleanEnv(), NUXT_TELEMETRY_DISABLED: '1', CI: process.env.CI ?? '1', NO_COLOR: '1' }
  if (stages.has('types')) await stage('types', () => runCheck('types', 'nuxt/bin/nuxt.mjs', ['typecheck'], env))
  if (stages.has('lint')) await stage('lint', () => runCheck('lint', 'eslint/bin/eslint.js', ['.'], env))
  if (stages.has('unit')) await stage('unit', () => runVitest('unit', ['tests/unit'], env))
  if (stages.has('db')) await stage('db', () => runVitest('db', ['tests/db'], { ...env, ...asTestNames(addresses[DATABASES.testDb]) }))
  if (stages.has('nuxt')) await stage('nuxt', () => runVitest('nuxt', ['tests/nuxt'], env))
  await testServed(stages, addresses, env)
  const sum = sumOf(results)
  if (sum.skipped > 0) say(`\n${sum.skipped} skipped`)
  return sum
}

stopOnSignals(() => say('\nStopping …'))
alone('test-run', testAll, { patienceMs: 0 }).then(async (sum) => {
  if (isStopping()) return
  await stopAll()
  // Last of all, so that nothing can be printed below it.
  say(`\n${sum.passed} passed, ${sum.failed} failed`)
  process.exit(sum.failed > 0 ? 1 : 0)
}, async (error) => {
  if (isStopping()) return
  sayFailure(error)
  await stopAll()
  say(`\n0 passed, 1 failed`)
  process.exit(1)
})
