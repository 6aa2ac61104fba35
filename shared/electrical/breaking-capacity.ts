/**
 * Can the device break the fault current at its place?
 *
 * It reaches the current itself, or it has 6 kA in a consumer unit whose conditional rating reaches it, behind at most 100 A.
 * Where nothing is measured: 16 kA with at least 2 m of service cable, else 19.6 kA.
 *
 * @source BS 7671 536.4.201 and Appendix 14; ENA P25; BS EN 61439-3 Annex ZB
 * @example 6 kA device, 100 A service fuse, 2 m -> 16 kA needed, outside without a unit rated for it
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notAbove, notBelow } from './compare'
import { above, fields, fromZero } from './inputs'
import { shown, step } from './working'

const input = fields({
  device_kA: above('the device\'s breaking capacity in kA'),
  Ipf_kA: above('the fault current in kA'),
  consumerUnitConditional_kA: above('the consumer unit\'s conditional rating in kA'),
  serviceFuse_A: above('the service fuse\'s rating'),
  serviceCable_m: fromZero('the length of service cable'),
})
export type BreakingCapacityInput = z.infer<typeof input>
export interface BreakingCapacityResult { needed_kA: number }

const AT_THE_MAIN_KA = 19.6
const AFTER_SERVICE_CABLE_KA = 16
const SERVICE_CABLE_M = 2
const LARGEST_FUSE_A = 100
const DEVICE_IN_RATED_UNIT_KA = 6

export function breakingCapacity({ device_kA, Ipf_kA, consumerUnitConditional_kA, serviceFuse_A, serviceCable_m }: BreakingCapacityInput): Answer<BreakingCapacityResult> {
  if (Ipf_kA === undefined && serviceFuse_A !== undefined && serviceFuse_A > LARGEST_FUSE_A) {
    return waiting(['Ipf_kA'], { reasons: [`TST-10: the figures of the network operators hold up to a ${LARGEST_FUSE_A} A service fuse. Measure or ask.`] })
  }
  const longService = serviceCable_m !== undefined && serviceCable_m >= SERVICE_CABLE_M
  const needed_kA = Ipf_kA ?? (longService ? AFTER_SERVICE_CABLE_KA : AT_THE_MAIN_KA)
  const needed = Ipf_kA === undefined
    ? step('needed', longService ? `at least ${SERVICE_CABLE_M} m of service cable` : `less than ${SERVICE_CABLE_M} m of service cable, or not known`, needed_kA, 'kA', longService ? 'BS 7671 536.4.201' : 'ENA P25', 'two sources')
    : step('needed', 'as measured or given', needed_kA, 'kA', 'given', 'given')
  const rest = { result: { needed_kA }, working: [needed] }
  if (device_kA === undefined) return waiting(['device_kA'], rest)

  if (notBelow(device_kA, needed_kA)) return answer({ ...rest, verdict: 'within', reasons: [`TST-10: the device breaks ${shown(device_kA)} kA; ${shown(needed_kA)} kA is needed.`] })
  const unitReaches = consumerUnitConditional_kA !== undefined && notBelow(consumerUnitConditional_kA, needed_kA)
  if (unitReaches && device_kA >= DEVICE_IN_RATED_UNIT_KA) {
    if (serviceFuse_A === undefined) return waiting(['serviceFuse_A'], rest)
    if (notAbove(serviceFuse_A, LARGEST_FUSE_A)) return answer({ ...rest, verdict: 'within', reasons: [`TST-10: the consumer unit's conditional rating of ${shown(consumerUnitConditional_kA)} kA covers a ${shown(device_kA)} kA device behind ${shown(serviceFuse_A)} A, with all parts as its maker specifies.`] })
  }
  return answer({ ...rest, verdict: 'outside', reasons: [`TST-10: the device breaks ${shown(device_kA)} kA; ${shown(needed_kA)} kA is needed, and no conditional rating of the consumer unit covers it.`] })
}

export const breakingCapacityCalculation = defineCalculation({ name: 'breaking-capacity', purpose: 'Whether a device can break the fault current at its place.', input, run: breakingCapacity })
