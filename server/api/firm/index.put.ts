import { firmChange } from '#shared/schemas/people'
import { changeFirm } from '#server/services/firm/change-firm'

export default defineFirmHandler({ may: 'change-settings', body: firmChange }, ({ ctx, body }) => changeFirm(ctx, body))
