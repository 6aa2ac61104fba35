/** Fields of the design, of what was fitted and of what the certificate states. */
import { choice, date, figure, longText, text, yesNo, type Fields } from './field'

export const wantedFields = {
  rating_kW: figure('Charger rating', 'kW', 1, 50, { hint: '7.36 is 32 A single-phase' }),
  phases: choice('Charger phases', { 1: 'Single-phase', 3: 'Three-phase' }),
  outlet: choice('Outlet', { socket: 'Socket', tethered: 'Tethered cable' }),
  device_standard: yesNo('The maker declares the usual emission standards'),
  export_A: figure('Export a phase', 'A', 0, 63, { hint: '0 where the charger only charges' }),
  vehicle: text('Vehicle'),
  wish_date: date('Wished for by'),
  grant_who: choice('Grant', { 'none': 'None', 'renter': 'Renter', 'flat-owner': 'Flat owner', 'landlord': 'Landlord', 'on-street': 'On-street parking' }),
} as const satisfies Fields

export const consentFields = {
  kind: choice('Permission', { 'landlord': 'Landlord', 'freeholder': 'Freeholder', 'highway': 'Highway authority', 'planning': 'Planning', 'network-operator': 'To tell the network operator for the customer' }),
  state: choice('State', { 'asked': 'Asked', 'given': 'Given', 'refused': 'Refused', 'not-needed': 'Not needed' }),
  given_on: date('Given on'),
  by: text('By whom'),
  note: longText('Note'),
} as const satisfies Fields

/** The uses of the `demand` calculation, in the words of a household. */
export const applianceFields = {
  name: text('Appliance'),
  use: choice('Counts as', { 'lighting': 'Lighting', 'heating': 'Heating', 'cooker': 'Cooker or hob', 'instantaneous-water': 'Shower or instantaneous water heater', 'thermostatic-water': 'Immersion or thermostatic water heater', 'sockets': 'Socket circuit', 'storage-heating': 'Storage or floor heating', 'motor': 'Motor or heat pump', 'fixed': 'Other fixed appliance', 'ev': 'Another vehicle charger' }),
  I_A: figure('Current', 'A', 0, 200),
  P_W: figure('Power', 'W', 0, 50000),
  socket: yesNo('Cooker unit has a socket'),
} as const satisfies Fields

export const recordedDemandFields = {
  source: text('Where the readings come from'),
  interval_min: figure('Interval', 'min', 1, 60, { whole: true }),
  max_A: figure('Highest recorded', 'A', 0, 200),
  at: text('When it was highest'),
  days: figure('Days covered', '', 0, 4000),
} as const satisfies Fields

export const legFields = {
  name: text('Leg', { hint: 'e.g. Along the joists' }),
  method: choice('Way of fixing', { A: 'A · in conduit in an insulated wall', B: 'B · in conduit or trunking on a wall', C: 'C · clipped direct', D: 'D · in the ground', E: 'E · in free air or on tray', 100: '100 · above a ceiling, insulation to 100 mm', 101: '101 · above a ceiling, insulation over 100 mm', 102: '102 · in a stud wall, touching the inner surface', 103: '103 · in a stud wall, not touching' }),
  L_m: figure('Length', 'm', 0.1, 500),
  ambient_C: figure('Ambient', '°C', -20, 80),
  ground_C: figure('Ground', '°C', 0, 60),
  circuits: figure('Circuits together', '', 1, 20, { whole: true, hint: 'This one counts' }),
  arrangement: choice('Grouped', { 'bunched': 'Bunched or enclosed', 'single-layer-wall': 'Single layer on a wall or floor', 'perforated-tray': 'Single layer on perforated tray', 'ladder': 'Single layer on ladder', 'buried-touching': 'Buried, touching', 'ducts-touching': 'In ducts, touching' }),
  insulationLength_mm: figure('Length inside insulation', 'mm', 0, 100000),
  depth_m: figure('Depth', 'm', 0.2, 3),
  rho_Km_per_W: figure('Thermal resistivity of the soil', 'K·m/W', 0.5, 3),
} as const satisfies Fields

