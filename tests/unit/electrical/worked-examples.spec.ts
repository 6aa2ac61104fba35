import { describe, expect, it } from 'vitest'
import { electricalCalculations } from '#shared/electrical/registry'
import { isCalculationProblem, runCalculation } from '#shared/utils/calculation'
import fixture from '../../fixtures/worked-examples/electrical.json'

interface Example {
  id: string
  calc: string
  input: unknown
  expect: { verdict?: string, result?: Record<string, unknown>, reasonsInclude?: string[] }
  tolerance: Record<string, number>
  note: string
}

/** Compares what the example states and leaves what it is silent on. */
function compare(actual: unknown, expected: unknown, tolerance: Record<string, number>, key: string) {
  if (Array.isArray(expected)) return expected.forEach((each, index) => compare((actual as unknown[] | undefined)?.[index], each, tolerance, key))
  if (expected !== null && typeof expected === 'object') {
    for (const [inner, value] of Object.entries(expected)) compare((actual as Record<string, unknown> | undefined)?.[inner], value, tolerance, inner)
    return
  }
  if (typeof expected !== 'number') return expect(actual, key).toBe(expected)
  expect(typeof actual, key).toBe('number')
  const room = tolerance[key] ?? Math.abs(expected) * 0.005
  expect(Math.abs((actual as number) - expected), `${key}: ${actual} for ${expected}`).toBeLessThanOrEqual(room + 1e-9)
}

describe('worked examples', () => {
  it.each((fixture.examples as unknown as Example[]).map(example => [`${example.id} ${example.calc}`, example] as const))('%s', (_title, example) => {
    const calculation = electricalCalculations[example.calc]
    expect(calculation, example.calc).toBeDefined()
    const reply = runCalculation(calculation!, example.input)
    if (isCalculationProblem(reply)) throw new Error(JSON.stringify(reply))
    if (example.expect.verdict !== undefined) expect(reply.verdict).toBe(example.expect.verdict)
    if (example.expect.result) compare(reply.result, example.expect.result, example.tolerance, 'result')
    for (const ids of example.expect.reasonsInclude ?? []) {
      expect(reply.reasons.some(reason => ids.split('|').some(id => reason.startsWith(`${id}:`))), `${ids} in ${reply.reasons.join(' / ')}`).toBe(true)
    }
  })
})
