import { existsSync, rmSync } from 'node:fs'
import { setTimeout as pause } from 'node:timers/promises'
import pg from 'pg'
import { adopt, whenStopped } from '../../lib/children.mjs'
import { ensureBuild } from '../../lib/build.mjs'
import { freshOnNamedServer, leaveCluster, namedServer, useOwnCluster } from '../../lib/database-up.mjs'
import { ensureProfileEnv } from '../../lib/env.mjs'
import { inData, root } from '../../lib/paths.mjs'
import { runScript } from '../../lib/prepare.mjs'
import { Mendable } from '../../lib/say.mjs'
import { appEnv, freePorts, startFakes, startWeb, startWorker, waitForAll } from '../../lib/serve.mjs'
import { hashOf, isStamped, stamp } from '../../lib/stamps.mjs'
import { cleanEnv } from '../../lib/test-databases.mjs'
import { DEMO_DOMAIN, DEMO_PASSWORD } from '../../demo-sign-ins.mjs'
import { FIRMS, loadFirms } from './load-data.mjs'
import { note } from './note.mjs'
import { signIn } from './requests.mjs'

const DATABASE = 'copperplate_bench'
const stampFile = () => inData('bench/loaded')

/** What the data is made from: when any of it changes, it is made anew. */
const dataHash = ({ million }) => `${hashOf(root, ['drizzle', 'scripts/seed', 'scripts/seed.mjs', 'scripts/bench/lib/load-data.mjs'])}${million ? ' million' : ''}`

async function databaseAddresses(fresh) {
  const named = namedServer(process.env)
  if (named) return freshOnNamedServer(named, [DATABASE])[DATABASE]
  whenStopped(leaveCluster)
  return (await useOwnCluster({ databases: [DATABASE], fresh })).addresses[DATABASE]
}

async function openOwner(addresses) {
  const owner = new pg.Client({ connectionString: addresses.DATABASE_URL_OWNER, application_name: 'copperplate bench' })
  owner.on('error', error => note(`database: ${error.message}`))
  await owner.connect()
  whenStopped(() => owner.end().catch(() => {}))
  return owner
}

/** The database with its data: kept from the last run where nothing it is made from has changed. */
async function prepareDatabase(wishes) {
  const hash = dataHash(wishes)
  const isKept = !wishes.fresh && !namedServer(process.env) && isStamped(stampFile(), hash)
  if (existsSync(stampFile()) && !isKept) rmSync(stampFile())
  const addresses = await databaseAddresses(!isKept)
  const owner = await openOwner(addresses)
  const { rows: [{ there }] } = await owner.query('select to_regclass(\'firm\') is not null as there')
  if (isKept && there) return { addresses, owner, isLoaded: true, keep: () => {} }
  await runScript('migrate.mjs', { ...cleanEnv(), ...addresses })
  return { addresses, owner, isLoaded: false, keep: () => stamp(stampFile(), hash) }
}

async function loadAll(owner, env, { million }) {
  note('loading: the invented firm, then firms of 100 and 100,000 jobs')
  await runScript('seed.mjs', env)
  await loadFirms(owner, [FIRMS.small, FIRMS.large, ...(million ? [FIRMS.million] : [])])
}

/** The worker's backlog from the seed would be measured with everything else. */
async function untilQuiet(owner) {
  for (let tries = 0; tries < 240; tries++) {
    const { rows } = await owner.query('select count(*)::int as left from graphile_worker._private_jobs where attempts < max_attempts')
    if (rows[0].left === 0) return
    await pause(500)
  }
  throw new Mendable('The worker did not come to the end of its papers', `its log is ${inData('log/bench-worker.log')}`)
}

async function serve(wishes) {
  note('build')
  await ensureBuild({ onStart: adopt })
  const { addresses, owner, isLoaded, keep } = await prepareDatabase(wishes)
  const { host, ports } = await freePorts()
  const fakes = { mail: true, stripe: true }
  const base = { ...cleanEnv(), ...ensureProfileEnv('bench'), ...addresses, COPPERPLATE_SEED: 'demo' }
  const parts = { env: appEnv({ base, host, ports, fakes, filesDir: inData('bench/files') }), ports, fakes, label: 'bench' }
  if (!isLoaded) await loadAll(owner, parts.env, wishes)
  keep()
  await startFakes(parts)
  await waitForAll([startWorker(parts), startWeb(parts)])
  await untilQuiet(owner)
  const baseUrl = parts.env.COPPERPLATE_BASE_URL
  const demo = { id: (await owner.query('select firm_id from find_sign_in($1)', [`office@${DEMO_DOMAIN}`])).rows[0].firm_id, email: `office@${DEMO_DOMAIN}`, password: DEMO_PASSWORD }
  return { baseUrl, addresses, owner, parts, firms: { ...FIRMS, demo }, signIn: firm => signIn(baseUrl, firm) }
}

/** What figures are measured on, started when the first of them asks for it. */
export function benchWorld(wishes) {
  let served
  return { served: () => served ??= serve(wishes) }
}
