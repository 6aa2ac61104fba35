import { mkdirSync, symlinkSync, existsSync, writeFileSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { adopt, startChild, waitUntilWell } from '../../lib/children.mjs'
import { inData, inRoot, root } from '../../lib/paths.mjs'
import { nextFree } from '../../lib/ports.mjs'
import { mustRun } from '../../lib/run.mjs'
import { hashOf, isStamped, stamp } from '../../lib/stamps.mjs'
import { note } from './note.mjs'

/** The smallest application with pages that this framework makes: what its pages load is the floor for ours. */
const FILES = {
  'package.json': '{ "name": "hello", "private": true, "type": "module" }\n',
  'nuxt.config.ts': 'export default defineNuxtConfig({ compatibilityDate: \'2026-05-01\', telemetry: false, devtools: { enabled: false } })\n',
  'app/app.vue': '<template><NuxtPage /></template>\n',
  'app/pages/index.vue': '<template><main><h1>Hello</h1><NuxtLink to="/other">Other</NuxtLink></main></template>\n',
  'app/pages/other.vue': '<template><main><h1>Other</h1></main></template>\n',
}

const home = () => inData('bench/hello', '.').replace(/\/\.$/, '')

function writeApp(folder) {
  for (const [name, text] of Object.entries(FILES)) {
    mkdirSync(dirname(join(folder, name)), { recursive: true })
    writeFileSync(join(folder, name), text)
  }
  if (!existsSync(join(folder, 'node_modules'))) symlinkSync(inRoot('node_modules'), join(folder, 'node_modules'))
}

/** Builds it once for these packages and serves it; answers its address and where its files lie. */
export async function helloApp() {
  const folder = home()
  const stampFile = inData('bench/hello-built')
  const hash = `${hashOf(root, ['package-lock.json'])} ${hashOf(root, ['scripts/bench/lib/hello-app.mjs'])}`
  if (!isStamped(stampFile, hash)) {
    note('building the hello application')
    writeApp(folder)
    await mustRun('The build of the hello application', 'read the lines above', process.execPath, [inRoot('node_modules/nuxt/bin/nuxt.mjs'), 'build'], { cwd: folder, env: { ...process.env, NUXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' }, onStart: adopt })
    stamp(stampFile, hash)
  }
  const port = await nextFree(34_500)
  const child = startChild({ name: 'bench-hello', args: [join(folder, '.output/server/index.mjs')], env: { ...process.env, PORT: String(port), HOST: '127.0.0.1' }, cwd: folder })
  const url = `http://127.0.0.1:${port}`
  await waitUntilWell(child, url)
  return { url, publicFolder: join(folder, '.output/public') }
}
