/**
 * The parts of a job's record that people fill in field by field. Each is a table of its own with one shape:
 * `key` is a slot's name ('designed') where there is one of a kind, or the id its sender made. What the fields are,
 * with their units, is `shared/job/parts.ts`, which checks every change; the database guards keys, firm and job.
 */
import { foreignKey, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core'
import type { PartContent } from '../../../shared/types/record'
import { editable, firmId } from './columns'
import { job } from './job'

const partTable = <Name extends string>(name: Name) => pgTable(name, {
  firmId: firmId(),
  jobId: uuid('job_id').notNull(),
  key: text('key').notNull(),
  position: integer('position').notNull().default(0),
  content: jsonb('content').$type<PartContent>().notNull(),
  ...editable(),
}, t => [
  primaryKey({ columns: [t.firmId, t.jobId, t.key] }),
  foreignKey({ columns: [t.firmId, t.jobId], foreignColumns: [job.firmId, job.id] }),
])

export type PartTable = ReturnType<typeof partTable>

export const wanted = partTable('wanted')
export const consent = partTable('consent')
export const surveyAnswer = partTable('survey_answer')
export const appliance = partTable('appliance')
export const recordedDemand = partTable('recorded_demand')
export const leg = partTable('leg')
export const circuit = partTable('circuit')
export const earthingDecision = partTable('earthing_decision')
export const departure = partTable('departure')
export const equipmentFitted = partTable('equipment_fitted')
export const loadLimit = partTable('load_limit')
export const putBackItem = partTable('put_back_item')
export const inspectionOutcome = partTable('inspection_outcome')
export const unexpectedSentence = partTable('unexpected_sentence')
export const statement = partTable('statement')
export const handover = partTable('handover')
export const promise = partTable('promise')
