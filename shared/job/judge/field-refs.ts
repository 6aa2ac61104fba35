/** Where a field of the record lives and what it is called, so that whatever waits for it can lead there. */
import type { FieldRef, JobPage } from './types'
import { PARTS, type Part } from '../parts'
import { boardFields, siteFields } from '../fields/survey'
import { TESTS, type TestKey } from '../tests.data'
import type { Fields } from '../fields/field'

const PART_PAGES: Record<Exclude<Part, 'survey'>, JobPage> = {
  wanted: 'enquiry', consent: 'enquiry', appliance: 'supply', recordedDemand: 'supply', leg: 'cable', circuit: 'cable', earthing: 'point', departure: 'leave',
  equipment: 'point', loadLimit: 'point', putBack: 'point', inspection: 'point', unexpected: 'leave', statement: 'leave', handover: 'leave', promise: 'leave',
}
/** Of the circuit's fields, those that belong to the board rather than to the cable. */
const BOARD_CIRCUIT_FIELDS = new Set(['number', 'device', 'device_standard', 'In_A', 'device_kA', 'energyClass', 'rcd_where', 'rcd_standard', 'rcd_type', 'rcd_IdeltaN_mA', 'rcd_A', 'dc_where'])

/** The page that holds a field. */
export function pageOf(part: Part, field: string): JobPage {
  if (part === 'survey') return field in boardFields ? 'board' : field in siteFields ? 'point' : 'supply'
  if (part === 'circuit' && BOARD_CIRCUIT_FIELDS.has(field)) return 'board'
  return PART_PAGES[part]
}

/** A field by its place in the record. @example fieldRef('survey', 'survey', 'cutout_A') -> supply, "main fuse rating" */
export function fieldRef(part: Part, key: string, field: string, words?: string): FieldRef {
  const fields: Fields = PARTS[part].fields
  return { page: pageOf(part, field), field: `${part}.${key}.${field}`, words: words ?? lowerFirst(fields[field]?.label ?? field) }
}

export function readingRef(test: TestKey): FieldRef {
  return { page: TESTS[test].page, field: `reading.${test}`, words: `the reading of ${TESTS[test].label}` }
}

/** "Design current" -> "design current"; abbreviations and symbols keep their capitals. */
export function lowerFirst(text: string): string {
  return /^[A-Z][a-z]/.test(text) ? text.charAt(0).toLowerCase() + text.slice(1) : text
}
