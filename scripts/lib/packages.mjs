import { existsSync, readFileSync } from 'node:fs'
import { alone } from './lock.mjs'
import { inData, inRoot, root } from './paths.mjs'
import { mustRun } from './run.mjs'
import { Mendable } from './say.mjs'
import { hashOf, isStamped, stamp } from './stamps.mjs'

/** Refuses a Node that the pinned packages were not proven with. */
export function checkNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number)
  if (major === 20 && minor >= 19) return
  throw new Mendable(`This is Node ${version}, and Copperplate runs on Node 20.19 or a later 20`, 'install Node 20 and run this again')
}

/** npm writes this file last, so it tells an interrupted install from a finished one. */
const INSTALLED = 'node_modules/.package-lock.json'

/** True when what is installed is what package-lock.json asks for, name by name and version by version. */
function agreesWithLock() {
  if (!existsSync(inRoot(INSTALLED))) return false
  const read = name => JSON.parse(readFileSync(inRoot(name), 'utf8')).packages
  const wanted = read('package-lock.json')
  return Object.entries(read(INSTALLED)).every(([name, { version }]) => wanted[name]?.version === version)
    && Object.entries(wanted).every(([name, { optional, devOptional, peer }]) => name === '' || optional || devOptional || peer || existsSync(inRoot(name)))
}

/** Installs packages when they are missing or the lock file has changed since the last time. */
export function ensurePackages({ onStart } = {}) {
  return alone('packages', async () => {
    const stampFile = inData('packages.stamp')
    const hash = hashOf(root, ['package-lock.json'])
    if (existsSync(inRoot(INSTALLED)) && isStamped(stampFile, hash)) return prepared(onStart, 'as the lock file says')
    if (agreesWithLock()) {
      stamp(stampFile, hash)
      return prepared(onStart, 'as the lock file says')
    }
    const env = { ...process.env, NUXT_TELEMETRY_DISABLED: '1' }
    await mustRun('npm ci', 'check the network to the package registry and run this again', 'npm', ['ci', '--no-audit', '--no-fund'], { cwd: root, env, onStart })
    stamp(stampFile, hash)
    return prepared(onStart, 'installed')
  })
}

/** Nuxt's generated types and lint settings come with npm ci; somebody may have deleted them since. */
async function prepared(onStart, words) {
  if (existsSync(inRoot('.nuxt/eslint.config.mjs'))) return words
  await mustRun('nuxt prepare', 'read the lines above', process.execPath, [inRoot('node_modules/nuxt/bin/nuxt.mjs'), 'prepare'], { cwd: root, env: { ...process.env, NUXT_TELEMETRY_DISABLED: '1' }, onStart })
  return `${words}, types prepared`
}
