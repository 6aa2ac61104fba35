/** Every kind of change to a job's record that travels through `POST /api/mutations`, with its schema and who may do it. */
import * as z from 'zod'
import { changeSchema } from './fields/field'
import { PART_NAMES, partSpec, type Part } from './parts'
import type { Act } from './permissions'
import { TEST_KEYS, testSpec, type TestKey } from './tests.data'

const kebab = (part: string) => part.replace(/[A-Z]/g, letter => `-${letter.toLowerCase()}`)
const id = z.uuid('Give the id its sender made')

export interface MutationKind {
  may: Act
  /** Changes the work itself, so refused once the capacities have signed. */
  isWork: boolean
  /** Which part's row it changes, where it changes one. */
  part?: Part
  payload: z.ZodType
}

export interface PartChange { key: string, position?: number, fields: Record<string, string | number | string[] | null> }

function partKinds(): Record<string, MutationKind> {
  const kinds: Record<string, MutationKind> = {}
  for (const part of PART_NAMES) {
    const { slots, fields, may, isWork } = partSpec(part)
    const key = slots ? z.enum(slots as [string, ...string[]]) : z.string().min(1).max(60).regex(/^[A-Za-z0-9.-]+$/)
    kinds[`change-${kebab(part)}`] = { may, isWork, part, payload: z.strictObject({ key, position: z.int().min(0).max(1000).optional(), fields: changeSchema(fields) }) }
    if (!slots) kinds[`remove-${kebab(part)}`] = { may, isWork, part, payload: z.strictObject({ key }) }
  }
  return kinds
}

export const readingPayload = z.strictObject({
  id,
  test: z.enum(TEST_KEYS as [TestKey, ...TestKey[]]),
  kind: z.enum(['value', 'over-range', 'limited', 'not-applicable', 'seen']),
  shown: z.string().min(1, 'Enter what the instrument shows').max(40),
  value: z.number().nullable(),
  unit: z.string().max(10),
  resolution: z.number().positive().nullable(),
  reason: z.string().max(500).default(''),
  context: z.strictObject({
    byEnquiry: z.boolean().optional(),
    testVoltage_V: z.number().positive().max(1000).optional(),
    ambient_C: z.number().min(-30).max(60).optional(),
    waited_s: z.number().min(0).max(3600).optional(),
    cause: z.enum(['connection', 'cable', 'device', 'other']).optional(),
  }).default({}),
  instrumentId: id.nullable(),
  /** Who measured; left out where it is the sender. */
  measuredBy: id.optional(),
  deviceId: id.nullable().optional(),
}).superRefine((reading, check) => {
  const say = (path: string, message: string) => check.addIssue({ code: 'custom', path: [path], message })
  const spec = testSpec(reading.test)
  if ((reading.kind === 'value' || reading.kind === 'over-range') && (reading.value === null || !Number.isFinite(reading.value) || reading.value < 0)) say('value', 'Enter the figure the instrument shows')
  if ((reading.kind === 'limited' || reading.kind === 'not-applicable') && !reading.reason.trim()) say('reason', 'Say why there is no reading')
  if (reading.kind === 'seen' && !['correct', 'wrong'].includes(reading.shown)) say('shown', 'Say whether it was correct or wrong')
  if (spec.answer === 'seen' && (reading.kind === 'value' || reading.kind === 'over-range')) say('kind', 'This check has no figure')
  if (spec.answer === 'figure' && reading.kind === 'seen') say('kind', 'This test needs a figure')
})
export type ReadingPayload = z.infer<typeof readingPayload>

const customerPayload = z.strictObject({ fields: z.strictObject({ name: z.string().trim().min(1, 'Enter the customer\'s name').max(120), email: z.union([z.literal(''), z.email('Enter an e-mail address like name@example.org')]), telephone: z.string().max(40) }).partial() })
const premisesPayload = z.strictObject({ fields: z.strictObject({ address: z.string().max(300), town: z.string().max(120), postcode: z.string().max(10), country: z.enum(['England', 'Wales', 'Scotland', 'Northern Ireland']), mpan: z.string().max(30), occupier: z.string().max(120), tenure: z.enum(['', 'owner', 'tenant', 'flat-owner', 'landlord']), parking: z.string().max(200) }).partial() })

export const MUTATION_KINDS: Record<string, MutationKind> = {
  ...partKinds(),
  'change-job': { may: 'change-enquiry', isWork: false, payload: z.strictObject({ fields: z.strictObject({ note: z.string().max(8000), sideState: z.enum(['waiting', 'cancelled']).nullable(), sideNote: z.string().max(500), nextDay: z.iso.date().nullable() }).partial() }) },
  'change-customer': { may: 'change-enquiry', isWork: false, payload: customerPayload },
  'change-premises': { may: 'change-enquiry', isWork: false, payload: premisesPayload },
  'add-reading': { may: 'take-readings', isWork: true, payload: readingPayload },
  'confirm-reading': { may: 'take-readings', isWork: true, payload: z.strictObject({ readingId: id }) },
  'keep-photograph': { may: 'take-photographs', isWork: false, payload: z.strictObject({ id, claim: z.string().min(1).max(60), sha256: z.string().regex(/^[0-9a-f]{64}$/), takenAt: z.iso.datetime() }) },
  'remove-photograph': { may: 'take-photographs', isWork: false, payload: z.strictObject({ id }) },
  'finish-survey': { may: 'answer-survey', isWork: true, payload: z.strictObject({}) },
  'answer-query': { may: 'record-work', isWork: true, payload: z.strictObject({ id, answer: z.string().trim().min(1, 'Write an answer').max(2000) }) },
}

export const changeKind = (part: Part) => `change-${kebab(part)}`
export const removeKind = (part: Part) => `remove-${kebab(part)}`

/** One change on its way: made on the device, with its own id, and the version of the row it was based on. */
export const mutationSchema = z.strictObject({
  id,
  kind: z.string().max(60),
  jobId: id,
  /** Version of the row the change was based on; null for a row that is new. */
  baseVersion: z.int().min(0).nullable(),
  at: z.iso.datetime(),
  payload: z.record(z.string(), z.unknown()),
})
export type Mutation = z.infer<typeof mutationSchema>

export const mutationBatch = z.strictObject({ items: z.array(mutationSchema).min(1).max(100) })

export type MutationOutcome
  = { id: string, status: 'applied' | 'repeated', recordVersion: number, row?: { part: Part, row: unknown } }
    | { id: string, status: 'stale', mine: Record<string, unknown>, theirs: { part: Part, row: unknown } }
    | { id: string, status: 'refused', problem: { code: string, message: string, fields?: Record<string, string> } }