export const CABLE_OPTIONS = { 'twin-earth-70': 'Twin and earth, 70 °C', 'singles-70': 'Singles, 70 °C', 'multicore-70': 'Multicore, 70 °C', 'multicore-90': 'Multicore, 90 °C', 'swa-70': 'Armoured, 70 °C', 'swa-90': 'Armoured, 90 °C', 'flex-60': 'Flexible, 60 °C', 'flex-90': 'Flexible, 90 °C' } as const
const DEVICE_OPTIONS = { 'B': 'Type B', 'C': 'Type C', 'D': 'Type D', 'BS88-2': 'BS 88-2 fuse', 'BS88-3': 'BS 88-3 fuse', 'BS3036': 'BS 3036 fuse', 'BS1361': 'BS 1361 fuse' } as const
const SIZES = [1, 1.5, 2.5, 4, 6, 10, 16, 25, 35, 50]

export const circuitFields = {
  number: text('Circuit number'),
  description: text('Description'),
  points: figure('Points served', '', 1, 20, { whole: true }),
  Ib_A: figure('Design current', 'A', 1, 100),
  phases: choice('Phases', { 1: 'Single-phase', 3: 'Three-phase' }),
  device: choice('Protective device', DEVICE_OPTIONS),
  device_standard: choice('Device standard', { 'BS EN 60898': 'BS EN 60898', 'BS EN 61009': 'BS EN 61009', 'BS 88-2': 'BS 88-2', 'BS 88-3': 'BS 88-3', 'BS 3036': 'BS 3036', 'BS 1361': 'BS 1361' }),
  In_A: figure('Device rating', 'A', 6, 125, { sizes: [6, 10, 13, 16, 20, 25, 30, 32, 40, 45, 50, 63, 80, 100, 125] }),
  device_kA: figure('Breaking capacity', 'kA', 1, 50),
  energyClass: figure('Energy limiting class', '', 1, 3, { sizes: [1, 3] }),
  cable: choice('Cable', CABLE_OPTIONS),
  terminals_C: figure('Terminals rated for', '°C', 70, 90, { sizes: [70, 90] }),
  S_mm2: figure('Line conductor', 'mm²', 1, 50, { sizes: SIZES }),
  cpc_mm2: figure('Protective conductor', 'mm²', 1, 50, { sizes: SIZES }),
  wiring: text('Wiring and reference methods', { hint: 'Filled from the legs when left empty' }),
  rcd_where: choice('Residual-current device', { board: 'In the board', charger: 'In the charger' }),
  rcd_standard: text('Residual-current device standard', { hint: 'e.g. BS EN 61009' }),
  rcd_type: choice('Residual-current device type', { A: 'Type A', F: 'Type F', B: 'Type B', AC: 'Type AC' }),
  rcd_IdeltaN_mA: figure('Residual current rating', 'mA', 10, 300, { sizes: [10, 30, 100, 300] }),
  rcd_A: figure('Residual-current device rating', 'A', 16, 125, { whole: true }),
  dc_where: choice('6 mA d.c. detection', { charger: 'In the charger', board: 'In the board', type_b: 'Not needed: type B' }),
  start_mark_m: figure('Cable mark at the start', 'm', 0, 10000),
  end_mark_m: figure('Cable mark at the end', 'm', 0, 10000),
  L_m: figure('Cable run as fitted', 'm', 0.1, 500),
} as const satisfies Fields

