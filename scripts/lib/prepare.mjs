import { existsSync } from 'node:fs'
import { adopt, whenStopped } from './children.mjs'
import { DATABASES, leaveCluster, namedServer, useOwnCluster } from './database-up.mjs'
import { ensureProfileEnv } from './env.mjs'
import { inRoot, root } from './paths.mjs'
import { mustRun } from './run.mjs'

/** Runs one of our own scripts to its end; its last line becomes the progress line. */
export async function runScript(name, env) {
  const output = await mustRun(`scripts/${name}`, 'read the lines above', process.execPath, [inRoot('scripts', name)], { cwd: root, env, onStart: adopt })
  return output.trim().split('\n').at(-1) || 'done'
}

/**
 * The database of `npm start` and `npm run dev`: the server that the person named, or our own.
 * Answers the profile's values (secrets and addresses) and words for the progress line.
 */
export async function startDatabase(personal) {
  const named = namedServer(personal)
  if (named) return { values: { ...ensureProfileEnv('start'), ...named }, words: 'the server that DATABASE_URL names' }
  whenStopped(leaveCluster)
  const { cluster, addresses } = await useOwnCluster({ databases: [DATABASES.start] })
  const words = cluster.isNew ? 'made' : cluster.started ? 'started' : 'already running'
  return { values: ensureProfileEnv('start', addresses[DATABASES.start]), words: `PostgreSQL on 127.0.0.1:${cluster.port}, ${words}` }
}

/** Values for a run: secrets and addresses of the profile, with what the person set winning. */
export function withPersonal(values, personal) {
  const set = Object.fromEntries(Object.entries(personal).filter(([, value]) => value !== ''))
  return { ...values, ...set }
}

/** Fills an empty database with the invented firm; does nothing where a firm exists. */
export function seed(env) {
  if (env.COPPERPLATE_SEED !== 'demo') return 'not asked for'
  if (!existsSync(inRoot('scripts/seed.mjs'))) return 'no seed in this checkout'
  return runScript('seed.mjs', env)
}

/** The invented firm's people, if the seed offers any. */
export async function listDemoSignIns() {
  const path = inRoot('scripts/demo-sign-ins.mjs')
  if (!existsSync(path)) return []
  const exported = await import(path)
  return Object.values(exported).find(Array.isArray) ?? []
}
