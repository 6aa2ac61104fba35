/** The connections to PostgreSQL: made on first use, closed with the server, never the end of the process. */
import pg from 'pg'
import { config } from '../utils/config'

let pool: pg.Pool | undefined

export function databasePool(): pg.Pool {
  if (!pool) {
    const { role, databaseUrl, workerDatabaseUrl } = config()
    pool = new pg.Pool({ connectionString: role === 'worker' ? workerDatabaseUrl : databaseUrl, max: role === 'worker' ? 6 : 12, idleTimeoutMillis: 30_000, connectionTimeoutMillis: 4_000, statement_timeout: 15_000, application_name: `copperplate-${role}` })
    // A connection that dies with the database must not take the process along.
    pool.on('error', error => console.error('A database connection was lost:', error.message))
    pool.on('connect', client => client.on('error', error => console.error('A database connection was lost:', error.message)))
  }
  return pool
}

export async function closeDatabase(): Promise<void> {
  const open = pool
  pool = undefined
  await open?.end()
}

/** Stops the start where an acknowledged commit could be lost in a crash. */
export async function assertCommitsAreKept(): Promise<void> {
  const { rows } = await databasePool().query<{ synchronous_commit: string }>('show synchronous_commit')
  if (rows[0]?.synchronous_commit === 'off') throw new Error('PostgreSQL runs with synchronous_commit off: a crash would lose what people were told is kept. Switch it on.')
}
