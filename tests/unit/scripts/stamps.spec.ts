import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { hashOf, isStamped, stamp } from '../../../scripts/lib/stamps.mjs'

let base: string
beforeEach(() => {
  base = mkdtempSync(join(tmpdir(), 'stamps-'))
  mkdirSync(join(base, 'app/pages'), { recursive: true })
  writeFileSync(join(base, 'app/pages/one.vue'), 'one')
  writeFileSync(join(base, 'nuxt.config.ts'), 'config')
})
afterEach(() => rmSync(base, { recursive: true }))

const names = ['app', 'public', 'nuxt.config.ts']

describe('hashOf', () => {
  it('is the same for the same files, and absent ones count as empty', () => {
    expect(hashOf(base, names)).toBe(hashOf(base, names))
    expect(hashOf(base, names)).toBe(hashOf(base, ['app', 'nuxt.config.ts', 'nowhere']))
  })

  it.each([
    ['a change of content', () => writeFileSync(join(base, 'app/pages/one.vue'), 'two')],
    ['a new file', () => writeFileSync(join(base, 'app/pages/two.vue'), '')],
    ['a new name for the same content', () => {
      rmSync(join(base, 'app/pages/one.vue'))
      writeFileSync(join(base, 'app/pages/uno.vue'), 'one')
    }],
    ['content that moves from one file to the next', () => {
      writeFileSync(join(base, 'app/pages/one.vue'), '')
      writeFileSync(join(base, 'nuxt.config.ts'), 'oneconfig')
    }],
  ])('tells %s', (_title, change) => {
    const before = hashOf(base, names)
    change()
    expect(hashOf(base, names)).not.toBe(before)
  })
})

describe('stamp', () => {
  it('holds for one hash only, and not at all without a file', () => {
    const path = join(base, 'built-from')
    expect(isStamped(path, 'a')).toBe(false)
    stamp(path, 'a')
    expect(isStamped(path, 'a')).toBe(true)
    expect(isStamped(path, 'b')).toBe(false)
  })
})
