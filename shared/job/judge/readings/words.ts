/** A verdict on a reading in words: for the eye and for the ear. */
import type { ReadingRow } from '../../../types/record'
import { formatFigure, formatNumber } from '../../../utils/figures'
import { VERDICT_WORDS, type Verdict } from '../../../utils/verdict'
import type { ReadingExpected, ReadingLimit } from '../types'

const SPOKEN_UNITS: Record<string, string> = { 'Ω': 'ohms', 'MΩ': 'megohms', 'kA': 'kiloamps', 'mA': 'milliamps', 'A': 'amps', 'ms': 'milliseconds', 's': 'seconds', 'V': 'volts' }
const MOST_PLACES = 6

/** How far inside or outside its limit a figure is: "0.79 Ω inside", "by 0.12 Ω". A margin that is there is never written as nothing. */
export function marginWords(value: number, limit: ReadingLimit, unit: string, decimals: number): string {
  const margin = Math.abs(limit.value - value)
  let places = decimals
  while (margin > 1e-9 && places < MOST_PLACES && Number(margin.toFixed(places)) === 0) places++
  // Rounded down, so that no margin is promised that is not there.
  const factor = 10 ** places
  const shown = formatFigure(Math.floor(margin * factor + 1e-9) / factor, unit, places)
  const fits = limit.is === 'most' ? value <= limit.value : value >= limit.value
  if (margin <= 1e-9) return 'on the limit'
  return fits ? `${shown} inside` : `by ${shown}`
}

/** "1.8 × design", or that it does not fit, where nothing was expected. */
export function oddWords(value: number | null, expected: ReadingExpected | null): string {
  if (value === null || !expected || expected.value === 0) return 'does not fit the other figures'
  return `${formatNumber(value / expected.value, 1)} × design`
}

export function lineWords(verdict: Verdict, detail: string): string {
  return detail ? `${VERDICT_WORDS[verdict]} · ${detail}` : VERDICT_WORDS[verdict]
}

export function spokenWords(verdict: Verdict, detail: string): string {
  const spoken = detail.replace(/[\u2009 ](Ω|MΩ|kA|mA|A|ms|s|V)(?=$|[ ,])/g, (_, unit: string) => ` ${SPOKEN_UNITS[unit] ?? unit}`).replace('×', 'times').replaceAll('\u2009', ' ')
  const name = verdict === 'limited' ? 'limited' : verdict === 'not-applicable' ? 'not applicable' : VERDICT_WORDS[verdict].toLowerCase()
  return spoken ? `${name}, ${spoken}` : name
}

/** A reading as printed, unit and all. */
export function shownReading(reading: ReadingRow | null): string {
  if (!reading) return VERDICT_WORDS['not-entered']
  if (reading.kind === 'seen') return reading.shown === 'correct' ? 'Correct' : 'Wrong'
  if (reading.kind === 'limited') return 'LIM'
  if (reading.kind === 'not-applicable') return 'N/A'
  return reading.unit && reading.value !== null ? `${reading.shown}\u2009${reading.unit}` : reading.shown
}
