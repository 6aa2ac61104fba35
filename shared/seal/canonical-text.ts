import canonicalize from 'canonicalize'

/**
 * The one text a record has, whoever writes it down: keys in order, no spare space, numbers in their shortest form.
 * A value that JSON cannot hold (undefined at the top, NaN, half a surrogate pair) is refused, never guessed at.
 *
 * @source RFC 8785, JSON Canonicalization Scheme
 * @example { b: 1.0, a: 'x' } -> {"a":"x","b":1}
 */
export function canonicalText(value: unknown): string {
  const text = canonicalize(value)
  if (text === undefined) throw new TypeError('There is no JSON for this value')
  if (!text.isWellFormed()) throw new TypeError('Text with half a surrogate pair has no UTF-8')
  return text
}
