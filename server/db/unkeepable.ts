import { problem } from '../../shared/utils/problem'

/**
 * PostgreSQL's class 22: of the right form, and still nothing that can be kept or looked for, such as a zero byte in a text,
 * a number beyond its column or a day of the year 0. It comes from what was entered, so it is answered as that.
 * @source PostgreSQL documentation, appendix "Error Codes"
 */
const CANNOT_BE_KEPT = /^22[0-9A-Z]{3}$/

/** The error itself, or a refusal in words where what was entered is the cause. */
export function asRefusal(error: unknown): unknown {
  if (!isUnkeepable(error)) return error
  const refusal = problem('check-answers', 'Something in this cannot be kept as it stands: a sign that is no letter or figure, a number far too large, or a day that does not exist.')
  refusal.cause = error
  return refusal
}

function isUnkeepable(error: unknown): boolean {
  const { code, cause } = error as { code?: unknown, cause?: unknown }
  return (typeof code === 'string' && CANNOT_BE_KEPT.test(code)) || (cause !== undefined && cause !== null && isUnkeepable(cause))
}
