/** What a customer may do with a quote: accept it once, decline it with a reason, ask about it. */
import type { AcceptQuote, Ask, DeclineQuote } from '../../../shared/schemas/customer'
import { formatDay, londonDay } from '../../../shared/utils/dates'
import { formatPounds } from '../../../shared/utils/money'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { lockJob, moveJob, touchJob } from '../../db/queries/jobs'
import { changeQuote, findAddressee, handToOffice, lockQuote, type StoredQuote } from '../../db/queries/quotes'
import { customerAct, type FoundLink } from '../links/customer-links'
import { tellFirm } from '../links/tell-firm'
import { stateOf } from './customer-quote'

export async function acceptQuote(link: FoundLink, input: AcceptQuote): Promise<{ state: 'accepted', depositPence: number }> {
  return customerAct(link, input.mutationId, 'accept-quote', input, async (tx) => {
    const locked = await lockJob(tx, link.firmId, link.jobId)
    const quote = await lockOpenQuote(tx, link)
    if (quote.version !== input.version) throw problem('stale-copy', 'The firm has changed this quote since you opened it. Read it again before you accept it.')
    if (locked.sideState === 'cancelled') throw problem('wrong-stage', 'The firm has closed this job. Ask them before you accept.')
    await changeQuote(tx, link.firmId, quote.id, { state: 'accepted', acceptedAt: new Date(), acceptedName: input.name })
    await moveJob(tx, link.firmId, locked, 'quote-accepted')
    await touchJob(tx, link.firmId, link.jobId)
    await recordEvent(tx, { type: 'quote-accepted', jobId: link.jobId, detail: { quoteId: quote.id, linkId: link.linkId, startEarly: input.startEarly } })
    const to = await findAddressee(tx, link.firmId, link.jobId)
    await tellFirm(tx, link.firmId, link.jobId, `accepted:${quote.id}`, {
      subject: `Quote ${quote.number} accepted: ${to.shortAddress}`,
      sentences: [`${input.name} has accepted quote ${quote.number}, ${formatPounds(quote.grossPence)} with VAT.`, input.startEarly ? 'They ask for work to begin within the 14 days for cancelling.' : 'They do not ask for work to begin within the 14 days for cancelling: book it after them, or get their request in writing.'],
      path: `/jobs/${link.jobId}/quote`,
    })
    return { state: 'accepted' as const, depositPence: quote.depositPence }
  })
}

export async function declineQuote(link: FoundLink, input: DeclineQuote): Promise<{ state: 'declined' }> {
  return customerAct(link, input.mutationId, 'decline-quote', input, async (tx) => {
    await lockJob(tx, link.firmId, link.jobId)
    const quote = await lockOpenQuote(tx, link)
    await changeQuote(tx, link.firmId, quote.id, { state: 'declined', declinedAt: new Date(), declinedReason: input.reason })
    await handToOffice(tx, link.firmId, link.jobId, `The customer declined quote ${quote.number}`)
    await touchJob(tx, link.firmId, link.jobId)
    await recordEvent(tx, { type: 'quote-declined', jobId: link.jobId, detail: { quoteId: quote.id } })
    const to = await findAddressee(tx, link.firmId, link.jobId)
    await tellFirm(tx, link.firmId, link.jobId, `declined:${quote.id}`, { subject: `Quote ${quote.number} declined: ${to.shortAddress}`, sentences: [`${to.name} has declined quote ${quote.number}. Their words:`, input.reason], path: `/jobs/${link.jobId}/quote` })
    return { state: 'declined' as const }
  })
}

/** A question from a customer's page, told to the firm with what it is about; any link may ask. */
export async function askFirm(link: FoundLink, input: Ask): Promise<{ sent: true }> {
  return customerAct(link, input.mutationId, 'ask-firm', input, async (tx) => {
    const to = await findAddressee(tx, link.firmId, link.jobId)
    await handToOffice(tx, link.firmId, link.jobId, 'The customer asks a question')
    await touchJob(tx, link.firmId, link.jobId)
    await tellFirm(tx, link.firmId, link.jobId, `question:${input.mutationId}`, {
      subject: `Question from ${to.name}: ${to.shortAddress}`,
      sentences: [...(input.about ? [`About: ${input.about}`] : []), input.question, `Answer to ${[to.email, to.telephone].filter(Boolean).join(' or ')}.`],
      path: link.purpose === 'quote' ? `/jobs/${link.jobId}/quote` : `/jobs/${link.jobId}`,
    })
    return { sent: true as const }
  })
}

/** @throws wrong-stage with what has become of the quote, where it is no longer open */
async function lockOpenQuote(tx: FirmTx, link: FoundLink): Promise<StoredQuote> {
  if (!link.subjectId) throw problem('not-found', 'There is no such quote.')
  const quote = await lockQuote(tx, link.firmId, link.subjectId)
  const state = stateOf(quote, 0, londonDay(Date.now()))
  if (state === 'open') return quote
  throw problem('wrong-stage', {
    'run-out': `This quote stood until ${quote.expiresOn ? formatDay(quote.expiresOn) : 'its last day'}. Ask the firm for a fresh one.`,
    'accepted': 'This quote has been accepted already.',
    'deposit-received': 'This quote has been accepted already.',
    'declined': 'This quote has been declined. Ask the firm for a fresh one if you have changed your mind.',
    'replaced': 'The firm has taken this quote back.',
  }[state])
}
