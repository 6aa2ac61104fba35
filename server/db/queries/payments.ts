import { and, asc, desc, eq, isNull, or, sql } from 'drizzle-orm'
import type { InvoiceView, OwedLine, PaymentView } from '../../../shared/schemas/quote'
import type { FirmTx } from '../firm-db'
import { outsideEvent } from '../schema/message'
import { checkout, invoice, payment } from '../schema/money'

export type StoredCheckout = typeof checkout.$inferSelect

/** Keeps an event of the payment service by its id; false where it was kept before. */
export async function keepOutsideEvent(tx: FirmTx, firmId: string, event: { id: string, kind: string, content: unknown }): Promise<boolean> {
  return (await tx.insert(outsideEvent).values({ firmId, ...event }).onConflictDoNothing().returning({ id: outsideEvent.id })).length > 0
}

export async function insertCheckout(tx: FirmTx, row: typeof checkout.$inferInsert): Promise<void> {
  await tx.insert(checkout).values(row)
}

export async function lockCheckout(tx: FirmTx, firmId: string, checkoutId: string): Promise<StoredCheckout | null> {
  const [row] = await tx.select().from(checkout).where(and(eq(checkout.firmId, firmId), eq(checkout.id, checkoutId))).for('update')
  return row ?? null
}

export async function changeCheckout(tx: FirmTx, firmId: string, checkoutId: string, set: Partial<typeof checkout.$inferInsert>): Promise<void> {
  await tx.update(checkout).set(set).where(and(eq(checkout.firmId, firmId), eq(checkout.id, checkoutId)))
}

/** Ties our row to the page that the payment service made for it; a second answer for the same row changes nothing. */
export async function noteCheckoutPage(tx: FirmTx, firmId: string, checkoutId: string, page: { outsideId: string, url: string }): Promise<void> {
  await tx.update(checkout).set(page).where(and(eq(checkout.firmId, firmId), eq(checkout.id, checkoutId), or(isNull(checkout.outsideId), eq(checkout.outsideId, page.outsideId))))
}

/** The quote's payment page that still stands for this amount, asked for less than 20 hours ago. */
export async function findOpenCheckout(tx: FirmTx, firmId: string, quoteId: string, pence: number): Promise<StoredCheckout | null> {
  const [row] = await tx.select().from(checkout)
    .where(and(eq(checkout.firmId, firmId), eq(checkout.quoteId, quoteId), eq(checkout.state, 'open'), eq(checkout.pence, pence), sql`${checkout.madeAt} > now() - interval '20 hours'`)).orderBy(desc(checkout.madeAt)).limit(1)
  return row ?? null
}

export async function countOddCheckouts(tx: FirmTx, firmId: string, jobId: string): Promise<number> {
  return tx.$count(checkout, and(eq(checkout.firmId, firmId), eq(checkout.jobId, jobId), eq(checkout.state, 'odd')))
}

/** Adds a payment; false where the same one stands already. */
export async function insertPayment(tx: FirmTx, row: typeof payment.$inferInsert): Promise<boolean> {
  return (await tx.insert(payment).values(row).onConflictDoNothing().returning({ id: payment.id })).length > 0
}

export async function findPayments(tx: FirmTx, firmId: string, jobId: string): Promise<PaymentView[]> {
  const rows = await tx.select({ id: payment.id, quoteId: payment.quoteId, pence: payment.pence, way: payment.way, at: payment.at }).from(payment).where(and(eq(payment.firmId, firmId), eq(payment.jobId, jobId))).orderBy(asc(payment.at))
  return rows.map(row => ({ ...row, at: row.at.toISOString() }))
}

/** What came in for a quote, less what was given back. */
export async function paidForQuote(tx: FirmTx, firmId: string, quoteId: string): Promise<number> {
  const [row] = await tx.select({ pence: sql<string>`coalesce(sum(${payment.pence}), 0)` }).from(payment).where(and(eq(payment.firmId, firmId), eq(payment.quoteId, quoteId)))
  return Number(row!.pence)
}

/** What was given back by card for one quote so far, as a positive amount. */
export async function refundedOf(tx: FirmTx, firmId: string, chargeId: string): Promise<number> {
  const [row] = await tx.select({ pence: sql<string>`coalesce(-sum(${payment.pence}), 0)` }).from(payment).where(and(eq(payment.firmId, firmId), eq(payment.way, 'card-refund'), sql`${payment.outsideId} like ${`${chargeId}:%`}`))
  return Number(row!.pence)
}

