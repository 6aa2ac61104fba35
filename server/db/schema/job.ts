import { sql } from 'drizzle-orm'
import { bigint, check, date, foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import type { Stage } from '../../../shared/job/stages'
import { editable, firmId, madeAt, moment } from './columns'
import { customer, premises } from './customer'
import { crew, firm, person } from './firm'

export const job = pgTable('job', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  /** What people say on the telephone: the firm's prefix and a number. */
  ref: text('ref').notNull(),
  customerId: uuid('customer_id').notNull(),
  premisesId: uuid('premises_id').notNull(),
  stage: text('stage').$type<Stage>().notNull(),
  stageSince: moment('stage_since').notNull().defaultNow(),
  sideState: text('side_state'),
  sideNote: text('side_note').notNull().default(''),
  note: text('note').notNull().default(''),
  /** Who must move next, in words, kept with the stage so that a list never computes it. */
  withWhom: text('with_whom').notNull().default('office'),
  nextDay: date('next_day', { mode: 'string' }),
  /** Rises with every accepted change of the record: the order of events is the server's, never a tablet's clock. */
  recordVersion: bigint('record_version', { mode: 'number' }).notNull().default(1),
  changedAt: moment('changed_at').notNull().defaultNow(),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  unique('job_ref_once').on(t.firmId, t.ref),
  foreignKey({ columns: [t.firmId, t.customerId], foreignColumns: [customer.firmId, customer.id] }),
  foreignKey({ columns: [t.firmId, t.premisesId], foreignColumns: [premises.firmId, premises.id] }),
  index('job_newest').on(t.firmId, t.changedAt.desc(), t.id.desc()),
  index('job_by_stage').on(t.firmId, t.stage, t.changedAt.desc(), t.id.desc()),
  check('job_stage_known', sql`${t.stage} in ('enquiry','survey-booked','surveyed','quoted','accepted','install-booked','on-site','ready-to-check','countersigned','handed-over','closed')`),
])

/** One row per firm and kind of number; locked while a number is given out, so that there are no gaps. */
export const counter = pgTable('counter', {
  firmId: firmId().references(() => firm.id),
  name: text('name').notNull(),
  last: integer('last').notNull().default(0),
}, t => [primaryKey({ columns: [t.firmId, t.name] })])

export const visit = pgTable('visit', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  kind: text('kind').notNull(),
  day: date('day', { mode: 'string' }).notNull(),
  half: text('half').notNull(),
  crewId: uuid('crew_id').notNull(),
  hours: integer('hours').notNull().default(3),
  state: text('state').notNull().default('booked'),
  note: text('note').notNull().default(''),
  ...editable(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  foreignKey({ columns: [t.firmId, t.crewId], foreignColumns: [crew.firmId, crew.id] }),
  index('visit_by_day').on(t.firmId, t.day),
  index('visit_by_job').on(t.firmId, t.jobId),
  check('visit_half_known', sql`${t.half} in ('am','pm')`),
  check('visit_kind_known', sql`${t.kind} in ('survey','install','return')`),
  check('visit_state_known', sql`${t.state} in ('booked','done','cancelled')`),
])

/** A supervisor's question on one field; answering it is the installer's way back to "Ready to check". */
export const fieldQuery = pgTable('field_query', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  part: text('part').notNull(),
  field: text('field').notNull(),
  question: text('question').notNull(),
  askedBy: uuid('asked_by').notNull(),
  askedAt: moment('asked_at').notNull().defaultNow(),
  answer: text('answer'),
  answeredBy: uuid('answered_by'),
  answeredAt: moment('answered_at'),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  foreignKey({ columns: [t.firmId, t.askedBy], foreignColumns: [person.firmId, person.id] }),
])

/** What a mutation or act was answered with, by the id its sender made: a repeat gets the same answer. */
export const mutationRecord = pgTable('mutation_record', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  kind: text('kind').notNull(),
  jobId: uuid('job_id'),
  personId: uuid('person_id'),
  contentHash: text('content_hash').notNull(),
  outcome: jsonb('outcome').$type<unknown>(),
  at: moment('at').notNull().defaultNow(),
}, t => [primaryKey({ columns: [t.firmId, t.id] })])
