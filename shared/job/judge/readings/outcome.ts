/** What judging one reading gives, and the small judgements that several tests share. */
import type { ReadingRow } from '../../../types/record'
import type { Answer, WorkingStep } from '../../../utils/answer'
import { notAbove, notBelow } from '../../../electrical/compare'
import type { CircuitResult } from '../../../electrical/circuit'
import type { TestKey } from '../../tests.data'
import type { TestReadings } from '../counted'
import type { JobInputs } from '../inputs-from-record'
import type { FieldRef, Judged, JudgedReading, ReadingExpected, ReadingLimit } from '../types'

/** Everything a reading is judged against. */
export interface ReadingBench {
  inputs: JobInputs
  counted: Record<TestKey, TestReadings>
  installed: Judged<CircuitResult>
  /** Edition of the wiring rules that the job is tested to. */
  edition: string
}

export interface ReadingOutcome {
  verdict: 'within' | 'outside' | 'waiting'
  reasons: string[]
  notes: string[]
  working: WorkingStep[]
  waitsFor: FieldRef[]
  /** What it waits for that is no field: "the charger's start delay". */
  waitsForWords?: string
  odd: string[]
  corrected: JudgedReading['corrected']
}

export interface Frame { limit: ReadingLimit | null, expected: ReadingExpected | null, waitsFor: FieldRef[] }

export interface TestJudge {
  /** What it must be and what the design leads one to expect, before anybody measures. */
  frame(bench: ReadingBench): Frame
  /** `value` is null for what was seen or is over the tester's range without a bound. */
  judge(bench: ReadingBench, reading: ReadingRow, value: number | null, frame: Frame): ReadingOutcome
}

export const EMPTY_FRAME: Frame = { limit: null, expected: null, waitsFor: [] }

export function outcome(verdict: ReadingOutcome['verdict'], rest: Partial<ReadingOutcome> = {}): ReadingOutcome {
  return { verdict, reasons: [], notes: [], working: [], waitsFor: [], odd: [], corrected: null, ...rest }
}

/** An engine's answer as an outcome. */
export function fromAnswer(answer: Answer<unknown>, waitsFor: FieldRef[] = []): ReadingOutcome {
  return outcome(answer.verdict ?? 'waiting', { reasons: answer.reasons, notes: answer.notes, working: answer.working, waitsFor: answer.verdict === 'waiting' ? waitsFor : [] })
}

/** A figure against the frame's limit; without a limit it waits for what the limit needs. */
export function againstLimit(value: number, { limit, waitsFor }: Frame): ReadingOutcome {
  if (!limit) return outcome('waiting', { waitsFor })
  const fits = limit.is === 'most' ? notAbove(value, limit.value) : notBelow(value, limit.value)
  return outcome(fits ? 'within' : 'outside')
}

/** Over the tester's range: the true value lies above the bound, which may or may not decide. */
export function overRange(value: number | null, { limit, waitsFor }: Frame): ReadingOutcome | null {
  if (!limit) return outcome('waiting', { waitsFor })
  if (limit.is === 'least') return value === null || notBelow(value, limit.value) ? outcome('within') : outcome('waiting', { waitsForWords: 'a range of the tester that reaches the limit' })
  return value === null || notBelow(value, limit.value) ? outcome('outside', { reasons: ['Over the range of the tester, and so over the limit.'] }) : outcome('waiting', { waitsForWords: 'a range of the tester that reaches the limit' })
}
