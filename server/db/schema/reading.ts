import { sql } from 'drizzle-orm'
import { boolean, check, date, doublePrecision, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import type { ReadingContext } from '../../../shared/types/record'
import { firmId, madeAt, moment } from './columns'
import { firm, person } from './firm'
import { job } from './job'

export const instrument = pgTable('instrument', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  name: text('name').notNull(),
  description: text('description').notNull().default(''),
  serial: text('serial').notNull(),
  /** What it measures: continuity, insulation, loop, rcd, electrode, vehicle-adapter. */
  functions: text('functions').array().notNull(),
  active: boolean('active').notNull().default(true),
  madeAt: madeAt(),
}, t => [primaryKey({ columns: [t.firmId, t.id] })])

export const calibration = pgTable('calibration', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  instrumentId: uuid('instrument_id').notNull(),
  doneOn: date('done_on', { mode: 'string' }).notNull(),
  goodUntil: date('good_until', { mode: 'string' }).notNull(),
  reference: text('reference').notNull().default(''),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.instrumentId], foreignColumns: [instrument.firmId, instrument.id] }),
  check('calibration_days_in_order', sql`${t.goodUntil} >= ${t.doneOn}`),
])

/** One measured value. Append-only (a trigger refuses change and removal): a second value is a re-test. */
export const reading = pgTable('reading', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  test: text('test').notNull(),
  kind: text('kind').notNull(),
  shown: text('shown').notNull(),
  value: doublePrecision('value'),
  unit: text('unit').notNull(),
  resolution: doublePrecision('resolution'),
  reason: text('reason').notNull().default(''),
  context: jsonb('context').$type<ReadingContext>().notNull().default({}),
  instrumentId: uuid('instrument_id'),
  /** Who measured. */
  personId: uuid('person_id').notNull(),
  /** Who typed it in, where that was somebody else (from a paper sheet). */
  typedBy: uuid('typed_by'),
  deviceId: uuid('device_id'),
  deviceAt: moment('device_at').notNull(),
  serverAt: moment('server_at').notNull().defaultNow(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
  foreignKey({ columns: [t.firmId, t.instrumentId], foreignColumns: [instrument.firmId, instrument.id] }),
  index('reading_by_job').on(t.firmId, t.jobId, t.serverAt),
  check('reading_kind_known', sql`${t.kind} in ('value','over-range','limited','not-applicable','seen')`),
  check('reading_value_has_number', sql`(${t.kind} <> 'value') or (${t.value} is not null)`),
  check('reading_excuse_has_reason', sql`(${t.kind} not in ('limited','not-applicable')) or (${t.reason} <> '')`),
])

/** The measurer's word for a reading that somebody else typed from a paper sheet; until then it counts as not entered. */
export const readingConfirmation = pgTable('reading_confirmation', {
  firmId: firmId(),
  readingId: uuid('reading_id').notNull(),
  personId: uuid('person_id').notNull(),
  at: moment('at').notNull().defaultNow(),
}, t => [
  primaryKey({ columns: [t.firmId, t.readingId] }),
  foreignKey({ columns: [t.firmId, t.readingId], foreignColumns: [reading.firmId, reading.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
])

/** Bytes kept by the file store under their SHA-256; the picture shown is re-encoded, never the one sent. */
export const storedFile = pgTable('stored_file', {
  firmId: firmId().references(() => firm.id),
  sha256: text('sha256').notNull(),
  mediaType: text('media_type').notNull(),
  bytes: doublePrecision('bytes').notNull(),
  thumbSha256: text('thumb_sha256'),
  madeAt: madeAt(),
}, t => [primaryKey({ columns: [t.firmId, t.sha256] })])

export const photograph = pgTable('photograph', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  /** Which claim it answers (the shot list's id). */
  claim: text('claim').notNull(),
  sha256: text('sha256').notNull(),
  takenAt: moment('taken_at').notNull(),
  /** Null where the customer sent it through their link. */
  personId: uuid('person_id'),
  serverAt: moment('server_at').notNull().defaultNow(),
  removedAt: moment('removed_at'),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  foreignKey({ columns: [t.firmId, t.sha256], foreignColumns: [storedFile.firmId, storedFile.sha256] }),
  index('photograph_by_job').on(t.firmId, t.jobId),
])
