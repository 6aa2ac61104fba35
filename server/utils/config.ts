import * as z from 'zod'

const text = z.string().trim().min(1)
const port = z.coerce.number('Give a port number from 1 to 65535').int().min(1).max(65_535)
const yesNo = z.enum(['true', 'false'], 'Give true or false').transform(value => value === 'true')

const baseUrl = z.string('Give the address people type, such as https://jobs.example.co.uk').transform((value, ctx) => {
  const url = URL.canParse(value) ? new URL(value) : null
  if (url && (url.protocol === 'https:' || url.protocol === 'http:') && url.pathname === '/' && !url.search && !url.hash) return url.origin
  ctx.addIssue({ code: 'custom', message: 'Give an address with https:// or http:// and nothing after the host' })
  return z.NEVER
})

const databaseUrl = z.string('Give a postgres:// address').regex(/^postgres(ql)?:\/\//, 'Give a postgres:// address')

const keySecret = z.string('Give 32 random bytes in base64: openssl rand -base64 32').transform((value, ctx) => {
  const bytes = Buffer.from(value, 'base64')
  if (bytes.length === 32) return bytes
  ctx.addIssue({ code: 'custom', message: `Give exactly 32 bytes in base64: this is ${bytes.length} bytes` })
  return z.NEVER
})

const environment = z.object({
  COPPERPLATE_ROLE: z.enum(['web', 'worker', 'both'], 'Give web, worker or both').default('web'),
  COPPERPLATE_BASE_URL: baseUrl,
  COPPERPLATE_KEY_SECRET: keySecret,
  COPPERPLATE_FILES_DIR: z.string('Give the folder that keeps photographs and papers').trim().min(1),
  COPPERPLATE_COOKIE_SECURE: yesNo.optional(),
  NUXT_SESSION_PASSWORD: z.string('Give at least 32 random characters: openssl rand -base64 36').min(32, 'Give at least 32 characters'),
  DATABASE_URL: databaseUrl.optional(),
  DATABASE_URL_WORKER: databaseUrl.optional(),
  SMTP_HOST: text.optional(),
  SMTP_PORT: port.default(587),
  SMTP_SECURE: yesNo.default(false),
  SMTP_USER: text.optional(),
  SMTP_PASSWORD: text.optional(),
  MAIL_FROM: text.optional(),
  STRIPE_SECRET_KEY: text.optional(),
  STRIPE_WEBHOOK_SECRET: text.optional(),
  STRIPE_HOST: text.optional(),
  STRIPE_PORT: port.optional(),
  STRIPE_PROTOCOL: z.enum(['https', 'http'], 'Give https or http').default('https'),
  WORKER_HEALTH_PORT: port.default(3028),
})

type Environment = z.output<typeof environment>

/** What this process is told from outside, checked once; nothing else reads the environment. */
export interface Config {
  role: 'web' | 'worker' | 'both'
  /** Origin that people and links use, without a slash at its end. */
  baseUrl: string
  /** Connection strings; the one of a role that does not run here may be absent. */
  databaseUrl?: string
  workerDatabaseUrl?: string
  sessionPassword: string
  /** 32 bytes under which each firm's private seal key is kept. */
  keySecret: Buffer
  filesDir: string
  /** False only where pages are served over plain http on one's own machine. */
  cookieSecure: boolean
  /** Null in a web process that was told of no mail server; the worker always has one. */
  mail: { host: string, port: number, secure: boolean, user?: string, password?: string, from: string } | null
  /** Null when the firm's server takes no card payments. `host` and `port` are set only for a stand-in. */
  stripe: { secretKey: string, webhookSecret: string, host?: string, port?: number, protocol: 'https' | 'http' } | null
  workerHealthPort: number
}

/** The environment cannot be used; the message lists every variable to mend, one a line. */
export class ConfigError extends Error {
  constructor(readonly problems: string[]) {
    super(`Copperplate cannot start. Mend these settings (see .env.example):\n${problems.map(line => `  ${line}`).join('\n')}`)
    this.name = 'ConfigError'
  }
}

/** Settings that only make sense together, as sentences. */
function listContradictions(env: Environment): string[] {
  const problems: string[] = []
  const needs = (name: keyof Environment, why: string) => {
    if (env[name] === undefined) problems.push(`${name}: ${why}`)
  }
  if (env.COPPERPLATE_ROLE !== 'worker') needs('DATABASE_URL', 'The web process needs the address of the database')
  if (env.COPPERPLATE_ROLE !== 'web') {
    needs('DATABASE_URL_WORKER', 'The worker needs the address of the database under its own role')
    needs('SMTP_HOST', 'The worker needs a mail server to send through')
  }
  if (env.SMTP_HOST) needs('MAIL_FROM', 'Mail needs a sender, such as "Copperplate <post@example.co.uk>"')
  if (env.SMTP_USER) needs('SMTP_PASSWORD', 'SMTP_USER is set, so its password is needed')
  if (env.STRIPE_SECRET_KEY) needs('STRIPE_WEBHOOK_SECRET', 'STRIPE_SECRET_KEY is set, so payments can be asked for but never confirmed')
  if (env.STRIPE_WEBHOOK_SECRET) needs('STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET is set without it')
  if (env.COPPERPLATE_BASE_URL.startsWith('https:') && env.COPPERPLATE_COOKIE_SECURE === false) problems.push('COPPERPLATE_COOKIE_SECURE: The pages are served over https, so the sign-in cookie must be too')
  return problems
}

function toConfig(env: Environment): Config {
  return {
    role: env.COPPERPLATE_ROLE,
    baseUrl: env.COPPERPLATE_BASE_URL,
    databaseUrl: env.DATABASE_URL,
    workerDatabaseUrl: env.DATABASE_URL_WORKER,
    sessionPassword: env.NUXT_SESSION_PASSWORD,
    keySecret: env.COPPERPLATE_KEY_SECRET,
    filesDir: env.COPPERPLATE_FILES_DIR,
    cookieSecure: env.COPPERPLATE_COOKIE_SECURE ?? env.COPPERPLATE_BASE_URL.startsWith('https:'),
    mail: env.SMTP_HOST && env.MAIL_FROM
      ? { host: env.SMTP_HOST, port: env.SMTP_PORT, secure: env.SMTP_SECURE, user: env.SMTP_USER, password: env.SMTP_PASSWORD, from: env.MAIL_FROM }
      : null,
    stripe: env.STRIPE_SECRET_KEY && env.STRIPE_WEBHOOK_SECRET
      ? { secretKey: env.STRIPE_SECRET_KEY, webhookSecret: env.STRIPE_WEBHOOK_SECRET, host: env.STRIPE_HOST, port: env.STRIPE_PORT, protocol: env.STRIPE_PROTOCOL }
      : null,
    workerHealthPort: env.WORKER_HEALTH_PORT,
  }
}

/**
 * Checks an environment and answers the settings in it.
 * An empty value counts as unset, as in a copied `.env` file.
 * @throws ConfigError with every problem found
 */
export function readConfig(env: Record<string, string | undefined>): Config {
  const set = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== undefined && value.trim() !== ''))
  const parsed = environment.safeParse(set)
  if (!parsed.success) throw new ConfigError(parsed.error.issues.map(issue => `${issue.path.join('.')}: ${issue.message}`))
  const contradictions = listContradictions(parsed.data)
  if (contradictions.length > 0) throw new ConfigError(contradictions)
  return toConfig(parsed.data)
}

let held: Config | undefined

/** This process's settings, read once. */
export function config(): Config {
  held ??= readConfig(process.env)
  return held
}
