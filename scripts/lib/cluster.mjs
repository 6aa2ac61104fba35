import { randomBytes } from 'node:crypto'
import { chmodSync, chownSync, existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { checkoutMark, inData } from './paths.mjs'
import { nextFree, isFree, portFrom, takenSentence } from './ports.mjs'
import { findPrograms, getPrograms } from './postgres-programs.mjs'
import { isRoot, runQuietly } from './run.mjs'
import { Mendable } from './say.mjs'

const STANDARD_PORT = 54_329

/**
 * Where this checkout's own cluster lives. PostgreSQL refuses to run as root, and its
 * account may not enter root's folders, so root's cluster stands in that account's home.
 */
export const clusterHome = () => isRoot() ? `/var/lib/postgresql/local-${checkoutMark}` : inData('pg')
const clusterData = () => join(clusterHome(), 'data')
const keysFile = () => join(clusterHome(), 'keys.json')

/** Runs a PostgreSQL program under the account that owns the cluster. */
function asServer(program, args) {
  const options = { cwd: '/', stdio: ['ignore', 'pipe', 'pipe'] }
  return isRoot() ? runQuietly(existsSync('/usr/sbin/runuser') ? '/usr/sbin/runuser' : 'runuser', ['-u', 'postgres', '--', program, ...args], options) : runQuietly(program, args, options)
}

function giveToServer(path, mode) {
  chmodSync(path, mode)
  if (!isRoot()) return
  chownSync(path, Number(runQuietly('id', ['-u', 'postgres']).out), Number(runQuietly('id', ['-g', 'postgres']).out))
}

/** Passwords and port of the cluster; they live beside it, so that deleting `.data` as root does not lock us out. */
export function readKeys() {
  return existsSync(keysFile()) ? JSON.parse(readFileSync(keysFile(), 'utf8')) : null
}

function writeKeys(keys) {
  writeFileSync(keysFile(), JSON.stringify(keys, null, 2), { mode: 0o600 })
  giveToServer(keysFile(), 0o600)
}

function makeCluster(programs) {
  mkdirSync(clusterHome(), { recursive: true, mode: 0o700 })
  giveToServer(clusterHome(), 0o700)
  // What is there without its keys is half made: nobody could ever sign in to it.
  if (existsSync(clusterData())) rmSync(clusterData(), { recursive: true })
  const password = () => randomBytes(24).toString('base64url')
  const keys = { port: STANDARD_PORT, superuser: password(), owner: password(), app: password(), worker: password() }
  const passwordFile = join(clusterHome(), 'initdb-password')
  writeFileSync(passwordFile, keys.superuser, { mode: 0o600 })
  giveToServer(passwordFile, 0o600)
  const made = asServer(join(programs, 'initdb'), ['-D', clusterData(), '-U', 'postgres', '--auth=scram-sha-256', `--pwfile=${passwordFile}`, '--encoding=UTF8', '--locale=C.UTF-8', '--data-checksums'])
  rmSync(passwordFile)
  if (made.status !== 0) throw new Mendable('initdb could not make the database cluster', `read the lines above; the folder is ${clusterHome()}`, made.out + made.err)
  writeKeys(keys)
}

/** The running server's process and port, or null. A stale pid file (after a crash) counts as not running. */
function findRunning() {
  const pidFile = join(clusterData(), 'postmaster.pid')
  if (!existsSync(pidFile)) return null
  const [pid, , , port] = readFileSync(pidFile, 'utf8').split('\n')
  const commandLine = `/proc/${pid}/cmdline`
  if (existsSync('/proc/self') && !(existsSync(commandLine) && readFileSync(commandLine, 'utf8').includes(clusterData()))) {
    rmSync(pidFile)
    return null
  }
  return Number(port) ? { pid: Number(pid), port: Number(port) } : null
}

async function choosePort(keys) {
  const asked = portFrom(process.env, 'PGPORT_LOCAL', 0)
  if (asked) {
    if (await isFree(asked)) return asked
    const { what, mend } = takenSentence('the database', asked, 'PGPORT_LOCAL')
    throw new Mendable(what, mend)
  }
  return nextFree(keys.port)
}

/** Starts the cluster, made on first use. Answers its port, its passwords, psql's path and whether this call started it. */
export async function startCluster() {
  const versionFile = join(clusterData(), 'PG_VERSION')
  const programs = await getPrograms(existsSync(versionFile) ? Number.parseInt(readFileSync(versionFile, 'utf8')) : undefined)
  const isNew = !readKeys()
  if (isNew) makeCluster(programs)
  const keys = readKeys()
  const psql = join(programs, 'psql')
  const running = findRunning()
  if (running) return { ...keys, port: running.port, psql, started: false, isNew }
  const port = await choosePort(keys)
  const settings = { listen_addresses: '127.0.0.1', unix_socket_directories: '', port, synchronous_commit: 'on', timezone: 'UTC', log_timezone: 'UTC', max_connections: 100 }
  const options = Object.entries(settings).map(([name, value]) => `-c ${name}=${value}`).join(' ')
  const log = join(clusterHome(), 'log')
  const up = asServer(join(programs, 'pg_ctl'), ['-D', clusterData(), '-l', log, '-w', '-t', '60', '-o', options, 'start'])
  if (up.status !== 0) throw new Mendable('The database server did not start', `its log is ${log}`, up.out + up.err)
  if (port !== keys.port) writeKeys({ ...keys, port })
  return { ...keys, port, psql, started: true, isNew }
}

/** Stops the cluster, ending open connections; true when it was running. */
export function stopCluster() {
  if (!existsSync(clusterData()) || !findRunning()) return false
  const programs = findPrograms(Number.parseInt(readFileSync(join(clusterData(), 'PG_VERSION'), 'utf8')))
  return Boolean(programs) && asServer(join(programs, 'pg_ctl'), ['-D', clusterData(), '-m', 'fast', '-w', 'stop']).status === 0
}
