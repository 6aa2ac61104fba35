import { uuidv7 } from 'uuidv7'
import { quoteTotal } from '../../../shared/pricing/quote-total'
import type { SendQuote } from '../../../shared/schemas/quote'
import { addDays, compareDays, daysBetween, londonDay } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { withdrawLinks } from '../../db/queries/links'
import { queueMessage } from '../../db/queries/outbox'
import { queuePaper } from '../../db/queries/papers'
import { findAddressee, findFirm, findQuotesOfJob, insertQuote, replaceOpenQuotes, takeNumber, type Addressee } from '../../db/queries/quotes'
import type { FirmContext } from '../firm-context'
import type { NeededLink } from '../links/customer-links'

/** The page must still say "run out", "accepted" or "deposit received" for a while; acts are held to the quote's own day. */
export const DAYS_READABLE_AFTER = 60
const LONGEST_DAYS = 365

/** Sends a quote: earlier ones that nobody accepted are replaced and their links taken back. */
export async function sendQuote(ctx: FirmContext, jobId: string, input: SendQuote): Promise<{ id: string, number: string }> {
  return ctx.once(input.mutationId, 'send-quote', { jobId, ...input }, async (tx) => {
    const { firmId } = ctx
    const locked = await lockJob(tx, firmId, jobId)
    if (locked.sideState === 'cancelled') throw problem('wrong-stage', 'This job is cancelled. Take it up again before you send a quote.')
    const [firm, to, earlier] = [await findFirm(tx, firmId), await findAddressee(tx, firmId, jobId), await findQuotesOfJob(tx, firmId, jobId)]
    const accepted = earlier.find(each => each.state === 'accepted')
    if (accepted) throw problem('wrong-stage', `The customer has accepted quote ${accepted.number}. Withdraw it before you send another.`)
    assertCanSend(input, to)
    const today = londonDay(Date.now())
    if (compareDays(input.expiresOn, today) < 0 || daysBetween(today, input.expiresOn) > LONGEST_DAYS) throw problem('check-answers', 'Look at the last day again.', { fields: { expiresOn: `Choose a day from today to ${LONGEST_DAYS} days ahead` } })

    const total = quoteTotal(input.lines, firm.vatNumber !== null, firm.settings.depositBp)
    if (total.grossPence <= 0) throw problem('check-answers', 'A quote must come to more than nothing.', { fields: { lines: 'Look at the prices again: the quote comes to nothing or less' } })
    for (const gone of await replaceOpenQuotes(tx, firmId, jobId)) await withdrawLinks(tx, firmId, 'quote', gone)

    const id = uuidv7()
    const number = await takeNumber(tx, 'quote', 'Q')
    await insertQuote(tx, { firmId, id, jobId, number, state: 'sent', expiresOn: input.expiresOn, terms: input.terms, netPence: total.netPence, vatPence: total.vatPence, grossPence: total.grossPence, depositPence: total.depositPence, sentAt: new Date() }, input.lines)
    await queueQuoteMail(tx, { firmId, jobId, to, quote: { id, number, ...total, expiresOn: input.expiresOn }, reason: 'sent' })
    await moveJob(tx, firmId, locked, 'quote-sent')
    await touchJob(tx, firmId, jobId)
    await recordEvent(tx, { type: 'quote-sent', jobId, personId: ctx.person.id, detail: { quoteId: id, number } })
    return { id, number }
  })
}

function assertCanSend(input: SendQuote, to: Addressee): void {
  if (!to.email) throw problem('check-answers', 'This customer has no e-mail address to send to. Enter one on the enquiry page.', { fields: { email: 'Enter the customer’s e-mail address on the enquiry page' } })
  if (!input.lines.length) throw problem('check-answers', 'Add at least one line.', { fields: { lines: 'Add at least one line' } })
}

interface QuoteMail { firmId: string, jobId: string, to: Addressee, quote: { id: string, number: string, grossPence: number, depositPence: number, expiresOn: string }, /** Tells one sending from the next, so that each is queued once. */ reason: string }

/** Queues the mail with the quote's link; the worker makes the link while it sends. */
export async function queueQuoteMail(tx: FirmTx, { firmId, jobId, to, quote, reason }: QuoteMail): Promise<void> {
  const days = Math.max(1, daysBetween(londonDay(Date.now()), addDays(quote.expiresOn, DAYS_READABLE_AFTER)))
  const needsLink: NeededLink = { kind: 'customer', purpose: 'quote', subjectId: quote.id, sentTo: to.email, days }
  const waitsForPaper = await queuePaper(tx, { firmId, jobId, kind: 'quote', sourceId: quote.id })
  await queueMessage(tx, {
    firmId, jobId, waitsForPaper, message: 'quote-sent', recipient: to.email, dedupeKey: `quote:${quote.id}:${reason}:${to.email}`,
    content: { customerName: to.name, shortAddress: to.shortAddress, number: quote.number, gross_pence: quote.grossPence, deposit_pence: quote.depositPence, validUntil: quote.expiresOn, needsLink },
  })
}
