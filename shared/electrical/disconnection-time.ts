/**
 * How soon must a fault be cleared?
 *
 * TN: 0.4 s for sockets up to 63 A and fixed equipment up to 32 A, else 5 s. TT: 0.2 s and 1 s.
 *
 * @source BS 7671 411.3.2.2 to 411.3.2.4, Table 41.1 (2018 wording for the 63 A)
 * @example TT, fixed, 32 A -> 0.2 s
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { above, fields, oneOf, system } from './inputs'
import { shown, step } from './working'

const input = fields({ system, circuit: oneOf('the circuit', ['socket', 'fixed']), In_A: above('the device\'s rating') })
export type DisconnectionTimeInput = z.infer<typeof input>
export interface DisconnectionTimeResult { time_s: number }

const SHORT_UP_TO_A = { socket: 63, fixed: 32 } as const
const SHORT_S = { TN: 0.4, TT: 0.2 } as const
const LONG_S = { TN: 5, TT: 1 } as const

export function disconnectionTime(given: DisconnectionTimeInput): Answer<DisconnectionTimeResult> {
  const { system, circuit, In_A } = given
  const missing = (['system', 'circuit', 'In_A'] as const).filter(key => given[key] === undefined)
  if (system === undefined || circuit === undefined || In_A === undefined) return waiting(missing)
  const short = In_A <= SHORT_UP_TO_A[circuit]
  const time_s = short ? SHORT_S[system] : LONG_S[system]
  return answer({
    result: { time_s },
    working: [step('time', `${system}, ${circuit}, ${shown(In_A)} A ${short ? 'is at most' : 'is over'} ${SHORT_UP_TO_A[circuit]} A`, time_s, 's', 'BS 7671 411.3.2, Table 41.1', system === 'TT' && !short ? 'from memory' : 'two sources')],
    notes: short ? [] : ['A charging point is held to the shorter time whatever its rating (common practice).'],
  })
}

export const disconnectionTimeCalculation = defineCalculation({ name: 'disconnection-time', purpose: 'How soon a fault must be cleared.', input, run: disconnectionTime })
