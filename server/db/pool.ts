/** The connections to PostgreSQL: made on first use, closed with the server, never the end of the process. */
import pg from 'pg'
import { config } from '../utils/config'

let pool: pg.Pool | undefined
let queuePool: pg.Pool | undefined

function makePool(connectionString: string | undefined, max: number, name: string): pg.Pool {
  const made = new pg.Pool({ connectionString, max, idleTimeoutMillis: 30_000, connectionTimeoutMillis: 4_000, statement_timeout: 15_000, application_name: `copperplate-${name}` })
  // A connection that dies with the database must not take the process along.
  made.on('error', error => console.error('A database connection was lost:', error.message))
  made.on('connect', client => client.on('error', error => console.error('A database connection was lost:', error.message)))
  return made
}

/** The connections of this process's role. */
export function databasePool(): pg.Pool {
  const { role, databaseUrl, workerDatabaseUrl } = config()
  return pool ??= makePool(role === 'worker' ? workerDatabaseUrl : databaseUrl, role === 'worker' ? 4 : 12, role)
}

/** The worker's own connections: its queue and the look-ups that only its role may make. */
export function workerPool(): pg.Pool {
  return queuePool ??= makePool(config().workerDatabaseUrl, 6, 'queue')
}

export async function closeDatabase(): Promise<void> {
  const open = [pool, queuePool]
  pool = queuePool = undefined
  await Promise.all(open.map(each => each?.end()))
}

/** Stops the start where an acknowledged commit could be lost in a crash. */
export async function assertCommitsAreKept(on: pg.Pool): Promise<void> {
  const { rows } = await on.query<{ synchronous_commit: string }>('show synchronous_commit')
  if (rows[0]?.synchronous_commit === 'off') throw new Error('PostgreSQL runs with synchronous_commit off: a crash would lose what people were told is kept. Switch it on.')
}
