/**
 * Must the network operator be asked before this charger is connected, or told afterwards?
 *
 * The tests run in a fixed order and the first that is met decides the route; every other one that is met is named too,
 * so that nobody cures one reason and meets the next. While the first deciding fact is blank the answer waits for it.
 *
 * @source rules DNO-02 to DNO-15, SUR-09
 * @example 62 A after the work on a 100 A fuse -> ask-first (DNO-03)
 */
import * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer, type WorkingStep } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { formatBesideLimit } from '../../utils/figures'
import { generationForm, NOTICE_DAYS, type NetworkForm } from './generation-form'
import { country, current, phases, yesOrNo } from './inputs'
import { limiterConditions, limiterReason } from './load-limiter'
import { because, ruleStep } from './rule'
import { ROUTE_TESTS, TELL_AFTER_LIMIT_A, type NetworkRoute } from './route-tests'

const MOST_KW = 10_000

const input = fields({
  md_after_A: current.nullish().describe('Maximum demand after the work; with a limiter, the limited demand'),
  cutout_A: current.nullish().describe('Rating of the main fuse'),
  cutout_known: z.enum(['read', 'told', 'assumed', 'unknown'], 'Enter read, told, assumed or unknown').nullish(),
  looped: yesOrNo.nullish(),
  service_ok: yesOrNo.nullish(),
  unmetered: yesOrNo.nullish(),
  device_standard: yesOrNo.nullish().describe('Meets the emission standards and is of usual size'),
  export_A: current.nullish().describe('What the charger can export, amps a phase; 0 for one that only charges'),
  total_generation_kW: z.number('Enter a power in kW').min(0, 'Enter 0 kW or more').max(MOST_KW, 'Enter a power a home can generate').nullish(),
  limiter: z.enum(['none', 'planned', 'fitted', 'tested'], 'Enter none, planned, fitted or tested').nullish(),
  country: country.nullish(),
  phases: phases.nullish().describe('Phases of the supply, for the limits on generation; 1 where left out'),
  clustered: yesOrNo.nullish().describe('One of many in a close programme; no where left out'),
})
export type NetworkRouteInput = z.infer<typeof input>

export interface NetworkRouteResult {
  route: NetworkRoute
  /** Whether the charger may be connected before the operator has replied. */
  installAllowed: boolean
  /** Days after the work by which the operator must be told; null where nothing may be connected before the reply. */
  deadlineDays: number | null
  conditions: string[]
  forms: NetworkForm[]
  /** The same sentences as the answer's reasons, so that a stored result stands alone. */
  reasons: string[]
}

export function networkRoute(given: NetworkRouteInput): Answer<NetworkRouteResult> {
  const outcomes = ROUTE_TESTS.map(test => ({ test, ...test.judge(given) }))
  const first = outcomes.find(each => each.blank?.length || each.reasons?.length)
  const blank = [...new Set(outcomes.flatMap(each => each.blank ?? []))]
  const hits = outcomes.flatMap(each => each.reasons ?? [])
  if (first?.blank?.length) return waiting([...blank, ...blankLimiter(given)], { reasons: hits })
  if (!first && blankLimiter(given).length) return waiting(blankLimiter(given))

  const route = first?.test.route ?? 'tell-after'
  const form = generationForm(given)
  const reasons = [...(first ? hits : [tellAfterReason(given)]), ...limiterReason(given)]
  return answer({
    result: {
      route,
      installAllowed: route === 'tell-after',
      deadlineDays: deadline(route, form),
      conditions: [...limiterConditions(given), ...(form === 'generation-notice' ? [] : generationConditions(form))],
      forms: formsFor(given, form),
      reasons,
    },
    working: demandSteps(given),
    reasons,
    notes: notesFor(given, route),
  })
}

function formsFor(given: NetworkRouteInput, form: NetworkForm | null): NetworkForm[] {
  if (form === null) return ['demand']
  const isLimited = (given.limiter ?? 'none') !== 'none'
  return ['demand', form, ...(isLimited ? ['limitation' as const] : [])]
}

function deadline(route: NetworkRoute, form: NetworkForm | null): number | null {
  if (route === 'tell-after') return NOTICE_DAYS
  return route === 'generation-application' && form === 'generation-notice' ? NOTICE_DAYS : null
}

function generationConditions(form: NetworkForm | null): string[] {
  if (form === null) return []
  return [because('DNO-13', 'The network operator accepts the generation before the charger is energised.')]
}

function tellAfterReason(given: NetworkRouteInput): string {
  return because('DNO-02', `Every condition is met with ${formatBesideLimit(given.md_after_A ?? 0, TELL_AFTER_LIMIT_A, 'A', 1)} after the work. Tell the network operator within ${NOTICE_DAYS} days of installing.`)
}

/** A blank limiter answer is asked for: the limited demand counts only where there is a limiter. */
function blankLimiter(given: NetworkRouteInput): string[] {
  return given.limiter ? [] : ['limiter']
}

function demandSteps(given: NetworkRouteInput): WorkingStep[] {
  if (given.md_after_A === undefined || given.md_after_A === null) return []
  return [ruleStep('DNO-03', { symbol: 'demand after the work', expression: `${given.md_after_A} A against ${TELL_AFTER_LIMIT_A} A`, value: given.md_after_A, unit: 'A' })]
}

function notesFor(given: NetworkRouteInput, route: NetworkRoute): string[] {
  return [
    ...(given.country === 'Northern Ireland' ? [because('SUR-05', 'The network operator is NIE Networks, with forms of its own.')] : []),
    ...(route === 'tell-after' ? [] : [because('DNO-17', 'A network operator does not refuse, but may require works first.')]),
    ...((given.export_A ?? 0) > 0 && given.country !== 'Northern Ireland'
      ? [because('DNO-14', 'Requirements for storage and vehicles that export are new since 1 March 2026. Check the edition of the form.')]
      : []),
  ]
}

export const networkRouteCalculation = defineCalculation({
  name: 'network-route',
  purpose: 'Says whether to ask the network operator first or tell them afterwards, with the reasons.',
  input,
  run: networkRoute,
})
