/** `lasts_days`: how long from today the paper is valid; left out where it has no end. */
const DESIGN = { title: 'Design and verification of installations, level 4', number: 'INV-DV-4471', capacities: ['designer', 'constructor', 'inspector'] }
const CHARGING = { title: 'Vehicle charging equipment installation, level 3', number: 'INV-EV-0932', capacities: ['designer', 'constructor'], lasts_days: 900 }
const TESTING = { title: 'Inspection and testing, level 3', number: 'INV-IT-2208', capacities: ['inspector'], lasts_days: 640 }
const CONSTRUCTION = { title: 'Electrical installation, level 3', number: 'INV-EI-6613', capacities: ['constructor'] }

export const PEOPLE = [
  { key: 'office', name: 'Priya Nandakumar', mailbox: 'office', telephone: '01632 960041', roles: ['office'], qualifications: [] },
  { key: 'installer', name: 'Tomasz Wilk', mailbox: 'installer', telephone: '07700 900141', roles: ['installer'], crew: 'Crew A', qualifications: [CHARGING, TESTING] },
  { key: 'grace', name: 'Grace Adeyemi', mailbox: 'grace', telephone: '07700 900142', roles: ['installer'], crew: 'Crew B', qualifications: [{ ...CHARGING, number: 'INV-EV-1077' }, { ...TESTING, number: 'INV-IT-2390' }] },
  { key: 'owen', name: 'Owen Bright', mailbox: 'owen', telephone: '07700 900143', roles: ['installer'], crew: 'Crew B', qualifications: [CONSTRUCTION] },
  { key: 'supervisor', name: 'Rhiannon Pryce', mailbox: 'supervisor', telephone: '07700 900144', roles: ['supervisor'], qualifications: [DESIGN] },
  { key: 'principal', name: 'Desmond Achebe', mailbox: 'principal', telephone: '07700 900145', roles: ['principal'], qualifications: [] },
]

/** `calibrated`: done and good until, in days from today, with the certificate's reference. */
export const INSTRUMENTS = [
  { key: 'tester', name: 'Tester 1', description: 'Multifunction tester', serial: 'INV-MF-30418', functions: ['continuity', 'insulation', 'loop', 'rcd', 'electrode'], calibrated: [[-570, -205, 'CAL-1180'], [-205, 160, 'CAL-1466']] },
  { key: 'tester2', name: 'Tester 2', description: 'Multifunction tester', serial: 'INV-MF-30977', functions: ['continuity', 'insulation', 'loop', 'rcd', 'electrode'], calibrated: [[-345, 20, 'CAL-1391']] },
  { key: 'expired', name: 'Insulation tester', description: 'Continuity and insulation tester', serial: 'INV-IC-08812', functions: ['continuity', 'insulation'], calibrated: [[-388, -23, 'CAL-1302']] },
  { key: 'adapter', name: 'Vehicle adapter', description: 'Vehicle simulator with 6 mA d.c. ramp', serial: 'INV-VA-00265', functions: ['vehicle-adapter'], calibrated: [[-120, 245, 'CAL-1512']] },
]

/** Code, description, unit, net pence. */
export const PRICES = [
  ['SURVEY', 'Survey visit and written design', 'visit', 9_500],
  ['CHARGER-7T', 'Wall charger, 7.4 kW, tethered 5 m', 'each', 62_000],
  ['CHARGER-7S', 'Wall charger, 7.4 kW, socket', 'each', 58_500],
  ['CHARGER-22S', 'Wall charger, 22 kW three-phase, socket', 'each', 84_000],
  ['RCBO-40', 'RCBO, 40 A type B curve, 30 mA type A, fitted', 'each', 6_800],
  ['SPD', 'Surge device, type 2, fitted', 'each', 9_200],
  ['CABLE-6-SWA', 'Armoured cable 6 mm², three-core, fixed', 'm', 1_450],
  ['CABLE-6-TE', 'Twin and earth 6 mm², fixed', 'm', 1_120],
  ['ISOLATOR', 'Double-pole isolator with padlock, fitted', 'each', 7_400],
  ['LIMITER', 'Load limiter with current transformer, fitted and tested', 'each', 14_500],
  ['ELECTRODE', 'Earth electrode with inspection pit, driven and tested', 'each', 18_000],
  ['LABOUR', 'Labour, two-person crew', 'hour', 8_400],
  ['TRENCH', 'Trench by hand, 600 mm, made good', 'm', 4_600],
]

/** What is kept how long, and why. */
export const RETENTION = [
  ['certificate', 6, 'Scheme rules and limitation period'],
  ['invoice', 6, 'VAT records'],
  ['job', 6, 'Limitation period for claims under the contract'],
  ['photograph', 6, 'Evidence for the certificate it belongs to'],
  ['enquiry', 1, 'Legitimate interest in answering; no contract came of it'],
  ['message', 2, 'Proof of what was sent'],
]
