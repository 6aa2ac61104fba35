import { existsSync, mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { startCluster, stopCluster } from './cluster.mjs'
import { addressesFor, ensureDatabase, ensureRoles, freshDatabaseOn, withDatabase } from './databases.mjs'
import { alone, isAlive } from './lock.mjs'
import { inData } from './paths.mjs'
import { findPrograms } from './postgres-programs.mjs'
import { Mendable } from './say.mjs'

/** Each profile's databases: `start` is kept, the others are made afresh by every test run. */
export const DATABASES = { start: 'copperplate', test: 'copperplate_test', testDb: 'copperplate_test_db' }

const NAMES = ['DATABASE_URL', 'DATABASE_URL_WORKER', 'DATABASE_URL_OWNER']

/** Addresses of a server that the environment names instead of our own cluster, or null. */
export function namedServer(env) {
  const given = NAMES.filter(name => env[name])
  if (given.length === 0) return null
  const missing = NAMES.filter(name => !env[name])
  if (missing.length > 0) throw new Mendable(`${given.join(' and ')} is set but not ${missing.join(' and ')}`, 'set all three to use a server of your own, or none to let this script run one')
  return Object.fromEntries(NAMES.map(name => [name, env[name]]))
}

const usersFolder = () => {
  const folder = inData('database-users', '.')
  mkdirSync(folder, { recursive: true })
  return folder
}
const keepFile = () => join(usersFolder(), 'keep')

function otherUsers() {
  return readdirSync(usersFolder()).map(Number).filter(pid => pid && pid !== process.pid && isAlive(pid))
}

/** Leaves the cluster; the last one out stops it, unless `db-up.mjs` was told to keep it running. */
export function leaveCluster() {
  rmSync(join(usersFolder(), String(process.pid)), { force: true })
  if (existsSync(keepFile()) || otherUsers().length > 0) return false
  return stopCluster()
}

/**
 * Starts the own cluster and makes the named databases ready.
 * @param {{ databases: string[], fresh?: boolean, keep?: boolean }} wish
 * @returns {Promise<{ cluster: object, addresses: Record<string, Record<string, string>> }>} by database name
 */
export function useOwnCluster({ databases, fresh = false, keep = false }) {
  return alone('cluster', async () => {
    writeFileSync(join(usersFolder(), String(process.pid)), '')
    if (keep) writeFileSync(keepFile(), '')
    const cluster = await startCluster()
    ensureRoles(cluster)
    for (const database of databases) ensureDatabase(cluster, database, { fresh })
    return { cluster, addresses: Object.fromEntries(databases.map(name => [name, addressesFor(cluster, name)])) }
  })
}

/** Stops the cluster whoever uses it. */
export function stopOwnCluster() {
  rmSync(usersFolder(), { recursive: true, force: true })
  return stopCluster()
}

/** Fresh databases on a named server; the database in its address is never touched. */
export function freshOnNamedServer(named, databases) {
  const programs = findPrograms()
  const psql = programs ? join(programs, 'psql') : 'psql'
  for (const database of databases) freshDatabaseOn({ psql, ownerUrl: named.DATABASE_URL_OWNER, database })
  return Object.fromEntries(databases.map(database => [database, Object.fromEntries(NAMES.map(name => [name, withDatabase(named[name], database)]))]))
}
