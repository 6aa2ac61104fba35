import * as z from 'zod'

export const ROLES = ['office', 'installer', 'supervisor', 'principal'] as const
export const ROLE_LABELS: Record<(typeof ROLES)[number], string> = { office: 'Office', installer: 'Installer', supervisor: 'Supervisor', principal: 'Principal' }
export const CAPACITIES = ['designer', 'constructor', 'inspector', 'supervisor'] as const
export const CAPACITY_LABELS: Record<(typeof CAPACITIES)[number], string> = { designer: 'Designer', constructor: 'Constructor', inspector: 'Inspector and tester', supervisor: 'Supervisor' }

const roles = z.array(z.enum(ROLES)).min(1, 'Choose at least one role').max(4)
const crewId = z.uuid().nullable().default(null)

export const invitationForm = z.strictObject({
  mutationId: z.uuid(),
  name: z.string().trim().min(1, 'Enter the person\'s name').max(120),
  email: z.email('Enter an e-mail address like name@example.org').max(254),
  roles,
  crewId,
})

/** `active: false` switches the person off: every session ends, the name stays on what they signed. */
export const personChange = z.strictObject({ mutationId: z.uuid(), roles: roles.optional(), crewId: z.uuid().nullable().optional(), active: z.boolean().optional() })
export type PersonChange = z.infer<typeof personChange>

export const qualificationForm = z.strictObject({
  mutationId: z.uuid(),
  title: z.string().trim().min(1, 'Enter what the paper says').max(200),
  number: z.string().trim().max(80).default(''),
  capacities: z.array(z.enum(CAPACITIES)).min(1, 'Choose what it lets the person sign'),
  validTo: z.iso.date().nullable().default(null),
})
export type NewQualification = z.infer<typeof qualificationForm>

export const crewForm = z.strictObject({ mutationId: z.uuid(), name: z.string().trim().min(1, 'Enter the crew\'s name').max(40) })

/** The firm's own details and what the principal chooses for it. */
export const firmChange = z.strictObject({
  mutationId: z.uuid(),
  name: z.string().trim().min(1, 'Enter the firm\'s name').max(160),
  address: z.string().trim().min(1, 'Enter the firm\'s address').max(400),
  telephone: z.string().trim().max(40),
  email: z.union([z.literal(''), z.email('Enter an e-mail address like name@example.org').max(254)]),
  scheme: z.string().trim().max(120),
  registration: z.string().trim().max(80),
  vatNumber: z.string().trim().regex(/^$|^GB ?\d{3} ?\d{4} ?\d{2}(?: ?\d{3})?$/, 'Enter GB and nine digits, as on the VAT certificate'),
  selfCountersign: z.boolean(),
  depositPercent: z.number('Enter a share from 0 to 100').min(0, 'Enter a share from 0 to 100').max(100, 'Enter a share from 0 to 100'),
  quoteDays: z.int('Enter whole days').min(1, 'Enter at least one day').max(365, 'Enter at most 365 days'),
})
export type FirmChange = z.infer<typeof firmChange>

export interface PersonLine { id: string, name: string, email: string, roles: (typeof ROLES)[number][], active: boolean, crewId: string | null, hasPassword: boolean, lastSeenAt: string | null, qualifications: { id: string, title: string, number: string, capacities: string[], validTo: string | null }[] }
export interface PeopleView { people: PersonLine[], crews: { id: string, name: string }[] }
export type FirmView = Omit<FirmChange, 'mutationId'>
