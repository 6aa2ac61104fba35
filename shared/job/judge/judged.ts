/** Asks a calculation on the job's own figures, and says in words what it waits for. */
import type { Answer } from '../../utils/answer'
import { waiting } from '../../utils/answer'
import { isCalculationProblem, runCalculation, type Calculation } from '../../utils/calculation'
import type { FieldRef, Judged } from './types'

export interface Asked {
  title: string
  /** What goes in; keys without a value are left out. */
  input: Record<string, unknown>
  /** Where each input key comes from; a key like `legs.0.L_m` falls back on `legs`. */
  from: Record<string, FieldRef | readonly FieldRef[]>
}

export function judged<I, R>(calculation: Calculation<I, R>, { title, input, from }: Asked): Judged<R> {
  const given = withoutBlanks(input)
  const answer = answerOf(calculation, given)
  return { name: calculation.name, title, input: given, answer, waitsFor: waitsFor(answer.missing, from) }
}

/**
 * Answers given lately, by the question. A job is judged again on every keystroke, and one key changes one figure: all
 * other questions were just asked. The same question always has the same answer, so keeping it changes nothing but the time.
 */
const lately = new Map<string, Answer<unknown>>()
const MOST_KEPT = 400

function answerOf<I, R>(calculation: Calculation<I, R>, given: Record<string, unknown>): Answer<R> {
  const question = `${calculation.name} ${JSON.stringify(given)}`
  const kept = lately.get(question)
  if (kept) return kept as Answer<R>
  const reply = runCalculation(calculation, given)
  // Figures that cannot be put together (a method the cable's table has not) are to be changed: until then nobody can tell.
  const answer: Answer<R> = isCalculationProblem(reply)
    ? waiting(reply.error.issues.map(issue => issue.path), { reasons: reply.error.issues.map(issue => issue.message) })
    : reply
  if (lately.size >= MOST_KEPT) lately.clear()
  lately.set(question, answer)
  return answer
}

export function withoutBlanks(input: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(input).filter(([, value]) => value !== undefined && value !== null))
}

function waitsFor(missing: readonly string[], from: Asked['from']): FieldRef[] {
  const refs = missing.flatMap(key => from[key] ?? from[key.split('.')[0]!] ?? [])
  return [...new Map(refs.map(ref => [ref.field, ref])).values()]
}

/** "the length, the device's rating and 2 more" for a sentence. */
export function listWords(refs: readonly FieldRef[]): string {
  const words = refs.slice(0, 3).map(ref => ref.words)
  const rest = refs.length - words.length
  const all = rest > 0 ? [...words, `${rest} more`] : words
  return all.length > 1 ? `${all.slice(0, -1).join(', ')} and ${all.at(-1)}` : all[0] ?? ''
}
