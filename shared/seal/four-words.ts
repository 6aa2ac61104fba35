import { SEAL_WORDS } from './words.data'

/**
 * Which four words stand for a hash, so that two people can compare it by ear.
 *
 * The first 44 bits of the hash are four numbers of 11 bits, each a place (from 0) in the list of 2,048 words.
 *
 * @source list and order: words.data.ts; 11 hexadecimal digits are 44 bits
 * @example a hash of zeros -> abandon abandon abandon abandon
 */
export function fourWords(hashHex: string): [string, string, string, string] {
  if (!/^[0-9a-f]{64}$/.test(hashHex)) throw new RangeError('Four words are made from a SHA-256 in lower-case hexadecimal')
  const bits = Number.parseInt(hashHex.slice(0, 11), 16)
  const wordAt = (place: number) => SEAL_WORDS[Math.floor(bits / 2048 ** place) % 2048] ?? ''
  return [wordAt(3), wordAt(2), wordAt(1), wordAt(0)]
}
