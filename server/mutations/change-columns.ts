import { and, eq, sql } from 'drizzle-orm'
import { canonicalMpan } from '../../shared/job/mpan-text'
import { customer, premises } from '../db/schema/customer'
import { job as jobTable } from '../db/schema/job'
import type { Apply } from './mutation'

type ColumnChange = { fields: Record<string, string | null> }

/** The customer, the premises and the job's own line: people edit them from any of their jobs; the last writer's field stands and the story says whose. */
export const changeCustomer: Apply<ColumnChange> = async ({ tx, ctx, job, payload }) => {
  await tx.update(customer).set({ ...payload.fields, version: sql`${customer.version} + 1` }).where(and(eq(customer.firmId, ctx.firmId), eq(customer.id, job.customerId)))
  return { event: 'record-changed', detail: { part: 'customer', fields: Object.keys(payload.fields) } }
}

export const changePremises: Apply<ColumnChange> = async ({ tx, ctx, job, payload }) => {
  const fields = payload.fields.mpan === undefined ? payload.fields : { ...payload.fields, mpan: canonicalMpan(payload.fields.mpan ?? '') }
  await tx.update(premises).set({ ...fields, version: sql`${premises.version} + 1` }).where(and(eq(premises.firmId, ctx.firmId), eq(premises.id, job.premisesId)))
  return { event: 'record-changed', detail: { part: 'premises', fields: Object.keys(payload.fields) } }
}

export const changeJob: Apply<ColumnChange> = async ({ tx, ctx, job, payload }) => {
  await tx.update(jobTable).set({ ...payload.fields, changedAt: sql`now()` }).where(and(eq(jobTable.firmId, ctx.firmId), eq(jobTable.id, job.id)))
  return { event: 'record-changed', detail: { part: 'job', fields: Object.keys(payload.fields) } }
}
