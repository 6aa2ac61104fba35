/**
 * Which generation form goes with a charger that can export.
 *
 * Up to 16 A a phase, of the charger and of all generation together, is notified; above it is applied for, on the short
 * form up to 17 kW single-phase or 50 kW three-phase in all, otherwise on the full one.
 *
 * @source rules DNO-13 and DNO-15; that all generation counts towards the 16 A is from memory
 */
import { formatBesideLimit, formatFigure, formatKilowatts } from '../../utils/figures'
import type { NetworkRouteInput } from './network-route'
import { because } from './rule'

export type NetworkForm = 'demand' | 'generation-notice' | 'generation-short' | 'generation-full' | 'limitation'

/** Days after the work within which a notice is sent (rules DNO-02 and DNO-15). */
export const NOTICE_DAYS = 28

const NOTICE_A_PER_PHASE = 16
const SHORT_FORM_KW = { 1: 17, 3: 50 } as const
const NOMINAL_V = 230
const WATTS_PER_KW = 1000

/** Null where nothing is exported: a charger that only charges is a load. */
export function generationForm(given: NetworkRouteInput): NetworkForm | null {
  const exported = given.export_A ?? 0
  if (exported <= 0) return null
  const total = given.total_generation_kW ?? 0
  const phaseCount = given.phases ?? 1
  const noticeLimit_kW = NOTICE_A_PER_PHASE * NOMINAL_V * phaseCount / WATTS_PER_KW
  if (exported <= NOTICE_A_PER_PHASE && total <= noticeLimit_kW) return 'generation-notice'
  return total <= SHORT_FORM_KW[phaseCount] ? 'generation-short' : 'generation-full'
}

export function exportReason(given: NetworkRouteInput): string {
  const exported = given.export_A ?? 0
  const figures = `The charger can export ${formatBesideLimit(exported, NOTICE_A_PER_PHASE, 'A', 1)} a phase, with ${formatKilowatts(given.total_generation_kW ?? 0)} of generation in all.`
  if (generationForm(given) === 'generation-notice') {
    return because('DNO-13', `${figures} It is demand and generation: send the demand form, and the notice for generation up to ${formatFigure(NOTICE_A_PER_PHASE, 'A')} a phase.`)
  }
  return because('DNO-13', `${figures} Above ${formatFigure(NOTICE_A_PER_PHASE, 'A')} a phase, apply and wait for acceptance before energising.`)
}
