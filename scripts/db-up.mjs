// Starts this checkout's own PostgreSQL and leaves it running; `--stop` stops it. Prints the addresses.
import { DATABASES, stopOwnCluster, useOwnCluster } from './lib/database-up.mjs'
import { ensureProfileEnv } from './lib/env.mjs'
import { say, sayFailure } from './lib/say.mjs'

async function up() {
  if (process.argv.includes('--stop')) return say(stopOwnCluster() ? 'The database server has stopped.' : 'The database server was not running.')
  const { addresses } = await useOwnCluster({ databases: Object.values(DATABASES), keep: true })
  ensureProfileEnv('start', addresses[DATABASES.start])
  ensureProfileEnv('test', addresses[DATABASES.test])
  for (const [name, url] of Object.entries(addresses[DATABASES.start])) say(`${name}=${url}`)
}

up().catch((error) => {
  sayFailure(error)
  process.exitCode = 1
})
