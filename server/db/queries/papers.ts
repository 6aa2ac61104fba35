import { sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { FirmTx } from '../firm-db'
import { paper } from '../schema/certificate'

export interface NewPaper { firmId: string, jobId: string, kind: 'pack' | 'draft' | 'notice' | 'quote' | 'invoice' | 'working', sourceId: string }

/** Asks for a paper to be made by the worker, once per source; gives its id. Part of the transaction it belongs to. */
export async function queuePaper(tx: FirmTx, wanted: NewPaper): Promise<string> {
  const [row] = await tx.insert(paper).values({ ...wanted, id: uuidv7(), isDraft: wanted.kind === 'draft' })
    .onConflictDoUpdate({ target: [paper.firmId, paper.kind, paper.sourceId], set: { state: sql`case when ${paper.state} = 'failed' then 'to-make' else ${paper.state} end` } }).returning({ id: paper.id })
  await tx.execute(sql`select graphile_worker.add_job('make-paper', json_build_object('firmId', ${wanted.firmId}::text, 'paperId', ${row!.id}::text), job_key := ${`paper:${row!.id}`}, max_attempts := 5)`)
  return row!.id
}
