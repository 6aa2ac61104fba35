import { priceForm } from '#shared/schemas/quote'
import { changePrice } from '#server/services/quotes/change-price'

export default defineFirmHandler({ may: 'change-prices', body: priceForm }, ({ ctx, body }) => changePrice(ctx, body))
