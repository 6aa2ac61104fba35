import { paidForQuote } from '../../db/queries/payments'
import { compareDays, londonDay } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { withdrawLink, withdrawLinks } from '../../db/queries/links'
import { changeQuote, findAddressee, lockQuote, type StoredQuote } from '../../db/queries/quotes'
import type { FirmContext } from '../firm-context'
import { queueQuoteMail } from './send-quote'

async function lockQuoteOfJob(tx: FirmTx, firmId: string, jobId: string, quoteId: string): Promise<StoredQuote> {
  const quote = await lockQuote(tx, firmId, quoteId)
  if (quote.jobId !== jobId) throw problem('not-found', 'There is no such quote.')
  return quote
}

/** The job goes on without a quote: the work is agreed already. */
export async function skipQuote(ctx: FirmContext, jobId: string, mutationId: string): Promise<{ stage: string }> {
  return ctx.once(mutationId, 'quote-not-needed', { jobId }, async (tx) => {
    const locked = await lockJob(tx, ctx.firmId, jobId)
    const stage = await moveJob(tx, ctx.firmId, locked, 'quote-not-needed')
    if (stage === locked.stage) throw problem('wrong-stage', 'This job is past its quote already.')
    await touchJob(tx, ctx.firmId, jobId)
    await recordEvent(tx, { type: 'quote-not-needed', jobId, personId: ctx.person.id })
    return { stage }
  })
}

/** Takes a quote back: its links open nothing afterwards. Refused once money has come in for it. */
export async function withdrawQuote(ctx: FirmContext, jobId: string, quoteId: string, mutationId: string): Promise<{ state: string }> {
  return ctx.once(mutationId, 'withdraw-quote', { jobId, quoteId }, async (tx) => {
    await lockJob(tx, ctx.firmId, jobId)
    const quote = await lockQuoteOfJob(tx, ctx.firmId, jobId, quoteId)
    if (quote.state === 'replaced') throw problem('wrong-stage', 'This quote was taken back already.')
    if (await paidForQuote(tx, ctx.firmId, quoteId) > 0) throw problem('wrong-stage', 'Money has come in for this quote. Give it back through the payment service first.')
    await changeQuote(tx, ctx.firmId, quoteId, { state: 'replaced' })
    await withdrawLinks(tx, ctx.firmId, 'quote', quoteId)
    await touchJob(tx, ctx.firmId, jobId)
    await recordEvent(tx, { type: 'link-withdrawn', jobId, personId: ctx.person.id, detail: { quoteId, number: quote.number } })
    return { state: 'replaced' }
  })
}

/** Sends the customer a fresh link to a quote that stands; the earlier ones open nothing afterwards. */
export async function sendQuoteAgain(ctx: FirmContext, jobId: string, quoteId: string, mutationId: string): Promise<{ sentTo: string }> {
  return ctx.once(mutationId, 'send-quote-again', { jobId, quoteId }, async (tx) => {
    const quote = await lockQuoteOfJob(tx, ctx.firmId, jobId, quoteId)
    const stands = quote.state === 'accepted' || (quote.state === 'sent' && quote.expiresOn !== null && compareDays(quote.expiresOn, londonDay(Date.now())) >= 0)
    if (!stands) throw problem('wrong-stage', 'This quote no longer stands. Send a new one.')
    const to = await findAddressee(tx, ctx.firmId, jobId)
    if (!to.email) throw problem('check-answers', 'This customer has no e-mail address to send to. Enter one on the enquiry page.')
    await withdrawLinks(tx, ctx.firmId, 'quote', quoteId)
    await queueQuoteMail(tx, { firmId: ctx.firmId, jobId, to, quote: { ...quote, expiresOn: quote.expiresOn! }, reason: mutationId })
    await touchJob(tx, ctx.firmId, jobId)
    await recordEvent(tx, { type: 'message-sent-again', jobId, personId: ctx.person.id, detail: { quoteId } })
    return { sentTo: to.email }
  })
}

/** Takes back one customer link of a job, whatever it is for. */
export async function takeBackLink(ctx: FirmContext, jobId: string, input: { mutationId: string, linkId: string }): Promise<{ done: true }> {
  return ctx.once(input.mutationId, 'withdraw-link', { jobId, linkId: input.linkId }, async (tx) => {
    if (!await withdrawLink(tx, ctx.firmId, jobId, input.linkId)) throw problem('not-found', 'This link was taken back already.')
    await recordEvent(tx, { type: 'link-withdrawn', jobId, personId: ctx.person.id, detail: { linkId: input.linkId } })
    return { done: true as const }
  })
}
