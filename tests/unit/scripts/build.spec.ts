import { describe, expect, it } from 'vitest'
import { fromFirstError } from '../../../scripts/lib/build.mjs'

const noise = (n: number) => Array.from({ length: n }, (_, i) => `line ${i}`)

describe('fromFirstError', () => {
  it('begins where the cause stands', () => {
    const output = [...noise(100), '[nitro]  ERROR  RollupError: Could not resolve "./gone"', ...noise(400)].join('\n')
    const shown = fromFirstError(output).split('\n')
    expect(shown[0]).toContain('Could not resolve "./gone"')
    expect(shown).toHaveLength(30)
  })

  it('shows the end when nothing calls itself an error', () => {
    expect(fromFirstError(noise(100).join('\n'), 2)).toBe('line 98\nline 99')
  })
})
