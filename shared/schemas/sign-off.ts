import * as z from 'zod'

const id = z.uuid('Give the id its sender made')

export const CAPACITIES = ['designer', 'constructor', 'inspector'] as const
export type SignedCapacity = (typeof CAPACITIES)[number]

/** What each capacity declares. Our own words for what the model forms of BS 7671 Appendix 6 have people declare. */
export const CAPACITY_STATEMENTS: Record<SignedCapacity | 'supervisor', string> = {
  designer: 'I am responsible for the design of this work. I used reasonable skill and care, and the design complies with the edition of BS 7671 named here, but for the departures listed.',
  constructor: 'I am responsible for the construction of this work. I used reasonable skill and care, and the construction complies with the edition of BS 7671 named here, but for the departures listed.',
  inspector: 'I am responsible for inspecting and testing this work. I used reasonable skill and care, and what I inspected and tested complies with the edition of BS 7671 named here, but for the departures listed.',
  supervisor: 'Checked for the firm: the record is complete, its figures stand within their limits, and what does not fit is explained.',
}

export const signForm = z.strictObject({
  mutationId: id,
  capacities: z.array(z.enum(CAPACITIES)).min(1, 'Choose at least one capacity').max(3),
  name: z.string().trim().min(2, 'Type your name as it shall be printed').max(120),
  way: z.enum(['typed', 'drawn']),
  declared: z.literal(true, 'Read the statement and tick that it is yours'),
})
export type SignForm = z.infer<typeof signForm>

export const sendBackForm = z.strictObject({
  mutationId: id,
  queries: z.array(z.strictObject({ part: z.string().min(1).max(60), field: z.string().max(120), question: z.string().trim().min(3, 'Say what to look at').max(2000) })).min(1, 'Write at least one remark').max(40),
})
export type SendBackForm = z.infer<typeof sendBackForm>

export const countersignForm = z.strictObject({
  mutationId: id,
  name: z.string().trim().min(2, 'Type your name as it shall be printed').max(120),
  declared: z.literal(true, 'Read the statement and tick that it is yours'),
  /** Which rows the supervisor opened; kept with the event. */
  opened: z.array(z.string().max(80)).max(200).default([]),
})
export type CountersignForm = z.infer<typeof countersignForm>

export const reviseForm = z.strictObject({ mutationId: id, reason: z.string().trim().min(5, 'Say why the certificate is replaced').max(1000) })
export type ReviseForm = z.infer<typeof reviseForm>

export const actForm = z.strictObject({ mutationId: id })
