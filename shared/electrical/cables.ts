/**
 * The kinds of cable, each with the tables that rate it and give its volt drop.
 * Column rules: an ending _2 is two loaded conductors (single-phase, whatever the number of cores), _3 three (three-phase).
 */
import { CalculationInputError } from '../utils/calculation'
import { table60228 } from './tables/conductors.data'
import { table4D1A, table4D2A, table4D4A, table4D5, table4E2A, table4E4A, table4F1A, table4F2A, table4F3A } from './tables/current-carrying.data'
import type { ReferenceTable } from './tables/reference-table'
import { table4D1B, table4D2B, table4D4B, table4E2B, table4E4B, table4F3B } from './tables/volt-drop.data'
import { cite, exactRow, numberAt } from './lookup'
import type { Row } from './lookup'
import type { Cited } from './working'

export const CABLE_WORDS = ['twin-earth-70', 'singles-70', 'multicore-70', 'swa-70', 'swa-90', 'multicore-90', 'flex-60', 'flex-90'] as const
export type CableWord = (typeof CABLE_WORDS)[number]
export const METHOD_WORDS = ['A', 'B', 'C', 'D', 'E', '100', '101', '102', '103'] as const
export type MethodWord = (typeof METHOD_WORDS)[number]
export type Phases = 1 | 3

interface Cable {
  insulation_C: 60 | 70 | 90
  /** Words of the adiabatic table. */
  insulation: '70 C thermoplastic' | '90 C thermosetting' | '60 C rubber'
  /** In rising order of size; a later table gives only sizes the earlier ones lack. */
  ratings: readonly ReferenceTable[]
  drop: ReferenceTable
  /** 1.09 for 90 °C cords in the 60 °C table. */
  dropFactor: number
  flexible: boolean
  /** What rates it where the terminals stand 70 °C only. */
  at70: CableWord
}

const cable = (insulation_C: 60 | 70 | 90, ratings: readonly ReferenceTable[], drop: ReferenceTable, at70: CableWord, rest: Partial<Cable> = {}): Cable => ({
  insulation_C,
  insulation: insulation_C === 90 ? '90 C thermosetting' : insulation_C === 60 ? '60 C rubber' : '70 C thermoplastic',
  ratings, drop, at70, dropFactor: 1, flexible: false, ...rest,
})

export const CABLES: Record<CableWord, Cable> = {
  'twin-earth-70': cable(70, [table4D5], table4D5, 'twin-earth-70'),
  'singles-70': cable(70, [table4D1A], table4D1B, 'singles-70'),
  'multicore-70': cable(70, [table4D2A], table4D2B, 'multicore-70'),
  'swa-70': cable(70, [table4D4A], table4D4B, 'swa-70'),
  'swa-90': cable(90, [table4E4A], table4E4B, 'swa-70'),
  'multicore-90': cable(90, [table4E2A], table4E2B, 'multicore-70'),
  'flex-60': cable(60, [table4F1A, table4F3A], table4F3B, 'flex-60', { flexible: true }),
  'flex-90': cable(90, [table4F2A], table4F3B, 'flex-60', { flexible: true, dropFactor: 1.09 }),
}

/** Which cable's table rates this one: a 90 °C cable on 70 °C terminals is rated as a 70 °C cable (Reg. 512.1.2). */
export function ratedAs(word: CableWord, terminals_C: 70 | 90): CableWord {
  return terminals_C === 90 ? word : CABLES[word].at70
}

export interface Found extends Cited {
  readonly value: number
  readonly table: string
}

function ratingColumn(word: CableWord, table: ReferenceTable, method: MethodWord | undefined, phases: Phases): string {
  if (CABLES[word].flexible) return table === table4F3A ? (phases === 1 ? 'one_phase' : 'three_phase') : phases === 1 ? 'two_core_1ph' : 'multi_3ph'
  if (word === 'twin-earth-70') return /^\d/.test(method!) ? `M${method}` : method!
  return `${method}_${phases === 1 ? 2 : 3}`
}

