// Brings the database up to date as its owner. Safe to run twice and from two places at once.
import { existsSync, readFileSync } from 'node:fs'
import { drizzle } from 'drizzle-orm/node-postgres'
import { migrate } from 'drizzle-orm/node-postgres/migrator'
import pg from 'pg'
import { profileFile, readEnvFile } from './lib/env.mjs'
import { inRoot } from './lib/paths.mjs'
import { migrateQueue } from './lib/queue-schema.mjs'
import { Mendable, say, sayFailure } from './lib/say.mjs'

/** One number for this project, so that two migrations wait for each other. */
const LOCK = 726_573_401

const folder = inRoot('drizzle')
const journal = inRoot('drizzle/meta/_journal.json')

async function countApplied(client) {
  const { rows: [place] } = await client.query('select to_regclass(\'drizzle.__drizzle_migrations\') as name')
  if (!place.name) return 0
  const { rows: [{ count }] } = await client.query('select count(*)::int as count from drizzle.__drizzle_migrations')
  return count
}

async function applyAll(client, pool) {
  // A migration that cannot get its lock gives up instead of queueing every reader behind it.
  await client.query('set lock_timeout = \'10s\'')
  const before = await countApplied(client)
  const written = existsSync(journal) ? JSON.parse(readFileSync(journal, 'utf8')).entries.length : 0
  if (written > 0) await migrate(drizzle(client), { migrationsFolder: folder })
  await migrateQueue(pool, client)
  const applied = await countApplied(client) - before
  return `${applied === 0 ? 'no migration was waiting' : `${applied} applied`}, ${written} in all`
}

async function run() {
  const url = process.env.DATABASE_URL_OWNER ?? readEnvFile(profileFile('start')).DATABASE_URL_OWNER
  if (!url) throw new Mendable('DATABASE_URL_OWNER is not set', 'run `node scripts/db-up.mjs` first, or set it')
  const pool = new pg.Pool({ connectionString: url, max: 2, application_name: 'copperplate migrate' })
  // Both handlers: the queue's library insists, and a connection that dies must not end the process unread.
  pool.on('error', () => {})
  pool.on('connect', connection => connection.on('error', () => {}))
  try {
    const client = await pool.connect()
    try {
      await client.query('select pg_advisory_lock($1)', [LOCK])
      const outcome = await applyAll(client, pool)
      say(`Database ${new URL(url).pathname.slice(1)} is up to date: ${outcome}.`)
    }
    finally {
      client.release(true)
    }
  }
  catch (error) {
    const because = error.cause ?? error
    throw new Mendable(`The database could not be brought up to date: ${because.message}`, 'mend the migration or the address in DATABASE_URL_OWNER; nothing of the failed migration stays', because.code ? '' : error.stack)
  }
  finally {
    await pool.end()
  }
}

run().catch((error) => {
  sayFailure(error)
  process.exitCode = 1
})
