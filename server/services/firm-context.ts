/** Who acts, in which firm, and the two ways to the firm's rows: reading, and an act that happens once. */
import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import { and, eq, sql } from 'drizzle-orm'
import { problem } from '../../shared/utils/problem'
import type { Me } from '../../shared/types/firm'
import { changeAsFirm, readAsFirm, type FirmTx } from '../db/firm-db'
import { mutationRecord } from '../db/schema/job'

export interface FirmContext {
  firmId: string
  person: Me & { crewId: string | null }
  read<T>(act: (tx: FirmTx) => Promise<T>): Promise<T>
  /** Runs an act once: a repeat of the same id gets the stored outcome, the same id with other content is refused. */
  once<T>(mutationId: string, kind: string, content: unknown, act: (tx: FirmTx) => Promise<T>): Promise<T>
}

/**
 * SHA-256 of the content's RFC 8785 form, by which a repeat is told from another change under the same id.
 * @throws check-answers where text holds half a sign (a lone surrogate), which that form refuses
 */
export function contentHash(content: unknown): string {
  try {
    return createHash('sha256').update(canonicalize(content) ?? '').digest('hex')
  }
  catch {
    throw problem('check-answers', 'Some of the text holds a sign that cannot be kept. Type it again.')
  }
}

export function firmContext(firmId: string, person: FirmContext['person']): FirmContext {
  return {
    firmId,
    person,
    read: act => readAsFirm(firmId, act),
    once: (mutationId, kind, content, act) => changeAsFirm(firmId, async (tx) => {
      const stored = await claimMutation<never>(tx, { firmId, id: mutationId, kind, personId: person.id, content })
      if (stored) return stored.outcome
      const outcome = await act(tx)
      await storeOutcome(tx, firmId, mutationId, outcome)
      return outcome
    }),
  }
}

interface Claim { firmId: string, id: string, kind: string, personId: string | null, jobId?: string, content: unknown }

/**
 * Takes the mutation's id for this transaction. Null: it is ours to act on. Otherwise the outcome stored by the earlier
 * one; a second sender of the same id waits here until the first has committed.
 * @throws 422 where the id was used for other content
 */
export async function claimMutation<T>(tx: FirmTx, claim: Claim): Promise<{ outcome: T } | null> {
  const hash = contentHash({ kind: claim.kind, content: claim.content ?? null })
  const made = await tx.insert(mutationRecord).values({ firmId: claim.firmId, id: claim.id, kind: claim.kind, jobId: claim.jobId, personId: claim.personId, contentHash: hash }).onConflictDoNothing().returning({ id: mutationRecord.id })
  if (made.length) return null
  const [earlier] = await tx.select().from(mutationRecord).where(and(eq(mutationRecord.firmId, claim.firmId), eq(mutationRecord.id, claim.id)))
  if (!earlier || earlier.contentHash !== hash) throw problem('check-answers', 'This change was already sent with other content. Open the page again and repeat it.')
  return { outcome: earlier.outcome as T }
}

export async function storeOutcome(tx: FirmTx, firmId: string, id: string, outcome: unknown): Promise<void> {
  await tx.update(mutationRecord).set({ outcome: sql`${JSON.stringify(outcome ?? null)}::jsonb` }).where(and(eq(mutationRecord.firmId, firmId), eq(mutationRecord.id, id)))
}
