import { uuidv7 } from 'uuidv7'
import { problem } from '../../../shared/utils/problem'
import type { PaymentService } from '../../adapters/payments'
import { changeAsFirm } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { findOpenCheckout, insertCheckout, noteCheckoutPage, paidForQuote } from '../../db/queries/payments'
import { findAddressee, lockQuote } from '../../db/queries/quotes'
import { customerAct, type FoundLink } from '../links/customer-links'

/**
 * Gives the address of the payment page for an accepted quote's deposit. The amount is ours; the service is asked
 * outside any transaction and by one key a checkout, so that a repeat opens the same page.
 */
export async function askDeposit(link: FoundLink, mutationId: string, payments: PaymentService | null, baseUrl: string): Promise<{ url: string }> {
  if (!payments) throw problem('try-later', 'Card payments are not open just now. Ask the firm how to pay.')
  const open = await customerAct(link, mutationId, 'ask-deposit', {}, async (tx) => {
    if (!link.subjectId) throw problem('not-found', 'There is no such quote.')
    const quote = await lockQuote(tx, link.firmId, link.subjectId)
    if (quote.state !== 'accepted') throw problem('wrong-stage', 'Accept the quote first. The deposit is due after that.')
    const pence = quote.depositPence - await paidForQuote(tx, link.firmId, quote.id)
    if (pence <= 0) throw problem('wrong-stage', 'The deposit has been received already. There is nothing more to pay now.')
    const to = await findAddressee(tx, link.firmId, link.jobId)
    const description = `Deposit for quote ${quote.number}`
    const standing = await findOpenCheckout(tx, link.firmId, quote.id, pence)
    if (standing) return { checkoutId: standing.id, pence, url: standing.url, description, email: to.email }
    const checkoutId = uuidv7()
    await insertCheckout(tx, { firmId: link.firmId, id: checkoutId, jobId: link.jobId, quoteId: quote.id, pence })
    await recordEvent(tx, { type: 'deposit-asked', jobId: link.jobId, detail: { quoteId: quote.id, checkoutId, pence } })
    return { checkoutId, pence, url: null, description, email: to.email }
  })
  if (open.url) return { url: open.url }
  const page = await payments.askCheckout({
    firmId: link.firmId, checkoutId: open.checkoutId, pence: open.pence, description: open.description, email: open.email || null,
    // The link's token stays out of these: they are handed to the payment service.
    successUrl: `${baseUrl}/c/paid?page={CHECKOUT_SESSION_ID}`, cancelUrl: `${baseUrl}/c/paid?left=yes`,
  }).catch(() => {
    throw problem('try-later', 'The payment page could not be opened just now. Your acceptance stands: try again in a moment.')
  })
  await changeAsFirm(link.firmId, tx => noteCheckoutPage(tx, link.firmId, open.checkoutId, page))
  return { url: page.url }
}
