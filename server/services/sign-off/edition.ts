import { editionInForce } from '../../../shared/job/rules/editions'

/** The edition that what is signed on this day cites. */
export function editionOn(day: string): string {
  const inForce = editionInForce(day)
  if (!inForce) throw new Error(`No edition of the wiring regulations is on record for ${day}`)
  return inForce.edition
}
