/**
 * Does the earthing method chosen suit the supply and the charger?
 *
 * A PME earth serves a charger outdoors only by one of the listed methods; each method has limits of its own.
 * This judges the choice. That a method reaches its figures is shown by its own calculation or test.
 *
 * @source rules EAR-01 to EAR-06, EAR-09, EAR-10, SUR-13
 * @example PME, outdoors, no method -> outside (EAR-01)
 */
import * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { blankKeys, phases, yesOrNo } from './inputs'
import { METHOD_RULES } from './earthing-methods.data'
import { because, ruleStep } from './rule'

const input = fields({
  supply: z.enum(['PME', 'TN-S', 'TT'], 'Enter PME, TN-S or TT').nullish(),
  phases: phases.nullish().describe('Phases of the supply'),
  outdoors: yesOrNo.nullish().describe('The charger is outdoors, or likely to charge a vehicle outdoors'),
  method: z.enum(['none', 'i', 'ii', 'iii', 'iv', 'v', 'TT'], 'Enter none, i, ii, iii, iv, v or TT').nullish(),
  chargerPhases: phases.nullish(),
})
export type EarthingMethodInput = z.infer<typeof input>

export interface EarthingMethodResult {
  /** Whether the supply and the place ask for a method at all. */
  methodNeeded: boolean
}

export function earthingMethod(given: EarthingMethodInput): Answer<EarthingMethodResult> {
  const { supply, phases: supplyPhases, outdoors, method, chargerPhases } = given
  if (!supply || !supplyPhases || typeof outdoors !== 'boolean' || !method || !chargerPhases) {
    return waiting(blankKeys({ supply, phases: supplyPhases, outdoors, method, chargerPhases }))
  }
  const methodNeeded = supply === 'PME' && outdoors
  const { rule, suits, notes } = METHOD_RULES[method]
  const faults = [
    ...(methodNeeded && method === 'none' ? [because('EAR-01', 'A PME earth serves no charger outdoors unless one of the listed methods is used.')] : []),
    ...suits({ phases: supplyPhases, chargerPhases }),
    ...(chargerPhases > supplyPhases ? ['A three-phase charger cannot be fed from a single-phase supply.'] : []),
  ]
  return answer({
    verdict: faults.length ? 'outside' : 'within',
    result: { methodNeeded },
    working: [ruleStep(rule, { symbol: 'method', expression: `${supply}, ${supplyPhases}-phase supply, ${chargerPhases}-phase charger, ${outdoors ? 'outdoors' : 'indoors'}`, value: method, unit: '' })],
    reasons: faults.length ? faults : [fits(supply, outdoors, method)],
    notes: [...notes, ...supplyNotes(supply, method)],
  })
}

function fits(supply: string, outdoors: boolean, method: string): string {
  if (method !== 'none') return because(METHOD_RULES[method as keyof typeof METHOD_RULES].rule, `Method ${method} suits this supply and charger.`)
  if (supply === 'PME' && !outdoors) return because('EAR-01', 'The bar on a PME earth is for chargers outdoors, or likely to charge a vehicle outdoors.')
  return because('EAR-01', `The bar on a PME earth does not reach a ${supply} supply.`)
}

function supplyNotes(supply: string, method: string): string[] {
  if (supply === 'TN-S' && method === 'none') return [because('SUR-13', 'Repairs to the network may have made an old TN-S service a combined one. Treat it as PME unless the network operator confirms it.')]
  if (supply === 'TT') return [because('EAR-09', 'The installation\'s own electrode serves the charger. Measure it: at most 1667 Ω with 30 mA, and under 200 Ω to be stable.')]
  return []
}

export const earthingMethodCalculation = defineCalculation({
  name: 'earthing-method',
  purpose: 'Says whether the earthing method chosen suits the supply and the charger.',
  input,
  run: earthingMethod,
})
