/**
 * By which day must whom be told about finished work, or about a supervisor who left?
 *
 * last day = day of completion (or of leaving) + the days the rule gives; a weekend or holiday does not move it
 *
 * @source rules DNO-02, DOC-10 to DOC-14, PPL-01
 * @example completed 2026-12-01 in England -> network operator by 2026-12-29, building control by 2026-12-31
 */
import type * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer, type WorkingStep } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { addDays, formatDay, type Day } from '../../utils/dates'
import { isWorkingDay, lastWorkingDayBy, type Nation } from '../working-days'
import { NOTICE_DAYS } from './generation-form'
import { blankKeys, country, day, yesOrNo } from './inputs'
import { because, ruleStep } from './rule'
import type { RuleId } from './rule-types'

const BUILDING_CONTROL_DAYS = 30
const SUPERVISOR_TOLD_DAYS = 30
const SUCCESSOR_DAYS = 120

const input = fields({
  completed: day.nullish(),
  country: country.nullish(),
  schemeMember: yesOrNo.nullish().describe('The firm is registered with a competent person scheme'),
  supervisorLeft: day.nullish(),
})
export type DeadlinesInput = z.infer<typeof input>

/** Last days, each null where nobody need be told. */
export interface DeadlinesResult {
  network_operator_by: Day | null
  building_control_by: Day | null
  occupier_certificate_by: Day | null
  scheme_told_by: Day | null
  successor_by: Day | null
}

export function deadlines(given: DeadlinesInput): Answer<DeadlinesResult> {
  const { completed, supervisorLeft, country: where, schemeMember } = given
  const asksForScheme = where !== 'Scotland' && where !== 'Northern Ireland'
  const blank = blankKeys({ country: where, ...(asksForScheme && { schemeMember }) })
  if (!completed && !supervisorLeft) return waiting(['completed', ...blank])
  if (completed && blank.length) return waiting(blank)

  const isNotifiable = (where === 'England' || where === 'Wales') && schemeMember === true
  const later = (from: Day | null | undefined, days: number) => (from ? addDays(from, days) : null)
  const supervisorFrom = schemeMember === false ? null : supervisorLeft
  const result: DeadlinesResult = {
    network_operator_by: later(completed, NOTICE_DAYS),
    building_control_by: isNotifiable ? later(completed, BUILDING_CONTROL_DAYS) : null,
    occupier_certificate_by: isNotifiable ? later(completed, BUILDING_CONTROL_DAYS) : null,
    scheme_told_by: later(supervisorFrom, SUPERVISOR_TOLD_DAYS),
    successor_by: later(supervisorFrom, SUCCESSOR_DAYS),
  }
  return answer({
    result,
    working: [
      ...step('DNO-02', 'network operator by', completed, NOTICE_DAYS, result.network_operator_by),
      ...step('DOC-10', 'building control by', completed, BUILDING_CONTROL_DAYS, result.building_control_by),
      ...step('PPL-01', 'scheme told by', supervisorLeft, SUPERVISOR_TOLD_DAYS, result.scheme_told_by),
      ...step('PPL-01', 'successor by', supervisorLeft, SUCCESSOR_DAYS, result.successor_by),
    ],
    reasons: [...(completed ? workReasons(given) : []), ...supervisorReasons(given)],
    notes: restDayNotes(result, where ?? 'England'),
  })
}

function workReasons({ country: where, schemeMember }: DeadlinesInput): string[] {
  const network = because('DNO-02', `Where the network operator is told afterwards, tell them within ${NOTICE_DAYS} days of installing.`)
  if (where === 'Scotland') return [network, because('DOC-12', 'Scotland has no notice of this kind; a building warrant depends on the type of building.')]
  if (where === 'Northern Ireland') return [network, because('DOC-13', 'Northern Ireland asks for no notice to building control.')]
  if (!schemeMember) return [network, because('DOC-11', 'A firm outside a scheme applies to building control before starting, so no last day follows from completion.')]
  return [
    network,
    because('DOC-10', `Building control and the occupier are told within ${BUILDING_CONTROL_DAYS} days of completion.`),
    ...(where === 'Wales' ? [because('DOC-14', 'Wales keeps a text of its own; a new circuit is notifiable there too.')] : []),
  ]
}

function supervisorReasons({ supervisorLeft, schemeMember }: DeadlinesInput): string[] {
  if (!supervisorLeft) return []
  if (schemeMember === false) return [because('PPL-01', 'A firm outside a scheme has nobody to tell that its supervisor left.')]
  return [because('PPL-01', `The scheme is told within ${SUPERVISOR_TOLD_DAYS} days that the supervisor left; a successor is in post within ${SUCCESSOR_DAYS} days.`)]
}

function step(id: RuleId, symbol: string, from: Day | null | undefined, days: number, until: Day | null): WorkingStep[] {
  return from && until ? [ruleStep(id, { symbol, expression: `${from} + ${days} days`, value: until, unit: '' })] : []
}

/** A last day that nobody works on: the rule does not move it, so the act belongs before it. */
function restDayNotes(result: DeadlinesResult, nation: Nation): string[] {
  const days = [...new Set(Object.values(result).filter((each: Day | null): each is Day => each !== null))]
  return days
    .filter(each => !isWorkingDay(each, nation))
    .map(each => `${formatDay(each)} is not a working day. The last working day before it is ${formatDay(lastWorkingDayBy(each, nation))}.`)
}

export const deadlinesCalculation = defineCalculation({
  name: 'deadlines',
  purpose: 'Gives the last day for each notice that finished work or a leaving supervisor asks for.',
  input,
  run: deadlines,
})
