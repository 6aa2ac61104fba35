/**
 * Is the insulation resistance high enough, and was it tested at the right voltage for the stage?
 *
 * The cable alone at 500 V d.c.; once the charger is connected at 250 V, line and neutral joined, to earth. At least 1 MΩ either way.
 *
 * @source BS 7671 643.3, Table 64
 * @example 500 V, cable, 0.8 MΩ -> outside (limit 1 MΩ)
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notBelow } from './compare'
import { above, fields, oneOf } from './inputs'
import { shown, step } from './working'

const input = fields({
  test_V: above('the test voltage'),
  stage: oneOf('the stage', ['cable', 'charger-connected']),
  readings_Mohm: z.array(z.number('Give the readings as numbers.').nonnegative('Give the readings as numbers not below zero.'), 'Give the readings as a list.').max(100, 'At most 100 readings.').optional(),
})
export type InsulationTestInput = z.infer<typeof input>
export interface InsulationTestResult { limit_Mohm: number, lowest_Mohm?: number }

const LIMIT_MOHM = 1
/** Within the limit, yet new cable reads far more. */
const LOW_FOR_NEW_MOHM = 2
const CABLE_TEST_V = 500
const CONNECTED_TEST_V = 250

export function insulationTest({ test_V, stage, readings_Mohm }: InsulationTestInput): Answer<InsulationTestResult> {
  const missing = Object.entries({ test_V, stage }).filter(([, value]) => value === undefined).map(([key]) => key)
  if (!readings_Mohm?.length) missing.push('readings_Mohm')
  const limit = step('limit', `tested at ${test_V === undefined ? 'a voltage not yet given' : `${shown(test_V)} V`}`, LIMIT_MOHM, 'MΩ', 'BS 7671 Table 64', 'two sources')
  if (test_V === undefined || stage === undefined || !readings_Mohm?.length) return waiting(missing, { result: { limit_Mohm: LIMIT_MOHM }, working: [limit] })

  const lowest_Mohm = Math.min(...readings_Mohm)
  const against: string[] = []
  if (stage === 'cable' && test_V < CABLE_TEST_V) against.push(`TST-05: the cable is tested at ${CABLE_TEST_V} V before the charger is connected; this was at ${shown(test_V)} V.`)
  if (stage === 'charger-connected' && test_V !== CONNECTED_TEST_V) against.push(`TST-05: with the charger connected the test is at ${CONNECTED_TEST_V} V, line and neutral joined, to earth; this was at ${shown(test_V)} V.`)
  if (!notBelow(lowest_Mohm, LIMIT_MOHM)) against.push(`TST-04: ${shown(lowest_Mohm)} MΩ is less than ${LIMIT_MOHM} MΩ.`)
  return answer({
    verdict: against.length ? 'outside' : 'within',
    result: { limit_Mohm: LIMIT_MOHM, lowest_Mohm },
    working: [limit, step('lowest', readings_Mohm.length === 1 ? 'the reading' : `min(${readings_Mohm.map(shown).join(', ')})`, lowest_Mohm, 'MΩ', 'readings', 'given')],
    reasons: against.length ? against : [`TST-04: ${shown(lowest_Mohm)} MΩ is at least ${LIMIT_MOHM} MΩ.`],
    notes: [
      ...!against.length && lowest_Mohm < LOW_FOR_NEW_MOHM ? [`Under ${LOW_FOR_NEW_MOHM} MΩ is low for new cable: look for the cause.`] : [],
      ...stage === 'charger-connected' ? ['TST-05: the maker may want the charger disconnected even at 250 V.'] : [],
    ],
  })
}

export const insulationTestCalculation = defineCalculation({ name: 'insulation-test', purpose: 'Whether insulation resistance is high enough at the right test voltage.', input, run: insulationTest })
