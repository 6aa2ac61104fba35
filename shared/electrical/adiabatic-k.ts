/**
 * The adiabatic constant k of a conductor, A·s^½/mm².
 * @source BS 7671 tables 43.1 and 54.2 to 54.6, as in tables/protective-conductors.data.ts
 */
import { CalculationInputError } from '../utils/calculation'
import { tableK } from './tables/protective-conductors.data'
import type { Cited } from './working'

export const MATERIALS = ['copper', 'aluminium', 'steel'] as const
export const INSULATIONS = ['70 C thermoplastic', '90 C thermoplastic', '90 C thermosetting', '60 C rubber', '85 C rubber', 'bare'] as const
export const CONDUCTOR_ARRANGEMENTS = ['in-cable', 'separate', 'armour', 'conduit', 'bare-visible', 'bare-normal', 'bare-fire-risk'] as const
export type Material = (typeof MATERIALS)[number]
export type Insulation = (typeof INSULATIONS)[number]
export type ConductorArrangement = (typeof CONDUCTOR_ARRANGEMENTS)[number]

const TABLE_OF: Record<ConductorArrangement, string> = { 'in-cable': '54.3', 'separate': '54.2', 'armour': '54.4', 'conduit': '54.5', 'bare-visible': '54.6', 'bare-normal': '54.6', 'bare-fire-risk': '54.6' }
const BARE_WORD: Partial<Record<ConductorArrangement, string>> = { 'bare-visible': 'visible', 'bare-normal': 'normal', 'bare-fire-risk': 'fire risk' }

export interface KFound extends Cited { k: number }

/** Above 300 mm² thermoplastic has a lower final temperature, and so a row of its own. */
export function findK({ material, insulation, arrangement, size_mm2 = 0 }: { material: Material, insulation: Insulation, arrangement: ConductorArrangement, size_mm2?: number }): KFound {
  const bareWord = BARE_WORD[arrangement]
  const rows = tableK.rows.filter(row => row.table.startsWith(TABLE_OF[arrangement]) && row.material === material
    && (bareWord ? row.use.includes(bareWord) : row.insulation === insulation))
  const row = rows.find(each => each.use.includes('above 300') === size_mm2 > 300) ?? rows[0]
  if (!row) throw new CalculationInputError('insulation', `Table ${TABLE_OF[arrangement]} gives no k for ${material}, ${insulation}, ${arrangement}. Give k itself.`)
  return { k: row.k, source: `Table ${TABLE_OF[arrangement]}`, confidence: tableK.confidence }
}
