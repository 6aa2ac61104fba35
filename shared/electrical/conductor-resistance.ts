/**
 * What do line and protective conductor resist together?
 *
 * R1+R2 = (r1 + r2) × length × multiplier ÷ 1000, multiplier = 1 + 0.004 (temperature − 20); a ring: (r1 + r2) ÷ 4
 *
 * @source IEC 60228 (d.c. resistance at 20 °C); On-Site Guide Table I3 and Guidance Note 3 for the ring
 * @example 1.5 mm² with 1 mm², 50 m at 20 °C -> 1.51 Ω
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { conductorMohmPerM } from './cables'
import { above, anyNumber, fields, fromZero } from './inputs'
import { temperatureMultiplier } from './temperature'
import { computed, shown, step } from './working'

const input = fields({
  line_mm2: above('the line conductor\'s size'),
  cpc_mm2: above('the protective conductor\'s size'),
  L_m: fromZero('the length'),
  temperature_C: anyNumber('the temperature'),
  multiplier: above('the multiplier'),
  ring: fields({ r1_ohm: fromZero('r1'), r2_ohm: fromZero('r2') }).optional(),
})
export type ConductorResistanceInput = z.infer<typeof input>
export interface ConductorResistanceResult {
  /** At the temperature asked for. */
  mohm_per_m?: number
  R1R2_ohm: number
}

export function conductorResistance({ line_mm2, cpc_mm2, L_m, temperature_C, multiplier, ring }: ConductorResistanceInput): Answer<ConductorResistanceResult> {
  if (ring) return ofRing(ring.r1_ohm, ring.r2_ohm)
  if (line_mm2 === undefined) return waiting(['line_mm2', ...L_m === undefined ? ['L_m'] : []])
  const warmth = multiplier ?? temperatureMultiplier(temperature_C ?? 20)
  if (warmth <= 0) throw new CalculationInputError('temperature_C', 'Give a temperature at which the conductor still resists.')
  const r1 = conductorMohmPerM(line_mm2, false, 'line_mm2')
  const r2 = cpc_mm2 === undefined ? null : conductorMohmPerM(cpc_mm2, false, 'cpc_mm2')
  const mohm_per_m = (r1 + (r2 ?? 0)) * warmth
  const sum = r2 === null ? shown(r1) : `(${shown(r1)} + ${shown(r2)})`
  const perMetre = step('mΩ/m', `${sum} × ${multiplier === undefined ? `(1 + 0.004 × (${shown(temperature_C ?? 20)} − 20))` : shown(multiplier)}`, mohm_per_m, 'mΩ/m', 'IEC 60228', 'two sources')
  if (L_m === undefined) return waiting(['L_m'], { result: { mohm_per_m }, working: [perMetre] })
  const R1R2_ohm = mohm_per_m * L_m / 1000
  return answer({
    result: { mohm_per_m, R1R2_ohm },
    working: [perMetre, computed(r2 === null ? 'R1' : 'R1+R2', `${shown(mohm_per_m)} × ${shown(L_m)} ÷ 1000`, R1R2_ohm, 'Ω')],
    notes: r2 === null ? ['No protective conductor is given: the figure is that of the line conductor alone.'] : [],
  })
}

/** Read at each socket with the ring cross-connected. */
function ofRing(r1_ohm: number | undefined, r2_ohm: number | undefined): Answer<ConductorResistanceResult> {
  if (r1_ohm === undefined || r2_ohm === undefined) return waiting([...r1_ohm === undefined ? ['ring.r1_ohm'] : [], ...r2_ohm === undefined ? ['ring.r2_ohm'] : []])
  const R1R2_ohm = (r1_ohm + r2_ohm) / 4
  return answer({ result: { R1R2_ohm }, working: [step('R1+R2', `(${shown(r1_ohm)} + ${shown(r2_ohm)}) ÷ 4`, R1R2_ohm, 'Ω', 'Guidance Note 3, ring final circuit', 'one source')] })
}

export const conductorResistanceCalculation = defineCalculation({ name: 'conductor-resistance', purpose: 'What line and protective conductor resist, by size, length and temperature.', input, run: conductorResistance })
