import { describe, expect, it } from 'vitest'
import { fourWords } from '#shared/seal/four-words'
import { SEAL_WORDS } from '#shared/seal/words.data'

describe('the list of words', () => {
  it('holds 2,048 different words, told apart by four letters, from abandon to zoo', () => {
    expect(SEAL_WORDS).toHaveLength(2048)
    expect(new Set(SEAL_WORDS.map(word => word.slice(0, 4))).size).toBe(2048)
    expect([SEAL_WORDS[0], SEAL_WORDS[2047]]).toEqual(['abandon', 'zoo'])
    expect(SEAL_WORDS.every(word => /^[a-z]{3,8}$/.test(word))).toBe(true)
  })
})

describe('four words', () => {
  it.each([
    ['0'.repeat(64), ['abandon', 'abandon', 'abandon', 'abandon']],
    ['f'.repeat(64), ['zoo', 'zoo', 'zoo', 'zoo']],
    // 00000000001 in 11-bit groups: 00000000000 00000000000 00000000000 00000000001
    ['00000000001' + 'f'.repeat(53), ['abandon', 'abandon', 'abandon', 'ability']],
    ['00200400801' + '0'.repeat(53), ['ability', 'ability', 'ability', 'ability']],
  ])('reads the first 44 bits of %s', (hash, words) => {
    expect(fourWords(hash)).toEqual(words)
  })

  it.each(['', 'ABC', '0'.repeat(63), 'g'.repeat(64)])('refuses "%s"', (hash) => {
    expect(() => fourWords(hash)).toThrow(RangeError)
  })
})
