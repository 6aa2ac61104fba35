/**
 * What current does a control pilot's duty cycle offer, and the other way round?
 *
 * 10 to 85 %: I = duty × 0.6; over 85 to 96 %: I = (duty − 64) × 2.5; 8 to under 10 %: 6 A; over 96 to 97 %: 80 A; else none
 *
 * @source IEC 61851-1 Annex A
 * @example 32 A -> 53.33 %
 */
import * as z from 'zod'
import { answer, waiting } from '../utils/answer'
import type { Answer } from '../utils/answer'
import { CalculationInputError, defineCalculation } from '../utils/calculation'
import { fields } from './inputs'
import { LEAST_CHARGE_A } from './least-charge'
import { table61851_duty } from './tables/charging.data'
import { shown, step } from './working'

const input = fields({
  duty_percent: z.number('Give the duty cycle as a number.').min(0, 'Give a duty cycle from 0 to 100 %.').max(100, 'Give a duty cycle from 0 to 100 %.').optional(),
  I_A: z.number('Give the current as a number.').min(LEAST_CHARGE_A, 'The least current a pilot offers is 6 A.').max(80, 'The most a pilot offers is 80 A.').optional(),
})
export type PilotInput = z.infer<typeof input>
export interface PilotResult {
  duty_percent: number
  /** null where the duty cycle asks for digital communication. */
  I_A: number | null
}

const SOURCE = 'IEC 61851-1 Annex A'

export function pilot({ duty_percent, I_A }: PilotInput): Answer<PilotResult> {
  if (duty_percent !== undefined && I_A !== undefined) throw new CalculationInputError('duty_percent', 'Give the duty cycle or the current, not both.')
  if (I_A !== undefined) {
    const upper = I_A > 51
    const duty = upper ? I_A / 2.5 + 64 : I_A / 0.6
    return answer({ result: { duty_percent: duty, I_A }, working: [step('duty', upper ? `${shown(I_A)} ÷ 2.5 + 64` : `${shown(I_A)} ÷ 0.6`, duty, '%', SOURCE, table61851_duty.confidence)] })
  }
  if (duty_percent === undefined) return waiting(['duty_percent'])
  const offered = offer(duty_percent)
  return answer({
    result: { duty_percent, I_A: offered.I_A },
    working: [step('I', offered.expression, offered.I_A ?? 'by digital communication', offered.I_A === null ? '' : 'A', SOURCE, table61851_duty.confidence)],
    notes: offered.note ? [offered.note] : [],
  })
}

function offer(duty: number): { I_A: number | null, expression: string, note?: string } {
  if (duty >= 3 && duty <= 7) return { I_A: null, expression: '3 to 7 %', note: 'At this duty cycle the current is agreed by digital communication.' }
  if (duty < 8 || duty > 97) return { I_A: 0, expression: `${shown(duty)} %`, note: 'At this duty cycle charging is not allowed.' }
  if (duty < 10) return { I_A: LEAST_CHARGE_A, expression: '8 to under 10 %' }
  if (duty <= 85) return { I_A: duty * 0.6, expression: `${shown(duty)} × 0.6` }
  if (duty <= 96) return { I_A: (duty - 64) * 2.5, expression: `(${shown(duty)} − 64) × 2.5` }
  return { I_A: 80, expression: 'over 96 to 97 %' }
}

export const pilotCalculation = defineCalculation({ name: 'pilot', purpose: 'Control pilot: duty cycle to current and back.', input, run: pilot })
