import { createHash } from 'node:crypto'
import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The checkout's own folder, without a trailing slash. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')

/** What a run leaves behind on this machine: secrets, stamps, logs, files. Never committed. */
export const dataDir = join(root, '.data')

/** Joins a path under the checkout. */
export const inRoot = (...parts) => join(root, ...parts)

/** Joins a path under `.data` and makes the folder that holds it. */
export function inData(...parts) {
  const path = join(dataDir, ...parts)
  mkdirSync(join(path, '..'), { recursive: true, mode: 0o700 })
  return path
}

/** Eight characters that differ between two checkouts on one machine. */
export const checkoutMark = createHash('sha256').update(root).digest('hex').slice(0, 8)
