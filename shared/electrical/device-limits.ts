/**
 * The current that makes a device's overcurrent part act in time, and the loop impedance that lets it flow.
 *
 * breaker: Ia = multiple × In; Zs = Cmin × U0 ÷ Ia.  fuse: the table's Zs × Cmin ÷ 0.95 (× U0 ÷ 230).
 *
 * @source BS 7671 tables 41.2 to 41.4, as in tables/loop-impedance.data.ts
 */
import { CalculationInputError } from '../utils/calculation'
import { cite, exactRow, tableName } from './lookup'
import type { ReferenceTable } from './tables/reference-table'
import { table41_2_BS3036, table41_2_BS88_2, table41_2_BS88_3, table41_3_B, table41_3_C, table41_3_D, table41_4_BS3036_5s, table41_4_BS88_2_5s, table41_4_BS88_3_5s, tableBS1361_0_4s, tableBS1361_5s } from './tables/loop-impedance.data'
import type { Cited } from './working'
import { shown } from './working'

export const DEVICE_WORDS = ['B', 'C', 'D', 'BS88-2', 'BS88-3', 'BS3036', 'BS1361'] as const
export type DeviceWord = (typeof DEVICE_WORDS)[number]
export type BreakerType = 'B' | 'C' | 'D'

/** The figures every table of loop impedances was computed with. */
const TABLE_CMIN = 0.95
const TABLE_U0_V = 230

const BREAKERS: Record<BreakerType, { table: ReferenceTable, multiple: number, multiple5s: number }> = {
  B: { table: table41_3_B, multiple: 5, multiple5s: 5 },
  C: { table: table41_3_C, multiple: 10, multiple5s: 10 },
  D: { table: table41_3_D, multiple: 20, multiple5s: 10 },
}

const FUSES: Record<Exclude<DeviceWord, BreakerType>, { at0_4s: ReferenceTable, at5s: ReferenceTable }> = {
  'BS88-2': { at0_4s: table41_2_BS88_2, at5s: table41_4_BS88_2_5s },
  'BS88-3': { at0_4s: table41_2_BS88_3, at5s: table41_4_BS88_3_5s },
  'BS3036': { at0_4s: table41_2_BS3036, at5s: table41_4_BS3036_5s },
  'BS1361': { at0_4s: tableBS1361_0_4s, at5s: tableBS1361_5s },
}

export interface DeviceLimit extends Cited {
  Ia_A: number
  ZsMax_ohm: number
  IaExpression: string
  ZsExpression: string
  notes: string[]
}

interface Query { device: DeviceWord, In_A: number, time_s: number, Cmin: number, U0_V: number }

export function findDeviceLimit(query: Query): DeviceLimit {
  return isBreaker(query.device) ? breakerLimit(query.device, query) : fuseLimit(query.device, query)
}

function isBreaker(device: DeviceWord): device is BreakerType {
  return device in BREAKERS
}

function breakerLimit(device: BreakerType, { In_A, time_s, Cmin, U0_V }: Query): DeviceLimit {
  const { table, multiple, multiple5s } = BREAKERS[device]
  const times = time_s >= 5 ? multiple5s : multiple
  const Ia_A = times * In_A
  const tabulated = exactRow(table.rows, 'In_A', In_A) !== undefined
  return {
    Ia_A,
    ZsMax_ohm: Cmin * U0_V / Ia_A,
    IaExpression: `${times} × ${shown(In_A)}`,
    ZsExpression: `${shown(Cmin)} × ${shown(U0_V)} ÷ ${shown(Ia_A)}`,
    notes: tabulated ? [] : [`${shown(In_A)} A is not a rating of the table: the limit is by the table's formula.`],
    ...(tabulated ? cite(table, times === multiple ? 'Zs_ohm' : 'Zs_5s_ohm', In_A) : { source: `${tableName(table)}, its formula`, confidence: 'computed' as const }),
  }
}

function fuseLimit(device: Exclude<DeviceWord, BreakerType>, { In_A, time_s, Cmin, U0_V }: Query): DeviceLimit {
  if (time_s < 0.4) throw new CalculationInputError('time_s', 'The tables give fuses at 0.4 s and at 5 s; a shorter time needs the maker\'s curve.')
  const table = time_s >= 5 ? FUSES[device].at5s : FUSES[device].at0_4s
  const row = exactRow(table.rows, 'In_A', In_A)
  if (!row) throw new CalculationInputError('In_A', `The table for this fuse has no rating of ${shown(In_A)} A. It has ${table.rows.map(each => each.In_A).join(', ')} A.`)
  const Zs = row.Zs_ohm as number
  const known = typeof row.Ia_A === 'number' ? row.Ia_A : null
  const otherVoltage = U0_V === TABLE_U0_V ? '' : ` × ${shown(U0_V)} ÷ ${TABLE_U0_V}`
  return {
    Ia_A: known ?? TABLE_CMIN * TABLE_U0_V / Zs,
    ZsMax_ohm: Zs * (Cmin / TABLE_CMIN) * (U0_V / TABLE_U0_V),
    IaExpression: known === null ? `${TABLE_CMIN} × ${TABLE_U0_V} ÷ ${shown(Zs)}` : 'from the time/current curve',
    ZsExpression: `${shown(Zs)} × ${shown(Cmin)} ÷ ${TABLE_CMIN}${otherVoltage}`,
    notes: time_s > 0.4 && time_s < 5 ? ['The tables give fuses at 0.4 s and at 5 s: the 0.4 s figure is taken, which is the safe side.'] : [],
    ...cite(table, 'Zs_ohm', In_A),
  }
}
