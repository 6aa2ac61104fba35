/**
 * Is the charger mounted at a height that the rules allow?
 *
 * socket: 0.5 m ≤ lowest part ≤ 1.5 m; controls: 0.75 m ≤ lowest part ≤ 1.2 m
 *
 * @source rules EAR-19 and EAR-20
 * @example a socket at 0.45 m -> outside
 */
import * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { formatBesideLimit, formatMetres } from '../../utils/figures'
import { blankKeys } from './inputs'
import { because, ruleStep } from './rule'

const MOST_M = 20
const HEIGHTS = {
  socket: { least_m: 0.5, most_m: 1.5, rule: 'EAR-19' },
  controls: { least_m: 0.75, most_m: 1.2, rule: 'EAR-20' },
} as const

const input = fields({
  lowest_m: z.number('Enter a height in metres').min(0, 'Enter a height of 0 m or more').max(MOST_M, 'Enter a height a person can reach').nullish().describe('Height of the lowest part above the ground'),
  kind: z.enum(['socket', 'controls'], 'Enter socket or controls').nullish(),
})
export type MountingInput = z.infer<typeof input>

export interface MountingResult {
  least_m: number
  most_m: number
}

export function mounting({ lowest_m: height, kind }: MountingInput): Answer<MountingResult> {
  if (typeof height !== 'number' || !kind) return waiting(blankKeys({ lowest_m: height, kind }))
  const { least_m, most_m, rule } = HEIGHTS[kind]
  const isWithin = height >= least_m && height <= most_m
  const what = kind === 'socket' ? 'The lowest part of the socket' : 'The controls'
  const nearest = height < least_m ? least_m : most_m
  const shown = formatBesideLimit(height, nearest, 'm', 2)
  return answer({
    verdict: isWithin ? 'within' : 'outside',
    result: { least_m, most_m },
    working: [ruleStep(rule, { symbol: 'height', expression: `${least_m} ≤ ${height} ≤ ${most_m}`, value: height, unit: 'm' })],
    reasons: [because(rule, `${what} is at ${shown}; the height is from ${formatMetres(least_m)} to ${formatMetres(most_m)}.`.replace('controls is', 'controls are'))],
    notes: isWithin && kind === 'socket' ? accessNotes(height) : [],
  })
}

function accessNotes(height: number): string[] {
  const { least_m, most_m } = HEIGHTS.controls
  if (height >= least_m && height <= most_m) return []
  return [because('EAR-20', `For easy access the code of practice asks for ${formatMetres(least_m)} to ${formatMetres(most_m)}.`)]
}

export const mountingCalculation = defineCalculation({
  name: 'mounting',
  purpose: 'Holds the height of a charger\'s socket or controls against the heights allowed.',
  input,
  run: mounting,
})
