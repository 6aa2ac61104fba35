/**
 * Does the supply carry the charger?
 *
 * after = house + charger; behind a tested limiter max(house, min(house + charger, limit)): a limiter cannot shed the house.
 * The charger may draw the fuse less the house, whatever its own rating; below 6 A it must pause.
 *
 * @source BS 7671 311.1 and 722.311.201 (no diversity on the charger; load curtailment may be counted)
 * @example fuse 80 A read, house 32 A, charger 32 A -> 64 A, within
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notAbove } from './compare'
import { above, fields, fromZero, oneOf, yesNo } from './inputs'
import { LEAST_CHARGE_A } from './least-charge'
import { computed, shown, step } from './working'

const input = fields({
  fuse_A: above('the main fuse\'s rating'),
  fuseKnown: oneOf('how the fuse is known', ['read', 'told', 'assumed']),
  house_A: fromZero('the house\'s demand'),
  ev_A: fromZero('the charger\'s current'),
  loadLimit_A: above('the load limit'),
  limiterTested: yesNo('whether the limiter is tested'),
})
export type SupplyInput = z.infer<typeof input>

export interface SupplyResult {
  demandAfter_A: number
  headroom_A: number
  evAllowed_A: number
  limitNeeded: boolean
  limitSetting_A: number
  demandIfLimited_A: number
}

export function supply(given: SupplyInput): Answer<SupplyResult> {
  const { fuse_A, fuseKnown, house_A, ev_A, loadLimit_A, limiterTested } = given
  const missing = (['fuse_A', 'fuseKnown', 'house_A', 'ev_A'] as const).filter(key => given[key] === undefined)
  if (fuse_A === undefined || house_A === undefined || ev_A === undefined) return waiting(missing)

  const limitSetting_A = Math.min(fuse_A, loadLimit_A ?? fuse_A)
  const limited = (limit_A: number) => Math.max(house_A, Math.min(house_A + ev_A, limit_A))
  const demandAfter_A = limiterTested ? limited(loadLimit_A ?? fuse_A) : house_A + ev_A
  const headroom_A = fuse_A - house_A
  const allowed_A = Math.min(ev_A, headroom_A)
  const result: SupplyResult = {
    demandAfter_A,
    headroom_A,
    evAllowed_A: allowed_A < LEAST_CHARGE_A ? 0 : allowed_A,
    limitNeeded: !notAbove(house_A + ev_A, limitSetting_A),
    limitSetting_A,
    demandIfLimited_A: limited(limitSetting_A),
  }
  const rest = { result, working: working(given, result), notes: notes(given, result) }

  if (fuseKnown === undefined || fuseKnown === 'assumed') {
    return waiting(['fuseKnown'], { ...rest, reasons: ['DNO-05: the main fuse\'s rating is not known for certain. Read it, or ask the network operator.'] })
  }
  if (!notAbove(house_A, fuse_A)) {
    return answer({ ...rest, verdict: 'outside', reasons: [`DNO-04: the house alone draws ${shown(house_A)} A, more than the main fuse's ${shown(fuse_A)} A. No limiter can cure that.`] })
  }
  if (notAbove(demandAfter_A, fuse_A)) {
    return answer({ ...rest, verdict: 'within', reasons: limiterTested && result.limitNeeded ? [`DNO-11: a tested limiter holds the demand at ${shown(demandAfter_A)} A.`] : [] })
  }
  const limiterMeant = !limiterTested && (loadLimit_A !== undefined || limiterTested === false)
  if (limiterMeant && notAbove(result.demandIfLimited_A, fuse_A)) {
    return waiting(['limiterTested'], { ...rest, reasons: [`DNO-11: the demand fits once the limiter, set at ${shown(limitSetting_A)} A, is tested.`] })
  }
  return answer({ ...rest, verdict: 'outside', reasons: [`DNO-04: the demand would be ${shown(demandAfter_A)} A, more than the main fuse's ${shown(fuse_A)} A.`] })
}

function working({ fuse_A, house_A, ev_A, loadLimit_A, limiterTested }: SupplyInput, result: SupplyResult) {
  const house = shown(house_A!)
  const ev = shown(ev_A!)
  const limited = (limit_A: number) => `max(${house}, min(${house} + ${ev}, ${shown(limit_A)}))`
  return [
    step('demand after', limiterTested ? limited(loadLimit_A ?? fuse_A!) : `${house} + ${ev}`, result.demandAfter_A, 'A', 'BS 7671 722.311.201: no diversity on the charger', 'one source'),
    computed('headroom', `${shown(fuse_A!)} − ${house}`, result.headroom_A, 'A'),
    step('charger may draw', `min(${ev}, ${shown(result.headroom_A)}), 0 below ${LEAST_CHARGE_A}`, result.evAllowed_A, 'A', 'IEC 61851-1: least current offered 6 A', 'two sources'),
    computed('demand if limited', limited(result.limitSetting_A), result.demandIfLimited_A, 'A'),
  ]
}

function notes({ house_A, ev_A, loadLimit_A, fuse_A }: SupplyInput, result: SupplyResult): string[] {
  const list: string[] = []
  if (ev_A! > 0 && result.evAllowed_A === 0) list.push(`Less than ${LEAST_CHARGE_A} A is left while the house draws its most: charging pauses then.`)
  if (loadLimit_A !== undefined && loadLimit_A > fuse_A!) list.push(`The load limit of ${shown(loadLimit_A)} A is above the main fuse: set it to ${shown(fuse_A!)} A at most.`)
  if (result.limitSetting_A < fuse_A!) {
    const left_A = Math.min(ev_A!, result.limitSetting_A - house_A!)
    list.push(`With the load limit at ${shown(result.limitSetting_A)} A, ${left_A < LEAST_CHARGE_A ? 'charging pauses' : `the charger gets ${shown(left_A)} A`} while the house draws ${shown(house_A!)} A.`)
  }
  return list
}

export const supplyCalculation = defineCalculation({ name: 'supply', purpose: 'Whether the main fuse carries the house and the charger, and what a load limit must be.', input, run: supply })
