/**
 * Until which day may the customer cancel?
 *
 * last day = 14 days after the day of the contract (a service) or after the day the goods were received (goods, or both)
 *
 * @source rule COM-01
 * @example a service agreed on 2026-12-03 -> 2026-12-17
 */
import * as z from 'zod'
import { fields } from '../electrical/inputs'
import { answer, waiting, type Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { addDays, compareDays, formatDay, type Day } from '../utils/dates'
import { blankKeys, day } from '../job/rules/inputs'
import { because, ruleStep } from '../job/rules/rule'

const CANCELLATION_DAYS = 14

const input = fields({
  agreed: day.nullish().describe('The day the contract was made'),
  goodsReceived: day.nullish().describe('The day the customer received the goods'),
  kind: z.enum(['service', 'goods', 'goods-and-service'], 'Enter service, goods or goods-and-service').nullish(),
})
export type CancellationInput = z.infer<typeof input>

export interface CancellationResult {
  /** The last day of the right to cancel. */
  cancel_until: Day
}

export function cancellation({ agreed, goodsReceived, kind }: CancellationInput): Answer<CancellationResult> {
  if (!kind) return waiting(blankKeys({ agreed, kind }))
  const needsGoods = kind !== 'service'
  if (!agreed || (needsGoods && !goodsReceived)) return waiting(blankKeys({ agreed, ...(needsGoods && { goodsReceived }) }), { notes: needsGoods ? [openNote()] : [] })
  // Goods left before the contract cannot shorten the customer's time.
  const start = needsGoods && goodsReceived && compareDays(goodsReceived, agreed) > 0 ? goodsReceived : agreed
  const cancel_until = addDays(start, CANCELLATION_DAYS)
  const counted = needsGoods ? 'the day the goods were received' : 'the day of the contract'
  return answer({
    result: { cancel_until },
    working: [ruleStep('COM-01', { symbol: 'last day', expression: `${start} + ${CANCELLATION_DAYS} days`, value: cancel_until, unit: '' })],
    reasons: [because('COM-01', `${CANCELLATION_DAYS} days after ${counted}: until the end of ${formatDay(cancel_until)}.`)],
    notes: [
      because('COM-01', 'This is for a contract made at the customer\'s home or at a distance. Without the information on the right it runs up to 12 months longer (from memory).'),
      because('COM-02', 'Work inside this time needs the customer\'s express request in writing.'),
    ],
  })
}

function openNote(): string {
  return because('COM-01', `The ${CANCELLATION_DAYS} days begin when the customer receives the goods. Until then the right to cancel stays open.`)
}

export const cancellationCalculation = defineCalculation({
  name: 'cancellation',
  purpose: 'Gives the last day on which a customer may cancel.',
  input,
  run: cancellation,
})
