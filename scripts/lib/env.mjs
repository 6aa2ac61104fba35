import { randomBytes } from 'node:crypto'
import { chmodSync, existsSync, readFileSync, writeFileSync } from 'node:fs'
import { inData, inRoot } from './paths.mjs'

/** Reads `NAME=value` lines; `#` opens a comment line and quotes round a value fall away. */
export function parseEnv(text) {
  const values = {}
  for (const line of text.split('\n')) {
    const match = /^\s*(?:export\s+)?([A-Z][A-Z0-9_]*)\s*=\s*(.*?)\s*$/.exec(line)
    if (match) values[match[1]] = match[2].replace(/^(['"])(.*)\1$/, '$2')
  }
  return values
}

/** Writes values back as `NAME=value` lines in a steady order. */
export function formatEnv(values) {
  return Object.keys(values).sort().map(name => `${name}=${values[name]}\n`).join('')
}

/** Values of a file, or none when the file is absent. */
export function readEnvFile(path) {
  return existsSync(path) ? parseEnv(readFileSync(path, 'utf8')) : {}
}

/** The file that holds a profile's generated secrets and addresses (`start` or `test`). */
export const profileFile = profile => inData(`${profile}.env`)

/** Secrets that a first run makes up. The Stripe pair only ever meets the fake. */
export function generateSecrets() {
  return {
    NUXT_SESSION_PASSWORD: randomBytes(36).toString('base64url'),
    COPPERPLATE_KEY_SECRET: randomBytes(32).toString('base64'),
    STRIPE_SECRET_KEY: `sk_test_local${randomBytes(16).toString('hex')}`,
    STRIPE_WEBHOOK_SECRET: `whsec_local${randomBytes(16).toString('hex')}`,
  }
}

/**
 * Makes or completes a profile's file and answers its values. Secrets that are
 * already there stay: a new key secret would make earlier seal keys unreadable.
 */
export function ensureProfileEnv(profile, values = {}) {
  const path = profileFile(profile)
  const held = { ...generateSecrets(), ...readEnvFile(path), ...values }
  writeFileSync(path, formatEnv(held), { mode: 0o600 })
  chmodSync(path, 0o600)
  return held
}

/** What the person set: the environment first, then `.env` beside package.json. */
export function personalEnv() {
  return { ...readEnvFile(inRoot('.env')), ...process.env }
}
