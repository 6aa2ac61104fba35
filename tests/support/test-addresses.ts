import { existsSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

const inData = (name: string) => fileURLToPath(new URL(`../../.data/${name}`, import.meta.url))

/** Where the served build and its stand-ins are, as `scripts/serve-test.mjs` writes them. */
export interface TestServer {
  /** First web process. */
  TEST_BASE_URL: string
  /** Second web process on the same database: nothing may depend on there being one. */
  TEST_SECOND_URL: string
  /** Stand-in mail server's page and data: GET /messages, POST /behaviour. */
  TEST_MAIL_URL: string
  /** Stand-in for card payments: GET /sessions, POST /sessions/:id/pay, POST /events/:id/replay. */
  TEST_STRIPE_URL: string
  /** The served database under its three roles. */
  TEST_DATABASE_URL: string
  TEST_DATABASE_URL_WORKER: string
  TEST_DATABASE_URL_OWNER: string
}

const NAMES: Array<keyof TestServer> = ['TEST_BASE_URL', 'TEST_SECOND_URL', 'TEST_MAIL_URL', 'TEST_STRIPE_URL', 'TEST_DATABASE_URL', 'TEST_DATABASE_URL_WORKER', 'TEST_DATABASE_URL_OWNER']

function pick(source: Record<string, string | undefined>): TestServer | null {
  const found = Object.fromEntries(NAMES.map(name => [name, source[name]]))
  return NAMES.every(name => found[name]) ? found as unknown as TestServer : null
}

/** The served build's addresses: from the environment, else from a running `scripts/serve-test.mjs`; null when there is neither. */
export function findTestServer(): TestServer | null {
  const fromEnvironment = pick(process.env)
  if (fromEnvironment) return fromEnvironment
  const path = inData('test-server.json')
  return existsSync(path) ? pick(JSON.parse(readFileSync(path, 'utf8'))) : null
}

/** Addresses of the database for `tests/db` under its three roles: from the environment, else this checkout's own. */
export function findTestDatabase(): { app: string, worker: string, owner: string } | null {
  const { TEST_DATABASE_URL: app, TEST_DATABASE_URL_WORKER: worker, TEST_DATABASE_URL_OWNER: owner } = process.env
  if (app && worker && owner) return { app, worker, owner }
  const path = inData('test.env')
  if (!existsSync(path)) return null
  const lines = readFileSync(path, 'utf8').split('\n')
  const at = (name: string) => lines.find(line => line.startsWith(`${name}=`))?.slice(name.length + 1).replace(/\/copperplate_test$/, '/copperplate_test_db')
  const held = { app: at('DATABASE_URL'), worker: at('DATABASE_URL_WORKER'), owner: at('DATABASE_URL_OWNER') }
  return held.app && held.worker && held.owner ? { app: held.app, worker: held.worker, owner: held.owner } : null
}
