/** How the price list's codes name a cable, and what a line calls it. */
export const CABLE_WORDS: Record<string, { code: string, words: string }> = {
  'twin-earth-70': { code: 'TE', words: 'Twin and earth cable' },
  'singles-70': { code: 'SI', words: 'Single-core cables' },
  'multicore-70': { code: 'MC', words: 'Multicore cable' },
  'multicore-90': { code: 'MC', words: 'Multicore cable' },
  'swa-70': { code: 'SWA', words: 'Armoured cable' },
  'swa-90': { code: 'SWA', words: 'Armoured cable' },
  'flex-60': { code: 'FX', words: 'Flexible cable' },
  'flex-90': { code: 'FX', words: 'Flexible cable' },
}

/** Our own starting figure for labour, to be changed by whoever quotes. */
export const LABOUR_PLAIN_HOURS = 4
export const LABOUR_PLAIN_METRES = 10
export const LABOUR_METRES_PER_HOUR = 10

/** Codes that the design can ask for besides chargers, cables and devices, so that the price list can say which are missing. */
export const DESIGN_CODES: readonly { code: string, description: string, unit: string }[] = [
  { code: 'LABOUR', description: 'Labour', unit: 'hour' },
  { code: 'TEST', description: 'Inspection, testing and certificate', unit: 'each' },
  { code: 'NOTICE', description: 'Paperwork for the network operator', unit: 'each' },
  { code: 'LIMITER', description: 'Load limiter, fitted and tested', unit: 'each' },
  { code: 'ELECTRODE', description: 'Earth electrode, driven and tested', unit: 'each' },
  { code: 'OPEN-PEN', description: 'Open-PEN protective device', unit: 'each' },
  { code: 'SPD', description: 'Surge device, fitted', unit: 'each' },
  { code: 'ISOLATOR', description: 'Isolator at the charger, fitted', unit: 'each' },
  { code: 'BOARD', description: 'Small board for the new circuit', unit: 'each' },
  { code: 'BOND', description: 'Main bonding to one service', unit: 'each' },
  { code: 'TRENCH', description: 'Trench, made good', unit: 'm' },
]
