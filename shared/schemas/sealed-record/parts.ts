import * as z from 'zod'
import { moment, printedField, sha256Hex, words } from './field'

const day = z.iso.date()

export const firmPart = z.strictObject({ name: words, address: words, scheme: words, registration: words })

/** The heading of a paper. `formEdition` names the edition of the list of fields, `edition` that of the wiring rules. */
export const certificatePart = z.strictObject({
  number: words,
  /** A for the first issue, then B, C … */
  revision: z.string().regex(/^[A-Z]{1,2}$/),
  replaces: z.strictObject({ number: words, revision: words, hash: sha256Hex, why: words }).nullable(),
  edition: words,
  formEdition: words,
  ruleDataVersion: words,
  /** The server's moment of sealing; of a draft, the moment it was drawn up. */
  at: moment,
})

export const clientPart = z.strictObject({ name: words, address: words })

/** The way a person signed: a passkey, a typed name, or strokes drawn with a finger. */
export const SIGNING_WAYS = ['passkey', 'typed', 'drawn'] as const
export const CAPACITIES = ['design', 'second-design', 'construction', 'inspection-and-test', 'minor-works', 'checked-for-the-firm'] as const
export type Capacity = (typeof CAPACITIES)[number]

/** One signature; where one person answers for several capacities, it names them all and says so. */
export const signature = z.strictObject({
  capacities: z.array(z.enum(CAPACITIES)).min(1),
  personId: words,
  name: words,
  firm: words,
  address: words,
  telephone: words,
  edition: words,
  at: moment,
  way: z.enum(SIGNING_WAYS),
  statement: words,
  /** Strokes as the `d` of one SVG path, in a box of the stated size: letters, digits and separators only, so that nothing else can ride on it. */
  drawing: z.strictObject({ width: z.number().positive(), height: z.number().positive(), path: z.string().regex(/^[MLCQHVSTZmlcqhvstz0-9 .,-]+$/) }).optional(),
})
export type Signature = z.infer<typeof signature>

export const departure = z.strictObject({ regulation: words, differs: words, whySafe: words, designer: words })
/** A permitted exception (a residual-current or surge device left out) with its risk assessment. */
export const permittedException = z.strictObject({ omitted: words, reason: words, riskAssessment: z.strictObject({ title: words, sha256: sha256Hex }), designer: words })

export const instrument = z.strictObject({
  /** continuity, insulation, loop, RCD, electrode, vehicle adapter. */
  function: words,
  description: words,
  serial: words,
  calibratedOn: day.optional(),
  calibratedUntil: day,
  /** In calibration on the day of each reading it was used for. */
  validOnUse: printedField,
})
export type Instrument = z.infer<typeof instrument>

export const photograph = z.strictObject({ claim: words, sha256: sha256Hex, at: moment.optional(), personName: words.optional() })

/** One calculation as it stood: what went in, what came out, and every step, so that anyone can reproduce it. */
export const sealedCalculation = z.strictObject({
  /** The calculation's name at the command line. */
  name: words,
  /** What it answers, as a heading. */
  title: words,
  input: z.record(z.string(), z.json()),
  result: z.record(z.string(), z.json()),
  verdict: z.enum(['within', 'outside', 'waiting']).nullable(),
  working: z.array(z.strictObject({
    symbol: words,
    expression: z.string(),
    value: z.union([z.number(), z.string()]),
    unit: z.string(),
    source: z.string(),
    confidence: z.enum(['two sources', 'one source', 'from memory', 'common practice', 'confirmed', 'computed', 'given']),
  })),
  reasons: z.array(z.string()),
  notes: z.array(z.string()),
})
export type SealedCalculation = z.infer<typeof sealedCalculation>

/** The design behind the paper; what was installed is in the schedules, which never quote this. */
export const designPart = z.strictObject({
  circuit: sealedCalculation,
  supplyCheck: sealedCalculation,
  /** Any further sheets: demand, earthing method, electrode … */
  others: z.array(sealedCalculation),
})

export const earthingMethodPart = z.strictObject({ method: printedField, why: printedField, rule: words.optional() })

/** What every sealed paper holds, whatever its kind. */
export const commonParts = {
  format: z.literal(1),
  firm: firmPart,
  certificate: certificatePart,
  jobReference: words,
  client: clientPart,
  departures: z.array(departure),
  exceptions: z.array(permittedException),
  signatures: z.array(signature),
  /** The firm lets the signing person check their own work; printed so. */
  selfCountersigned: z.boolean(),
  instruments: z.array(instrument),
  photographs: z.array(photograph),
  /** The hash before this one in the firm's chain of certificates; null for the firm's first. */
  previousHash: sha256Hex.nullable(),
}
