/**
 * What surroundings take off a cable's rating. Between two rows the worse row is taken (hotter, longer, fuller, drier);
 * below 30 °C the printed table, never the formula, because it prints less.
 * @source BS 7671 Appendix 4, tables 4B1 to 4C3 and 52.2, as in tables/rating-factors.data.ts
 */
import { CalculationInputError } from '../utils/calculation'
import { cite, numberAt, rowFrom } from './lookup'
import type { Row } from './lookup'
import type { ReferenceTable } from './tables/reference-table'
import { table4B1, table4B2, table4B3, table4B4, table4C1, table4C2, table4C3, table52_2, tableCf_Cc } from './tables/rating-factors.data'
import type { Cited } from './working'
import { weaker } from './working'

export interface FactorFound extends Cited {
  factor: number
  table: string
  /** What was looked up, in words. */
  expression: string
  note?: string
}

export const INSULATION_TEMPERATURES = [60, 70, 90] as const
export type InsulationTemperature = (typeof INSULATION_TEMPERATURES)[number]
export const LAYINGS = ['direct', 'ducts'] as const
export type Laying = (typeof LAYINGS)[number]

export const ARRANGEMENTS = [
  'bunched', 'single-layer-wall', 'perforated-tray', 'ladder',
  'buried-touching', 'buried-one-diameter', 'buried-0.125m', 'buried-0.25m', 'buried-0.5m',
  'ducts-touching', 'ducts-0.25m', 'ducts-0.5m', 'ducts-1m',
] as const
export type Arrangement = (typeof ARRANGEMENTS)[number]

const GROUPING: Record<Arrangement, { table: ReferenceTable, column: string }> = {
  'bunched': { table: table4C1, column: 'bunched' },
  'single-layer-wall': { table: table4C1, column: 'single_layer_wall' },
  'perforated-tray': { table: table4C1, column: 'perforated_tray' },
  'ladder': { table: table4C1, column: 'ladder' },
  'buried-touching': { table: table4C2, column: 'touching' },
  'buried-one-diameter': { table: table4C2, column: 'one_diameter' },
  'buried-0.125m': { table: table4C2, column: 'm0_125' },
  'buried-0.25m': { table: table4C2, column: 'm0_25' },
  'buried-0.5m': { table: table4C2, column: 'm0_5' },
  'ducts-touching': { table: table4C3, column: 'touching' },
  'ducts-0.25m': { table: table4C3, column: 'm0_25' },
  'ducts-0.5m': { table: table4C3, column: 'm0_5' },
  'ducts-1m': { table: table4C3, column: 'm1_0' },
}

export function isBelowGround(arrangement: Arrangement): boolean {
  return GROUPING[arrangement].table !== table4C1
}

function found(table: ReferenceTable, row: Row | undefined, keyColumn: string, column: string, expression: string, pastTheEnd: () => CalculationInputError): FactorFound {
  const factor = numberAt(row, column)
  if (factor === null) throw pastTheEnd()
  return { factor, table: table.id, expression, ...cite(table, column, row![keyColumn] as number) }
}

const temperatureColumn = (insulation_C: InsulationTemperature) => `c${insulation_C}`

/** Ca in air (reference 30 °C). */
export function ambientFactor(ambient_C: number, insulation_C: InsulationTemperature, path = 'ambient_C'): FactorFound {
  const row = rowFrom(table4B1.rows, 'ambient_C', ambient_C)
  return found(table4B1, row, 'ambient_C', temperatureColumn(insulation_C), `air at ${ambient_C} °C, insulation for ${insulation_C} °C`,
    () => new CalculationInputError(path, `Table 4B1 gives no factor at ${ambient_C} °C for insulation rated ${insulation_C} °C.`))
}

/** Ca in the ground (reference 20 °C). The table has no column for 60 °C insulation. */
export function groundFactor(ground_C: number, insulation_C: InsulationTemperature, path = 'ground_C'): FactorFound {
  const row = rowFrom(table4B2.rows, 'ground_C', ground_C)
  return found(table4B2, row, 'ground_C', temperatureColumn(insulation_C), `ground at ${ground_C} °C, insulation for ${insulation_C} °C`,
    () => new CalculationInputError(path, `Table 4B2 gives no factor at ${ground_C} °C for insulation rated ${insulation_C} °C.`))
}

/** Cs by soil resistivity or Cd by depth; where the laying is not said, the lower of the two columns. */
function byLaying(table: ReferenceTable, key: string, value: number, laying: Laying | undefined, words: string, path: string): FactorFound {
  const row = rowFrom(table.rows, key, value)
  const end = () => new CalculationInputError(path, `Table ${table.id} ends before ${value}. Give the factor itself, from the printed standard.`)
  if (laying) return found(table, row, key, laying, `${words}, ${laying === 'ducts' ? 'in ducts' : 'laid direct'}`, end)
  const direct = found(table, row, key, 'direct', words, end)
  const ducts = found(table, row, key, 'ducts', words, end)
  return { ...(direct.factor <= ducts.factor ? direct : ducts), expression: `${words}, the lower of laid direct and in ducts` }
}

export function soilFactor(rho_Km_per_W: number, laying?: Laying, path = 'rho_Km_per_W'): FactorFound {
  return byLaying(table4B3, 'rho_Km_per_W', rho_Km_per_W, laying, `soil of ${rho_Km_per_W} K·m/W`, path)
}

export function depthFactor(depth_m: number, laying?: Laying, path = 'depth_m'): FactorFound {
  const factor = byLaying(table4B4, 'depth_m', depth_m, laying, `${depth_m} m deep`, path)
  return factor.factor === 1 ? factor : { ...factor, note: 'Table 4B4 is known from memory only: check the depth factor in the printed standard.' }
}

/** Cg for equally loaded circuits touching; a number between two rows takes the fuller row. */
export function groupingFactor(circuits: number, arrangement: Arrangement, path = 'circuits'): FactorFound {
  const { table, column } = GROUPING[arrangement]
  const words = `${circuits} ${circuits === 1 ? 'circuit' : 'circuits'}, ${arrangement}`
  if (circuits === 1) return { factor: 1, table: table.id, expression: words, ...cite(table, column, 1) }
  const row = rowFrom(table.rows, 'circuits', circuits)
  return found(table, row, 'circuits', column, words, () => new CalculationInputError(path, `Table ${table.id} ends before ${circuits} circuits.`))
}

/** Ci for a cable wholly inside thermal insulation over this length. */
export function insulationFactor(length_mm: number): FactorFound {
  if (length_mm === 0) return { factor: 1, table: '52.2', expression: 'no insulation', source: 'Table 52.2', confidence: 'computed' }
  const row = rowFrom(table52_2.rows, 'length_mm', Math.min(length_mm, 500))!
  return { factor: row.Ci, table: '52.2', expression: `${length_mm} mm within thermal insulation`, ...cite(table52_2, 'Ci', row.length_mm), note: 'Table 52.2 covers cables up to 10 mm².' }
}

/** Cf for a semi-enclosed (BS 3036) fuse, Cc for a buried circuit sized by a ground rating. */
export function protectionFactor(symbol: 'Cf' | 'Cc'): FactorFound {
  const row = tableCf_Cc.rows.find(each => each.symbol === symbol)!
  // The 0.9 is known from memory though the table's first figure is printed.
  const confidence = symbol === 'Cc' ? weaker(tableCf_Cc.confidence, 'from memory') : tableCf_Cc.confidence
  return { factor: row.value as number, table: tableCf_Cc.id, expression: row.use, source: 'BS 7671 Appendix 4', confidence }
}
