/**
 * Do the charging hours a charger is set to stay out of the peak, and is its start still delayed at random?
 *
 * Peak: 08:00 to 11:00 and 16:00 to 22:00, Monday to Friday. A window that ends at or before it starts runs into the next day.
 *
 * @source rules SMT-02 and SMT-03
 * @example weekdays 15:00 to 17:00 -> outside, overlapping 16:00 to 17:00
 */
import * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { because, ruleStep } from './rule'
import { PEAKS, clockText, overlapsOf, type PeakOverlap } from './peak-hours'

const CAPABLE_DELAY_S = 1800
const DEFAULT_DELAY_S = 600
const SECONDS_PER_MINUTE = 60
const MOST_WINDOWS = 50
const MOST_DELAY_S = 86_400

const from = z.string('Enter a time as 16:00').regex(/^(?:[01]\d|2[0-3]):[0-5]\d$/, 'Enter a time as 16:00')
const to = z.string('Enter a time as 16:00').regex(/^(?:(?:[01]\d|2[0-3]):[0-5]\d|24:00)$/, 'Enter a time as 16:00')
const days = z.enum(['weekday', 'weekend', 'every-day', 'mon', 'tue', 'wed', 'thu', 'fri', 'sat', 'sun'], 'Enter weekday, weekend, every-day or mon to sun')

const input = fields({
  windows: z.array(fields({ days, from, to })).max(MOST_WINDOWS, `Enter at most ${MOST_WINDOWS} windows`).nullish(),
  randomDelay_s: z.number('Enter the delay in seconds').min(0, 'Enter a delay of 0 s or more').max(MOST_DELAY_S, 'Enter a delay of a day at most').nullish(),
})
export type SmartWindowInput = z.infer<typeof input>
export type ChargingWindow = NonNullable<SmartWindowInput['windows']>[number]

export interface SmartWindowResult {
  /** One for each window and peak that meet; `window` counts from 0. */
  overlaps: PeakOverlap[]
}

export function smartWindow({ windows, randomDelay_s: delay }: SmartWindowInput): Answer<SmartWindowResult> {
  const overlaps = (windows ?? []).flatMap(overlapsOf)
  const delayFault = typeof delay === 'number' ? delayReason(delay) : null
  const reasons = [
    ...overlaps.map(each => because('SMT-02', `Window ${each.window + 1} runs from ${each.from} to ${each.to} in the weekday peak.`)),
    ...(delayFault ? [delayFault] : []),
  ]
  const missing = [...(windows?.length ? [] : ['windows']), ...(typeof delay === 'number' ? [] : ['randomDelay_s'])]
  if (!reasons.length && missing.length) return waiting(missing, { result: windows?.length ? { overlaps } : {} })
  return answer({
    verdict: reasons.length ? 'outside' : 'within',
    result: { overlaps },
    missing,
    working: [
      ...PEAKS.map(peak => ruleStep('SMT-02', { symbol: 'peak', expression: `${clockText(peak.from)} to ${clockText(peak.to)}, weekdays`, value: peak.name, unit: '' })),
      ...(typeof delay === 'number' ? [ruleStep('SMT-03', { symbol: 'random delay', expression: `0 < ${delay} ≤ ${CAPABLE_DELAY_S}`, value: delay, unit: 's' })] : []),
    ],
    reasons: reasons.length ? reasons : [because('SMT-02', 'Every window lies outside the weekday peak.')],
    notes: notesFor(windows ?? [], delay ?? 0),
  })
}

function delayReason(delay: number): string | null {
  if (delay === 0) return because('SMT-03', `The randomised delay is off. Set it again; the usual setting is ${DEFAULT_DELAY_S} s.`)
  if (delay > CAPABLE_DELAY_S) return because('SMT-03', `A delay of ${delay} s is more than the ${CAPABLE_DELAY_S} s the rule knows.`)
  return null
}

function notesFor(windows: readonly ChargingWindow[], delay: number): string[] {
  const endsClose = windows.some(window => window.days !== 'weekend' && PEAKS.some((peak) => {
    const end = Number(window.to.slice(0, 2)) * 60 + Number(window.to.slice(3))
    return end <= peak.from && peak.from - end < delay / SECONDS_PER_MINUTE
  }))
  return [
    ...(endsClose ? [because('SMT-03', `A window ends less than the random delay of ${delay} s before a peak. A charger that delays its stop as well runs into it.`)] : []),
    ...(windows.some(window => window.from === window.to) ? ['A window that ends when it starts is taken as the whole day.'] : []),
    because('SMT-02', 'The owner may change or remove the hours at first use and at any time. This judges what the charger is set to.'),
  ]
}

export const smartWindowCalculation = defineCalculation({
  name: 'smart-window',
  purpose: 'Holds a charger\'s charging hours against the weekday peak and checks its random delay.',
  input,
  run: smartWindow,
})
