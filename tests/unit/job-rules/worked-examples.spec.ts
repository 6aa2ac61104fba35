import { describe, expect, it } from 'vitest'
import { answerCalculation } from '#shared/calculations/answer-calculation'
import examples from '../../fixtures/worked-examples/job.json'
import { expectToFit, mustBeAnswer, namesRule, type WorkedExample } from './expect-answer'

describe('worked examples of the trade', () => {
  it.each((examples.examples as unknown as WorkedExample[]).map(example => [example.id, example] as const))('%s', (_, example) => {
    const answer = mustBeAnswer(answerCalculation(example.calc, example.input).reply)
    if (example.expect.verdict) expect(answer.verdict).toBe(example.expect.verdict)
    expectToFit(answer.result, example.expect.result ?? {}, example.tolerance)
    for (const ids of example.expect.reasonsInclude ?? []) expect(namesRule(answer, ids), ids).toBe(true)
    expect(Object.keys(example.expect).length).toBeGreaterThan(0)
  })
})
