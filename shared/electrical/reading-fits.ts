/**
 * Do the readings fit the cable that is said to be there, and each other?
 *
 * R1+R2 expected = (r1 + r2) × length ÷ 1000 × (1 + 0.004 (ambient − 20)); Zs expected = Ze + R1+R2.
 * What does not fit is odd, not wrong: it asks for a sentence.
 *
 * @source IEC 60228 (greatest resistances, so real cable reads a little under); the bands are our own, named below
 * @example 6 mm² with 2.5 mm² over 18 m at 20 °C -> 0.189 Ω
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer, WorkingStep } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { conductorMohmPerM } from './cables'
import { above, anyNumber, fields, fromZero } from './inputs'
import { temperatureMultiplier } from './temperature'
import { shown, step } from './working'

const input = fields({
  R1R2_ohm: fromZero('R1+R2'),
  R1Rn_ohm: fromZero('R1+Rn'),
  line_mm2: above('the line conductor\'s size'),
  cpc_mm2: above('the protective conductor\'s size'),
  L_m: above('the length'),
  ambient_C: anyNumber('the temperature').refine(t => t === undefined || (t >= -40 && t <= 70), 'Give a temperature between −40 and 70 °C.'),
  Ze_ohm: fromZero('Ze'),
  Zs_ohm: fromZero('Zs'),
  instrument_ohm: fromZero('the instrument\'s error'),
})
export type ReadingFitsInput = z.infer<typeof input>

export interface Band { expected_ohm: number, low_ohm: number, high_ohm: number }
export interface ReadingFitsResult {
  R1R2?: Band
  R1Rn?: Band
  Zs?: Band
  /** A sentence for each figure that does not fit. */
  odd: string[]
}

/** The instrument's error where none is given, Ω. */
const CONTINUITY_ERROR_ohm = 0.03
const LOOP_ERROR_ohm = 0.05
/** Real conductors come below the standard's greatest resistance, and a route is measured to some few percent. */
const BELOW_SHARE = 0.15
const ABOVE_SHARE = 0.1
/** A loop tester that must not trip the RCD reads high. */
const LOOP_ABOVE_ohm = 0.2

export function readingFits(given: ReadingFitsInput): Answer<ReadingFitsResult> {
  const { line_mm2, cpc_mm2, L_m, ambient_C = 20, R1R2_ohm, R1Rn_ohm, Ze_ohm, Zs_ohm } = given
  const missing = (['line_mm2', 'cpc_mm2', 'L_m'] as const).filter(key => given[key] === undefined)
  if (line_mm2 === undefined || cpc_mm2 === undefined || L_m === undefined) return waiting(missing)
  const r1 = conductorMohmPerM(line_mm2, false, 'line_mm2')
  const r2 = conductorMohmPerM(cpc_mm2, false, 'cpc_mm2')
  const error_ohm = given.instrument_ohm ?? CONTINUITY_ERROR_ohm
  const warmth = temperatureMultiplier(ambient_C)
  const R1R2 = cableBand((r1 + r2) * L_m / 1000 * warmth, error_ohm)
  const R1Rn = cableBand(2 * r1 * L_m / 1000 * warmth, error_ohm)
  const Zs = Ze_ohm === undefined ? undefined : loopBand(Ze_ohm + (R1R2_ohm ?? R1R2.expected_ohm), given.instrument_ohm ?? LOOP_ERROR_ohm)

  const odd: string[] = []
  if (R1R2_ohm !== undefined) odd.push(...againstCable('R1+R2', R1R2_ohm, R1R2, L_m, (r1 + r2) * warmth, `${shown(line_mm2)} mm² with ${shown(cpc_mm2)} mm²`))
  if (R1Rn_ohm !== undefined) odd.push(...againstCable('R1+Rn', R1Rn_ohm, R1Rn, L_m, 2 * r1 * warmth, `${shown(line_mm2)} mm²`))
  if (R1R2_ohm !== undefined && R1Rn_ohm !== undefined) odd.push(...againstEachOther(R1R2_ohm, R1Rn_ohm, line_mm2 === cpc_mm2, error_ohm))
  if (Zs !== undefined && Zs_ohm !== undefined) odd.push(...againstLoop(Zs_ohm, Zs, Ze_ohm!, R1R2_ohm))

  return answer({
    result: { R1R2, R1Rn, ...Zs && { Zs }, odd },
    working: showWorking(r1, r2, L_m, ambient_C, { R1R2, R1Rn, Zs }, Ze_ohm, R1R2_ohm),
    reasons: odd,
    notes: given.ambient_C === undefined ? ['No temperature is given: 20 °C is taken.'] : [],
  })
}

