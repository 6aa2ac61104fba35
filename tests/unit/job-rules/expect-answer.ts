import { expect } from 'vitest'
import type { Answer } from '#shared/utils/answer'
import { isCalculationProblem } from '#shared/utils/calculation'
import type { CalculationReply } from '#shared/calculations/answer-calculation'

export interface WorkedExample {
  id: string
  calc: string
  input: unknown
  expect: { verdict?: string, result?: Record<string, unknown>, reasonsInclude?: string[] }
  tolerance: Record<string, number>
}

/** A reply that must be an answer, not a refusal. */
export function mustBeAnswer(reply: CalculationReply | CalculationReply[]): Answer<unknown> {
  if (Array.isArray(reply)) throw new Error('An array came back for one object')
  if (isCalculationProblem(reply)) throw new Error(`Refused: ${JSON.stringify(reply.error)}`)
  return reply
}

/** Holds every expected figure against the one found: by tolerance where a number, exactly otherwise. */
export function expectToFit(found: unknown, wanted: unknown, tolerance: Record<string, number>, key = 'result') {
  if (typeof wanted === 'number') {
    expect(Math.abs(Number(found) - wanted), key).toBeLessThanOrEqual(tolerance[key] ?? Math.abs(wanted) * 0.005)
    return
  }
  if (Array.isArray(wanted)) {
    expect(found, key).toEqual(wanted)
    return
  }
  if (wanted !== null && typeof wanted === 'object') {
    const inside = found as Record<string, unknown>
    for (const [name, value] of Object.entries(wanted)) expectToFit(inside[name], value, tolerance, name)
    return
  }
  expect(found, key).toBe(wanted)
}

/** Whether one of the ids parted by | begins a reason or a note. */
export function namesRule(answer: Answer<unknown>, ids: string): boolean {
  return ids.split('|').some(id => [...answer.reasons, ...answer.notes].some(line => line.startsWith(`${id}:`)))
}
