import { describe, expect, it } from 'vitest'
import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { plainFace } from '#server/adapters/pdf/plain-face'

const font = readFileSync(createRequire(import.meta.url).resolve('@expo-google-fonts/inter/400Regular/Inter_400Regular.ttf'))

describe('a plain face', () => {
  it('has lost the swapping by neighbours and nothing else', () => {
    const plain = plainFace(font)
    const changed = [...plain].flatMap((byte, at) => (byte === font[at] ? [] : [at]))
    expect(plain.length).toBe(font.length)
    expect(font.includes('calt')).toBe(true)
    expect(plain.includes('calt')).toBe(false)
    expect(plain.includes('tnum')).toBe(true)
    expect(changed.every(at => 'calt'.includes(String.fromCharCode(font[at] ?? 0)))).toBe(true)
  })

  it('leaves a font without substitutions as it is', () => {
    const bare = Buffer.alloc(12 + 16)
    bare.writeUInt16BE(1, 4)
    bare.write('glyf', 12, 'latin1')
    expect(plainFace(bare).equals(bare)).toBe(true)
  })
})
