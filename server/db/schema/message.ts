import { sql } from 'drizzle-orm'
import { bigint, check, date, foreignKey, index, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import { firmId, madeAt, moment } from './columns'
import { firm, person } from './firm'
import { job } from './job'

/** A link that lets a customer reach one job for one purpose, without an account. Only the token's SHA-256 is kept. */
export const customerLink = pgTable('customer_link', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  purpose: text('purpose').notNull(),
  subjectId: uuid('subject_id'),
  tokenHash: text('token_hash').notNull().unique('customer_link_hash_once'),
  sentTo: text('sent_to').notNull(),
  expiresAt: moment('expires_at'),
  withdrawnAt: moment('withdrawn_at'),
  openedAt: moment('opened_at'),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  check('customer_link_purpose_known', sql`${t.purpose} in ('photographs','quote','visit','pack')`),
])

/** One row per recipient, written in the transaction of what it tells of; the worker alone sends. */
export const outboxMessage = pgTable('outbox_message', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  jobId: uuid('job_id'),
  message: text('message').notNull(),
  recipient: text('recipient').notNull(),
  content: jsonb('content').$type<Record<string, unknown>>().notNull(),
  dedupeKey: text('dedupe_key').notNull(),
  state: text('state').notNull().default('queued'),
  /** Null: may go now. Otherwise what it waits for, e.g. a paper that is still being made. */
  waitsForPaper: uuid('waits_for_paper'),
  attempts: integer('attempts').notNull().default(0),
  messageId: text('message_id').notNull(),
  claimedAt: moment('claimed_at'),
  nextTryAt: moment('next_try_at').notNull().defaultNow(),
  sentAt: moment('sent_at'),
  problem: text('problem'),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  unique('outbox_dedupe_once').on(t.firmId, t.dedupeKey),
  index('outbox_to_send').on(t.nextTryAt).where(sql`${t.state} = 'queued'`),
  index('outbox_by_job').on(t.firmId, t.jobId),
  check('outbox_state_known', sql`${t.state} in ('queued','claimed','sent','failed','unclear')`),
])

/** An event a payment service told us, by its id: handled once. */
export const outsideEvent = pgTable('outside_event', {
  firmId: firmId().references(() => firm.id),
  id: text('id').notNull(),
  kind: text('kind').notNull(),
  content: jsonb('content').$type<unknown>().notNull(),
  handledAt: moment('handled_at').notNull().defaultNow(),
}, t => [primaryKey({ columns: [t.firmId, t.id] })])

/** Who did what, chained by hash within the firm: rows are only ever added (function `record_event`). */
export const auditEvent = pgTable('audit_event', {
  firmId: firmId().references(() => firm.id),
  number: bigint('number', { mode: 'number' }).notNull(),
  jobId: uuid('job_id'),
  personId: uuid('person_id'),
  type: text('type').notNull(),
  detail: jsonb('detail').$type<Record<string, unknown>>().notNull(),
  at: moment('at').notNull(),
  previousHash: text('previous_hash').notNull(),
  hash: text('hash').notNull(),
}, t => [
  primaryKey({ columns: [t.firmId, t.number] }),
  index('audit_by_job').on(t.firmId, t.jobId, t.number.desc()),
])

/** Where the firm's chain of events stands; its row is the lock that keeps the numbers without gaps. */
export const auditHead = pgTable('audit_head', {
  firmId: firmId().primaryKey().references(() => firm.id),
  number: bigint('number', { mode: 'number' }).notNull().default(0),
  hash: text('hash').notNull().default(''),
})

/** A row of a reference table that the firm has seen in its printed book, or overrides with a reason and a source. */
export const tableConfirmation = pgTable('table_confirmation', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  tableId: text('table_id').notNull(),
  rowKey: text('row_key').notNull(),
  way: text('way').notNull(),
  value: jsonb('value').$type<unknown>(),
  reason: text('reason').notNull().default(''),
  source: text('source').notNull().default(''),
  personId: uuid('person_id').notNull(),
  at: moment('at').notNull().defaultNow(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.personId], foreignColumns: [person.firmId, person.id] }),
  check('table_confirmation_way_known', sql`${t.way} in ('seen','override')`),
])

/** How long a kind of row is kept and on what ground. */
export const retentionRule = pgTable('retention_rule', {
  firmId: firmId().references(() => firm.id),
  subject: text('subject').notNull(),
  years: integer('years').notNull(),
  ground: text('ground').notNull(),
  since: date('since', { mode: 'string' }).notNull(),
}, t => [primaryKey({ columns: [t.firmId, t.subject] })])