export async function insertInvoice(tx: FirmTx, row: typeof invoice.$inferInsert): Promise<void> {
  await tx.insert(invoice).values(row)
}

export async function findInvoices(tx: FirmTx, firmId: string, jobId: string): Promise<InvoiceView[]> {
  return tx.select({ id: invoice.id, number: invoice.number, kind: invoice.kind, state: invoice.state, grossPence: invoice.grossPence, duePence: invoice.duePence, issuedOn: invoice.issuedOn }).from(invoice).where(and(eq(invoice.firmId, firmId), eq(invoice.jobId, jobId))).orderBy(asc(invoice.madeAt))
}

export async function findInvoiceContent(tx: FirmTx, firmId: string, jobId: string, invoiceId: string): Promise<unknown> {
  const [row] = await tx.select({ content: invoice.content }).from(invoice).where(and(eq(invoice.firmId, firmId), eq(invoice.jobId, jobId), eq(invoice.id, invoiceId)))
  return row?.content ?? null
}

const MOST_OWED = 300

/** Every job with money still to come, the longest standing first: one statement however many. */
export async function findOwed(tx: FirmTx, firmId: string, today: string): Promise<OwedLine[]> {
  const { rows } = await tx.execute<{ line: OwedLine }>(sql`
    with standing as (
      select q.job_id, q.number, q.state, q.gross_pence, q.deposit_pence, q.expires_on, q.sent_at, q.accepted_at, i.number as invoice_number, i.due_pence, i.issued_on, i.made_at as issued_at, i.id as invoice_id, i.content ->> 'dueBy' as due_by,
        coalesce((select sum(p.pence) from payment p where p.firm_id = q.firm_id and p.job_id = q.job_id), 0)::int as paid
      from quote q left join invoice i on i.firm_id = q.firm_id and i.job_id = q.job_id and i.kind = 'balance'
      where q.firm_id = ${firmId} and q.state in ('sent','accepted')),
    owed as (
      select s.*, j.ref, j.id as jid, c.name as customer, p.address, j.stage, j.stage_since,
        case when s.state = 'sent' and s.expires_on < ${today}::date then 'quote-run-out' when s.state = 'sent' then 'quote-waiting'
          when s.invoice_id is not null then 'balance-due' when j.stage in ('handed-over','closed') then 'to-invoice'
          when s.paid < s.deposit_pence then 'deposit-unpaid' else 'deposit-paid' end as kind
      from standing s join job j on j.firm_id = ${firmId} and j.id = s.job_id and j.side_state is distinct from 'cancelled'
      join customer c on c.firm_id = j.firm_id and c.id = j.customer_id join premises p on p.firm_id = j.firm_id and p.id = j.premises_id)
    select json_build_object('jobId', jid, 'ref', ref, 'customer', customer, 'address', address, 'kind', kind, 'number', coalesce(invoice_number, number),
      'pence', case kind when 'quote-waiting' then gross_pence when 'quote-run-out' then gross_pence when 'deposit-unpaid' then deposit_pence - paid when 'deposit-paid' then paid else gross_pence - paid end,
      'since', case kind when 'quote-waiting' then sent_at when 'quote-run-out' then sent_at when 'balance-due' then issued_at when 'to-invoice' then stage_since else accepted_at end,
      'day', case kind when 'quote-waiting' then expires_on::text when 'quote-run-out' then expires_on::text when 'balance-due' then due_by else null end) as line
    from owed where not (kind in ('balance-due', 'to-invoice') and gross_pence <= paid)
    order by array_position(array['balance-due','to-invoice','deposit-unpaid','quote-run-out','quote-waiting','deposit-paid'], kind), coalesce(sent_at, accepted_at) limit ${MOST_OWED}`)
  return rows.map(row => row.line)
}

export async function findCheckoutState(tx: FirmTx, firmId: string, checkoutId: string): Promise<string | null> {
  const [row] = await tx.select({ state: checkout.state }).from(checkout).where(and(eq(checkout.firmId, firmId), eq(checkout.id, checkoutId)))
  return row?.state ?? null
}
