import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatPounds, shareOf, splitPence, vatOn } from '#shared/utils/money'

const sum = (parts: number[]) => parts.reduce((total, part) => total + part, 0)

describe('formatPounds', () => {
  it.each([
    [123_450, '£1,234.50'], [0, '£0.00'], [5, '£0.05'], [100_000_000, '£1,000,000.00'], [-5, '\u2212£0.05'], [-123_456, '\u2212£1,234.56'],
  ])('%d p is %s', (amount, text) => {
    expect(formatPounds(amount)).toBe(text)
  })
})

describe('shareOf', () => {
  it.each([
    [5, 1, 2, 3, 2], [-5, 1, 2, -3, -2], [4, 1, 2, 2, 2], [1, 1, 3, 0, 0], [2, 1, 3, 1, 0],
  ])('%d × %d ÷ %d: %d to the nearest, %d down', (amount, numerator, denominator, nearest, down) => {
    expect(shareOf(amount, numerator, denominator)).toBe(nearest)
    expect(shareOf(amount, numerator, denominator, 'down')).toBe(down)
  })

  it('is exact where a float would not be', () => {
    expect(vatOn(9_007_199_254_740_991, 10_000)).toBe(9_007_199_254_740_991)
  })
})

describe('splitPence', () => {
  it.each([
    [100, [1, 1, 1], [34, 33, 33]],
    [101, [1, 1, 1], [34, 34, 33]],
    [10, [1, 2, 3], [2, 3, 5]],
    [-100, [1, 1, 1], [-34, -33, -33]],
    [7, [0, 0], [4, 3]],
    [5, [0, 1], [0, 5]],
    [5, [], []],
  ])('%d by %j is %j', (total, weights, parts) => {
    expect(splitPence(total, weights)).toEqual(parts)
  })

  it('hands out every penny and never more than one above the exact share', () => {
    const weights = fc.array(fc.integer({ min: 0, max: 100_000 }), { minLength: 1, maxLength: 20 })
    fc.assert(fc.property(fc.integer({ min: -1_000_000_000, max: 1_000_000_000 }), weights, (total, given) => {
      const parts = splitPence(total, given)
      expect(sum(parts)).toBe(total)
      const whole = sum(given)
      if (whole > 0) parts.forEach((part, at) => expect(Math.abs(part - total * given[at]! / whole)).toBeLessThan(1.000001))
    }))
  })

  it('gives a heavier part no less', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 1_000_000 }), fc.array(fc.integer({ min: 0, max: 100 }), { minLength: 2, maxLength: 8 }), (total, given) => {
      const sorted = [...given].sort((a, b) => b - a)
      const parts = splitPence(total, sorted)
      expect(parts).toEqual([...parts].sort((a, b) => b - a))
    }))
  })
})
