/**
 * Does the residual current device of a charging point act in time, and is it of a kind that may be used?
 *
 * @source BS 7671 643.8 and Table 3A (300 ms at IΔn since A2:2022; 40 ms at five times before), 722.531.3; IEC 62955
 * @example type A, 30 mA, 28 ms at IΔn -> limit 300 ms, within
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer, WorkingStep } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notAbove } from './compare'
import { hasAmendment2 } from './editions'
import { above, fields, fromZero, oneOf, yesNo } from './inputs'
import { shown, step } from './working'

const input = fields({
  type: oneOf('the type', ['AC', 'A', 'F', 'B']),
  IdeltaN_mA: above('the rated residual current in mA'),
  delay: yesNo('whether it is time-delayed'),
  trip_ms: fromZero('the time in ms'),
  multiple: z.literal([1, 5], 'Give the multiple as 1 or 5.').optional(),
  edition: z.string('Give the edition in full, such as BS 7671:2018+A4:2026.').optional(),
  shared: yesNo('whether other circuits share it'),
  dc: fields({ trip_s: fromZero('the d.c. time in s'), at_mA: above('the d.c. current in mA') }).optional(),
  waited_s: fromZero('the seconds waited'),
  randomDelay_s: fromZero('the random delay'),
})
export type RcdTestInput = z.infer<typeof input>
export interface RcdTestResult {
  limit_ms: number
  /** Only of a delayed device. */
  least_ms?: number
  /** At the d.c. current of the test. */
  dcLimit_s?: number
}

const LIMIT_MS = 300
const LIMIT_FIVE_TIMES_MS = 40
/** Type S at IΔn and at five times, IEC 61008: least and most. */
const DELAYED_MS = { 1: [130, 500], 5: [50, 150] } as const
const MOST_mA = 30
const LONGEST_DELAY_S = 600
/** At this smooth direct current, within so many seconds. */
const DC_LIMITS = [{ at_mA: 6, within_s: 10 }, { at_mA: 60, within_s: 0.3 }, { at_mA: 200, within_s: 0.1 }] as const

export function rcdTest(given: RcdTestInput): Answer<RcdTestResult> {
  const { multiple = 1, delay = false, edition, IdeltaN_mA, trip_ms } = given
  const needed = (['type', 'IdeltaN_mA', 'edition'] as const).filter(key => given[key] === undefined)
  if (edition === undefined || IdeltaN_mA === undefined || given.type === undefined) return waiting(needed)
  const sinceA2 = hasAmendment2(edition)
  const [least_ms, limit_ms] = delay ? DELAYED_MS[multiple] : [null, multiple === 5 ? LIMIT_FIVE_TIMES_MS : LIMIT_MS]
  const dcLimit = given.dc?.at_mA === undefined ? null : DC_LIMITS.findLast(each => given.dc!.at_mA! >= each.at_mA) ?? DC_LIMITS[0]
  const result: RcdTestResult = { limit_ms, ...least_ms !== null && { least_ms }, ...dcLimit && { dcLimit_s: dcLimit.within_s } }
  const rest = { result, working: showWorking(given, result, multiple), notes: notesOn(given, sinceA2, multiple) }

  const against = [...refusals(given, IdeltaN_mA, delay), ...timeReasons(trip_ms, least_ms, limit_ms, multiple), ...dcReasons(given.dc)]
  const start = startDelay(given)
  if (against.length || start?.over) return answer({ ...rest, verdict: 'outside', reasons: [...against, ...start?.over ? [start.reason] : []] })
  const missing = [...trip_ms === undefined ? ['trip_ms'] : [], ...missingDc(given.dc)]
  if (missing.length) return waiting(missing, { ...rest, reasons: start ? [start.reason] : [] })
  return answer({ ...rest, verdict: 'within', reasons: [`${ruleOf(sinceA2, delay, multiple)}: ${shown(trip_ms!)} ms is within ${limit_ms} ms.`] })
}

function ruleOf(sinceA2: boolean, delay: boolean, multiple: 1 | 5): string {
  if (delay) return 'TST-13'
  return sinceA2 || multiple === 1 ? 'TST-11' : 'TST-12'
}

