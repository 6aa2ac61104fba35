/**
 * The photographs a job owes, each answering one claim. What must be in frame is common practice after what network
 * operators ask for online (rule SUR-15) and what audits look for; a sheet that was typed in carries its own picture.
 */
import type { JobPage } from './judge/types'

export interface ShotSpec {
  claim: string
  label: string
  /** What must be visible. */
  visible: string
  page: JobPage
  /** Signing waits for it; otherwise it is worth a look. */
  isMust: boolean
  when?: 'TT' | 'limiter' | 'open-PEN' | 'surge-device' | 'isolator' | 'transcribed' | 'exceptions'
  /** Who can take it: a customer through the photograph link, too. */
  mayCustomer?: boolean
}

export const SHOTS = [
  { claim: 'intake', label: 'Whole intake', visible: 'Cut-out, meter, tails and earth terminal in one picture', page: 'supply', isMust: false, mayCustomer: true },
  { claim: 'cutout-rating', label: 'Main fuse rating', visible: 'The cut-out close up, the rating on the carrier readable', page: 'supply', isMust: true, mayCustomer: true },
  { claim: 'meter', label: 'Meter', visible: 'The meter with its label readable', page: 'supply', isMust: false, mayCustomer: true },
  { claim: 'earthing-terminal', label: 'Earthing terminal', visible: 'Where the earthing conductor begins, with its label', page: 'supply', isMust: false },
  { claim: 'bonding', label: 'Main bonding', visible: 'Each bonding clamp on its pipe, the label on it', page: 'board', isMust: false },
  { claim: 'board-closed', label: 'Consumer unit before', visible: 'The whole unit, cover on, ways and labels readable', page: 'board', isMust: false, mayCustomer: true },
  { claim: 'board-finished', label: 'Consumer unit afterwards', visible: 'Cover off, the new device and its conductors, every terminal in view', page: 'board', isMust: true },
  { claim: 'circuit-label', label: 'Circuit label', visible: 'The circuit chart with the new circuit on it', page: 'board', isMust: false },
  { claim: 'surge-device', label: 'Surge device', visible: 'The surge device with its indicator', page: 'board', isMust: false, when: 'surge-device' },
  { claim: 'route', label: 'Cable route', visible: 'Each stretch of the cable with its fixings', page: 'cable', isMust: false, mayCustomer: true },
  { claim: 'route-covered', label: 'Cable before it is covered', visible: 'Any stretch that will be buried or boxed in, a tape measure beside it', page: 'cable', isMust: false },
  { claim: 'position', label: 'Where the charger goes', visible: 'The wall and the ground below it', page: 'point', isMust: false, mayCustomer: true },
  { claim: 'parking', label: 'Parking place', visible: 'The parking place wide, with the boundary and any metal posts', page: 'point', isMust: false, mayCustomer: true },
  { claim: 'charger-fitted', label: 'Charger fitted', visible: 'The charger, its height above the ground and the cable entry', page: 'point', isMust: true },
  { claim: 'charger-serial', label: 'Charger serial number', visible: 'The rating plate with the serial number readable', page: 'point', isMust: true },
  { claim: 'earth-connection', label: 'Earth at the charging point', visible: 'The protective conductor in its terminal, cover off', page: 'point', isMust: true },
  { claim: 'isolator', label: 'Isolator', visible: 'The isolator with its label', page: 'point', isMust: false, when: 'isolator' },
  { claim: 'open-pen-device', label: 'Open-PEN device', visible: 'Its plate with the standard readable, or the page of the charger\'s manual that names it', page: 'point', isMust: false, when: 'open-PEN' },
  { claim: 'electrode', label: 'Earth electrode', visible: 'The electrode, its clamp and its notice', page: 'point', isMust: true, when: 'TT' },
  { claim: 'ct-direction', label: 'Current transformer', visible: 'The transformer on its conductor, the arrow readable', page: 'point', isMust: true, when: 'limiter' },
  { claim: 'limit-setting', label: 'Load limit as set', visible: 'The dial, the switches or the screen with the figure', page: 'point', isMust: true, when: 'limiter' },
  { claim: 'reading-sheet', label: 'Paper sheet', visible: 'The whole sheet that the readings were typed from', page: 'live', isMust: true, when: 'transcribed' },
  { claim: 'risk-assessment', label: 'Risk assessment', visible: 'The signed risk assessment for the permitted exception', page: 'leave', isMust: true, when: 'exceptions' },
] as const satisfies readonly ShotSpec[]

export type ShotClaim = (typeof SHOTS)[number]['claim']

const BY_CLAIM: ReadonlyMap<string, ShotSpec> = new Map(SHOTS.map(shot => [shot.claim, shot]))

/** The shot of that claim, or null for a picture taken beyond the list. */
export function findShot(claim: string): ShotSpec | null {
  return BY_CLAIM.get(claim) ?? null
}
