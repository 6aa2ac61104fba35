/** Parts of input schemas that several trade calculations share, with the sentences they refuse with. */
import * as z from 'zod'
import { isDay } from '../../utils/dates'

export const UK_COUNTRIES = ['England', 'Wales', 'Scotland', 'Northern Ireland'] as const
export type UkCountry = (typeof UK_COUNTRIES)[number]

const MOST_AMPS = 10_000

export const country = z.enum(UK_COUNTRIES, 'Enter England, Wales, Scotland or Northern Ireland')
export const day = z.string('Enter the day as 2026-12-01').refine(isDay, 'Enter a day of the calendar as 2026-12-01').meta({ format: 'date' })
export const yesOrNo = z.boolean('Enter true or false')
export const phases = z.literal([1, 3], 'Enter 1 or 3 phases')
export const current = z.number('Enter a current in amps').min(0, 'Enter a current of 0 A or more').max(MOST_AMPS, 'Enter a current a service can carry')
/** Whole pence; negative only where the field says so. */
export const wholePence = z.number('Enter whole pence').int('Enter whole pence').min(0, 'Enter 0 pence or more').max(1_000_000_000, 'Enter at most 10 million pounds')

/** The keys of those inputs that are blank: what a `waiting` answer waits for. */
export function blankKeys(inputs: Record<string, unknown>): string[] {
  return Object.keys(inputs).filter(key => inputs[key] === undefined || inputs[key] === null || inputs[key] === '')
}
