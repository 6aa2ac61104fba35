/**
 * One box for an enquiry: what is typed in a call, or a whole e-mail pasted in, is read for what has a known form. What
 * was understood can be corrected; what was not stays as the note, so that nothing a customer said is lost.
 */
import type { Day } from '../utils/dates'
import { EMAIL_IN_TEXT, MPAN_IN_TEXT, nationOf, PHONE_IN_TEXT, POSTCODE_IN_TEXT, readPhone, readPostcode } from './intake/uk-formats'
import { findAddress, findName, findTown, piecesOf, withCapitals } from './intake/who-and-where'
import { readDay, readHalf, readOutlet, readPhases, readRating, type Wishes } from './intake/wishes'

export interface IntakeFields { name: string, telephone: string, email: string, address: string, town: string, postcode: string, country: 'England' | 'Wales' | 'Scotland' | 'Northern Ireland', mpan: string }
export type IntakeField = keyof IntakeFields | 'wanted' | 'when'
export interface Found { field: IntakeField, shown: string }

export interface Intake {
  fields: IntakeFields
  wanted: Wishes
  /** When the customer asked for somebody to come. */
  asked: { day: Day | null, half: 'am' | 'pm' | null }
  /** What was understood, in the order it is shown. */
  found: Found[]
  /** What was not understood, as it was typed. */
  note: string
}

interface Taken { value: string, from: number, to: number }

/** Reads an enquiry. Pure: the day it is comes in. */
export function readIntake(text: string, today: Day): Intake {
  const email = take(text, EMAIL_IN_TEXT, found => found[1] ?? null)
  const withoutEmail = blank(text, [email])
  const mpan = take(withoutEmail, MPAN_IN_TEXT, found => found[1]!.replace(/[ \t-]/g, ''))
  const withoutMpan = blank(withoutEmail, [mpan])
  const postcode = take(withoutMpan, POSTCODE_IN_TEXT, found => readPostcode(found[0]))
  const telephone = take(blank(withoutMpan, [postcode]), PHONE_IN_TEXT, found => readPhone(found[0]))

  const left = blank(withoutMpan, [postcode, telephone])
  const pieces = piecesOf(left)
  const address = findAddress(pieces)
  const town = findTown(pieces, address, postcode?.from ?? null)
  const name = findName(left, pieces, [address, town])

  const wanted: Wishes = {}
  const rating = readRating(left)
  const [phases, outlet] = [readPhases(left), readOutlet(left)]
  if (rating) wanted.rating_kW = rating.value
  if (phases) wanted.phases = phases
  if (outlet) wanted.outlet = outlet
  const asked = { day: readDay(left, today), half: readHalf(left) }

  const fields: IntakeFields = {
    name: name ? withCapitals(name.text) : '',
    telephone: telephone?.value ?? '',
    email: email?.value ?? '',
    address: address ? withCapitals(address.text) : '',
    town: town ? withCapitals(town.text) : '',
    postcode: postcode?.value ?? '',
    country: (postcode && nationOf(postcode.value)) || 'England',
    mpan: mpan?.value ?? '',
  }
  return { fields, wanted, asked, found: listFound(fields, wanted, asked), note: noteOf(left, [address, town, name]) }
}

function take(text: string, pattern: RegExp, read: (found: RegExpExecArray) => string | null): Taken | null {
  for (const found of text.matchAll(pattern)) {
    const value = read(found)
    if (value) return { value, from: found.index, to: found.index + found[0].length }
  }
  return null
}

/** The text with what was taken from it blanked out, every other place unchanged. */
function blank(text: string, taken: readonly ({ from: number, to: number } | null)[]): string {
  return taken.reduce((rest, part) => part ? rest.slice(0, part.from) + ' '.repeat(part.to - part.from) + rest.slice(part.to) : rest, text)
}

/** What is left, without the commas and labels that stood around what was taken. */
function noteOf(left: string, taken: readonly ({ from: number, to: number } | null)[]): string {
  return blank(left, taken).split('\n').map(line => line
    .replace(/\b(?:e-?mail|tel(?:ephone)?|phone|mob(?:ile)?|mpan|postcode|address|name)\b\s*[:.]?\s*(?=[,;]|\s*$)/gi, '')
    .replace(/\s*([,;])(?:\s*[,;])+/g, '$1').replace(/^[\s,;.]+|[\s,;]+$/g, '').replace(/\s{2,}/g, ' '))
    .filter(Boolean).join('\n')
}

function listFound(fields: IntakeFields, wanted: Wishes, asked: Intake['asked']): Found[] {
  const ofFields = (['name', 'telephone', 'email', 'address', 'town', 'postcode', 'mpan'] as const).filter(field => fields[field]).map(field => ({ field, shown: fields[field] }))
  const charger = [wanted.rating_kW && `${wanted.rating_kW}\u2009kW`, wanted.phases && (wanted.phases === '3' ? 'three-phase' : 'single-phase'), wanted.outlet].filter(Boolean).join(', ')
  const when = [asked.day, asked.half && (asked.half === 'am' ? 'morning' : 'afternoon')].filter(Boolean).join(', ')
  return [...ofFields, ...(charger ? [{ field: 'wanted' as const, shown: charger }] : []), ...(when ? [{ field: 'when' as const, shown: when }] : [])]
}
