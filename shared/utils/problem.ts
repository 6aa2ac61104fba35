/** Every refusal a person can meet, and its HTTP status: one table, so that none can be forgotten. */
export const PROBLEM_STATUS = {
  'not-signed-in': 401,
  'not-allowed': 403,
  'not-found': 404,
  'wrong-stage': 409,
  'stale-copy': 409,
  'check-answers': 422,
  'base-needed': 428,
  'too-large': 413,
  'too-many': 429,
  'try-later': 503,
} as const

export type ProblemCode = keyof typeof PROBLEM_STATUS

export interface Problem {
  code: ProblemCode
  /** A sentence for the person: what is wrong and what to do. */
  message: string
  /** Field path to the sentence that belongs beside it. */
  fields?: Record<string, string>
  /** What an act is stopped by, as sentences. */
  reasons?: string[]
}

export class ProblemError extends Error {
  constructor(readonly problem: Problem) {
    super(problem.message)
  }
}

/** Shorthand: `throw problem('not-found', 'There is no such job.')`. */
export function problem(code: ProblemCode, message: string, rest: Omit<Problem, 'code' | 'message'> = {}): ProblemError {
  return new ProblemError({ code, message, ...rest })
}
