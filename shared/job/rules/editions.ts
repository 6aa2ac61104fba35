/** Which edition of the wiring regulations a certificate of a given day may cite. */
import { compareDays, type Day } from '../../utils/dates'
import { WIRING_EDITIONS, type WiringEdition } from './editions.data'

/** Every edition that may be cited on that day, the one to prefer last. */
export function editionsOn(day: Day): WiringEdition[] {
  return WIRING_EDITIONS.filter(each =>
    compareDays(each.from, day) <= 0 && (each.lastDay === null || compareDays(day, each.lastDay) <= 0))
}

/** The edition to work to from that day on, or null before the first one on record. */
export function editionInForce(day: Day): WiringEdition | null {
  return editionsOn(day).at(-1) ?? null
}
