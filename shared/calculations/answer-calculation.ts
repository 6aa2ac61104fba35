/** The contract of every calculation as its two doors see it: a name and a body of JSON in, JSON out. */
import * as z from 'zod'
import type { Answer, CalculationProblem } from '../utils/answer'
import { calculationProblem, isCalculationProblem, runCalculation, type ErasedCalculation } from '../utils/calculation'
import { calculations } from './registry'

export type CalculationReply = Answer<unknown> | CalculationProblem

export interface CalculationOutcome {
  /** False where the name is unknown or a single input was refused; an array is answered item by item and is never refused whole. */
  isAnswered: boolean
  reply: CalculationReply | CalculationReply[]
}

/** The calculation of that name, or null. */
export function findCalculation(name: string): ErasedCalculation | null {
  return Object.hasOwn(calculations, name) ? calculations[name] ?? null : null
}

/** Answers one object, or each object of an array in its own place. */
export function answerCalculation(name: string, body: unknown): CalculationOutcome {
  const calculation = findCalculation(name)
  if (!calculation) {
    return { isAnswered: false, reply: calculationProblem([{ path: '', message: `There is no calculation named "${name}". "list" gives the names.` }]) }
  }
  if (Array.isArray(body)) return { isAnswered: true, reply: body.map(item => runCalculation(calculation, item)) }
  const reply = runCalculation(calculation, body)
  return { isAnswered: !isCalculationProblem(reply), reply }
}

export interface CalculationListing {
  name: string
  purpose: string
  /** JSON Schema of one input object. */
  input: object
}

/** Every name with its one-line purpose and what it takes. */
export function listCalculations(): CalculationListing[] {
  return Object.entries(calculations).map(([name, { purpose, input }]) => ({
    name,
    purpose,
    input: z.toJSONSchema(input, { io: 'input', unrepresentable: 'any' }),
  }))
}
