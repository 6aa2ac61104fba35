/** Column sets that every table shares, so that the firm, the moments and the keys are spelled one way. */
import { integer, jsonb, text, timestamp, uuid } from 'drizzle-orm/pg-core'

export const firmId = () => uuid('firm_id').notNull()
export const moment = (name: string) => timestamp(name, { withTimezone: true })
export const madeAt = () => moment('made_at').notNull().defaultNow()

/** Who last wrote each field of a row, when, and at which version of the row: what lets two tablets' different fields merge. */
export interface FieldStamp { v: number, by: string, at: string }
export type FieldStamps = Record<string, FieldStamp>

/** The columns of a row of a job's record that people edit field by field. */
export const editable = () => ({
  version: integer('version').notNull().default(1),
  stamps: jsonb('stamps').$type<FieldStamps>().notNull().default({}),
  removedAt: moment('removed_at'),
  madeAt: madeAt(),
})

export const lowerText = (name: string) => text(name)
