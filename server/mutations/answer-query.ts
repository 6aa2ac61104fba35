import { and, eq, isNull, sql } from 'drizzle-orm'
import { fieldQuery } from '../db/schema/job'
import type { Apply } from './mutation'

/** Answers a supervisor's question on a field. */
export const answerQuery: Apply<{ id: string, answer: string }> = async ({ tx, ctx, job, payload }) => {
  await tx.update(fieldQuery).set({ answer: payload.answer, answeredBy: ctx.person.id, answeredAt: sql`now()` })
    .where(and(eq(fieldQuery.firmId, ctx.firmId), eq(fieldQuery.jobId, job.id), eq(fieldQuery.id, payload.id), isNull(fieldQuery.answer)))
  return { event: 'query-answered', detail: { queryId: payload.id } }
}
