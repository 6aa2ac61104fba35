/**
 * What every calculation is to the outside: a name, a purpose, an input schema and one pure function.
 * The `calc` command line, the API route and the screens all go through `runCalculation`.
 */
import type * as z from 'zod'
import type { Answer, CalculationProblem } from './answer'

export interface Calculation<I, R> {
  name: string
  /** One line for a list. */
  purpose: string
  /** Convertible by z.toJSONSchema; what may be left out is optional here and defaulted in `run`. */
  input: z.ZodType<I>
  run(input: I): Answer<R>
}

/** A calculation whose input and result are known to itself only; how a registry holds it. */
export type ErasedCalculation = Calculation<unknown, unknown>

/** Lets the compiler read the input type off the schema and the result type off the function. */
export function defineCalculation<I, R>(calculation: Calculation<I, R>): Calculation<I, R> {
  return calculation
}

/** Refuses an input that is well formed but asks for what is not there: a size that is not made, a method the table has not. */
export class CalculationInputError extends Error {
  constructor(readonly path: string, message: string) {
    super(message)
    this.name = 'CalculationInputError'
  }
}

export function calculationProblem(issues: { path: string, message: string }[]): CalculationProblem {
  return { error: { message: issues.length === 1 ? issues[0]!.message : 'Check these answers.', issues } }
}

/** Whether what came back is an answer or the contract's refusal. */
export function isCalculationProblem(reply: Answer<unknown> | CalculationProblem): reply is CalculationProblem {
  return 'error' in reply
}

/** Parses the raw input, runs the calculation and makes sure that no figure leaves that is not a number. */
export function runCalculation<I, R>(calculation: Calculation<I, R>, rawInput: unknown): Answer<R> | CalculationProblem {
  const parsed = calculation.input.safeParse(rawInput)
  if (!parsed.success) return calculationProblem(parsed.error.issues.map(toIssue))
  try {
    const reply = calculation.run(parsed.data)
    const path = pathOfNonFinite(reply.result, 'result') ?? pathOfNonFinite(reply.working, 'working')
    return path === null ? reply : calculationProblem([{ path: '', message: `These figures give no number for ${path}. Check them.` }])
  }
  catch (error) {
    if (error instanceof CalculationInputError) return calculationProblem([{ path: error.path, message: error.message }])
    throw error
  }
}

function toIssue(issue: z.core.$ZodIssue) {
  return { path: issue.path.map(String).join('.'), message: issue.message }
}

/** Where the first NaN or Infinity sits, or null. */
function pathOfNonFinite(value: unknown, path: string): string | null {
  if (typeof value === 'number') return Number.isFinite(value) ? null : path
  if (value === null || typeof value !== 'object') return null
  for (const [key, inner] of Object.entries(value)) {
    const found = pathOfNonFinite(inner, `${path}.${key}`)
    if (found !== null) return found
  }
  return null
}
