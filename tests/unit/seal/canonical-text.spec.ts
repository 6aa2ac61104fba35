import { describe, expect, it } from 'vitest'
import { canonicalText } from '#shared/seal/canonical-text'

describe('canonical text', () => {
  it('gives the text of the example in RFC 8785, section 3.2.2 (from memory)', () => {
    const value = JSON.parse('{"numbers":[333333333.33333329,1E30,4.50,2e-3,0.000000000000000000000000001],"string":"\\u20ac$\\u000F\\u000aA\'\\u0042\\u0022\\u005c\\\\\\"\\/","literals":[null,true,false]}')
    expect(canonicalText(value)).toBe('{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}')
  })

  it('orders keys by UTF-16 units as in RFC 8785, section 3.2.3 (from memory)', () => {
    const value = { '€': 'Euro Sign', '\r': 'Carriage Return', '\ufb33': 'Hebrew Letter Dalet With Dagesh', '1': 'One', '😀': 'Emoji: Grinning Face', '\u0080': 'Control', 'ö': 'Latin Small Letter O With Diaeresis' }
    const order = Object.values(JSON.parse(canonicalText(value)) as Record<string, string>)
    expect([...canonicalText(value).matchAll(/:"([^"]+)"/g)].map(found => found[1])).toEqual(['Carriage Return', 'One', 'Control', 'Latin Small Letter O With Diaeresis', 'Euro Sign', 'Emoji: Grinning Face', 'Hebrew Letter Dalet With Dagesh'])
    expect(order).toHaveLength(7)
  })

  it.each([[-0, '0'], [1e21, '1e+21'], [9007199254740994, '9007199254740994'], [5e-324, '5e-324'], [0.1 + 0.2, '0.30000000000000004']])('writes %d as %s (RFC 8785, appendix B, and ECMAScript)', (value, text) => {
    expect(canonicalText([value])).toBe(`[${text}]`)
  })

  it('does not depend on the order in which keys were written', () => {
    expect(canonicalText({ b: { d: 1, c: 2 }, a: 3 })).toBe(canonicalText({ a: 3, b: { c: 2, d: 1 } }))
  })

  it.each([['nothing', undefined], ['not a number', [Number.NaN]], ['infinity', { a: Infinity }], ['half a surrogate pair', ['\uD800']]])('refuses %s', (_, value) => {
    expect(() => canonicalText(value)).toThrow()
  })
})
