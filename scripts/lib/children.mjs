import { spawn } from 'node:child_process'
import { appendFileSync, createWriteStream, existsSync, readFileSync, rmSync } from 'node:fs'
import { setTimeout as pause } from 'node:timers/promises'
import { isAlive } from './lock.mjs'
import { inData, root } from './paths.mjs'
import { Mendable } from './say.mjs'

const GRACE_MS = 8_000

/** Everything this run started and must stop again. */
const started = new Set()
const lastActs = []
let stopping = null

function signalGroup(child, signal) {
  try {
    // A child leads a process group of its own, so what it started goes with it.
    process.kill(-child.pid, signal)
  }
  catch (error) {
    if (error.code !== 'ESRCH') throw error
  }
}

/**
 * Starts a program that runs until we stop it, and keeps what it prints in `.data/log`.
 * `died` on the result settles with a sentence if it ends by itself.
 */
export function startChild({ name, command = process.execPath, args, env, cwd = root, show = false }) {
  const logPath = inData('log', `${name}.log`)
  const log = createWriteStream(logPath)
  const child = spawn(command, args, { cwd, env, detached: true, stdio: ['ignore', 'pipe', 'pipe'] })
  child.stdout.pipe(log, { end: false })
  child.stderr.pipe(log, { end: false })
  if (show) {
    child.stdout.pipe(process.stdout, { end: false })
    child.stderr.pipe(process.stderr, { end: false })
  }
  const entry = { name, child, logPath, ended: false }
  entry.died = new Promise((resolve) => {
    child.once('error', error => resolve(`${name} could not be started: ${error.message}`))
    child.once('close', (status, signal) => resolve(`${name} ended by itself (${signal ?? `status ${status}`})`))
  }).then((sentence) => {
    entry.ended = true
    return sentence
  })
  started.add(entry)
  if (child.pid) appendFileSync(inData('run', 'children'), `${process.pid} ${child.pid}\n`)
  return entry
}

/** Takes in a program that runs to its end by itself, so that stopping this run stops it too. */
export function adopt(child) {
  const entry = { name: child.spawnfile, child, ended: false }
  entry.died = new Promise(resolve => child.once('close', resolve)).then(() => {
    entry.ended = true
    started.delete(entry)
  })
  started.add(entry)
}

/** The last lines that a child printed. */
export function tailOf(entry, lines = 30) {
  return existsSync(entry.logPath) ? readFileSync(entry.logPath, 'utf8').trimEnd().split('\n').slice(-lines).join('\n') : ''
}

/** Stops one child and waits for it. */
export async function stopChild(entry) {
  started.delete(entry)
  if (!entry.child.pid) return
  signalGroup(entry.child, 'SIGTERM')
  await Promise.race([entry.died, pause(GRACE_MS, undefined, { ref: false })])
  signalGroup(entry.child, 'SIGKILL')
}

/** True once a stop has begun. */
export const isStopping = () => stopping !== null

/** Runs `act` once when everything started here has been stopped. */
export function whenStopped(act) {
  lastActs.push(act)
}

/** Stops all that this run started, youngest first. Safe to call twice. */
export function stopAll() {
  stopping ??= (async () => {
    await Promise.all([...started].reverse().map(stopChild))
    for (const act of lastActs.reverse()) await act()
  })()
  return stopping
}

/** Stops everything on Ctrl-C, SIGTERM and SIGHUP, and at the very end whatever happens. */
export function stopOnSignals(onStop = () => {}) {
  for (const [signal, status] of [['SIGINT', 130], ['SIGTERM', 143], ['SIGHUP', 129]]) {
    process.on(signal, () => {
      if (stopping) return
      onStop(signal)
      stopAll().finally(() => process.exit(status))
    })
  }
  process.on('exit', () => {
    for (const entry of started) if (entry.child.pid && !entry.ended) signalGroup(entry.child, 'SIGKILL')
  })
}

/** Stops what an earlier run left behind because it was killed outright. Only our own checkout's processes are touched. */
export async function sweepLeftovers() {
  const path = inData('run', 'children')
  if (!existsSync(path) || !existsSync('/proc/self')) return
  const swept = []
  const kept = readFileSync(path, 'utf8').split('\n').filter((line) => {
    const [parent, pid] = line.split(' ').map(Number)
    if (!pid || !isAlive(pid)) return false
    if (isAlive(parent)) return true
    const commandLine = `/proc/${pid}/cmdline`
    if (!existsSync(commandLine) || !readFileSync(commandLine, 'utf8').includes(root)) return false
    signalGroup({ pid }, 'SIGTERM')
    swept.push(pid)
    return false
  })
  rmSync(path)
  if (kept.length > 0) appendFileSync(path, `${kept.join('\n')}\n`)
  // Their ports come free when they are gone.
  for (let tries = 0; swept.some(isAlive) && tries < 50; tries++) await pause(100)
  for (const pid of swept.filter(isAlive)) signalGroup({ pid }, 'SIGKILL')
}

/** Waits until an address answers 200, or says why it does not. */
export async function waitUntilWell(entry, url, { withinMs = 60_000 } = {}) {
  const until = Date.now() + withinMs
  let last = 'no answer yet'
  let died = null
  entry.died.then((sentence) => {
    died = sentence
  })
  while (Date.now() < until) {
    if (died) throw new Mendable(died, `its log is ${entry.logPath}`, tailOf(entry))
    try {
      const answer = await fetch(url, { signal: AbortSignal.timeout(5_000) })
      if (answer.status === 200) return
      last = `it answers ${answer.status}`
    }
    catch (error) {
      last = error.cause?.code ?? error.name
    }
    await pause(150)
  }
  throw new Mendable(`${entry.name} was not well within ${withinMs / 1000} s: ${url} (${last})`, `its log is ${entry.logPath}`, tailOf(entry))
}