/** The methods a cable's table has. */
export function methodsOf(word: CableWord): readonly MethodWord[] {
  if (CABLES[word].flexible) return ['C', 'E']
  const row: Row = CABLES[word].ratings[0]!.rows[0]!
  return METHOD_WORDS.filter(method => ratingColumn(word, CABLES[word].ratings[0]!, method, 1) in row)
}

/** Refuses a method that the table has not, and three phases in a two-core cable. */
export function assertCableUse(word: CableWord, method: MethodWord | undefined, phases: Phases, path = 'method'): void {
  if (word === 'twin-earth-70' && phases === 3) throw new CalculationInputError('phases', 'Twin and earth has one line conductor: it cannot feed three phases.')
  const methods = methodsOf(word)
  if (method !== undefined && !methods.includes(method)) throw new CalculationInputError(path, `Table ${CABLES[word].ratings[0]!.id} has no method ${method} for this cable. It has ${methods.join(', ')}.`)
}

/** Remembers what was found (never what was not, so that odd sizes cannot fill it): a circuit asks for the same cells on every keystroke. */
function remembered(look: (word: CableWord, size_mm2: number, method: MethodWord | undefined, phases: Phases) => Found | null): typeof look {
  const known = new Map<string, Found>()
  return (word, size_mm2, method, phases) => {
    const key = `${word} ${size_mm2} ${method} ${phases}`
    const found = known.get(key) ?? look(word, size_mm2, method, phases)
    if (found) known.set(key, found)
    return found
  }
}

/** Current-carrying capacity of one size, A; null where the table leaves it blank. */
export const findRating = remembered((word, size_mm2, method, phases) => {
  for (const table of CABLES[word].ratings) {
    const column = ratingColumn(word, table, method, phases)
    const value = numberAt(exactRow(table.rows, 'size_mm2', size_mm2), column)
    if (value !== null) return { value, table: table.id, ...cite(table, column, size_mm2) }
  }
  return null
})

/** Volt drop, mV per amp and metre; of cells with r, x and z the impedance z, which is the most. Null where the table ends. */
export const findDrop = remembered((word, size_mm2, method, phases) => {
  const { drop: table, dropFactor } = CABLES[word]
  const column = table === table4D5 ? 'mV_per_A_m' : table === table4D1B ? `${method === 'C' ? 'C' : 'AB'}_${phases}ph` : phases === 1 ? 'one_phase' : 'three_phase'
  const row: Row | undefined = exactRow<Row>(table.rows, 'size_mm2', size_mm2)
  const cell = row?.[column]
  const value = typeof cell === 'number' ? cell : (cell as { z: number } | null | undefined)?.z
  return value === undefined ? null : { value: value * dropFactor, table: table.id, ...cite(table, column, size_mm2) }
})

/** The protective conductor inside a twin and earth of this size, mm². */
export function ownProtectiveConductor(word: CableWord, size_mm2: number): number | null {
  return word === 'twin-earth-70' ? exactRow(table4D5.rows, 'size_mm2', size_mm2)?.cpc_mm2 ?? null : null
}

const madeSizes = new Map<CableWord, readonly number[]>()

/** Sizes a cable's tables rate, smallest first. */
export function sizesOf(word: CableWord): readonly number[] {
  let sizes = madeSizes.get(word)
  if (!sizes) {
    sizes = [...new Set(CABLES[word].ratings.flatMap(table => table.rows.map(row => row.size_mm2 as number)))].sort((a, b) => a - b)
    madeSizes.set(word, sizes)
  }
  return sizes
}

export function notMade(path: string, size_mm2: number, sizes: readonly number[]): CalculationInputError {
  return new CalculationInputError(path, `${size_mm2} mm² is not made in this cable. It is made in ${sizes.join(', ')} mm².`)
}

/** d.c. resistance of one conductor at 20 °C, milliohm per metre. @source IEC 60228 */
export function conductorMohmPerM(size_mm2: number, flexible: boolean, path: string): number {
  const row = exactRow(table60228.rows, 'size_mm2', size_mm2)
  if (!row) throw new CalculationInputError(path, `${size_mm2} mm² is not a size conductors are made in. They are made in ${table60228.rows.map(each => each.size_mm2).join(', ')} mm².`)
  return flexible ? row.class5_6 : row.class1_2
}
