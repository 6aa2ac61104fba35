import { sql } from 'drizzle-orm'
import { boolean, check, date, foreignKey, integer, jsonb, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core'
import { firmId, madeAt, moment } from './columns'
import { firm } from './firm'
import { job } from './job'

export const priceItem = pgTable('price_item', {
  firmId: firmId().references(() => firm.id),
  id: uuid('id').notNull(),
  code: text('code').notNull(),
  description: text('description').notNull(),
  unit: text('unit').notNull(),
  netPence: integer('net_pence').notNull(),
  vatBp: integer('vat_bp').notNull().default(2000),
  active: boolean('active').notNull().default(true),
}, t => [primaryKey({ columns: [t.firmId, t.id] }), unique('price_code_once').on(t.firmId, t.code)])

export const quote = pgTable('quote', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  number: text('number').notNull(),
  state: text('state').notNull().default('draft'),
  expiresOn: date('expires_on', { mode: 'string' }),
  terms: text('terms').notNull().default(''),
  netPence: integer('net_pence').notNull().default(0),
  vatPence: integer('vat_pence').notNull().default(0),
  grossPence: integer('gross_pence').notNull().default(0),
  depositPence: integer('deposit_pence').notNull().default(0),
  sentAt: moment('sent_at'),
  acceptedAt: moment('accepted_at'),
  acceptedName: text('accepted_name'),
  declinedAt: moment('declined_at'),
  declinedReason: text('declined_reason'),
  version: integer('version').notNull().default(1),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  unique('quote_number_once').on(t.firmId, t.number),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  check('quote_state_known', sql`${t.state} in ('draft','sent','accepted','declined','expired','replaced')`),
])

export const quoteLine = pgTable('quote_line', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  quoteId: uuid('quote_id').notNull(),
  position: integer('position').notNull().default(0),
  description: text('description').notNull(),
  /** Thousandths, so that 7.5 m of cable is a whole number. */
  quantityThousandths: integer('quantity_thousandths').notNull(),
  unit: text('unit').notNull(),
  unitNetPence: integer('unit_net_pence').notNull(),
  vatBp: integer('vat_bp').notNull(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.quoteId], foreignColumns: [quote.firmId, quote.id] }),
])

export const invoice = pgTable('invoice', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  number: text('number').notNull(),
  kind: text('kind').notNull(),
  state: text('state').notNull().default('sent'),
  content: jsonb('content').$type<unknown>().notNull(),
  grossPence: integer('gross_pence').notNull(),
  duePence: integer('due_pence').notNull(),
  issuedOn: date('issued_on', { mode: 'string' }).notNull(),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  unique('invoice_number_once').on(t.firmId, t.number),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
])

/** Money received or given back, only ever from a verified event; never changed, never removed. */
export const payment = pgTable('payment', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  quoteId: uuid('quote_id'),
  invoiceId: uuid('invoice_id'),
  pence: integer('pence').notNull(),
  currency: text('currency').notNull().default('gbp'),
  way: text('way').notNull(),
  outsideId: text('outside_id').notNull(),
  at: moment('at').notNull().defaultNow(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  unique('payment_outside_once').on(t.firmId, t.outsideId),
])

/** A payment page asked for: what the verified event is matched against, so that no amount comes from outside. */
export const checkout = pgTable('checkout', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  quoteId: uuid('quote_id').notNull(),
  outsideId: text('outside_id').unique('checkout_outside_once'),
  pence: integer('pence').notNull(),
  url: text('url'),
  state: text('state').notNull().default('open'),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.quoteId], foreignColumns: [quote.firmId, quote.id] }),
])
