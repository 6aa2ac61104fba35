import * as z from 'zod'
import { printedField as field, words } from './field'
import { commonParts, designPart } from './parts'
import { devicePart, rcdPart } from './test-schedule'

/** A minor works certificate: an existing circuit altered, never a new one. */
export const minorWorksRecord = z.strictObject({
  ...commonParts,
  kind: z.literal('minor-works'),
  installation: z.strictObject({ shortAddress: words, address: field }),
  work: z.strictObject({ completed: field, description: field, location: field }),
  existingInstallation: z.strictObject({ comments: field }),
  /** The calculations behind the work, where it needed any. */
  design: designPart.nullable(),
  supply: z.strictObject({
    system: field,
    earthing: field,
    impedanceAt: z.enum(['Ze at the origin', 'Zs at the board']),
    impedance: field,
    earthingConductor: field,
    bonding: field,
  }),
  circuit: z.strictObject({
    identification: field,
    device: devicePart,
    rcd: rcdPart,
    surgeDevice: field,
    arcFaultDevice: field,
    lineSize: field,
    protectiveSize: field,
  }),
  results: z.strictObject({
    continuityOf: z.enum(['R1+R2', 'R2']),
    continuity: field,
    insulation: z.strictObject({ voltage: field, lineToLine: field, lineToEarth: field, neutralToEarth: field }),
    polarity: field,
    maximumZs: field,
    zs: field,
    rcdTime: field,
    rcdButton: field,
    arcFaultButton: field,
    remarks: field,
  }),
})
export type MinorWorksRecord = z.infer<typeof minorWorksRecord>
