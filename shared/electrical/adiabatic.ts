/**
 * How small may a protective conductor be, to survive the fault?
 *
 * S = √(I²t) ÷ k, with I²t = If² × t, or what the device lets through (always so under 0.1 s)
 *
 * @source BS 7671 543.1.3, tables 54.2 to 54.6
 * @example 230 V, 1.15 Ω, 0.4 s, k 115 -> 1.0999 mm², next size 1.5
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer, WorkingStep } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { CONDUCTOR_ARRANGEMENTS, findK, INSULATIONS, MATERIALS } from './adiabatic-k'
import { notAbove } from './compare'
import { above, fields, oneOf, U0_V } from './inputs'
import { nextStandardSize } from './standard-sizes'
import { computed, shown, step } from './working'

const input = fields({
  If_A: above('the fault current'),
  U0_V,
  Zs_ohm: above('Zs'),
  t_s: above('the time'),
  I2t_A2s: above('the energy let through'),
  k: above('k'),
  material: oneOf('the material', MATERIALS),
  insulation: oneOf('the insulation', INSULATIONS),
  arrangement: oneOf('the arrangement', CONDUCTOR_ARRANGEMENTS),
  cpc_mm2: above('the protective conductor\'s size'),
})
export type AdiabaticInput = z.infer<typeof input>
export interface AdiabaticResult { If_A?: number, I2t_A2s: number, S_min_mm2: number, standard_mm2: number | null }

const SHORT_S = 0.1
const LONG_S = 5

export function adiabatic(given: AdiabaticInput): Answer<AdiabaticResult> {
  const { U0_V = 230, Zs_ohm, t_s, cpc_mm2 } = given
  const missing = missingKeys(given)
  if (missing.length) return waiting(missing)
  const If_A = given.If_A ?? (Zs_ohm === undefined ? undefined : U0_V / Zs_ohm)
  const I2t_A2s = given.I2t_A2s ?? If_A! ** 2 * t_s!
  const { k, source, confidence } = given.k === undefined
    ? findK({ material: given.material!, insulation: given.insulation ?? 'bare', arrangement: given.arrangement!, size_mm2: cpc_mm2 })
    : { k: given.k, source: 'given', confidence: 'given' as const }
  const S_min_mm2 = Math.sqrt(I2t_A2s) / k
  const standard_mm2 = nextStandardSize(S_min_mm2)

  const working: WorkingStep[] = []
  if (If_A !== undefined) working.push(given.If_A === undefined ? computed('If', `${shown(U0_V)} ÷ ${shown(Zs_ohm!)}`, If_A, 'A') : step('If', 'as given', If_A, 'A', 'given', 'given'))
  working.push(given.I2t_A2s === undefined ? computed('I²t', `${shown(If_A!)}² × ${shown(t_s!)}`, I2t_A2s, 'A²s') : step('I²t', 'as given', I2t_A2s, 'A²s', 'given', 'given'))
  working.push(step('k', given.k === undefined ? `${given.material}, ${given.insulation ?? 'bare'}, ${given.arrangement}` : 'as given', k, '', source, confidence))
  working.push(computed('S least', `√${shown(I2t_A2s)} ÷ ${shown(k)}`, S_min_mm2, 'mm²', 'BS 7671 543.1.3'))

  const fits = cpc_mm2 === undefined ? null : notAbove(S_min_mm2, cpc_mm2)
  return answer({
    verdict: fits === null ? null : fits ? 'within' : 'outside',
    result: { ...If_A !== undefined && { If_A }, I2t_A2s, S_min_mm2, standard_mm2 },
    working,
    reasons: fits === null ? [] : [`${shown(cpc_mm2!)} mm² is ${fits ? 'at least' : 'less than'} the ${shown(S_min_mm2)} mm² the fault needs.`],
    notes: notesOn(given),
  })
}

function missingKeys({ If_A, Zs_ohm, t_s, I2t_A2s, k, material, insulation, arrangement }: AdiabaticInput): string[] {
  const missing: string[] = []
  if (I2t_A2s === undefined) {
    if (If_A === undefined && Zs_ohm === undefined) missing.push('If_A')
    if (t_s === undefined) missing.push('t_s')
  }
  if (k === undefined) {
    if (material === undefined && insulation === undefined && arrangement === undefined) missing.push('k')
    else {
      if (material === undefined) missing.push('material')
      if (arrangement === undefined) missing.push('arrangement')
      if (insulation === undefined && !arrangement?.startsWith('bare')) missing.push('insulation')
    }
  }
  return missing
}

function notesOn({ t_s, I2t_A2s }: AdiabaticInput): string[] {
  if (I2t_A2s !== undefined || t_s === undefined) return []
  if (t_s < SHORT_S) return [`Under ${SHORT_S} s the energy that the device lets through decides, not If² × t: use the maker's I²t.`]
  if (t_s > LONG_S) return [`Over ${LONG_S} s heat leaves the conductor and the formula no longer holds; it errs on the safe side.`]
  return []
}

export const adiabaticCalculation = defineCalculation({ name: 'adiabatic', purpose: 'The least protective conductor that survives a fault.', input, run: adiabatic })
