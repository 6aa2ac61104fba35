/** Plain facts of a job that several rules ask for: which system, how many phases, what is fitted. */
import type { JobRecord, PartContent } from '../../types/record'
import type { Part } from '../parts'
import type { FieldValue } from '../fields/field'

export interface JobFacts {
  /** TT where the circuit's earth is an electrode of its own, whatever the supply has. */
  system: 'TN' | 'TT'
  isThreePhase: boolean
  needsElectrode: boolean
  hasOpenPen: boolean
  hasLimiter: boolean
  hasSurgeDevice: boolean
  hasIsolator: boolean
  hasOtherSources: boolean
  needsDcTest: boolean
  isMainSwitchRcd: boolean
  isZeByEnquiry: boolean
  isTranscribed: boolean
  hasExceptions: boolean
}

/** The fields of a one-row part, or of the row with that key; empty where it is not there yet. */
export function contentOf(record: JobRecord, part: Part, key: string): PartContent {
  return record.parts[part].find(row => row.key === key)?.content ?? {}
}

/** Whether somebody answered: zero and "no" are answers, blank text is none. */
export function isAnswered(value: FieldValue | undefined): boolean {
  if (value === null || value === undefined) return false
  return typeof value === 'string' ? value.trim() !== '' : Array.isArray(value) ? value.length > 0 : true
}

export const numberOf = (content: PartContent, key: string): number | undefined => {
  const value = content[key]
  return typeof value === 'number' && Number.isFinite(value) ? value : undefined
}
export const textOf = (content: PartContent, key: string): string | undefined => {
  const value = content[key]
  return typeof value === 'string' && value.trim() !== '' ? value.trim() : undefined
}
export const phasesOf = (content: PartContent, key: string): 1 | 3 | undefined => {
  const value = Number(content[key])
  return value === 1 || value === 3 ? value : undefined
}
/** Yes and no as true and false; "cannot see" and blank as not known. */
export const yesOf = (content: PartContent, key: string): boolean | undefined => {
  const value = content[key]
  return value === 'yes' ? true : value === 'no' ? false : undefined
}

/** The circuit as installed; each field that was not recorded as installed is taken from the design. */
export function installedContent(record: JobRecord): PartContent {
  const installed = contentOf(record, 'circuit', 'installed')
  const answered = Object.fromEntries(Object.entries(installed).filter(([, value]) => isAnswered(value)))
  return { ...contentOf(record, 'circuit', 'designed'), ...answered }
}

/** "None" typed as a value is an answer, but nothing to act on. */
export function isNone(text: string | undefined): boolean {
  return text === undefined || /^(none|nil|no|n\/a)\.?$/i.test(text)
}

export function jobFacts(record: JobRecord): JobFacts {
  const survey = contentOf(record, 'survey', 'survey')
  const method = textOf(contentOf(record, 'earthing', 'earthing'), 'method')
  const circuit = installedContent(record)
  const system = survey.earthing === 'TT' || method === 'TT' ? 'TT' : 'TN'
  const sources = Array.isArray(survey.other_sources) ? survey.other_sources : []
  const limiter = textOf(contentOf(record, 'loadLimit', 'limit'), 'state') ?? 'none'
  return {
    system,
    isThreePhase: (phasesOf(circuit, 'phases') ?? phasesOf(contentOf(record, 'wanted', 'wanted'), 'phases')) === 3,
    needsElectrode: system === 'TT' || method === 'ii',
    hasOpenPen: method === 'iii' || method === 'iv' || method === 'v',
    hasLimiter: limiter !== 'none',
    hasSurgeDevice: survey.spd === 'fitted' || survey.spd === 'existing',
    hasIsolator: isAnswered(contentOf(record, 'equipment', 'isolator').description),
    hasOtherSources: sources.some(source => source !== 'none'),
    needsDcTest: circuit.dc_where !== 'type_b',
    isMainSwitchRcd: survey.main_switch_rcd === 'yes',
    isZeByEnquiry: record.readings.some(row => row.test === 'Ze' && row.context.byEnquiry === true) && !record.readings.some(row => row.test === 'Ze' && !row.context.byEnquiry && row.value !== null),
    isTranscribed: record.readings.some(row => row.typedBy !== null),
    hasExceptions: !isNone(textOf(contentOf(record, 'statement', 'statement'), 'exceptions')),
  }
}
