import { spawn, spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'
import { delimiter, join } from 'node:path'
import { Mendable } from './say.mjs'

/** True when this process runs as root. */
export const isRoot = () => process.getuid?.() === 0

/**
 * Runs a program to its end and answers what it printed; never throws for a bad status.
 * @returns {{ status: number, out: string, err: string }} status 127 means there is no such program
 */
export function runQuietly(command, args, options = {}) {
  const done = spawnSync(command, args, { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024, ...options })
  if (done.error) return { status: 127, out: '', err: String(done.error.message) }
  return { status: done.status ?? 1, out: done.stdout ?? '', err: done.stderr ?? '' }
}

/**
 * Runs a program to its end without blocking signals; answers its status and all that it printed, in order.
 * It leads a process group of its own, so that `onStart` can hand it to whoever stops things.
 */
export function runToEnd(command, args, { onStart, ...options } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'pipe'], detached: Boolean(onStart), ...options })
    onStart?.(child)
    let output = ''
    const keep = (chunk) => {
      output += chunk
    }
    child.stdout.setEncoding('utf8').on('data', keep)
    child.stderr.setEncoding('utf8').on('data', keep)
    child.on('error', error => resolve({ status: 127, output: `${output}${error.message}` }))
    child.on('close', (status, signal) => resolve({ status: status ?? 1, signal, output }))
  })
}

/** Runs a program that must succeed; its output is shown when it does not. */
export async function mustRun(what, mend, command, args, options) {
  const { status, output } = await runToEnd(command, args, options)
  if (status !== 0) throw new Mendable(`${what} ended with status ${status}`, mend, output)
  return output
}

/** True when a program of this name is on PATH. */
export function isThere(program) {
  return (process.env.PATH ?? '').split(delimiter).some(folder => folder && existsSync(join(folder, program)))
}
