/**
 * The one way pages talk to the server: plainly typed (the framework's own typing of every route is too deep for the
 * compiler), and every refusal comes back as a `Problem`.
 */
import { ProblemError, type Problem } from '#shared/utils/problem'

interface CallOptions { method?: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE', body?: unknown, query?: Record<string, unknown> }
type PlainFetch = (url: string, options?: Record<string, unknown>) => Promise<unknown>

/** @throws ProblemError always; a lost connection is `try-later`. */
export async function callApi<T>(url: string, options: CallOptions = {}): Promise<T> {
  const plain = (import.meta.server ? useRequestFetch() as unknown : $fetch as unknown) as PlainFetch
  try {
    return await plain(url, { ...options, retry: 0 }) as T
  }
  catch (error) {
    throw new ProblemError(readProblem(error))
  }
}

/** A refusal as the server put it, whatever wrapped it on the way. */
export function readProblem(error: unknown): Problem {
  if (error instanceof ProblemError) return error.problem
  const { data, statusCode } = error as { data?: { data?: Problem } & Partial<Problem>, statusCode?: number }
  const problem = data?.data ?? data
  if (problem?.code && problem.message) return problem as Problem
  if (statusCode === undefined && (error as Error).name === 'FetchError') return { code: 'try-later', message: 'There is no connection to the server just now. What you entered is still here.' }
  return { code: 'try-later', message: 'Something went wrong on the server. What you entered is still here: try again in a moment.' }
}
