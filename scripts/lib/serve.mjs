import { mkdirSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { serverEntry } from './build.mjs'
import { startChild, waitUntilWell, whenStopped } from './children.mjs'
import { inData, inRoot } from './paths.mjs'
import { mustBeFree, nextFree, portFrom } from './ports.mjs'

/** Every port that a run listens on: what it is for, the variable that moves it, its standard number. */
export const PORTS = {
  web: { what: 'the web pages', variable: 'PORT', standard: 3000 },
  mail: { what: 'the stand-in mail server', variable: 'MAIL_PORT', standard: 3025 },
  mailPage: { what: 'the page that shows its messages', variable: 'MAIL_PAGE_PORT', standard: 3026 },
  stripe: { what: 'the stand-in for card payments', variable: 'STRIPE_FAKE_PORT', standard: 3027 },
  worker: { what: 'the worker\'s health', variable: 'WORKER_HEALTH_PORT', standard: 3028 },
}

/** Address that a browser on this machine uses for a listening host. */
const reachable = host => host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host

/** What stands in for the outside: nothing that the person set up for real. */
export function chooseFakes(env) {
  return { mail: !env.SMTP_HOST, stripe: !env.STRIPE_SECRET_KEY && !env.STRIPE_HOST }
}

/** The ports that the environment asks for, each checked to be free before any long work begins. */
export async function portsFromEnv(env, fakes) {
  const host = env.HOST || '127.0.0.1'
  const ports = {}
  for (const [key, { what, variable, standard }] of Object.entries(PORTS)) {
    ports[key] = portFrom(env, variable, standard)
    const isUsed = key === 'web' || key === 'worker' || (key === 'stripe' ? fakes.stripe : fakes.mail)
    if (isUsed) await mustBeFree(what, ports[key], variable, key === 'web' ? host : '127.0.0.1')
  }
  return { host, ports }
}

/** Ports that nobody uses, away from the standard ones, for a test run. */
export async function freePorts() {
  const ports = {}
  let from = 33_000 + (process.pid % 1_000) * 8
  for (const key of [...Object.keys(PORTS), 'secondWeb']) {
    ports[key] = await nextFree(from)
    from = ports[key] + 1
  }
  return { host: '127.0.0.1', ports }
}

/**
 * The environment of the built processes.
 * @param {{ base: object, host: string, ports: object, fakes: object, filesDir: string }} plan `base` holds secrets and addresses
 */
export function appEnv({ base, host, ports, fakes, filesDir }) {
  const address = `http://${reachable(host)}:${ports.web}`
  const env = {
    ...base,
    HOST: host, PORT: String(ports.web), WORKER_HEALTH_PORT: String(ports.worker),
    COPPERPLATE_BASE_URL: base.COPPERPLATE_BASE_URL || address,
    COPPERPLATE_FILES_DIR: base.COPPERPLATE_FILES_DIR || filesDir,
    NODE_ENV: 'production', NUXT_TELEMETRY_DISABLED: '1', NITRO_SHUTDOWN_TIMEOUT: '5000',
  }
  if (fakes.mail) Object.assign(env, { SMTP_HOST: '127.0.0.1', SMTP_PORT: String(ports.mail), SMTP_SECURE: 'false', SMTP_USER: '', SMTP_PASSWORD: '', MAIL_FROM: base.MAIL_FROM || 'Copperplate <post@copperplate.example>' })
  if (fakes.stripe) Object.assign(env, { STRIPE_HOST: '127.0.0.1', STRIPE_PORT: String(ports.stripe), STRIPE_PROTOCOL: 'http' })
  mkdirSync(env.COPPERPLATE_FILES_DIR, { recursive: true, mode: 0o700 })
  const isSecure = env.COPPERPLATE_COOKIE_SECURE || String(env.COPPERPLATE_BASE_URL.startsWith('https:'))
  // Not every browser sends a secure cookie back over plain http, and none keeps a __Host- name without it.
  if (isSecure === 'false') Object.assign(env, { NUXT_SESSION_COOKIE_SECURE: 'false', NUXT_SESSION_NAME: 'copperplate' })
  return env
}

/** Only scripts hold the owner's address: a web or worker process must never be able to pass row security. */
export function withoutOwner(env) {
  const rest = { ...env }
  for (const name of ['DATABASE_URL_OWNER', 'NITRO_HOST', 'NITRO_PORT']) delete rest[name]
  return rest
}

/** Starts the stand-ins and answers their addresses. */
export async function startFakes({ env, ports, fakes, label }) {
  const waits = []
  const start = (name, script, more, pagePort) => {
    const child = startChild({ name: `${label}-${name}`, args: [inRoot('scripts/fakes', script)], env: { ...env, ...more } })
    waits.push(waitUntilWell(child, `http://127.0.0.1:${pagePort}/health`))
  }
  if (fakes.mail) start('mail', 'smtp.mjs', { MAIL_PORT: String(ports.mail), MAIL_PAGE_PORT: String(ports.mailPage), MAIL_DIR: inData(`${label}-mail`) }, ports.mailPage)
  if (fakes.stripe) start('stripe', 'stripe.mjs', { STRIPE_FAKE_PORT: String(ports.stripe), STRIPE_WEBHOOK_URL: `http://127.0.0.1:${ports.web}/api/stripe/webhook` }, ports.stripe)
  await Promise.all(waits)
}

/** Starts the worker: it opens no port but its health, so the pages it could serve go to a private socket. */
export function startWorker({ env, ports, label }) {
  const folder = mkdtempSync(join(tmpdir(), 'copperplate-'))
  whenStopped(() => rmSync(folder, { recursive: true, force: true }))
  const child = startChild({
    name: `${label}-worker`, args: [serverEntry()],
    env: { ...withoutOwner(env), COPPERPLATE_ROLE: 'worker', NITRO_UNIX_SOCKET: join(folder, 'worker.sock') },
  })
  return { child, url: `http://127.0.0.1:${ports.worker}/health` }
}

/** Starts one web process. */
export function startWeb({ env, label, name = 'web', port = env.PORT, baseUrl = env.COPPERPLATE_BASE_URL }) {
  const child = startChild({
    name: `${label}-${name}`, args: [serverEntry()],
    env: { ...withoutOwner(env), COPPERPLATE_ROLE: 'web', PORT: String(port), COPPERPLATE_BASE_URL: baseUrl },
  })
  return { child, url: `http://${reachable(env.HOST)}:${port}/api/health` }
}

/** Waits for several started processes at once. */
export async function waitForAll(parts) {
  await Promise.all(parts.map(({ child, url }) => waitUntilWell(child, url)))
}
