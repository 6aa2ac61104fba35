/** What a surveyor found, as answers to the survey: one set for each kind of supply. Figures are invented and ordinary. */
const BOARD = {
  board_name: 'Main board', board_location: 'Under the stairs', board_A: 100, board_conditional_kA: 16, spare_ways: 4, main_switch_location: 'In the main board',
  main_switch_standard: 'BS EN 60947-3 switch-disconnector', main_switch_poles: 2, main_switch_A: 100, main_switch_V: 230, main_switch_rcd: 'no', upstream_rcd: 'none',
  spd: 'existing', spd_type: 'Type 2, indicator green',
  earthing_conductor_material: 'copper', earthing_conductor_mm2: 16, earthing_conductor_verified: 'yes', bonding_material: 'copper', bonding_mm2: 10, bonding_verified: 'yes',
  bond_water: 'yes', bond_gas: 'yes', bond_oil: 'not-present', bond_steel: 'not-present', bond_lightning: 'not-present', bond_other: 'not-present',
  existing_comments: 'No comments',
}
const SITE = { position: 'Side wall beside the drive', outdoors: 'yes', other_earths: 'no', wall: 'Brick', private_parking: 'yes', signal: 'good' }
const SUPPLY = {
  supply_phases: '1', nominal_V: 230, frequency_Hz: 50, service_ok: 'sound', looped: 'no', asbestos: 'no', unmetered: 'no',
  tails_mm2: 25, tails_m: 1.5, isolator: 'yes', isolator_A: 100, other_sources: ['none'], generation_kW: 0,
}
const PME = { earthing: 'TN-C-S', earthing_how: 'read', earthing_evidence: 'Earthing conductor to the cut-out\'s neutral block, PME label there' }

export const SURVEYS = {
  pme80: { ...SUPPLY, ...PME, cutout_A: 80, cutout_A_how: 'read', cutout_standard: 'BS88-3', ...BOARD, ...SITE },
  pme60: { ...SUPPLY, ...PME, cutout_A: 60, cutout_A_how: 'told', cutout_standard: 'BS1361', tails_mm2: 16, ...BOARD, ...SITE, board_location: 'Hall cupboard', position: 'Front wall, left of the garage door' },
  pme100: { ...SUPPLY, ...PME, cutout_A: 100, cutout_A_how: 'read', cutout_standard: 'BS1361', ...BOARD, ...SITE, board_location: 'Utility room', position: 'Detached garage, gable wall', existing_comments: 'Two circuits share one way of the board: pointed out to the owner.' },
  bungalowTT: {
    ...SUPPLY, earthing: 'TT', earthing_how: 'read', earthing_evidence: 'Earthing conductor to a rod beside the porch; no earth at the cut-out', cutout_A: 80, cutout_A_how: 'read', cutout_standard: 'BS88-3',
    electrode_type: 'Rod', electrode_location: 'North side, beside the porch', ...BOARD, ...SITE, board_location: 'Porch cupboard', bond_gas: 'not-present', bond_oil: 'yes',
    main_switch_standard: 'BS EN 61008', main_switch_rcd: 'yes', main_switch_IdeltaN_mA: 100, main_switch_delay_ms: 130, main_switch_ms: 212, upstream_rcd: 'type-A', position: 'Post beside the hard standing',
  },
  looped: { ...SUPPLY, ...PME, cutout_A: 60, cutout_A_how: 'assumed', cutout_standard: 'cannot-see', looped: 'yes', tails_mm2: 16, isolator: 'no', isolator_A: null, ...BOARD, ...SITE, board_location: 'Above the front door', position: 'Front wall below the bay window', spd: 'declined', spd_type: null, spd_reason: 'Owner decided after the risk was explained', existing_comments: 'A second service cable leaves the cut-out towards number 14.' },
  unsafe: { ...SUPPLY, earthing: 'TN-S', earthing_how: 'read', earthing_evidence: 'Clamp on the lead sheath', cutout_A: 60, cutout_A_how: 'read', cutout_standard: 'BS1361', service_ok: 'unsafe', asbestos: 'cannot-see', tails_mm2: 16, isolator: 'no', isolator_A: null, ...BOARD, ...SITE, board_location: 'Cellar head', bond_gas: 'missing', bonding_verified: 'no', existing_comments: 'Cut-out discoloured and warm, compound has run out below it. Owner told at once; 105 called from the doorstep.' },
}

/** What the dwelling holds: by current where it is a circuit, by power where a plate says so. */
export const APPLIANCES = {
  gasHeated: [
    ['lighting', { name: 'Lighting', use: 'lighting', P_W: 1200 }],
    ['oven-hob', { name: 'Oven and hob', use: 'cooker', I_A: 30, socket: 'no' }],
    ['sockets-down', { name: 'Sockets downstairs', use: 'sockets', I_A: 32 }],
    ['sockets-up', { name: 'Sockets upstairs', use: 'sockets', I_A: 32 }],
  ],
  withShower: [
    ['lighting', { name: 'Lighting', use: 'lighting', P_W: 1500 }],
    ['oven-hob', { name: 'Oven and hob', use: 'cooker', I_A: 32, socket: 'yes' }],
    ['sockets', { name: 'Sockets', use: 'sockets', I_A: 32 }],
    ['shower', { name: 'Shower', use: 'instantaneous-water', P_W: 8500 }],
  ],
  small: [
    ['lighting', { name: 'Lighting', use: 'lighting', P_W: 600 }],
    ['oven-hob', { name: 'Hob', use: 'cooker', I_A: 16, socket: 'no' }],
    ['immersion', { name: 'Immersion heater', use: 'thermostatic-water', P_W: 3000 }],
  ],
}

/** Highest half-hours of a year, where the supplier's readings were at hand. */
export const RECORDED = {
  modest: { source: 'Half-hourly readings from the supplier', interval_min: 30, max_A: 22.6, days: 365 },
  /** With the charger more than 60 A: only a load limiter makes it fit. */
  busy: { source: 'Half-hourly readings from the supplier', interval_min: 30, max_A: 44.3, days: 365 },
  low: { source: 'Half-hourly readings from the supplier', interval_min: 30, max_A: 17.4, days: 365 },
}
