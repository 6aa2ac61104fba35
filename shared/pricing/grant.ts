/**
 * What the charge point grant pays towards this job.
 *
 * grant = the lesser of 75 % of the cost with VAT (rounded down to the penny) and the cap × sockets; the cap is that of the day of application
 *
 * @source rules GRT-01 to GRT-03, GRT-07, COM-08
 * @example a renter who applied on 2026-03-28, £950.00, one socket -> £350.00
 */
import * as z from 'zod'
import { fields } from '../electrical/inputs'
import { answer, waiting, type Answer } from '../utils/answer'
import { defineCalculation } from '../utils/calculation'
import { compareDays, formatDay, type Day } from '../utils/dates'
import { formatPounds, shareOf } from '../utils/money'
import { blankKeys, day, wholePence } from '../job/rules/inputs'
import { because, ruleStep } from '../job/rules/rule'
import { GRANT_CAPS, GRANT_SHARE, type GrantCap } from './grant-caps.data'

const MOST_SOCKETS = 500

const input = fields({
  who: z.enum(['renter', 'flat-owner', 'landlord', 'on-street', 'house-owner'], 'Enter renter, flat-owner, landlord, on-street or house-owner').nullish(),
  applied: day.nullish().describe('The day the customer applied'),
  costIncVat_pence: wholePence.nullish(),
  sockets: z.number('Enter a whole number of sockets').int('Enter a whole number of sockets').min(0, 'Enter 0 sockets or more').max(MOST_SOCKETS, `Enter at most ${MOST_SOCKETS} sockets`).nullish(),
})
export type GrantInput = z.infer<typeof input>

export interface GrantResult {
  /** Whole pence. */
  grant_pence: number
  reasons: string[]
}

export function grant(given: GrantInput): Answer<GrantResult> {
  const { who, applied, costIncVat_pence: cost, sockets } = given
  if (who === 'house-owner') return none(because('GRT-03', 'The owner of a house with a drive of its own gets no grant since 1 April 2022.'))
  if (!who || !applied || typeof cost !== 'number' || typeof sockets !== 'number') {
    return waiting(blankKeys({ who, applied, costIncVat_pence: cost, sockets }))
  }
  const cap = capOn(applied)
  if (!cap) return none(because('GRT-01', `No grant is on record for an application of ${formatDay(applied)}.`))
  const share = shareOf(cost, GRANT_SHARE.numerator, GRANT_SHARE.denominator, 'down')
  const most = cap.perSocket_pence * sockets
  const grant_pence = Math.min(share, most)
  const reasons = [
    because('GRT-01', `75 % of ${formatPounds(cost)} is ${formatPounds(share)}; at most ${formatPounds(most)} for ${sockets === 1 ? 'one socket' : `${sockets} sockets`}.`),
    because('GRT-02', `The cap is that of the day of application, ${formatDay(applied)}.`),
  ]
  return answer({
    result: { grant_pence, reasons },
    working: [
      ruleStep('GRT-01', { symbol: 'share', expression: `${cost} × ${GRANT_SHARE.numerator} ÷ ${GRANT_SHARE.denominator}, rounded down`, value: share, unit: 'p' }),
      ruleStep('GRT-01', { symbol: 'cap', expression: `${cap.perSocket_pence} × ${sockets}`, value: most, unit: 'p' }),
    ],
    reasons,
    notes: notesFor(who, sockets),
  })
}

function none(reason: string): Answer<GrantResult> {
  return answer({ result: { grant_pence: 0, reasons: [reason] }, reasons: [reason] })
}

function capOn(applied: Day): GrantCap | null {
  return GRANT_CAPS.find(cap => compareDays(cap.from, applied) <= 0 && compareDays(applied, cap.until) <= 0) ?? null
}

function notesFor(who: string, sockets: number): string[] {
  return [
    because('GRT-05', 'Do not fit the charge point before eligibility is confirmed.'),
    because('COM-08', 'VAT is due on the full price; the grant is part of the payment.'),
    ...(who !== 'landlord' && sockets > 1 ? [because('GRT-07', 'One grant is for one applicant. Ask whether a second socket counts before you promise it.')] : []),
    ...(who === 'on-street' ? [because('GRT-01', 'The home needs a cross-pavement solution as well as the charge point.')] : []),
  ]
}

export const grantCalculation = defineCalculation({
  name: 'grant',
  purpose: 'Works out the charge point grant from who applied, when, and what the job costs.',
  input,
  run: grant,
})
