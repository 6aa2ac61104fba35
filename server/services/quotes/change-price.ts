import { uuidv7 } from 'uuidv7'
import type { PriceForm } from '../../../shared/schemas/quote'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { keepPrice } from '../../db/queries/quotes'
import type { FirmContext } from '../firm-context'

/** Adds an item to the firm's price list or changes one. Quotes that were sent keep the price they were sent with. */
export async function changePrice(ctx: FirmContext, input: PriceForm): Promise<{ id: string }> {
  return ctx.once(input.mutationId, 'change-price', input, async (tx) => {
    const { mutationId: _, id: given, ...item } = input
    const id = given ?? uuidv7()
    if (!await keepPrice(tx, ctx.firmId, { ...item, id }, given === undefined)) throw problem('check-answers', 'This code is on the list already.', { fields: { code: 'Another item has this code: change that one, or choose another code' } })
    await recordEvent(tx, { type: 'price-changed', personId: ctx.person.id, detail: { priceId: id, code: item.code, netPence: item.netPence } })
    return { id }
  })
}
