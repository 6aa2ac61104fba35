import { sql } from 'drizzle-orm'
import { check, date, foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import { firmId, madeAt, moment } from './columns'
import { job } from './job'

/** What someone outside must be told, with its last day and the proof that it was. */
export const notice = pgTable('notice', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  jobId: uuid('job_id').notNull(),
  kind: text('kind').notNull(),
  recipient: text('recipient').notNull(),
  route: text('route').notNull(),
  reasons: jsonb('reasons').$type<string[]>().notNull(),
  lastDay: date('last_day', { mode: 'string' }),
  state: text('state').notNull().default('to-prepare'),
  /** The figures as they stood when it was prepared: the paper is made from these. */
  content: jsonb('content').$type<unknown>().notNull(),
  sentOn: date('sent_on', { mode: 'string' }),
  sentBy: uuid('sent_by'),
  sentHow: text('sent_how'),
  reference: text('reference').notNull().default(''),
  madeAt: madeAt(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
  index('notice_by_day').on(t.firmId, t.state, t.lastDay),
  check('notice_state_known', sql`${t.state} in ('not-needed','to-prepare','sent','answered')`),
])

export const noticeReply = pgTable('notice_reply', {
  firmId: firmId(),
  id: uuid('id').notNull(),
  noticeId: uuid('notice_id').notNull(),
  outcome: text('outcome').notNull(),
  note: text('note').notNull().default(''),
  repliedOn: date('replied_on', { mode: 'string' }).notNull(),
  at: moment('at').notNull().defaultNow(),
}, t => [
  primaryKey({ columns: [t.firmId, t.id] }),
  foreignKey({ columns: [t.firmId, t.noticeId], foreignColumns: [notice.firmId, notice.id] }),
])
