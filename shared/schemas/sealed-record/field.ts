import * as z from 'zod'
import { VERDICTS } from '../../utils/verdict'

/** A moment as the server wrote it: a UTC instant. */
export const moment = z.iso.datetime({ message: 'A moment is a UTC instant such as 2027-03-02T14:05:00Z' })
/** A SHA-256 in lower-case hexadecimal. */
export const sha256Hex = z.string().regex(/^[0-9a-f]{64}$/, 'A hash is 64 lower-case hexadecimal digits')
/** Text that is really there; kept exactly as it is, because changing a space would change the hash. */
export const words = z.string().regex(/\S/, 'There must be something here')

/** What a printed field holds; nothing else exists, so a cell can never be blank. */
export const FIELD_KINDS = ['value', 'over-range', 'limited', 'not-applicable', 'not-entered'] as const
export type FieldKind = (typeof FIELD_KINDS)[number]

/** How a figure stands against its limit and against the other figures; texts as printed. */
export const judgement = z.strictObject({
  verdict: z.enum(VERDICTS),
  /** What it must be, with its unit: `≤ 0.87 Ω`. */
  limit: words.optional(),
  /** What the design led one to expect: `0.39 Ω`. */
  expected: words.optional(),
  /** The distance to the limit in words: `0.16 Ω inside`. */
  margin: words.optional(),
  /** The sentence that an Unexpected figure stands on, and who wrote and accepted it. */
  sentence: words.optional(),
  sentenceBy: words.optional(),
  acceptedBy: words.optional(),
})
export type Judgement = z.infer<typeof judgement>

const fieldShape = {
  kind: z.enum(FIELD_KINDS),
  /** The text as printed, unit left out: `0.21`, `TN-C-S`, `> 999`, `N/A`, `LIM`. */
  shown: words,
  /** Why it is N/A or LIM. */
  reason: words.optional(),
  value: z.union([z.number(), z.string(), z.boolean()]).optional(),
  unit: words.optional(),
  /** The instrument's smallest step in the field's unit. */
  resolution: z.number().positive().optional(),
  /** `measured`, `read`, `by enquiry`, `calculated` … as printed. */
  howKnown: words.optional(),
  personId: words.optional(),
  personName: words.optional(),
  instrumentSerial: words.optional(),
  /** The server's moment. */
  at: moment.optional(),
  judgement: judgement.optional(),
}

/** One earlier reading of the same figure: kept, never overwritten. */
export const earlierReading = z.strictObject(fieldShape)

/** One field as printed: a value, N/A or LIM with its reason, or (drafts only) not entered. */
export const printedField = z.strictObject({ ...fieldShape, /** Earlier readings in order, oldest first. */ earlier: z.array(earlierReading).optional() })
  .refine(field => field.reason !== undefined || (field.kind !== 'limited' && field.kind !== 'not-applicable'), { message: 'N/A and LIM need their reason', path: ['reason'] })
export type PrintedField = z.infer<typeof printedField>

/** The only ways to make a field; each leaves nothing blank. */
export const textField = (shown: string, rest: Partial<PrintedField> = {}): PrintedField => ({ kind: 'value', shown, ...rest })
export const notApplicable = (reason: string): PrintedField => ({ kind: 'not-applicable', shown: 'N/A', reason })
export const limited = (reason: string, rest: Partial<PrintedField> = {}): PrintedField => ({ kind: 'limited', shown: 'LIM', reason, ...rest })
export const notEntered = (): PrintedField => ({ kind: 'not-entered', shown: 'not entered' })
