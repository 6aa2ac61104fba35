import { and, asc, eq, inArray, sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { PriceItem, QuoteLineForm } from '../../../shared/schemas/quote'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../firm-db'
import { customer, premises } from '../schema/customer'
import { firm } from '../schema/firm'
import { job } from '../schema/job'
import { priceItem, quote, quoteLine } from '../schema/money'

export type StoredQuote = typeof quote.$inferSelect
export type StoredQuoteLine = typeof quoteLine.$inferSelect

export async function findQuote(tx: FirmTx, firmId: string, quoteId: string): Promise<StoredQuote | null> {
  const [row] = await tx.select().from(quote).where(and(eq(quote.firmId, firmId), eq(quote.id, quoteId)))
  return row ?? null
}

/** The quote with its row locked until the transaction ends. */
export async function lockQuote(tx: FirmTx, firmId: string, quoteId: string): Promise<StoredQuote> {
  const [row] = await tx.select().from(quote).where(and(eq(quote.firmId, firmId), eq(quote.id, quoteId))).for('update')
  if (!row) throw problem('not-found', 'There is no such quote.')
  return row
}

export async function findQuoteLines(tx: FirmTx, firmId: string, quoteId: string): Promise<StoredQuoteLine[]> {
  return tx.select().from(quoteLine).where(and(eq(quoteLine.firmId, firmId), eq(quoteLine.quoteId, quoteId))).orderBy(asc(quoteLine.position), asc(quoteLine.id))
}

export async function findQuotesOfJob(tx: FirmTx, firmId: string, jobId: string): Promise<StoredQuote[]> {
  return tx.select().from(quote).where(and(eq(quote.firmId, firmId), eq(quote.jobId, jobId))).orderBy(asc(quote.madeAt))
}

export async function insertQuote(tx: FirmTx, row: typeof quote.$inferInsert, lines: readonly QuoteLineForm[]): Promise<void> {
  await tx.insert(quote).values(row)
  await tx.insert(quoteLine).values(lines.map((line, position) => ({ firmId: row.firmId, id: uuidv7(), quoteId: row.id, position, ...line })))
}

export async function changeQuote(tx: FirmTx, firmId: string, quoteId: string, set: Partial<typeof quote.$inferInsert>): Promise<void> {
  await tx.update(quote).set({ ...set, version: sql`${quote.version} + 1` as never }).where(and(eq(quote.firmId, firmId), eq(quote.id, quoteId)))
}

/** Marks a job's open quotes as replaced; gives their ids. */
export async function replaceOpenQuotes(tx: FirmTx, firmId: string, jobId: string): Promise<string[]> {
  const rows = await tx.update(quote).set({ state: 'replaced', version: sql`${quote.version} + 1` as never })
    .where(and(eq(quote.firmId, firmId), eq(quote.jobId, jobId), inArray(quote.state, ['draft', 'sent', 'declined', 'expired']))).returning({ id: quote.id })
  return rows.map(row => row.id)
}

/** The next number of a series, such as `Q0012`: without gaps, since the transaction keeps the counter's row. */
export async function takeNumber(tx: FirmTx, series: 'quote' | 'invoice', prefix: string): Promise<string> {
  const { rows: [row] } = await tx.execute<{ n: number }>(sql`select next_number(${series}) as n`)
  return `${prefix}${String(row!.n).padStart(4, '0')}`
}

export type FirmRow = typeof firm.$inferSelect

export async function findFirm(tx: FirmTx, firmId: string): Promise<FirmRow> {
  const [row] = await tx.select().from(firm).where(eq(firm.id, firmId))
  return row!
}

export interface Addressee { name: string, email: string, telephone: string, address: string, town: string, postcode: string, shortAddress: string }

/** Whom a job's papers and mails are for, and where the work is. */
export async function findAddressee(tx: FirmTx, firmId: string, jobId: string): Promise<Addressee> {
  const [row] = await tx.select({ name: customer.name, email: customer.email, telephone: customer.telephone, address: premises.address, town: premises.town, postcode: premises.postcode })
    .from(job).innerJoin(customer, and(eq(customer.firmId, job.firmId), eq(customer.id, job.customerId))).innerJoin(premises, and(eq(premises.firmId, job.firmId), eq(premises.id, job.premisesId)))
    .where(and(eq(job.firmId, firmId), eq(job.id, jobId)))
  if (!row) throw problem('not-found', 'There is no such job.')
  return { ...row, shortAddress: shortAddress(row.address) }
}

/** "19 Hill Street" of "19 Hill Street, Upper Ford". */
export const shortAddress = (address: string) => address.split(/[,\n]/)[0]!.trim()

export const fullAddress = (to: Pick<Addressee, 'address' | 'town' | 'postcode'>) => [to.address.replace(/\s*\n\s*/g, ', '), to.town, to.postcode].filter(part => part.trim()).join(', ')

export async function findPrices(tx: FirmTx, firmId: string): Promise<PriceItem[]> {
  return tx.select({ id: priceItem.id, code: priceItem.code, description: priceItem.description, unit: priceItem.unit, netPence: priceItem.netPence, vatBp: priceItem.vatBp, active: priceItem.active })
    .from(priceItem).where(eq(priceItem.firmId, firmId)).orderBy(asc(priceItem.code))
}

/** Adds an item, or changes the one of that id; false where its code belongs to another item, or there is none of that id. */
export async function keepPrice(tx: FirmTx, firmId: string, item: Omit<PriceItem, 'id'> & { id: string }, isNew: boolean): Promise<boolean> {
  const [taken] = await tx.select({ id: priceItem.id }).from(priceItem).where(and(eq(priceItem.firmId, firmId), eq(priceItem.code, item.code)))
  if (taken && taken.id !== item.id) return false
  if (isNew) return (await tx.insert(priceItem).values({ firmId, ...item }).onConflictDoNothing().returning({ id: priceItem.id })).length > 0
  const { id, ...set } = item
  return (await tx.update(priceItem).set(set).where(and(eq(priceItem.firmId, firmId), eq(priceItem.id, id))).returning({ id: priceItem.id })).length > 0
}

/** The job waits on the office, for a reason that people read beside it. */
export async function handToOffice(tx: FirmTx, firmId: string, jobId: string, note: string): Promise<void> {
  await tx.update(job).set({ withWhom: 'office', sideNote: note, changedAt: sql`now()` }).where(and(eq(job.firmId, firmId), eq(job.id, jobId)))
}
