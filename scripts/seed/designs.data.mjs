/** Circuits as designed: the device, the cable, its legs, the earthing method. */
const RCBO_40 = {
  number: '9', points: 1, Ib_A: 32, phases: '1', device: 'B', device_standard: 'BS EN 61009', In_A: 40, device_kA: 6, energyClass: 3, terminals_C: 70,
  rcd_where: 'board', rcd_standard: 'BS EN 61009', rcd_type: 'A', rcd_IdeltaN_mA: 30, rcd_A: 40, dc_where: 'charger',
}
const OPEN_PEN = { method: 'iv', reason: 'PME supply, charging out of doors; no electrode of low enough resistance can be had.', device: 'Open-PEN device inside the charger, to IET 01' }

export const DESIGNS = {
  shortTwin: {
    circuit: { ...RCBO_40, description: 'Charging point, side wall', cable: 'twin-earth-70', S_mm2: 6, cpc_mm2: 2.5 },
    legs: [
      ['under-stairs', { name: 'Under the stairs', method: 'C', L_m: 4, ambient_C: 30, circuits: 1 }],
      ['garage-wall', { name: 'Along the garage wall', method: 'C', L_m: 9, ambient_C: 30, circuits: 1 }],
    ],
    earthing: OPEN_PEN,
  },
  armoured: {
    circuit: { ...RCBO_40, description: 'Charging point, by the drive', cable: 'swa-90', S_mm2: 6, cpc_mm2: 6 },
    legs: [
      ['inside', { name: 'From the board to the outside wall', method: 'C', L_m: 5, ambient_C: 30, circuits: 1 }],
      ['outside', { name: 'Clipped along the house', method: 'C', L_m: 13, ambient_C: 30, circuits: 1 }],
    ],
    earthing: OPEN_PEN,
  },
  buried: {
    circuit: { ...RCBO_40, description: 'Charging point, detached garage', cable: 'swa-90', S_mm2: 10, cpc_mm2: 10 },
    legs: [
      ['inside', { name: 'Utility room', method: 'C', L_m: 3, ambient_C: 30, circuits: 1 }],
      ['trench', { name: 'In the ground to the garage', method: 'D', L_m: 22, ground_C: 15, depth_m: 0.6, rho_Km_per_W: 1.5, circuits: 1 }],
      ['garage', { name: 'Garage gable', method: 'C', L_m: 4, ambient_C: 30, circuits: 1 }],
    ],
    earthing: OPEN_PEN,
  },
  bungalowTT: {
    circuit: { ...RCBO_40, description: 'Charging point, post by the hard standing', cable: 'swa-90', S_mm2: 6, cpc_mm2: 6 },
    legs: [
      ['porch', { name: 'Porch to the outside', method: 'C', L_m: 2, ambient_C: 30, circuits: 1 }],
      ['wall', { name: 'Clipped below the eaves', method: 'C', L_m: 11, ambient_C: 30, circuits: 1 }],
    ],
    earthing: { method: 'TT', reason: 'The dwelling has its own electrode; the charger is served by it.', RA_max_ohm: 200 },
  },
}

export const LIMITER_60 = { state: 'planned', limit_A: 60 }
