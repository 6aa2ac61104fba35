import { electricalCalculations } from '#shared/electrical/registry'
import type { Answer, CalculationProblem } from '#shared/utils/answer'
import { isCalculationProblem, runCalculation } from '#shared/utils/calculation'


export function ask(name: string, input: unknown): Answer<unknown> | CalculationProblem {
  return runCalculation(electricalCalculations[name]!, input)
}

export function answerTo<R = Record<string, number>>(name: string, input: unknown): Answer<R> & { result: R } {
  const reply = ask(name, input)
  if (isCalculationProblem(reply)) throw new Error(JSON.stringify(reply))
  return reply as Answer<R> & { result: R }
}

export function issuesOf(name: string, input: unknown) {
  const reply = ask(name, input)
  if (!isCalculationProblem(reply)) throw new Error(`An answer where a refusal was expected: ${JSON.stringify(reply)}`)
  return reply.error.issues
}
