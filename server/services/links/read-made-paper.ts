import { and, eq } from 'drizzle-orm'
import { problem } from '../../../shared/utils/problem'
import { fileStore } from '../../adapters/files'
import type { FirmTx } from '../../db/firm-db'
import { paper } from '../../db/schema/certificate'

/** The stored hash of a made paper, or null while it is still being made. */
export async function findMadePaper(tx: FirmTx, firmId: string, kind: string, sourceId: string): Promise<{ id: string, sha256: string } | null> {
  const [row] = await tx.select({ id: paper.id, sha256: paper.sha256 }).from(paper).where(and(eq(paper.firmId, firmId), eq(paper.kind, kind), eq(paper.sourceId, sourceId), eq(paper.state, 'made')))
  return row?.sha256 ? { id: row.id, sha256: row.sha256 } : null
}

/** @throws try-later while the paper is not there yet */
export async function readMadeFile(made: { sha256: string } | null): Promise<Buffer> {
  const bytes = made && await fileStore().get(made.sha256)
  if (!bytes) throw problem('try-later', 'This file is still being made. Try again in a minute.')
  return bytes
}