function cableBand(expected_ohm: number, error_ohm: number): Band {
  return { expected_ohm, low_ohm: Math.max(0, expected_ohm * (1 - BELOW_SHARE) - error_ohm), high_ohm: expected_ohm * (1 + ABOVE_SHARE) + error_ohm }
}

function loopBand(expected_ohm: number, error_ohm: number): Band {
  return { expected_ohm, low_ohm: Math.max(0, expected_ohm - error_ohm), high_ohm: expected_ohm * (1 + ABOVE_SHARE) + LOOP_ABOVE_ohm + error_ohm }
}

function againstCable(symbol: string, read_ohm: number, band: Band, L_m: number, mohm_per_m: number, cable: string): string[] {
  if (read_ohm >= band.low_ohm - 1e-9 && read_ohm <= band.high_ohm + 1e-9) return []
  const fitting_m = Math.round(read_ohm * 1000 / mohm_per_m)
  return [`${symbol} reads ${shown(read_ohm)} Ω. ${shown(L_m)} m of ${cable} gives about ${rounded(band.expected_ohm)} Ω; the reading would fit about ${fitting_m} m. Check the length, the sizes and the joints.`]
}

/** Three conductors of one size: both loops are the same. A thinner protective conductor makes R1+R2 the greater. */
function againstEachOther(R1R2_ohm: number, R1Rn_ohm: number, sameSize: boolean, error_ohm: number): string[] {
  const room_ohm = error_ohm + 0.05 * Math.max(R1R2_ohm, R1Rn_ohm)
  if (sameSize && Math.abs(R1R2_ohm - R1Rn_ohm) > room_ohm) return [`R1+R2 reads ${shown(R1R2_ohm)} Ω and R1+Rn ${shown(R1Rn_ohm)} Ω. With all conductors of one size the two are alike.`]
  if (!sameSize && R1R2_ohm < R1Rn_ohm - room_ohm) return [`R1+R2 reads ${shown(R1R2_ohm)} Ω, less than R1+Rn at ${shown(R1Rn_ohm)} Ω. With a smaller protective conductor it is the other way round.`]
  return []
}

function againstLoop(Zs_ohm: number, band: Band, Ze_ohm: number, R1R2_ohm: number | undefined): string[] {
  const sum = `Ze + R1+R2 is ${rounded(band.expected_ohm)} Ω (${shown(Ze_ohm)} + ${R1R2_ohm === undefined ? 'the cable as expected' : shown(R1R2_ohm)})`
  if (Zs_ohm < band.low_ohm - 1e-9) return [`Zs reads ${shown(Zs_ohm)} Ω, yet ${sum}. A loop below the sum has a second path to earth, or one of the three readings is wrong.`]
  if (Zs_ohm > band.high_ohm + 1e-9) return [`Zs reads ${shown(Zs_ohm)} Ω, yet ${sum}. A loop well above the sum points to a poor joint.`]
  return []
}

const rounded = (ohm: number) => ohm.toFixed(2)

function showWorking(r1: number, r2: number, L_m: number, ambient_C: number, bands: { R1R2: Band, R1Rn: Band, Zs: Band | undefined }, Ze_ohm: number | undefined, R1R2_ohm: number | undefined): WorkingStep[] {
  const cable = (sum: string) => `${sum} × ${shown(L_m)} ÷ 1000 × (1 + 0.004 × (${shown(ambient_C)} − 20))`
  const steps = [
    step('R1+R2 expected', cable(`(${shown(r1)} + ${shown(r2)})`), bands.R1R2.expected_ohm, 'Ω', 'IEC 60228; On-Site Guide Table I2', 'from memory'),
    step('R1+Rn expected', cable(`2 × ${shown(r1)}`), bands.R1Rn.expected_ohm, 'Ω', 'IEC 60228; On-Site Guide Table I2', 'from memory'),
  ]
  if (bands.Zs) steps.push(step('Zs expected', `${shown(Ze_ohm!)} + ${shown(R1R2_ohm ?? bands.R1R2.expected_ohm)}`, bands.Zs.expected_ohm, 'Ω', 'Ze + R1+R2, as read', 'common practice'))
  return steps
}

export const readingFitsCalculation = defineCalculation({ name: 'reading-fits', purpose: 'What readings a cable should give, and which of those taken do not fit.', input, run: readingFits })
