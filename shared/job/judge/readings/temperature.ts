import { CABLES, CABLE_WORDS } from '../../../electrical/cables'
import { numberOf } from '../facts'
import type { ReadingBench } from './outcome'

/**
 * From a conductor at 20 °C to the same at work: 1.20 up to 70 °C, 1.28 up to 90 °C.
 * @source On-Site Guide Table I3, as in rule TST-21 (from memory); the circuit calculation takes the same
 */
export function temperatureMultiplierOf({ inputs }: ReadingBench): number {
  const cable = CABLE_WORDS.find(word => word === inputs.installed.cable)
  return numberOf(inputs.installed, 'terminals_C') === 90 && cable !== undefined && CABLES[cable].insulation_C === 90 ? 1.28 : 1.2
}
