/** What the survey asks of supply, board and point. Field lists follow the installation certificate's particulars. */
import { choice, figure, longText, text, yesNo, yesNoUnseen, type Fields } from './field'

export const supplyFields = {
  earthing: choice('Earthing arrangement', { 'TN-C-S': 'TN-C-S (PME)', 'TN-S': 'TN-S', 'TT': 'TT', 'cannot-see': 'Cannot see' }, { how: ['read', 'told', 'measured', 'assumed'] }),
  earthing_evidence: text('What shows it', { hint: 'Where the earthing conductor goes, what label is there' }),
  supply_phases: choice('Phases of the supply', { 1: 'Single-phase', 3: 'Three-phase' }),
  nominal_V: figure('Nominal voltage to earth', 'V', 200, 260, { whole: true, hint: '230 on a public supply in Great Britain and Northern Ireland' }),
  frequency_Hz: figure('Frequency', 'Hz', 45, 65, { whole: true }),
  cutout_A: figure('Main fuse rating', 'A', 30, 200, { sizes: [30, 40, 45, 50, 60, 63, 80, 100, 125, 160, 200], how: ['read', 'told', 'assumed'], hint: 'The rating marked on the carrier is the most it may hold' }),
  cutout_standard: choice('Main fuse standard', { 'BS88-3': 'BS 88-3', 'BS1361': 'BS 1361', 'BS3036': 'BS 3036', 'BS88-2': 'BS 88-2', 'cannot-see': 'Cannot see' }),
  service_ok: choice('Cut-out, meter and tails look', { 'sound': 'Sound', 'unsafe': 'Hot, damaged or exposed', 'cannot-see': 'Cannot see' }),
  looped: yesNoUnseen('Supply looped from or to a neighbour'),
  asbestos: yesNoUnseen('Old board or flash guards that may hold asbestos'),
  unmetered: yesNo('Unmetered supply'),
  tails_mm2: figure('Tails', 'mm²', 6, 50, { sizes: [6, 10, 16, 25, 35, 50] }),
  tails_m: figure('Length of the tails', 'm', 0.1, 30),
  isolator: yesNo('Isolator between meter and board'),
  isolator_A: figure('Isolator rating', 'A', 20, 200, { whole: true }),
  other_sources: { label: 'Other sources of supply', kind: 'choices', options: [{ value: 'none', label: 'None' }, { value: 'photovoltaic', label: 'Photovoltaic' }, { value: 'battery', label: 'Battery' }, { value: 'generator', label: 'Generator' }, { value: 'vehicle', label: 'Vehicle' }] },
  generation_kW: figure('Generation and storage in all', 'kW', 0, 100),
  electrode_type: text('Earth electrode, type', { hint: 'TT only: rod, tape, plate' }),
  electrode_location: text('Earth electrode, where'),
} as const satisfies Fields

export const boardFields = {
  board_name: text('Board', { hint: 'What the certificate calls it, e.g. Main board' }),
  board_location: text('Where the board is'),
  board_A: figure('Board rating', 'A', 40, 200, { whole: true }),
  board_conditional_kA: figure('Conditional short-circuit rating of the board', 'kA', 1, 50),
  spare_ways: figure('Spare ways', '', 0, 40, { whole: true }),
  main_switch_location: text('Where the main switch is'),
  main_switch_standard: text('Main switch standard and type', { hint: 'e.g. BS EN 60947-3 switch-disconnector' }),
  main_switch_poles: figure('Main switch poles', '', 1, 4, { sizes: [1, 2, 3, 4] }),
  main_switch_A: figure('Main switch current rating', 'A', 20, 200, { whole: true }),
  main_switch_V: figure('Main switch voltage rating', 'V', 200, 500, { whole: true }),
  main_switch_rcd: yesNo('Main switch is a residual-current device'),
  main_switch_IdeltaN_mA: figure('Main switch residual current rating', 'mA', 10, 500, { sizes: [10, 30, 100, 300, 500] }),
  main_switch_delay_ms: figure('Main switch time delay', 'ms', 0, 500),
  main_switch_ms: figure('Main switch measured time', 'ms', 0, 1000),
  upstream_rcd: choice('A residual-current device upstream of the new circuit', { 'none': 'None', 'type-AC': 'Type AC', 'type-A': 'Type A', 'type-F': 'Type F', 'type-B': 'Type B' }),
  spd: choice('Surge device', { fitted: 'Fitted', existing: 'Already there', declined: 'Left out, the owner decided', not_needed: 'Left out, not needed' }),
  spd_type: text('Surge device type and status'),
  spd_reason: text('Why it was left out, and who decided'),
  earthing_conductor_material: choice('Earthing conductor material', { copper: 'Copper', other: 'Other' }),
  earthing_conductor_mm2: figure('Earthing conductor', 'mm²', 2.5, 50, { sizes: [2.5, 4, 6, 10, 16, 25, 35, 50] }),
  earthing_conductor_verified: yesNo('Earthing conductor: continuity and connection verified'),
  bonding_material: choice('Main bonding material', { copper: 'Copper', other: 'Other' }),
  bonding_mm2: figure('Main bonding', 'mm²', 2.5, 50, { sizes: [2.5, 4, 6, 10, 16, 25, 35, 50] }),
  bonding_verified: yesNo('Main bonding: continuity verified'),
  bond_water: choice('Bond to water', { 'yes': 'Yes', 'not-present': 'Not present', 'missing': 'Missing' }),
  bond_gas: choice('Bond to gas', { 'yes': 'Yes', 'not-present': 'Not present', 'missing': 'Missing' }),
  bond_oil: choice('Bond to oil', { 'yes': 'Yes', 'not-present': 'Not present', 'missing': 'Missing' }),
  bond_steel: choice('Bond to structural steel', { 'yes': 'Yes', 'not-present': 'Not present', 'missing': 'Missing' }),
  bond_lightning: choice('Bond to lightning protection', { 'yes': 'Yes', 'not-present': 'Not present', 'missing': 'Missing' }),
  bond_other: choice('Bond to other services', { 'yes': 'Yes', 'not-present': 'Not present', 'missing': 'Missing' }),
  existing_comments: longText('Existing installation: what you saw and did not work on', { hint: 'Write "No comments" where there is nothing to say' }),
} as const satisfies Fields

export const siteFields = {
  position: text('Where the charger goes'),
  outdoors: yesNo('Vehicle charges out of doors'),
  other_earths: yesNoUnseen('Metal with another earth within 2.5 m of a place the vehicle can stand', { hint: 'Taps, lamp posts, metal cladding, neighbours\' outbuildings' }),
  wall: text('Wall and surface'),
  private_parking: yesNo('Parking is private and off the street'),
  signal: choice('Mobile signal at the point', { good: 'Good', weak: 'Weak', none: 'None' }),
} as const satisfies Fields

export const surveyFields = { ...supplyFields, ...boardFields, ...siteFields } as const satisfies Fields
