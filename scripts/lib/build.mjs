import { existsSync } from 'node:fs'
import { alone } from './lock.mjs'
import { inRoot, root } from './paths.mjs'
import { mustRun } from './run.mjs'
import { hashOf, isStamped, stamp } from './stamps.mjs'

/** All that a build is made from. */
export const SOURCES = ['app', 'server', 'shared', 'public', 'nuxt.config.ts', 'tailwind.config.ts', 'package-lock.json']

/** Inside the build itself: a build made or deleted by hand takes the stamp with it. */
const stampFile = () => inRoot('.output/built-from')

/** Where the built server starts. */
export const serverEntry = () => inRoot('.output/server/index.mjs')

/** Builds when the sources differ from what `.output` was built from. Answers words for the progress line. */
export function ensureBuild({ onStart } = {}) {
  return alone('build', async () => {
    const hash = hashOf(root, SOURCES)
    if (existsSync(serverEntry()) && isStamped(stampFile(), hash)) return 'nothing changed since the last build'
    const env = { ...process.env, NUXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' }
    await mustRun('nuxt build', 'read the lines above', process.execPath, [inRoot('node_modules/nuxt/bin/nuxt.mjs'), 'build'], { cwd: root, env, onStart })
    // Taken before building: a file changed meanwhile makes the next run build again.
    stamp(stampFile(), hash)
    return 'built'
  })
}
