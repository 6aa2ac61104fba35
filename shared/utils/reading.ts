/**
 * What a meter showed, kept as shown: the digits, the unit, the resolution. "Not entered" is the absence of a reading.
 * Nothing typed is dropped in silence: text that could mean two things is refused with a sentence that says what to do.
 */
import { formatFigure } from './figures'

export const READING_UNITS = ['Ω', 'MΩ', 'V', 'A', 'mA', 'kA', 'ms', 's', 'Hz', 'm', '°C'] as const
export type ReadingUnit = (typeof READING_UNITS)[number]

export interface Reading {
  kind: 'value' | 'over-range' | 'limited' | 'not-applicable'
  /** The digits as the meter showed them, with a point and a leading zero: '0.350', '>999', 'LIM', 'N/A'. */
  shown: string
  /** The number; for an over-range reading the bound that the true value lies above; null where there is none. */
  value: number | null
  unit: ReadingUnit
  /** The last place shown, 0.01 for '0.35'; null where there is no number. */
  resolution: number | null
  /** Why, for LIM and N/A. */
  reason?: string
}

export type ParsedReading = { reading: Reading, problem?: never } | { reading?: never, problem: string }

/** What people type for a unit. Case counts: MΩ and mΩ are a thousand million apart. */
const UNIT_SPELLINGS: Record<ReadingUnit, readonly string[]> = {
  'Ω': ['Ω', '\u2126', 'ohm', 'ohms', 'Ohm', 'Ohms'],
  'MΩ': ['MΩ', 'M\u2126', 'Mohm', 'Mohms', 'MOhm', 'megohm', 'megohms', 'Megohm'],
  'V': ['V', 'v', 'volt', 'volts'],
  'A': ['A', 'a', 'amp', 'amps'],
  'mA': ['mA', 'ma'],
  'kA': ['kA', 'ka', 'KA'],
  'ms': ['ms'],
  's': ['s', 'sec', 'second', 'seconds'],
  'Hz': ['Hz', 'hz'],
  'm': ['m', 'metre', 'metres'],
  '°C': ['°C', 'C', '°'],
}

const WORD = /^(LIM|N\/A|NA)(?:\s*[:·,–—-]\s*|\s+)?(.*)$/is
const NUMBER = /^([>\uFF1E]?)\s*([+\-\u2212]?)([\d.,]+)\s*(.*)$/s
const MOST_DIGITS = 6

/**
 * Reads what a person typed or the pad sent.
 * @example ('0,35', 'Ω') -> 0.35 Ω, resolution 0.01; ('>999', 'MΩ') -> over-range; ('035', 'Ω') -> a sentence
 */
export function parseReading(text: string, unit: ReadingUnit): ParsedReading {
  const typed = text.trim()
  if (!typed) return { problem: 'Enter what the meter shows, or LIM or N/A with the reason.' }
  const word = WORD.exec(typed)
  if (word) return parseWord(word, unit, typed)
  if (/^(OL|O\.L)$/i.test(typed)) return { reading: { kind: 'over-range', shown: 'OL', value: null, unit, resolution: null } }
  const parts = NUMBER.exec(typed)
  if (!parts) return { problem: `"${typed}" is not a reading. Enter the digits the meter shows, or LIM or N/A with the reason.` }
  const [, over = '', sign = '', digits = '', tail = ''] = parts
  const problem = signProblem(sign) ?? digitsProblem(digits) ?? tailProblem(tail, unit)
  if (problem) return { problem }
  return { reading: numberReading(digits, over !== '', unit) }
}

/** A reading as pages and papers print it: '0.35 Ω', '>999 MΩ', 'LIM · no access'. */
export function formatReading(reading: Reading): string {
  if (reading.kind === 'limited' || reading.kind === 'not-applicable') {
    return reading.reason ? `${reading.shown} · ${reading.reason}` : reading.shown
  }
  if (reading.value === null || reading.resolution === null) return reading.shown
  const figure = formatFigure(reading.value, reading.unit, decimalsOf(reading.shown))
  return reading.kind === 'over-range' ? `>${figure}` : figure
}

function parseWord(word: RegExpExecArray, unit: ReadingUnit, typed: string): ParsedReading {
  const [, name = '', rest = ''] = word
  const reason = rest.trim()
  // "NA…" and "LIM…" glued to more letters is another word, not one of these two with a reason.
  if (reason && typed.slice(name.length).startsWith(rest)) {
    return { problem: `"${typed}" is not a reading. Enter LIM or N/A, then a space and the reason.` }
  }
  const kind = name.toUpperCase() === 'LIM' ? 'limited' : 'not-applicable'
  const shown = kind === 'limited' ? 'LIM' : 'N/A'
  return { reading: { kind, shown, value: null, unit, resolution: null, ...(reason && { reason }) } }
}

function signProblem(sign: string): string | null {
  if (sign === '+') return 'Leave out the plus sign: enter the digits the meter shows.'
  if (sign) return 'A reading below zero is not possible here. Null the leads, measure again and enter what the meter then shows.'
  return null
}

function digitsProblem(digits: string): string | null {
  const separators = digits.replace(/\d/g, '')
  if (separators.length > 1) return `"${digits}" has more than one point. Enter one point at most.`
  const [before = '', after] = digits.split(/[.,]/)
  if (after === '') return `"${digits}" stops at the point. Enter the digits after it, or leave the point out.`
  if (/^0\d/.test(before)) return `"${digits}" can be read in two ways. Enter the point, as in ${withPoint(before)}, or leave out the leading zero.`
  if (separators === ',' && /^[1-9]/.test(before) && after?.length === 3) {
    return `"${digits}" can be read as ${before}.${after} or as ${before}${after}. Enter it with a point, or without the comma.`
  }
  if (before.length > MOST_DIGITS || (after?.length ?? 0) > MOST_DIGITS) return `"${digits}" has more digits than a meter shows. Check what was typed.`
  return null
}

function tailProblem(tail: string, unit: ReadingUnit): string | null {
  const spelling = tail.trim()
  if (!spelling || UNIT_SPELLINGS[unit].includes(spelling)) return null
  return `"${spelling}" does not fit here: this reading is in ${unit}. Enter it in ${unit}.`
}

function numberReading(digits: string, isOver: boolean, unit: ReadingUnit): Reading {
  const pointed = digits.replace(',', '.').replace(/^\./, '0.')
  const resolution = Number(`1e-${decimalsOf(pointed)}`)
  return { kind: isOver ? 'over-range' : 'value', shown: isOver ? `>${pointed}` : pointed, value: Number(pointed), unit, resolution }
}

const decimalsOf = (shown: string) => shown.split('.')[1]?.length ?? 0
const withPoint = (digits: string) => `0.${digits.slice(1)}`
