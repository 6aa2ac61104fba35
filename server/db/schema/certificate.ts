import { sql } from 'drizzle-orm'
import { boolean, check, foreignKey, integer, jsonb, pgTable, primaryKey, text, unique, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { firmId, madeAt, moment } from './columns'
import { firm, person } from './firm'
import { job } from './job'

/** A capacity signed on a job's work. Signing again after a send-back adds a row; the earlier one is withdrawn, not changed. */
export const signature = pgTable('signature', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  capacity: text('capacity').notNull(),
  personId: uuid('person_id').notNull(),
  nameShown: text('name_shown').notNull(),
  way: text('way').notNull(),
  statement: text('statement').notNull(),
  edition: text('edition').notNull(),
  recordVersion: integer('record_version').notNull(),
  at: moment('at').notNull().defaultNow(),
  withdrawnAt: moment('withdrawn_at'),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
  uniqueIndex('signature_standing_once').on(t.firmId, t.jobId, t.capacity).where(sql`${t.withdrawnAt} is null`),
  check('signature_capacity_known', sql`${t.capacity} in ('designer','constructor','inspector','supervisor')`),
])

export const sealKey = pgTable('seal_key', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  publicKey: text('public_key').notNull(),
  /** AES-256-GCM under the key from the environment. */
  encryptedPrivateKey: text('encrypted_private_key').notNull(),
  validFrom: moment('valid_from').notNull().defaultNow(),
  validTo: moment('valid_to'),
}, t => [primaryKey({ columns: [t.firmId, t.id] })])

/** A sealed certificate. Everything but `state`, `replaced_by` and the paper's own hash is refused change by a trigger. */
export const certificate = pgTable('certificate', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  kind: text('kind').notNull(),
  /** What the certificate speaks for ('new-circuit'): a job may owe two of different kinds. */
  subject: text('subject').notNull(),
  number: text('number').notNull(),
  revision: integer('revision').notNull().default(0),
  replacesId: uuid('replaces_id'),
  state: text('state').notNull().default('live'),
  record: jsonb('record').$type<unknown>().notNull(),
  hash: text('hash').notNull().unique('certificate_hash_once'),
  previousHash: text('previous_hash').notNull(),
  chainNumber: integer('chain_number').notNull(),
  seal: text('seal').notNull(),
  sealKeyId: uuid('seal_key_id').notNull(),
  words: text('words').notNull(),
  sealedAt: moment('sealed_at').notNull(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  foreignKey({ columns: [t.firmId, t.sealKeyId], foreignColumns: [sealKey.firmId, sealKey.id] }),
  unique('certificate_number_once').on(t.firmId, t.number, t.revision),
  unique('certificate_chain_once').on(t.firmId, t.chainNumber),
  uniqueIndex('certificate_live_once').on(t.firmId, t.jobId, t.kind, t.subject).where(sql`${t.state} = 'live'`),
  check('certificate_kind_known', sql`${t.kind} in ('installation','minor-works')`),
  check('certificate_state_known', sql`${t.state} in ('live','replaced')`),
])

/** A paper made once from a frozen source: its bytes by hash, and what it was made from. */
export const paper = pgTable('paper', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  kind: text('kind').notNull(),
  /** What it was made from: a certificate's id, a notice's, a quote's. */
  sourceId: uuid('source_id').notNull(),
  state: text('state').notNull().default('to-make'),
  sha256: text('sha256'),
  pages: integer('pages'),
  problem: text('problem'),
  isDraft: boolean('is_draft').notNull().default(false),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  uniqueIndex('paper_once').on(t.firmId, t.kind, t.sourceId),
])
