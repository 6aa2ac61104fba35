/**
 * The one shape in which a calculation answers (the contract is described in DEVELOPERS.md, "A calculation").
 * A calculation never throws for a blank or odd reading: what is missing makes it `waiting`.
 */
import type { Verdict } from './verdict'

/** How well a figure is known. The words are those of the reference data; they are shown wherever the figure is used. */
export type Confidence = 'two sources' | 'one source' | 'from memory' | 'common practice' | 'confirmed' | 'computed' | 'given'

/** One step of the working: the symbol, the expression with the numbers in it, its value and what it rests on. */
export interface WorkingStep {
  symbol: string
  expression: string
  value: number | string
  unit: string
  source: string
  confidence: Confidence
}

export interface Answer<Result> {
  /** null where the calculation judges nothing (it only gives a figure). */
  verdict: Extract<Verdict, 'within' | 'outside' | 'waiting'> | null
  /** Full precision; screens and papers round once. Partial while waiting. */
  result: Partial<Result>
  working: WorkingStep[]
  /** What a `waiting` verdict waits for, as keys of the input. */
  missing: string[]
  /** Why the verdict is what it is; begins with the rule's id where a rule of the trade stands behind it. */
  reasons: string[]
  notes: string[]
}

type Given<Result> = Partial<Omit<Answer<Result>, 'result'>> & { result: Result }

/** A complete answer; whatever list is left out is empty. */
export function answer<Result>(given: Given<Result>): Answer<Result> {
  return { verdict: null, working: [], missing: [], reasons: [], notes: [], ...given }
}

/** An answer that cannot be given yet, naming the inputs it waits for. */
export function waiting<Result>(missing: string[], rest: Partial<Omit<Answer<Result>, 'verdict' | 'missing'>> = {}): Answer<Result> {
  return { verdict: 'waiting', result: {}, working: [], reasons: [], notes: [], ...rest, missing }
}

/** The contract's answer to bad input: never NaN, never a stack trace. */
export interface CalculationProblem {
  error: { message: string, issues: { path: string, message: string }[] }
}