/** Kinds that must not protect a charging point, however fast they act. */
function refusals({ type, shared }: RcdTestInput, IdeltaN_mA: number, delay: boolean): string[] {
  const list: string[] = []
  if (type === 'AC') list.push('EAR-16: a type AC device must not be used for charging: direct current can blind it.')
  if (shared) list.push('EAR-14: each charging point needs a residual current device of its own; this one is shared.')
  if (delay && IdeltaN_mA <= MOST_mA) list.push('TST-13: a delayed device cannot give 30 mA additional protection.')
  if (!delay && IdeltaN_mA > MOST_mA) list.push(`EAR-14: a charging point needs at most ${MOST_mA} mA; this device has ${shown(IdeltaN_mA)} mA.`)
  return list
}

function timeReasons(trip_ms: number | undefined, least_ms: number | null, limit_ms: number, multiple: 1 | 5): string[] {
  if (trip_ms === undefined) return []
  const rule = least_ms !== null ? 'TST-13' : multiple === 5 ? 'TST-12' : 'TST-11'
  if (!notAbove(trip_ms, limit_ms)) return [`${rule}: ${shown(trip_ms)} ms is more than ${limit_ms} ms.`]
  if (least_ms !== null && !notAbove(least_ms, trip_ms)) return [`TST-13: a delayed device acts in ${least_ms} ms at the earliest; this took ${shown(trip_ms)} ms.`]
  return []
}

/** A device that must act at 6 mA is not proved by a current between 6 and 60 mA. */
function dcReasons(dc: RcdTestInput['dc']): string[] {
  if (dc?.at_mA === undefined) return []
  const limit = DC_LIMITS.findLast(each => dc.at_mA! >= each.at_mA) ?? DC_LIMITS[0]
  if (dc.at_mA > 6 && dc.at_mA < 60) return [`EAR-17: the direct-current part must act at 6 mA; this test was at ${shown(dc.at_mA)} mA.`]
  if (dc.trip_s === undefined || notAbove(dc.trip_s, limit.within_s)) return []
  return [`EAR-17: at ${shown(dc.at_mA)} mA d.c. it took ${shown(dc.trip_s)} s, more than ${limit.within_s} s.`]
}

function missingDc(dc: RcdTestInput['dc']): string[] {
  if (!dc) return []
  return (['trip_s', 'at_mA'] as const).filter(key => dc[key] === undefined).map(key => `dc.${key}`)
}

/** The charger may wait before current flows: until then no current means nothing. */
function startDelay({ trip_ms, waited_s, randomDelay_s = LONGEST_DELAY_S }: RcdTestInput): { over: boolean, reason: string } | null {
  if (trip_ms !== undefined || waited_s === undefined) return null
  const left_s = randomDelay_s - waited_s
  if (left_s > 0) return { over: false, reason: `TST-19: no current yet. The charger may wait up to ${shown(left_s)} s more: override its random delay, or wait.` }
  return { over: true, reason: `TST-19: no current after ${shown(waited_s)} s, and the random delay of ${shown(randomDelay_s)} s is over. Find out why charging does not start.` }
}

function notesOn({ type, dc, delay, IdeltaN_mA }: RcdTestInput, sinceA2: boolean, multiple: 1 | 5): string[] {
  const notes: string[] = []
  if (sinceA2 && multiple === 5) notes.push('TST-11: since A2:2022 the test at five times the rated current is not required; it may still be made.')
  if (!sinceA2 && multiple === 1 && !delay && IdeltaN_mA! <= MOST_mA) notes.push('TST-12: this edition also asks for the test at five times the rated current, within 40 ms.')
  if ((type === 'A' || type === 'F') && !dc) notes.push('EAR-15: with a type A or F device a 6 mA direct-current device is needed as well: record its test, or that it only tests itself.')
  if (delay && IdeltaN_mA! > MOST_mA) notes.push(`EAR-14: this device does not protect the charging point itself, which needs at most ${MOST_mA} mA of its own.`)
  return notes
}

function showWorking({ IdeltaN_mA, delay }: RcdTestInput, result: RcdTestResult, multiple: 1 | 5): WorkingStep[] {
  const steps = [step('limit', `at ${multiple} × ${shown(IdeltaN_mA!)} mA`, result.limit_ms, 'ms', delay ? 'BS EN 61008-1, type S' : 'BS 7671 643.8, Table 3A', delay && multiple === 5 ? 'from memory' : 'two sources')]
  if (result.dcLimit_s !== undefined) steps.push(step('d.c. limit', 'by test current', result.dcLimit_s, 's', 'IEC 62955', 'from memory'))
  return steps
}

export const rcdTestCalculation = defineCalculation({ name: 'rcd-test', purpose: 'Whether a charging point\'s residual current device acts in time and is of a kind that may be used.', input, run: rcdTest })
