/** How a step of the working is written, so that every sheet writes numbers alike. */
import type { Confidence, WorkingStep } from '../utils/answer'

/** A number as it stands in an expression: as given, or to seven figures where it came out of arithmetic. */
export function shown(value: number): string {
  const text = String(value)
  return text.length <= 9 ? text : String(Number(value.toPrecision(7)))
}

export function step(symbol: string, expression: string, value: number | string, unit: string, source: string, confidence: Confidence): WorkingStep {
  return { symbol, expression, value, unit, source, confidence }
}

/** A step that rests on a law of physics or on plain arithmetic. */
export function computed(symbol: string, expression: string, value: number, unit: string, source = 'arithmetic'): WorkingStep {
  return { symbol, expression, value, unit, source, confidence: 'computed' }
}

/** Where a figure was looked up and how well it is known. */
export interface Cited {
  source: string
  confidence: Confidence
}

const RANK: readonly Confidence[] = ['from memory', 'common practice', 'one source', 'two sources', 'confirmed', 'computed', 'given']

/** The weaker of two labels: a figure is known no better than the worst it rests on. */
export function weaker(a: Confidence, b: Confidence): Confidence {
  return RANK.indexOf(a) <= RANK.indexOf(b) ? a : b
}
