import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres'
import pg from 'pg'
import { afterAll } from 'vitest'
import { closeDatabase } from '#server/db/pool'
import { findTestDatabase } from './test-addresses'

const addresses = findTestDatabase()
if (!addresses) throw new Error('Database tests need their database: run `node scripts/db-up.mjs --migrate` once, or `npm test`.')

// What the services read of their surroundings: this database as the web's own role, and nothing of the person's own.
Object.assign(process.env, {
  COPPERPLATE_ROLE: 'web',
  COPPERPLATE_BASE_URL: 'http://127.0.0.1:3000',
  COPPERPLATE_KEY_SECRET: Buffer.alloc(32, 7).toString('base64'),
  COPPERPLATE_FILES_DIR: join(tmpdir(), 'copperplate-db-tests'),
  NUXT_SESSION_PASSWORD: 'for database tests only, no cookie is made',
  DATABASE_URL: addresses.app,
})

function openPool(connectionString: string) {
  const pool = new pg.Pool({ connectionString, max: 4 })
  // A connection that dies fails its own query; it must not end the test run as well.
  pool.on('error', () => {})
  pool.on('connect', client => client.on('error', () => {}))
  return pool
}

/** Pools on the migrated test database, one for each role: `app` and `worker` are held by row security, `owner` makes tables. */
export const pools = { app: openPool(addresses.app), worker: openPool(addresses.worker), owner: openPool(addresses.owner) }

afterAll(async () => {
  await closeDatabase()
  await Promise.all(Object.values(pools).map(pool => pool.end()))
})

/** What a rolled-back test works with: the raw connection and Drizzle over the same transaction. */
export interface TestTransaction {
  client: pg.PoolClient
  db: NodePgDatabase
}

/**
 * Runs a test's work in one transaction that is always undone.
 * Code under test that opens transactions of its own must use a firm of the test's own making instead.
 */
export async function withRollback<T>(work: (transaction: TestTransaction) => Promise<T>, role: keyof typeof pools = 'app'): Promise<T> {
  const client = await pools[role].connect()
  try {
    await client.query('begin')
    return await work({ client, db: drizzle(client) })
  }
  finally {
    await client.query('rollback')
    client.release()
  }
}
