import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findCalculation, listCalculations } from '#shared/calculations/answer-calculation'
import { isCalculationProblem, runCalculation } from '#shared/utils/calculation'
import { findRule, ruleIdOf } from '#shared/job/rules/rule'
import { anyInput } from './any-input'

const RUNS = 300

/** The path of the first number that is not finite, or null. */
function badNumber(value: unknown, path = ''): string | null {
  if (typeof value === 'number') return Number.isFinite(value) ? null : path
  if (value === null || typeof value !== 'object') return null
  for (const [key, inner] of Object.entries(value)) {
    const found = badNumber(inner, `${path}.${key}`)
    if (found !== null) return found
  }
  return null
}

describe.each(listCalculations().map(listing => [listing.name, listing] as const))('%s', (name, { purpose, input }) => {
  it('says in one line what it is for', () => {
    expect(purpose).toMatch(/^\S.{10,140}$/)
    expect(input).toHaveProperty('type', 'object')
  })

  it('answers or refuses whatever it is given, in the contract\'s shape, and never with NaN', () => {
    fc.assert(fc.property(anyInput(input), (given) => {
      const before = JSON.stringify(given)
      const reply = runCalculation(findCalculation(name)!, given)
      expect(JSON.stringify(given)).toBe(before)
      expect(badNumber(reply)).toBeNull()
      if (isCalculationProblem(reply)) {
        expect(reply.error.message).not.toBe('')
        expect(reply.error.issues.length).toBeGreaterThan(0)
        return
      }
      expect(['within', 'outside', 'waiting', null]).toContain(reply.verdict)
      if (reply.verdict === 'waiting') expect(reply.missing.length).toBeGreaterThan(0)
      for (const line of [...reply.reasons, ...reply.notes]) {
        expect(line).not.toMatch(/NaN|undefined|Infinity/)
        if (/^[A-Z]{3}-\d{2}: /.test(line)) expect(findRule(ruleIdOf(line) ?? '')).not.toBeNull()
      }
    }), { numRuns: RUNS })
  })
})
