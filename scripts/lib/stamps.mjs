import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import { join, relative } from 'node:path'

function* filesUnder(path) {
  if (!existsSync(path)) return
  if (!statSync(path).isDirectory()) return yield path
  for (const entry of readdirSync(path, { withFileTypes: true }).sort((a, b) => a.name < b.name ? -1 : 1)) {
    const inside = join(path, entry.name)
    if (entry.isDirectory()) yield* filesUnder(inside)
    else if (entry.isFile()) yield inside
  }
}

/** One hash over names and contents of files and folders; what is absent counts as empty. */
export function hashOf(base, names) {
  const hash = createHash('sha256')
  for (const name of names) {
    for (const file of filesUnder(join(base, name))) {
      hash.update(`${relative(base, file)}\0`).update(createHash('sha256').update(readFileSync(file)).digest())
    }
  }
  return hash.digest('hex')
}

/** True when the stamp file holds this very hash. */
export function isStamped(path, hash) {
  return existsSync(path) && readFileSync(path, 'utf8').trim() === hash
}

/** Notes that the work for this hash is done. */
export function stamp(path, hash) {
  writeFileSync(path, `${hash}\n`)
}
