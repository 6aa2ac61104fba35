/** How limits and expected figures are printed. */
import { formatFigure } from '../../../utils/figures'
import type { ReadingExpected, ReadingLimit } from '../types'

/** Forgives the dust of binary fractions, nothing larger. */
const DUST = 1e-9

/** From here on places after the point say nothing. */
const LARGE = 100

/** The most it may be; printed rounded down, so that the printed limit never allows more than the true one. */
export function most(value: number, unit: string, places: number): ReadingLimit {
  const decimals = value >= LARGE || Number.isInteger(value) && places === 1 ? 0 : places
  const factor = 10 ** decimals
  return { value, is: 'most', text: `≤ ${formatFigure(Math.floor(value * factor + DUST) / factor, unit, decimals)}` }
}

/** The least it must be; printed rounded up. */
export function least(value: number, unit: string, decimals: number): ReadingLimit {
  const factor = 10 ** decimals
  return { value, is: 'least', text: `≥ ${formatFigure(Math.ceil(value * factor - DUST) / factor, unit, decimals)}` }
}

export function expected(value: number, unit: string, decimals: number, from: string): ReadingExpected {
  return { value, text: formatFigure(value, unit, decimals), from }
}
