/**
 * How large may the earth fault loop impedance be, and does the reading keep within it?
 *
 * TN: Zs ≤ Cmin × U0 ÷ Ia; a reading at ambient ≤ 80 % of that, or corrected: reading + (R1+R2) × (multiplier ÷ (1 + 0.004 (ambient − 20)) − 1)
 * TT: Zs ≤ 50 V ÷ IΔn, no 80 %
 *
 * @source BS 7671 411.4.4, 411.5.3, Appendix 3; Guidance Note 3
 * @example type B, 32 A -> 1.365625 Ω, a reading up to 1.0925 Ω
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notAbove } from './compare'
import { DEVICE_WORDS, findDeviceLimit } from './device-limits'
import { above, anyNumber, Cmin, fields, fromZero, oneOf, system, U0_V } from './inputs'
import { temperatureRatio } from './temperature'
import { computed, shown, step } from './working'

const input = fields({
  device: oneOf('the device', DEVICE_WORDS),
  In_A: above('the device\'s rating'),
  time_s: above('the disconnection time').refine(time => time === undefined || time <= 5, 'Give a disconnection time of at most 5 s.'),
  Cmin, U0_V, system,
  measured_ohm: fromZero('the reading'),
  IdeltaN_A: above('the rated residual current in A'),
  R1R2_ohm: fromZero('R1+R2'),
  ambient_C: anyNumber('the temperature').refine(t => t === undefined || (t >= -40 && t <= 70), 'Give a temperature between −40 and 70 °C.'),
  multiplier: above('the multiplier'),
})
export type ZsLimitInput = z.infer<typeof input>

export interface ZsLimitResult {
  Ia_A?: number
  ZsMax_ohm: number
  /** Not in TT. */
  ZsMeasuredMax_ohm?: number
  /** Only where all three temperature inputs are given. */
  ZsCorrected_ohm?: number
}

const MEASURED_SHARE = 0.8
const TOUCH_V = 50
const STEADY_ohm = 200

export function zsLimit(given: ZsLimitInput): Answer<ZsLimitResult> {
  return given.system === 'TT' ? inTT(given) : inTN(given)
}

function inTN({ device, In_A, time_s = 0.4, Cmin = 0.95, U0_V = 230, measured_ohm, R1R2_ohm, ambient_C, multiplier }: ZsLimitInput): Answer<ZsLimitResult> {
  if (device === undefined || In_A === undefined) return waiting([...device === undefined ? ['device'] : [], ...In_A === undefined ? ['In_A'] : []])
  const limit = findDeviceLimit({ device, In_A, time_s, Cmin, U0_V })
  const { Ia_A, ZsMax_ohm } = limit
  const ZsMeasuredMax_ohm = MEASURED_SHARE * ZsMax_ohm
  const result: ZsLimitResult = { Ia_A, ZsMax_ohm, ZsMeasuredMax_ohm }
  const working = [
    step('Ia', limit.IaExpression, Ia_A, 'A', limit.source, limit.confidence),
    step('Zs max', limit.ZsExpression, ZsMax_ohm, 'Ω', limit.source, limit.confidence),
    step('Zs max, as read', `${MEASURED_SHARE} × ${shown(ZsMax_ohm)}`, ZsMeasuredMax_ohm, 'Ω', 'BS 7671 Appendix 3; Guidance Note 3', 'two sources'),
  ]
  const { notes } = limit
  if (measured_ohm === undefined) return answer({ result, working, notes })

  if (R1R2_ohm !== undefined && ambient_C !== undefined && multiplier !== undefined) {
    const ZsCorrected_ohm = measured_ohm + R1R2_ohm * (temperatureRatio(multiplier, ambient_C) - 1)
    const fits = notAbove(ZsCorrected_ohm, ZsMax_ohm)
    return answer({
      verdict: fits ? 'within' : 'outside',
      result: { ...result, ZsCorrected_ohm },
      working: [...working, step('Zs hot', `${shown(measured_ohm)} + ${shown(R1R2_ohm)} × (${shown(multiplier)} ÷ (1 + 0.004 × (${shown(ambient_C)} − 20)) − 1)`, ZsCorrected_ohm, 'Ω', 'On-Site Guide tables I2 and I3', 'from memory')],
      reasons: [`TST-08: corrected for temperature the loop is ${shown(ZsCorrected_ohm)} Ω, ${fits ? 'within' : 'more than'} ${shown(ZsMax_ohm)} Ω.`],
      notes: [
        ...notes,
        'TST-21: the reading is assessed by temperature, so it is held against the whole limit and not against 80 % of it.',
        ...R1R2_ohm > measured_ohm ? ['R1+R2 is more than the whole loop reads: there is a second path to earth, or one of the two is wrong.'] : [],
      ],
    })
  }
  const fits = notAbove(measured_ohm, ZsMeasuredMax_ohm)
  return answer({
    verdict: fits ? 'within' : 'outside',
    result, working,
    reasons: [`TST-08: ${shown(measured_ohm)} Ω is ${fits ? 'within' : 'more than'} 80 % of the limit, ${shown(ZsMeasuredMax_ohm)} Ω.`],
    notes: !fits && notAbove(measured_ohm, ZsMax_ohm) ? [...notes, `TST-08: the reading is still under the limit itself, ${shown(ZsMax_ohm)} Ω. Give R1+R2, the temperature and the multiplier to assess it by temperature.`] : notes,
  })
}

function inTT({ IdeltaN_A, measured_ohm }: ZsLimitInput): Answer<ZsLimitResult> {
  if (IdeltaN_A === undefined) return waiting(['IdeltaN_A'])
  const ZsMax_ohm = TOUCH_V / IdeltaN_A
  const fits = measured_ohm === undefined ? null : notAbove(measured_ohm, ZsMax_ohm)
  return answer({
    verdict: fits === null ? null : fits ? 'within' : 'outside',
    result: { ZsMax_ohm },
    working: [computed('Zs max', `${TOUCH_V} ÷ ${shown(IdeltaN_A)}`, ZsMax_ohm, 'Ω', 'BS 7671 411.5.3')],
    reasons: fits === null ? [] : [`EAR-09: ${shown(measured_ohm!)} Ω is ${fits ? 'within' : 'more than'} ${shown(ZsMax_ohm)} Ω.`],
    notes: measured_ohm !== undefined && measured_ohm > STEADY_ohm ? [`EAR-09: above ${STEADY_ohm} Ω the electrode's resistance may not be steady.`] : [],
  })
}

export const zsLimitCalculation = defineCalculation({ name: 'zs-limit', purpose: 'The largest earth fault loop impedance a device allows, and whether a reading keeps within it.', input, run: zsLimit })
