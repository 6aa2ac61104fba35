/**
 * Is this supply number typed right, and whose network is it on?
 *
 * check digit = (Σ core digit × weight) mod 11 mod 10
 *
 * @source rules SUR-01 to SUR-05
 * @example 1312345678907 -> valid, distributor 13, Merseyside, Cheshire and North Wales
 */
import * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer, type WorkingStep } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { DISTRIBUTORS, FIRST_INDEPENDENT_ID, NORTHERN_IRELAND_OPERATOR } from './distributors.data'
import { country } from './inputs'
import { because, ruleStep } from './rule'

const CORE_LENGTH = 13
const FULL_LENGTH = 21
const NORTHERN_IRELAND_LENGTH = 11
/** One for each of the core's first twelve digits: the primes from 3 without 11 (rule SUR-02). */
const CHECK_WEIGHTS = [3, 5, 7, 13, 17, 19, 23, 29, 31, 37, 41, 43] as const

const input = fields({
  mpan: z.string('Enter the number as text, so that leading zeros stay').max(60, 'Enter the 21 digits, or the 13 of the lower line').nullish(),
  country: country.nullish(),
})
export type MpanInput = z.infer<typeof input>

export interface MpanResult {
  valid: boolean
  /** The 13 digits that identify the supply (Northern Ireland: all 11). */
  core: string | null
  /** The core's first two digits. */
  distributor: string | null
  region: string | null
  operator: string | null
  /** Why it is not valid, as a sentence; null where it is. */
  reason: string | null
}

/** The digit that should stand last, from the first twelve. */
export function mpanCheckDigit(firstTwelve: string): number {
  return weightedSum(firstTwelve) % 11 % 10
}

export function checkMpan({ mpan, country: where }: MpanInput): Answer<MpanResult> {
  const typed = (mpan ?? '').replace(/[\s-]/g, '').toUpperCase()
  if (!typed) return waiting(['mpan'])
  if (where === 'Northern Ireland') return checkNorthernIreland(typed)
  if (!/^(?:[A-Z\d]{8})?\d{13}$/.test(typed)) return refused(null, because('SUR-01', shapeSentence(typed)))
  const core = typed.slice(-CORE_LENGTH)
  const expected = mpanCheckDigit(core)
  const working = [checkStep(core, expected)]
  if (expected !== Number(core.at(-1))) {
    return refused(core, because('SUR-02', `The last digit should be ${expected}, not ${core.at(-1)}. Compare the number with the meter label.`), working)
  }
  const known = DISTRIBUTORS.find(each => each.id === core.slice(0, 2))
  return answer({
    result: { valid: true, core, distributor: core.slice(0, 2), region: known?.region ?? null, operator: known?.operator ?? null, reason: null },
    working,
    notes: [
      because('SUR-02', 'A right check digit shows that the number is typed right, not that the supply is this house.'),
      ...(known ? [] : [unknownDistributorNote(core.slice(0, 2))]),
    ],
  })
}

function checkNorthernIreland(typed: string): Answer<MpanResult> {
  if (!/^\d{11}$/.test(typed)) {
    return refused(null, because('SUR-05', `A meter point reference in Northern Ireland has ${NORTHERN_IRELAND_LENGTH} digits; this has ${typed.length} characters.`))
  }
  return answer({
    result: { valid: true, core: typed, distributor: null, region: 'Northern Ireland', operator: NORTHERN_IRELAND_OPERATOR, reason: null },
    notes: [because('SUR-05', 'This reference has no check digit. Compare it with the meter or a bill.')],
  })
}

function refused(core: string | null, reason: string, working: WorkingStep[] = []): Answer<MpanResult> {
  const distributor = core?.slice(0, 2) ?? null
  const known = DISTRIBUTORS.find(each => each.id === distributor)
  return answer({
    result: { valid: false, core, distributor, region: known?.region ?? null, operator: known?.operator ?? null, reason },
    reasons: [reason],
    working,
  })
}

function shapeSentence(typed: string): string {
  if (/^\d{11}$/.test(typed)) return 'A number of 11 digits belongs to Northern Ireland; in Great Britain the lower line has 13.'
  if (!/^[A-Z\d]*$/.test(typed)) return 'The number holds characters that are neither digits nor letters.'
  if (typed.length === CORE_LENGTH || typed.length === FULL_LENGTH) return 'The lower line of the number holds digits only.'
  return `The number has ${FULL_LENGTH} digits, or ${CORE_LENGTH} for the lower line alone; this has ${typed.length}.`
}

function unknownDistributorNote(id: string): string {
  return Number(id) >= FIRST_INDEPENDENT_ID
    ? because('SUR-04', `${id} is an independent network operator. Ask who it is: the region cannot be read from the number.`)
    : because('SUR-03', `No network operator is on record for ${id}. Compare the number with the meter label.`)
}

function weightedSum(digits: string): number {
  return CHECK_WEIGHTS.reduce((sum, weight, at) => sum + weight * Number(digits[at]), 0)
}

function checkStep(core: string, expected: number): WorkingStep {
  const products = CHECK_WEIGHTS.map((weight, at) => `${core[at]} × ${weight}`).join(' + ')
  return ruleStep('SUR-02', { symbol: 'check digit', expression: `(${products}) mod 11 mod 10`, value: expected, unit: '' })
}

export const mpanCalculation = defineCalculation({
  name: 'mpan',
  purpose: 'Checks a supply number and names the network operator\'s region.',
  input,
  run: checkMpan,
})
