import { and, eq, isNull, sql } from 'drizzle-orm'
import { problem } from '../../shared/utils/problem'
import { fieldQuery } from '../db/schema/job'
import type { Apply } from './mutation'

/** Answers a supervisor's question on a field. */
export const answerQuery: Apply<{ id: string, answer: string }> = async ({ tx, ctx, job, payload }) => {
  const answered = await tx.update(fieldQuery).set({ answer: payload.answer, answeredBy: ctx.person.id, answeredAt: sql`now()` })
    .where(and(eq(fieldQuery.firmId, ctx.firmId), eq(fieldQuery.jobId, job.id), eq(fieldQuery.id, payload.id), isNull(fieldQuery.answer))).returning({ id: fieldQuery.id })
  // Two answers to one question: the second is told, never dropped.
  if (!answered.length) throw problem('stale-copy', 'This question has been answered already, or is not asked on this job. Reload the page to see its answer.')
  return { event: 'query-answered', detail: { queryId: payload.id } }
}
