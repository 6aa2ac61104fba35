import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { adopt } from './children.mjs'
import { countPlaywright, counted, countVitest, withStatus } from './counts.mjs'
import { inData, inRoot, root } from './paths.mjs'
import { runToEnd } from './run.mjs'

const program = path => inRoot('node_modules', path)

function hasTests(folders) {
  return folders.some(folder => existsSync(inRoot(folder)) && readdirSync(inRoot(folder), { recursive: true }).some(name => String(name).endsWith('.spec.ts')))
}

async function runTool(name, script, args, env) {
  const { status, output } = await runToEnd(process.execPath, [program(script), ...args], { cwd: root, env, onStart: adopt })
  writeFileSync(inData('test', `${name}.log`), output)
  return { status, output }
}

/** A tool that passes or fails as a whole, counted as one. */
export async function runCheck(name, script, args, env) {
  const { status, output } = await runTool(name, script, args, env)
  return { ...(status === 0 ? counted(1, 0) : counted(0, 1)), output }
}

function readReport(path, count) {
  try {
    return count(JSON.parse(readFileSync(path, 'utf8')))
  }
  catch {
    // No report: the tool broke before its first test.
    return counted(0, 1)
  }
}

/** Runs tests through a tool that leaves a JSON report. */
async function runReported({ name, folders, script, args, env, count }) {
  if (!hasTests(folders)) return { ...counted(0, 0), output: '', words: 'no tests yet' }
  mkdirSync(inData('test', '.'), { recursive: true })
  const report = inData('test', `${name}.json`)
  rmSync(report, { force: true })
  const { status, output } = await runTool(name, script, args(report), { ...env, TEST_JSON_FILE: report })
  return { ...withStatus(readReport(report, count), status), output }
}

/** One of Vitest's projects, under a zone that is not ours. */
export function runVitest(name, folders, env) {
  return runReported({
    name, folders, script: 'vitest/vitest.mjs', count: countVitest, env: { ...env, TZ: 'Pacific/Auckland' },
    args: report => ['run', '--project', name, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`],
  })
}

/** The journeys in a browser. */
export function runPlaywright(env) {
  return runReported({ name: 'e2e', folders: [join('tests', 'e2e')], script: '@playwright/test/cli.js', count: countPlaywright, env, args: () => ['test', '-c', 'tests/e2e/playwright.config.ts'] })
}
