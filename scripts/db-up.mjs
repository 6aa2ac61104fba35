// Starts this checkout's own PostgreSQL, leaves it running and prints the addresses.
// --migrate brings its databases up to date; --fresh-tests makes the test databases anew, --fresh all of them;
// --stop stops the server.
import { DATABASES, stopOwnCluster, useOwnCluster } from './lib/database-up.mjs'
import { ensureProfileEnv } from './lib/env.mjs'
import { runScript } from './lib/prepare.mjs'
import { say, sayFailure } from './lib/say.mjs'

const has = flag => process.argv.includes(flag)

async function up() {
  if (has('--stop')) return say(stopOwnCluster() ? 'The database server has stopped.' : 'The database server was not running.')
  if (has('--fresh') || has('--fresh-tests')) await useOwnCluster({ databases: [DATABASES.test, DATABASES.testDb], fresh: true, keep: true })
  if (has('--fresh')) await useOwnCluster({ databases: [DATABASES.start], fresh: true, keep: true })
  const { addresses } = await useOwnCluster({ databases: Object.values(DATABASES), keep: true })
  ensureProfileEnv('start', addresses[DATABASES.start])
  ensureProfileEnv('test', addresses[DATABASES.test])
  for (const [name, url] of Object.entries(addresses[DATABASES.start])) say(`${name}=${url}`)
  if (!has('--migrate') && !has('--fresh') && !has('--fresh-tests')) return
  for (const database of Object.values(DATABASES)) say(await runScript('migrate.mjs', { ...process.env, ...addresses[database] }))
}

up().catch((error) => {
  sayFailure(error)
  process.exitCode = 1
})
