/**
 * How large must main bonding be?
 *
 * PME: by the supply's neutral. Otherwise half the earthing conductor, at least 6 mm² and no more than 25 mm² need be.
 *
 * @source BS 7671 544.1.1 and Table 54.8; earthing conductor by Table 54.7
 * @example PME, neutral 25 mm² -> 10 mm²; TT, earthing conductor 16 mm² -> half is 8, next size 10 mm²
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer, WorkingStep } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { above, fields, oneOf } from './inputs'
import { nextStandardSize } from './standard-sizes'
import { tableProtectiveSizes } from './table-54-7'
import { shown, step } from './working'

const input = fields({
  system: oneOf('the system', ['PME', 'TN-S', 'TT']),
  neutral_mm2: above('the neutral\'s size'),
  earthing_mm2: above('the earthing conductor\'s size'),
  line_mm2: above('the line conductor\'s size'),
})
export type BondingInput = z.infer<typeof input>
export interface BondingResult { earthing_mm2?: number, bonding_mm2: number }

/** Table 54.8: neutral up to, bonding. */
const BY_NEUTRAL = [[35, 10], [50, 16], [95, 25], [150, 35], [Number.POSITIVE_INFINITY, 50]] as const
const LEAST_MM2 = 6
const MOST_MM2 = 25

export function bonding({ system, neutral_mm2, earthing_mm2, line_mm2 }: BondingInput): Answer<BondingResult> {
  if (system === undefined) return waiting(['system'])
  const live_mm2 = neutral_mm2 ?? line_mm2
  const earthing = earthingConductor(earthing_mm2, line_mm2 ?? neutral_mm2)
  if (system === 'PME') {
    if (live_mm2 === undefined) return waiting(['neutral_mm2'])
    const bonding_mm2 = BY_NEUTRAL.find(([upTo]) => live_mm2 <= upTo)![1]
    return answer({
      result: { ...earthing && { earthing_mm2: earthing.size_mm2 }, bonding_mm2 },
      working: [...earthing?.working ?? [], step('bonding', `neutral ${shown(live_mm2)} mm²`, bonding_mm2, 'mm²', 'Table 54.8', 'two sources')],
      notes: [...neutral_mm2 === undefined ? ['No neutral is given: it is taken to be as large as the line conductor.'] : [], 'SUR-14: copper; the network operator may ask for more.'],
    })
  }
  if (!earthing) return waiting(['earthing_mm2'])
  const half_mm2 = Math.min(Math.max(earthing.size_mm2 / 2, LEAST_MM2), MOST_MM2)
  const bonding_mm2 = nextStandardSize(half_mm2)!
  return answer({
    result: { earthing_mm2: earthing.size_mm2, bonding_mm2 },
    working: [...earthing.working, step('bonding', `${shown(earthing.size_mm2)} ÷ 2, at least ${LEAST_MM2}, at most ${MOST_MM2}, next size made`, bonding_mm2, 'mm²', 'BS 7671 544.1.1', 'two sources')],
  })
}

function earthingConductor(earthing_mm2: number | undefined, line_mm2: number | undefined): { size_mm2: number, working: WorkingStep[] } | null {
  if (earthing_mm2 !== undefined) return { size_mm2: earthing_mm2, working: [] }
  if (line_mm2 === undefined) return null
  const table = tableProtectiveSizes(line_mm2)
  const size_mm2 = nextStandardSize(table.size_mm2) ?? table.size_mm2
  return { size_mm2, working: [step('earthing conductor', table.expression, size_mm2, 'mm²', 'Table 54.7', 'two sources')] }
}

export const bondingCalculation = defineCalculation({ name: 'bonding', purpose: 'The main bonding and earthing conductors a supply needs.', input, run: bonding })
