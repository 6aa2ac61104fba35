import type { PaymentOutcome } from '../../../shared/schemas/customer'
import { lookUp, readAsFirm } from '../../db/firm-db'
import { findCheckoutState } from '../../db/queries/payments'
import { findFirm } from '../../db/queries/quotes'

/** What we know of a payment page, by the payment service's own unguessable id for it. */
export async function readPaymentOutcome(outsideId: string): Promise<PaymentOutcome> {
  const [found] = outsideId.length > 200 ? [] : await lookUp<{ firm_id: string, id: string }>('find-checkout', 'select * from find_checkout($1)', [outsideId])
  if (!found) return { state: 'unknown', firmName: null }
  return readAsFirm(found.firm_id, async (tx) => {
    const state = await findCheckoutState(tx, found.firm_id, found.id)
    return { state: state === 'paid' ? 'received' as const : 'waiting' as const, firmName: (await findFirm(tx, found.firm_id)).name }
  })
}
