/**
 * The average home's half-hours, as printed or scaled to a year's energy. A shape for a day, never one home's maximum demand.
 * @source Elexon Profile Class 1, as in tables/profile-class-1.data.ts; lengths of its seasons from memory
 */
import { tablePC1 } from './tables/profile-class-1.data'

export const PROFILE_COLUMNS = [
  'Aut_Wd', 'Aut_Sat', 'Aut_Sun', 'Hsr_Wd', 'Hsr_Sat', 'Hsr_Sun', 'Smr_Wd', 'Smr_Sat', 'Smr_Sun',
  'Spr_Wd', 'Spr_Sat', 'Spr_Sun', 'Wtr_Wd', 'Wtr_Sat', 'Wtr_Sun',
] as const
export type ProfileColumn = (typeof PROFILE_COLUMNS)[number]

/** Days of each season in a year, by the clock changes and the May and August bank holidays. */
const SEASON_DAYS = { Aut: 55, Hsr: 44, Smr: 56, Spr: 56, Wtr: 154 } as const
const DAYS_OF_WEEK = { Wd: 5, Sat: 1, Sun: 1 } as const

/** kW in each half-hour from midnight. */
export function profile_kW(column: ProfileColumn): number[] {
  return tablePC1.rows.map(row => row[column])
}

/** Energy of the whole profile over a year, kWh. */
export function profileYear_kWh(): number {
  return PROFILE_COLUMNS.reduce((sum, column) => {
    const [season, day] = column.split('_') as [keyof typeof SEASON_DAYS, keyof typeof DAYS_OF_WEEK]
    const day_kWh = profile_kW(column).reduce((total, kW) => total + kW / 2, 0)
    return sum + day_kWh * SEASON_DAYS[season] * DAYS_OF_WEEK[day] / 7
  }, 0)
}
