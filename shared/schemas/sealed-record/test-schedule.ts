import * as z from 'zod'
import { moment, printedField as field, words } from './field'

export const boardPart = z.strictObject({
  designation: field,
  location: field,
  suppliedFrom: field,
  device: field,
  rcd: field,
  zs: field,
  faultCurrent: field,
  polarity: field,
  phaseSequence: field,
  /** Type and status, or absent with the recorded decision. */
  surgeDevice: field,
})

/** What was tried with a vehicle simulator or by hand. */
export const functionalPart = z.strictObject({ vehicleStates: field, protectiveConductorFault: field, openPen: field, loadLimiter: field, randomDelay: field, isolation: field })

export const rcdPart = z.strictObject({ standard: field, type: field, tripCurrent: field, rating: field, place: field })

export const devicePart = z.strictObject({ standard: field, type: field, rating: field, breakingCapacity: field })

/** One circuit as installed and as measured. */
export const testedCircuit = z.strictObject({
  number: field,
  description: field,
  wiringType: field,
  referenceMethod: field,
  points: field,
  lineSize: field,
  protectiveSize: field,
  device: devicePart,
  disconnectionTime: field,
  maximumZs: field,
  /** What the limit rests on: the table, 80 % of it, or the electrode rule. */
  maximumZsBasis: field,
  rcd: rcdPart,
  /** Where smooth d.c. fault current is detected. */
  dcDetection: field,
  ring: z.strictObject({ r1: field, rn: field, r2: field }),
  continuityOf: z.enum(['R1+R2', 'R2']),
  continuity: field,
  r1rn: field,
  insulation: z.strictObject({ voltage: field, lineToLine: field, lineToEarth: field, neutralToEarth: field, chargerConnected: field }),
  polarity: field,
  zs: field,
  zsCorrected: field,
  rcdTime: field,
  dcTrip: field,
  rcdButton: field,
  arcFaultButton: field,
  functional: functionalPart,
  remarks: field,
})
export type TestedCircuit = z.infer<typeof testedCircuit>

export const testSchedulePart = z.strictObject({
  board: boardPart,
  circuits: z.array(testedCircuit).min(1),
  testedBy: z.strictObject({ personId: words, name: words, at: moment }),
})
