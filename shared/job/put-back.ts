/** What was changed for the work and must be restored, made from what the work needs; nobody has to think of it. */
import type { JobRecord } from '../types/record'
import { jobFacts } from './judge/facts'

export interface PutBackItem {
  /** Stable; the key of its row in part `putBack`. */
  key: string
  words: string
  /** The act that is refused while it is open. */
  before: 'energising' | 'sign-off'
}

/**
 * The put-back list of a job (common practice): earthing and bonding left off after Ze can kill, so they come before
 * energising and not only before sign-off.
 */
export function putBackItems(record: JobRecord): PutBackItem[] {
  const facts = jobFacts(record)
  const items: (PutBackItem | false)[] = [
    !facts.isZeByEnquiry && { key: 'earthing-conductor', words: 'Earthing conductor back on the main earthing terminal after Ze, and tight', before: 'energising' },
    !facts.isZeByEnquiry && { key: 'bonding', words: 'Main bonding back on after Ze, and tight', before: 'energising' },
    facts.needsElectrode && { key: 'electrode', words: 'Electrode conductor back on after its test, and tight', before: 'energising' },
    { key: 'neutrals-links', words: 'Neutrals and links re-made and torqued', before: 'energising' },
    { key: 'temporary-leads', words: 'Temporary leads, adapters and the R1+R2 link off', before: 'energising' },
    { key: 'covers-blanks', words: 'Covers and blanks on', before: 'energising' },
    facts.hasSurgeDevice && { key: 'surge-device', words: 'Surge device connected again after the insulation test', before: 'sign-off' },
    { key: 'charger', words: 'Charger connected again after the insulation test', before: 'sign-off' },
    { key: 'random-delay', words: 'Randomised delay back on', before: 'sign-off' },
    { key: 'lock-label', words: 'Lock and label removed', before: 'sign-off' },
    { key: 'other-circuits', words: 'Supply restored to the other circuits', before: 'sign-off' },
  ]
  return items.filter(item => item !== false)
}

/** The items not yet put back. */
export function openPutBacks(record: JobRecord): PutBackItem[] {
  const done = new Set(record.parts.putBack.filter(row => row.content.done === 'yes').map(row => row.key))
  return putBackItems(record).filter(item => !done.has(item.key))
}
