import { readFileSync, rmSync, writeFileSync } from 'node:fs'
import { setTimeout as pause } from 'node:timers/promises'
import { inData } from './paths.mjs'
import { Mendable } from './say.mjs'

/** True when a process of this number is alive, whoever owns it. */
export function isAlive(pid) {
  try {
    process.kill(pid, 0)
    return true
  }
  catch (error) {
    return error.code === 'EPERM'
  }
}

function take(path) {
  try {
    writeFileSync(path, String(process.pid), { flag: 'wx' })
    return true
  }
  catch (error) {
    if (error.code !== 'EEXIST') throw error
  }
  try {
    const holder = Number(readFileSync(path, 'utf8'))
    // A holder that died without cleaning up holds nothing.
    if (holder && !isAlive(holder)) rmSync(path, { force: true })
  }
  catch (error) {
    if (error.code !== 'ENOENT') throw error
  }
  return false
}

/**
 * Does the work while no other script of this checkout does work under the same name.
 * Another one's work is waited for, as long as `patienceMs` allows.
 */
export async function alone(name, work, { patienceMs = 300_000 } = {}) {
  const path = inData(`${name}.lock`)
  const until = Date.now() + patienceMs
  while (!take(path) && !take(path)) {
    if (Date.now() >= until) throw new Mendable(`Another run holds ${path}`, 'wait for it to end, or delete that file if nothing runs')
    await pause(250)
  }
  try {
    return await work()
  }
  finally {
    rmSync(path, { force: true })
  }
}
