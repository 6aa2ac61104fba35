import { uuidv7 } from 'uuidv7'
import { quoteTotal } from '../../../shared/pricing/quote-total'
import { addDays, daysBetween, londonDay, type Day } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, touchJob } from '../../db/queries/jobs'
import { queuePaper } from '../../db/queries/papers'
import { findPartRow } from '../../db/queries/part-rows'
import { findInvoices, insertInvoice, paidForQuote } from '../../db/queries/payments'
import { findAddressee, findFirm, findQuoteLines, findQuotesOfJob, fullAddress, takeNumber } from '../../db/queries/quotes'
import type { InvoiceContent } from '../../documents/invoice/content'
import type { FirmContext } from '../firm-context'
import { firmOnPaper } from './invoice-paper'

const DAYS_TO_PAY = 14
/** An invoice given within so many days of the work moves the tax point to its own day. */
const TAX_POINT_DAYS = 14

/**
 * Issues the invoice for the balance once the work is handed over: what was quoted, less what came in. Its content is
 * frozen with it; its number follows the last one without a gap.
 */
export async function issueInvoice(ctx: FirmContext, jobId: string, mutationId: string): Promise<{ id: string, number: string, duePence: number }> {
  return ctx.once(mutationId, 'issue-invoice', { jobId }, async (tx) => {
    const { firmId } = ctx
    const job = await lockJob(tx, firmId, jobId)
    if (job.stage !== 'handed-over' && job.stage !== 'closed') throw problem('wrong-stage', 'The balance is invoiced once the pack has been handed over.')
    const quote = (await findQuotesOfJob(tx, firmId, jobId)).find(each => each.state === 'accepted')
    if (!quote) throw problem('wrong-stage', 'There is no accepted quote to invoice.')
    if ((await findInvoices(tx, firmId, jobId)).some(each => each.kind === 'balance')) throw problem('wrong-stage', 'The balance has been invoiced already.')
    const content = await invoiceContent(tx, firmId, jobId, quote)
    const id = uuidv7()
    await insertInvoice(tx, { firmId, id, jobId, number: content.number, kind: 'balance', state: content.due_pence > 0 ? 'sent' : 'paid', content, grossPence: content.gross_pence, duePence: content.due_pence, issuedOn: content.issued })
    await queuePaper(tx, { firmId, jobId, kind: 'invoice', sourceId: id })
    await touchJob(tx, firmId, jobId)
    await recordEvent(tx, { type: 'invoice-issued', jobId, personId: ctx.person.id, detail: { invoiceId: id, number: content.number } })
    return { id, number: content.number, duePence: content.due_pence }
  })
}

type AcceptedQuote = Awaited<ReturnType<typeof findQuotesOfJob>>[number]

async function invoiceContent(tx: FirmTx, firmId: string, jobId: string, quote: AcceptedQuote): Promise<InvoiceContent> {
  const [firm, to, lines] = [await findFirm(tx, firmId), await findAddressee(tx, firmId, jobId), await findQuoteLines(tx, firmId, quote.id)]
  const total = quoteTotal(lines, firm.vatNumber !== null, 0)
  const statement = await findPartRow(tx, firmId, jobId, 'statement', 'statement')
  const completed = statement?.content.completed_on
  const now = new Date()
  const issued = londonDay(now.getTime())
  const paid = await paidForQuote(tx, firmId, quote.id)
  return {
    number: await takeNumber(tx, 'invoice', 'INV-'),
    at: now.toISOString(),
    issued,
    taxPoint: taxPointOf(typeof completed === 'string' ? completed : issued, issued),
    dueBy: addDays(issued, DAYS_TO_PAY),
    firm: firmOnPaper(firm),
    customer: { name: to.name, address: fullAddress(to) },
    premises: { address: fullAddress(to), shortAddress: to.shortAddress },
    lines: lines.map((line, at) => ({ description: line.description, quantity: line.quantityThousandths / 1000, unit: line.unit, unitNet_pence: line.unitNetPence, net_pence: total.lineNetPence[at]!, vat_bp: firm.vatNumber ? line.vatBp : 0 })),
    rates: total.rates.map(({ vat_bp, net_pence, vat_pence }) => ({ vat_bp, net_pence, vat_pence })),
    net_pence: total.netPence, vat_pence: total.vatPence, gross_pence: total.grossPence,
    paid_pence: paid, grant_pence: 0, due_pence: total.grossPence - paid,
    payUrl: null, corrects: null,
  }
}

/** The day the work was done, or the invoice's own day where it follows within 14 days (rule COM-06; from memory). */
function taxPointOf(completed: Day, issued: Day): Day {
  const after = daysBetween(completed, issued)
  return after >= 0 && after <= TAX_POINT_DAYS ? issued : completed
}
