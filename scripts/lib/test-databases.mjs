import { whenStopped } from './children.mjs'
import { DATABASES, freshOnNamedServer, leaveCluster, namedServer, useOwnCluster } from './database-up.mjs'
import { ensureProfileEnv, profileFile, readEnvFile } from './env.mjs'
import { runScript } from './prepare.mjs'

/** Variables that a person may have set for `npm start` and that must not reach a test. */
const NOT_FOR_TESTS = /^(DATABASE_URL|SMTP_|STRIPE_|MAIL_|COPPERPLATE_|NUXT_|NITRO_|TEST_|HOST$|PORT$|WORKER_HEALTH_PORT$)/

/** The environment without anybody's personal settings. */
export function cleanEnv(env = process.env) {
  return Object.fromEntries(Object.entries(env).filter(([name]) => !NOT_FOR_TESTS.test(name)))
}

/**
 * Test databases made afresh: on the server that the environment names, or on our own.
 * Answers addresses by database, and words for the progress line.
 */
export async function freshTestDatabases(databases) {
  const named = namedServer(process.env)
  if (named) return { addresses: freshOnNamedServer(named, databases), words: 'fresh, on the server that DATABASE_URL_OWNER names' }
  whenStopped(leaveCluster)
  const { cluster, addresses } = await useOwnCluster({ databases, fresh: true })
  return { addresses, words: `fresh, on 127.0.0.1:${cluster.port}` }
}

/** Secrets of the test profile with one database's addresses. */
export function testValues(addresses) {
  // A server that the environment names is not written down: the next run may use another.
  return namedServer(process.env) ? { ...ensureProfileEnv('test', readEnvFile(profileFile('test'))), ...addresses } : ensureProfileEnv('test', addresses)
}

/** Brings one test database up to date. */
export const migrateTest = addresses => runScript('migrate.mjs', { ...cleanEnv(), ...addresses })

/** Addresses under the names that tests read. */
export const asTestNames = addresses => ({ TEST_DATABASE_URL: addresses.DATABASE_URL, TEST_DATABASE_URL_WORKER: addresses.DATABASE_URL_WORKER, TEST_DATABASE_URL_OWNER: addresses.DATABASE_URL_OWNER })

export { DATABASES }
