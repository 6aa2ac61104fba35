import { mkdirSync, writeFileSync } from 'node:fs'
import { isRoot, mustRun, runQuietly } from './run.mjs'
import { Mendable } from './say.mjs'

/** The one line that an ordinary user is asked to run. */
export const aptLine = packages => `sudo apt-get install --no-install-recommends ${packages.join(' ')}`

/**
 * Installs Debian packages as root; says the one line to run otherwise.
 * @param {string} what what is missing, such as "PostgreSQL is not on this machine"
 */
export async function installPackages(what, packages) {
  if (runQuietly('apt-get', ['--version']).status !== 0) throw new Mendable(what, `install ${packages.join(', ')} by your system's own way, then run this again`)
  if (!isRoot()) throw new Mendable(what, `run: ${aptLine(packages)}`)
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  const install = ['install', '-y', '-qq', '--no-install-recommends', ...packages]
  if (runQuietly('apt-get', install, { env }).status === 0) return
  // A machine that has never fetched its package lists fails once; fetch them and try again.
  await mustRun('apt-get update', 'check the network and the machine\'s package sources', 'apt-get', ['update', '-qq'], { env })
  await mustRun(`apt-get install ${packages.join(' ')}`, 'read the lines above', 'apt-get', install, { env })
}

/** Keeps Debian from making a cluster of its own on port 5432 when the server is installed. */
export function refuseMainCluster() {
  if (!isRoot()) return
  mkdirSync('/etc/postgresql-common/createcluster.d', { recursive: true })
  writeFileSync('/etc/postgresql-common/createcluster.d/no-main.conf', 'create_main_cluster = false\n')
}
