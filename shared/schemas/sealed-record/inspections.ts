import * as z from 'zod'
import { moment, words } from './field'

export const INSPECTION_OUTCOMES = ['satisfactory', 'not-applicable', 'unsatisfactory', 'not-entered'] as const

export const inspectionItem = z.strictObject({
  /** As in inspection-items.data.ts: `1`, `13`, `13.2` … */
  number: z.string().regex(/^\d{1,2}(\.\d{1,2})?$/),
  words,
  outcome: z.enum(INSPECTION_OUTCOMES),
  reason: words.optional(),
  personId: words.optional(),
  personName: words.optional(),
  at: moment.optional(),
  /** The photograph or reading the outcome rests on. */
  restsOn: words.optional(),
}).refine(item => item.outcome !== 'not-applicable' || item.reason !== undefined, { message: 'N/A needs its reason', path: ['reason'] })
export type InspectionItem = z.infer<typeof inspectionItem>

export const inspectionsPart = z.strictObject({
  /** Edition of the list of items. */
  edition: words,
  items: z.array(inspectionItem).min(1),
})
