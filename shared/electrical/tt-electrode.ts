/**
 * Is an earth electrode low enough for its residual current device?
 *
 * RA × IΔn ≤ 50 V
 *
 * @source BS 7671 411.5.3 and the note to Table 41.5 (above 200 Ω it may not be steady)
 * @example 30 mA, 190 Ω -> 5.7 V, within; at most 1667 Ω
 */
import type * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { notAbove } from './compare'
import { above, fields, fromZero } from './inputs'
import { shown, step } from './working'

const input = fields({ IdeltaN_A: above('the rated residual current in A'), RA_ohm: fromZero('the electrode\'s resistance'), touch_V: above('the touch voltage') })
export type TtElectrodeInput = z.infer<typeof input>
export interface TtElectrodeResult { RA_max_ohm: number, advised_ohm: number, product_V?: number }

const ADVISED_OHM = 200

export function ttElectrode({ IdeltaN_A, RA_ohm, touch_V = 50 }: TtElectrodeInput): Answer<TtElectrodeResult> {
  if (IdeltaN_A === undefined) return waiting(['IdeltaN_A'])
  const RA_max_ohm = touch_V / IdeltaN_A
  const most = step('RA max', `${shown(touch_V)} ÷ ${shown(IdeltaN_A)}`, RA_max_ohm, 'Ω', 'BS 7671 411.5.3', 'two sources')
  if (RA_ohm === undefined) return answer({ result: { RA_max_ohm, advised_ohm: ADVISED_OHM }, working: [most] })
  const product_V = RA_ohm * IdeltaN_A
  const fits = notAbove(product_V, touch_V)
  return answer({
    verdict: fits ? 'within' : 'outside',
    result: { RA_max_ohm, advised_ohm: ADVISED_OHM, product_V },
    working: [most, step('RA × IΔn', `${shown(RA_ohm)} × ${shown(IdeltaN_A)}`, product_V, 'V', 'BS 7671 411.5.3', 'two sources')],
    reasons: [`EAR-09: ${shown(product_V)} V is ${fits ? 'within' : 'more than'} ${shown(touch_V)} V.`],
    notes: RA_ohm > ADVISED_OHM ? [`EAR-09: above ${ADVISED_OHM} Ω the electrode's resistance may not be steady through dry and frosty weather.`] : [],
  })
}

export const ttElectrodeCalculation = defineCalculation({ name: 'tt-electrode', purpose: 'Whether an earth electrode is low enough for its residual current device.', input, run: ttElectrode })