export const earthingFields = {
  method: choice('Earthing method for the charging point', { none: 'Indoors or TN-S, no further measure', i: 'i · loads balanced across three phases', ii: 'ii · additional electrode on the PME earth', iii: 'iii · open-PEN device at the point', iv: 'iv · open-PEN device, single-phase supply', v: 'v · other means giving no less safety', TT: 'TT · electrode of its own' }),
  reason: longText('Why this method'),
  device: text('Open-PEN device', { hint: 'Standard it is made to, and where' }),
  RA_max_ohm: figure('Electrode, highest resistance', 'Ω', 0.1, 2000),
} as const satisfies Fields

export const departureFields = {
  regulation: text('Regulation'),
  differs: longText('What differs'),
  why: longText('Why it is no less safe'),
} as const satisfies Fields

export const equipmentFields = {
  description: text('What it is'),
  standard: text('Standard'),
  rating_A: figure('Rating', 'A', 0, 200),
  serial: text('Serial number'),
  serial_again: text('Serial number again', { hint: 'Typed twice so that a slip shows' }),
  firmware: text('Firmware'),
  location: text('Where it is fitted'),
  height_m: figure('Lowest height above the ground', 'm', 0, 5),
  labels: yesNo('Labels fixed'),
} as const satisfies Fields

export const loadLimitFields = {
  state: choice('Load limiter', { none: 'None', planned: 'Planned', fitted: 'Fitted', tested: 'Fitted and seen to limit' }),
  limit_A: figure('Limit agreed or wanted', 'A', 6, 200),
  set_A: figure('Limit as set', 'A', 6, 200),
  set_where: choice('Set by', { dial: 'A dial or switches', app: 'The maker\'s application', tool: 'A maker\'s tool' }),
  ct_checked: yesNo('Current transformer the right way round, on the right conductor'),
  fails_safe: yesNo('Fails safe: charging stops when the measurement is lost'),
  seen: longText('How it was seen to limit'),
} as const satisfies Fields

export const putBackFields = { done: yesNo('Put back'), note: text('Note') } as const satisfies Fields

export const inspectionFields = {
  outcome: choice('Outcome', { 'satisfactory': 'Satisfactory', 'not-applicable': 'N/A', 'unsatisfactory': 'Unsatisfactory' }),
  reason: text('Reason', { hint: 'Needed for N/A' }),
} as const satisfies Fields

export const unexpectedFields = { sentence: longText('Why it does not fit') } as const satisfies Fields

export const statementFields = {
  nature: choice('The work is', { new: 'A new installation', addition: 'An addition', alteration: 'An alteration' }),
  description: longText('Description and extent of the work'),
  not_covered: longText('What is expressly not covered'),
  exceptions: longText('Permitted exceptions and the risk assessment'),
  next_inspection_years: figure('Next inspection within', 'years', 1, 10, { whole: true }),
  occupier: text('Occupier, where it is not the client'),
  completed_on: date('Work completed on'),
} as const satisfies Fields

export const handoverFields = {
  shown: { label: 'Shown to the customer', kind: 'choices', options: [{ value: 'switch-off', label: 'How to switch off in a hurry' }, { value: 'first-charge', label: 'First charge' }, { value: 'rcd-button', label: 'The test button, every six months' }, { value: 'schedule', label: 'The charging hours' }, { value: 'limit', label: 'What the load limit does' }, { value: 'whom-to-call', label: 'Whom to call' }] },
  received_by: text('Received by'),
  left_reason: choice('Left unfinished', { 'not-in': 'Customer not in', 'parts': 'Parts missing', 'weather': 'Weather', 'unsafe': 'Unsafe to go on', 'time': 'Ran out of time' }),
  made_safe: yesNo('Made safe before leaving'),
} as const satisfies Fields

export const promiseFields = {
  what: choice('Promise', { 'raise-limit': 'Raise the load limit after the fuse upgrade', 'label': 'Fit a missing label', 'bond': 'Recheck a bond', 'other': 'Other' }),
  trigger: text('When what has happened'),
  due_on: date('By'),
  state: choice('State', { open: 'Open', kept: 'Kept', dropped: 'Dropped' }),
  note: longText('Note'),
} as const satisfies Fields
