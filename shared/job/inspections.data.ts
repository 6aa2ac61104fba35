/**
 * The schedule of inspections as the installer answers it. Numbers and words are those of the certificate; here stand
 * the short label, when an item does not apply, and what it may rest on. A row's key in part `inspection` is the number.
 */
import { inspectionItems } from '../schemas/sealed-record/inspection-items.data'
import type { JobPage } from './judge/types'
import type { ShotClaim } from './shots.data'
import type { TestKey } from './tests.data'

export type InspectionNumber = (typeof inspectionItems.items)[number]['number']

export interface InspectionSpec {
  key: InspectionNumber
  label: string
  words: string
  /** Where one goes to look. */
  page: JobPage
  /** A sub-item of 13. */
  isSub: boolean
  /** Offered as the reason where the item does not apply; null where it always applies. */
  notApplicableReason: string | null
  /** When the record itself shows that the item does not apply. */
  notApplicableWhen?: 'no-open-PEN' | 'no-limiter' | 'no-other-sources'
  restsOn: { shots: readonly ShotClaim[], tests: readonly TestKey[] }
}

type Rest = Pick<InspectionSpec, 'label' | 'page'> & Partial<Pick<InspectionSpec, 'notApplicableReason' | 'notApplicableWhen'>> & { shots?: readonly ShotClaim[], tests?: readonly TestKey[] }

const REST: Record<InspectionNumber, Rest> = {
  '1': { label: 'Intake', page: 'supply', shots: ['intake', 'cutout-rating'] },
  '2': { label: 'Other sources', page: 'supply', notApplicableReason: 'No other source of supply', notApplicableWhen: 'no-other-sources' },
  '3': { label: 'Automatic disconnection', page: 'board', shots: ['earthing-terminal', 'bonding'], tests: ['R1R2', 'Zs'] },
  '4': { label: 'Basic protection', page: 'board', shots: ['board-finished'] },
  '5': { label: 'Other protective measures', page: 'board', notApplicableReason: 'Automatic disconnection is the only measure used' },
  '6': { label: 'Additional protection', page: 'board', tests: ['RCD-time', 'RCD-button'] },
  '7': { label: 'Distribution equipment', page: 'board', shots: ['board-finished'] },
  '8': { label: 'Circuits', page: 'cable', shots: ['route', 'route-covered'], tests: ['R1R2', 'IR-live-earth'] },
  '9': { label: 'Isolation and switching', page: 'point', shots: ['isolator'], tests: ['isolation'] },
  '10': { label: 'Fixed equipment', page: 'point', shots: ['charger-fitted', 'charger-serial'] },
  '11': { label: 'Labels and notices', page: 'board', shots: ['circuit-label'] },
  '12': { label: 'Bath or shower rooms', page: 'cable', notApplicableReason: 'No work in a room with a bath or shower' },
  '13': { label: 'Vehicle charging', page: 'point', shots: ['charger-fitted'] },
  '13.1': { label: 'Earthing method', page: 'point', shots: ['earth-connection'] },
  '13.2': { label: 'Circuit of its own', page: 'board', shots: ['board-finished'] },
  '13.3': { label: 'RCD and d.c. detection', page: 'board', shots: ['board-finished'], tests: ['RCD-time', 'RCD-dc'] },
  '13.4': { label: 'Outlet and height', page: 'point', shots: ['charger-fitted'] },
  '13.5': { label: 'Enclosure and impact', page: 'point', shots: ['charger-fitted'] },
  '13.6': { label: 'Isolating the point', page: 'point', shots: ['isolator'], tests: ['isolation'] },
  '13.7': { label: 'Open-PEN function', page: 'point', notApplicableReason: 'No open-PEN device: the earthing method needs none', notApplicableWhen: 'no-open-PEN', shots: ['open-pen-device'], tests: ['open-PEN'] },
  '13.8': { label: 'Load limiter', page: 'point', notApplicableReason: 'No load limiter', notApplicableWhen: 'no-limiter', shots: ['ct-direction', 'limit-setting'], tests: ['limiter'] },
  '14': { label: 'Generation and storage', page: 'supply', notApplicableReason: 'Nothing generates or stores here', notApplicableWhen: 'no-other-sources' },
}

export const INSPECTIONS: readonly InspectionSpec[] = inspectionItems.items.map(({ number, words }) => {
  const { label, page, notApplicableReason = null, notApplicableWhen, shots = [], tests = [] } = REST[number]
  return { key: number, label, words, page, isSub: number.includes('.'), notApplicableReason, ...(notApplicableWhen && { notApplicableWhen }), restsOn: { shots, tests } }
})

export const INSPECTIONS_EDITION = inspectionItems.edition
