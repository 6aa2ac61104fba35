/**
 * The most energy (I²t, A²s) an energy-limiting breaker lets through, by class, rating, breaking capacity and curve.
 * @source BS EN 60898-1 Annex ZA, as in tables/fault-current.data.ts
 */
import { tableI2t_class3 } from './tables/fault-current.data'
import type { Cited } from './working'

const BAND_WORDS = { small: '<=16 A', middle: '>16 to 32 A', forty: '40 A' } as const

function bandOf(In_A: number): string | null {
  if (In_A <= 16) return BAND_WORDS.small
  if (In_A <= 32) return BAND_WORDS.middle
  return In_A <= 40 ? BAND_WORDS.forty : null
}

export interface LetThrough extends Cited { I2t_A2s: number, expression: string }

/** Null where the table has no such device (type D and fuses are the maker's to say). */
export function findLetThrough({ device, In_A, Icn_A, energyClass }: { device: string, In_A: number, Icn_A: number, energyClass: number }): LetThrough | null {
  if (device !== 'B' && device !== 'C') return null
  const band = bandOf(In_A)
  const row = tableI2t_class3.rows.find(each => each.cls === energyClass && each.In === band && each.Icn_A === Icn_A)
  if (!row) return null
  return { I2t_A2s: row[device], expression: `class ${energyClass}, type ${device}, ${row.In}, ${row.Icn_A} A`, source: 'BS EN 60898-1 Annex ZA', confidence: tableI2t_class3.confidence }
}

/** The tabulated breaking capacities, A. */
export const TABULATED_ICN = [3000, 4500, 6000, 10000] as const
