import { existsSync, readdirSync } from 'node:fs'
import { join } from 'node:path'
import { installPackages, refuseMainCluster } from './apt.mjs'
import { runQuietly } from './run.mjs'
import { Mendable } from './say.mjs'

const DEBIAN = '/usr/lib/postgresql'
const OLDEST = 15

function debianVersions() {
  if (!existsSync(DEBIAN)) return []
  return readdirSync(DEBIAN).map(Number).filter(version => version >= OLDEST && existsSync(join(DEBIAN, String(version), 'bin/initdb'))).sort((a, b) => b - a)
}

/** Elsewhere than on Debian the programs are on PATH. */
function onPath(version) {
  const folder = runQuietly('pg_config', ['--bindir']).out.trim()
  if (!folder || !existsSync(join(folder, 'initdb'))) return null
  const found = Number(/(\d+)/.exec(runQuietly(join(folder, 'postgres'), ['--version']).out)?.[1] ?? 0)
  return found >= OLDEST && (!version || found === version) ? folder : null
}

/** The folder of initdb, pg_ctl and psql: of one version when named, else the newest. Null when absent. */
export function findPrograms(version) {
  const fit = debianVersions().find(found => !version || found === version)
  return fit ? join(DEBIAN, String(fit), 'bin') : onPath(version)
}

/** As `findPrograms`, but installs the server (root) or says how to (ordinary user). */
export async function getPrograms(version) {
  const found = findPrograms(version)
  if (found) return found
  if (version && findPrograms()) throw new Mendable(`This checkout's database was made by PostgreSQL ${version}, which is not on this machine`, `install postgresql-${version}`)
  refuseMainCluster()
  await installPackages('PostgreSQL is not on this machine', ['postgresql'])
  const installed = findPrograms(version)
  if (!installed) throw new Mendable(`PostgreSQL ${OLDEST} or newer was not found after installing`, `install postgresql-${OLDEST}`)
  return installed
}
