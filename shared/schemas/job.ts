import * as z from 'zod'
import { STAGES } from '../job/stages'

const id = z.uuid('Give the id its sender made')

/** What taking an enquiry needs: somebody to call back and where the work is. */
export const newJobForm = z.strictObject({
  mutationId: id,
  customer: z.strictObject({
    name: z.string().trim().min(1, 'Enter the customer\'s name').max(120),
    email: z.union([z.literal(''), z.email('Enter an e-mail address like name@example.org').max(254)]).default(''),
    telephone: z.string().trim().max(40).default(''),
  }),
  premises: z.strictObject({
    address: z.string().trim().min(1, 'Enter the address').max(300),
    town: z.string().trim().max(120).default(''),
    postcode: z.string().trim().min(1, 'Enter the postcode').max(10),
    country: z.enum(['England', 'Wales', 'Scotland', 'Northern Ireland']).default('England'),
    mpan: z.string().trim().max(30).default(''),
  }),
  wanted: z.strictObject({ rating_kW: z.number().min(1).max(50).optional(), phases: z.enum(['1', '3']).optional(), outlet: z.enum(['socket', 'tethered']).optional() }).default({}),
  note: z.string().max(8000).default(''),
})
export type NewJob = z.infer<typeof newJobForm>

export const jobListQuery = z.strictObject({
  stage: z.enum(STAGES).optional(),
  search: z.string().trim().max(80).optional(),
  before: z.string().max(200).optional(),
})

export interface JobLine {
  id: string
  ref: string
  stage: (typeof STAGES)[number]
  sideState: string | null
  withWhom: string
  nextDay: string | null
  changedAt: string
  customer: string
  address: string
  town: string
  postcode: string
}

export interface JobPage { lines: JobLine[], before: string | null }

export const newVisitForm = z.strictObject({
  mutationId: id,
  jobId: id,
  kind: z.enum(['survey', 'install', 'return']),
  day: z.iso.date('Choose a day'),
  half: z.enum(['am', 'pm']),
  crewId: id,
  hours: z.int().min(1).max(8).default(3),
  note: z.string().max(500).default(''),
})
export type NewVisit = z.infer<typeof newVisitForm>

export const movedVisitForm = z.strictObject({
  mutationId: id,
  baseVersion: z.int().min(1),
  day: z.iso.date('Choose a day').optional(),
  half: z.enum(['am', 'pm']).optional(),
  crewId: id.optional(),
  state: z.enum(['booked', 'done', 'cancelled']).optional(),
  note: z.string().max(500).optional(),
})
export type MovedVisit = z.infer<typeof movedVisitForm>

export const diaryQuery = z.strictObject({ from: z.iso.date(), days: z.coerce.number().int().min(1).max(35).default(14) })

export interface DiaryVisit { id: string, jobId: string, ref: string, kind: 'survey' | 'install' | 'return', day: string, half: 'am' | 'pm', crewId: string, hours: number, state: 'booked' | 'done' | 'cancelled', note: string, version: number, customer: string, postcode: string, address: string, stage: (typeof STAGES)[number] }
export interface Diary { crews: { id: string, name: string, people: string[] }[], visits: DiaryVisit[] }
