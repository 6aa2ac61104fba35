import { and, desc, eq, isNull, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { FirmTx } from '../firm-db'
import { recordEvent } from './events'
import { customerLink } from '../schema/message'

export type LinkPurpose = 'photographs' | 'quote' | 'visit' | 'pack'

interface NewLinkRow { firmId: string, jobId: string, purpose: LinkPurpose, subjectId: string | null, tokenHash: string, sentTo: string, days: number | null }

export async function insertLink(tx: FirmTx, { days, ...link }: NewLinkRow): Promise<string> {
  const id = uuidv7()
  await tx.insert(customerLink).values({ id, ...link, expiresAt: days === null ? null : sql`now() + make_interval(days => ${days}::int)` as never })
  return id
}

/** Notes the first act through a link; reading leaves no trace, since mail scanners read too. */
export async function noteLinkUsed(tx: FirmTx, link: { firmId: string, linkId: string, jobId: string, purpose: LinkPurpose }): Promise<void> {
  const first = await tx.update(customerLink).set({ openedAt: sql`now()` }).where(and(eq(customerLink.firmId, link.firmId), eq(customerLink.id, link.linkId), isNull(customerLink.openedAt))).returning({ id: customerLink.id })
  if (first.length) await recordEvent(tx, { type: 'link-opened', jobId: link.jobId, detail: { linkId: link.linkId, purpose: link.purpose } })
}

/** Takes back every standing link to a subject; gives how many there were. */
export async function withdrawLinks(tx: FirmTx, firmId: string, purpose: LinkPurpose, subjectId: string): Promise<number> {
  const gone = await tx.update(customerLink).set({ withdrawnAt: sql`now()` })
    .where(and(eq(customerLink.firmId, firmId), eq(customerLink.purpose, purpose), eq(customerLink.subjectId, subjectId), isNull(customerLink.withdrawnAt))).returning({ id: customerLink.id })
  return gone.length
}

/** Takes back one link of a job; false where it is not there or was taken back before. */
export async function withdrawLink(tx: FirmTx, firmId: string, jobId: string, linkId: string): Promise<boolean> {
  const gone = await tx.update(customerLink).set({ withdrawnAt: sql`now()` })
    .where(and(eq(customerLink.firmId, firmId), eq(customerLink.jobId, jobId), eq(customerLink.id, linkId), isNull(customerLink.withdrawnAt))).returning({ id: customerLink.id })
  return gone.length > 0
}

export interface LinkView { id: string, purpose: LinkPurpose, subjectId: string | null, sentTo: string, madeAt: string, expiresAt: string | null, withdrawnAt: string | null, openedAt: string | null }

/** A job's links, the newest first. Their tokens are known to nobody but the customer. */
export async function findJobLinks(tx: FirmTx, firmId: string, jobId: string): Promise<LinkView[]> {
  const rows = await tx.select({ id: customerLink.id, purpose: customerLink.purpose, subjectId: customerLink.subjectId, sentTo: customerLink.sentTo, madeAt: customerLink.madeAt, expiresAt: customerLink.expiresAt, withdrawnAt: customerLink.withdrawnAt, openedAt: customerLink.openedAt })
    .from(customerLink).where(and(eq(customerLink.firmId, firmId), eq(customerLink.jobId, jobId))).orderBy(desc(customerLink.madeAt))
  return rows.map(({ madeAt, expiresAt, withdrawnAt, openedAt, purpose, ...row }) => ({ ...row, purpose: purpose as LinkPurpose, madeAt: madeAt.toISOString(), expiresAt: expiresAt?.toISOString() ?? null, withdrawnAt: withdrawnAt?.toISOString() ?? null, openedAt: openedAt?.toISOString() ?? null }))
}
