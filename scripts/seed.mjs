/**
 * `npm run db:seed`: fills an empty database with an invented firm whose jobs stand in every state, round about today.
 * Does nothing where a firm exists. The owner's connection makes the firm's row alone; everything else goes through the
 * services that people use, as the web's own role, so that each row met the same checks and stands in the chain of events.
 */
import { existsSync } from 'node:fs'
import pg from 'pg'
import { profileFile, readEnvFile } from './lib/env.mjs'
import { inData } from './lib/paths.mjs'
import { Mendable, say, sayFailure } from './lib/say.mjs'
import { loadServices } from './seed/services.mjs'
import { seedDemo } from './seed/demo.mjs'

/** What a run by hand may leave out; `npm start` sets all of it. */
function completeEnv() {
  const held = existsSync(profileFile('start')) ? readEnvFile(profileFile('start')) : {}
  const defaults = { COPPERPLATE_BASE_URL: 'http://127.0.0.1:3000', COPPERPLATE_FILES_DIR: inData('files') }
  for (const [name, value] of Object.entries({ ...defaults, ...held })) process.env[name] ||= value
  process.env.COPPERPLATE_ROLE = 'web'
  // Made-up rows may be lost in a crash: without waiting for the disk at each of a thousand commits this takes seconds.
  process.env.PGOPTIONS = '-c synchronous_commit=off'
}

async function hasFirm(owner) {
  const { rows: [{ found }] } = await owner.query('select exists (select 1 from firm) as found')
  return found
}

/** What is half made stays: events and readings are never removed. */
function refuseHalf(error) {
  throw new Mendable('The invented firm could not be finished', 'make the database anew (`node scripts/db-up.mjs --fresh`) and run this again', error.stack)
}

async function run(now) {
  completeEnv()
  const url = process.env.DATABASE_URL_OWNER
  if (!url) throw new Mendable('DATABASE_URL_OWNER is not set', 'run `node scripts/db-up.mjs` first, or set it')
  const owner = new pg.Client({ connectionString: url, application_name: 'copperplate seed' })
  await owner.connect()
  let services
  try {
    if (await hasFirm(owner)) return say('A firm is already there; nothing was added.')
    services = await loadServices()
    const { firm, jobs } = await seedDemo({ services, owner, now }).catch(refuseHalf)
    say(`${firm.name} with ${jobs} jobs`)
  }
  finally {
    await services?.closeDatabase()
    await owner.end()
  }
}

run(process.argv[2] ?? new Date().toISOString()).catch((error) => {
  sayFailure(error)
  process.exitCode = 1
})
