import { and, eq, sql } from 'drizzle-orm'
import type { Part } from '../../../shared/job/parts'
import type { PartRow } from '../../../shared/types/record'
import type { FirmTx } from '../firm-db'
import * as parts from '../schema/parts'
import type { PartTable } from '../schema/parts'

/** Which table holds which part. */
export const PART_TABLES: Record<Part, PartTable> = {
  wanted: parts.wanted, consent: parts.consent, survey: parts.surveyAnswer, appliance: parts.appliance, recordedDemand: parts.recordedDemand,
  leg: parts.leg, circuit: parts.circuit, earthing: parts.earthingDecision, departure: parts.departure, equipment: parts.equipmentFitted,
  loadLimit: parts.loadLimit, putBack: parts.putBackItem, inspection: parts.inspectionOutcome, unexpected: parts.unexpectedSentence,
  statement: parts.statement, handover: parts.handover, promise: parts.promise,
} as unknown as Record<Part, PartTable>

export type StoredPartRow = PartRow & { removed: boolean }

const toRow = (row: PartTable['$inferSelect']): StoredPartRow =>
  ({ key: row.key, position: row.position, content: row.content, stamps: row.stamps, version: row.version, removed: row.removedAt !== null })

export async function findPartRow(tx: FirmTx, firmId: string, jobId: string, part: Part, key: string): Promise<StoredPartRow | null> {
  const table = PART_TABLES[part]
  const [row] = await tx.select().from(table).where(and(eq(table.firmId, firmId), eq(table.jobId, jobId), eq(table.key, key)))
  return row ? toRow(row) : null
}

/** Writes the row as it now stands (the job's row is locked by the caller). */
export async function keepPartRow(tx: FirmTx, firmId: string, jobId: string, part: Part, row: PartRow): Promise<void> {
  const table = PART_TABLES[part]
  const values = { firmId, jobId, key: row.key, position: row.position, content: row.content, stamps: row.stamps, version: row.version, removedAt: null }
  await tx.insert(table).values(values).onConflictDoUpdate({ target: [table.firmId, table.jobId, table.key], set: { position: row.position, content: row.content, stamps: row.stamps, version: row.version, removedAt: null } })
}

export async function removePartRow(tx: FirmTx, firmId: string, jobId: string, part: Part, key: string): Promise<void> {
  const table = PART_TABLES[part]
  await tx.update(table).set({ removedAt: sql`now()`, version: sql`${table.version} + 1` }).where(and(eq(table.firmId, firmId), eq(table.jobId, jobId), eq(table.key, key)))
}
