import { existsSync, writeFileSync } from 'node:fs'
import { alone } from './lock.mjs'
import { inData, inRoot, root } from './paths.mjs'
import { runToEnd } from './run.mjs'
import { Mendable } from './say.mjs'
import { hashOf, isStamped, stamp } from './stamps.mjs'

/** All that a build is made from. */
export const SOURCES = ['app', 'server', 'shared', 'public', 'nuxt.config.ts', 'tailwind.config.ts', 'package-lock.json']

/** Inside the build itself: a build made or deleted by hand takes the stamp with it. */
const stampFile = () => inRoot('.output/built-from')

/** Where the built server starts. */
export const serverEntry = () => inRoot('.output/server/index.mjs')

/** The lines from the first error on: a failed build prints hundreds, and the cause stands at their head. */
export function fromFirstError(output, most = 30) {
  const lines = output.split('\n')
  const first = lines.findIndex(line => /\bERROR\b|Error[:\]]/.test(line))
  return lines.slice(first < 0 ? -most : first).slice(0, most).join('\n')
}

/** Builds when the sources differ from what `.output` was built from. Answers words for the progress line. */
export function ensureBuild({ onStart } = {}) {
  return alone('build', async () => {
    const hash = hashOf(root, SOURCES)
    if (existsSync(serverEntry()) && isStamped(stampFile(), hash)) return 'nothing changed since the last build'
    const env = { ...process.env, NUXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' }
    const { status, output } = await runToEnd(process.execPath, [inRoot('node_modules/nuxt/bin/nuxt.mjs'), 'build'], { cwd: root, env, onStart })
    const log = inData('log', 'build.log')
    writeFileSync(log, output)
    if (status !== 0) throw new Mendable('nuxt build failed', `mend what the lines above name; all of its output is in ${log}`, fromFirstError(output))
    // Taken before building: a file changed meanwhile makes the next run build again.
    stamp(stampFile(), hash)
    return 'built'
  })
}
