import { and, eq, isNull, sql } from 'drizzle-orm'
import { problem } from '../../shared/utils/problem'
import { photograph, storedFile } from '../db/schema/reading'
import type { Apply } from './mutation'

/** Notes that a photograph (its bytes already kept under their hash) answers a claim of the shot list. */
export const keepPhotograph: Apply<{ id: string, claim: string, sha256: string, takenAt: string }> = async ({ tx, ctx, job, payload }) => {
  const [file] = await tx.select({ sha256: storedFile.sha256 }).from(storedFile).where(and(eq(storedFile.firmId, ctx.firmId), eq(storedFile.sha256, payload.sha256)))
  if (!file) throw problem('check-answers', 'The photograph itself has not arrived yet. It is sent again by itself.')
  const kept = await tx.insert(photograph).values({ firmId: ctx.firmId, id: payload.id, jobId: job.id, claim: payload.claim, sha256: payload.sha256, takenAt: new Date(payload.takenAt), personId: ctx.person.id }).onConflictDoNothing().returning({ id: photograph.id })
  if (!kept.length) throw problem('check-answers', 'A photograph of this id is already kept. Take it again.')
  return { event: 'photograph-kept', detail: { photographId: payload.id, claim: payload.claim } }
}

export const removePhotograph: Apply<{ id: string }> = async ({ tx, ctx, job, payload }) => {
  await tx.update(photograph).set({ removedAt: sql`now()` }).where(and(eq(photograph.firmId, ctx.firmId), eq(photograph.jobId, job.id), eq(photograph.id, payload.id), isNull(photograph.removedAt)))
  return { event: 'photograph-removed', detail: { photographId: payload.id } }
}
