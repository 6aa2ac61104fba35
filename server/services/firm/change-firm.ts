import { eq } from 'drizzle-orm'
import type { FirmChange } from '../../../shared/schemas/people'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { firm } from '../../db/schema/firm'
import type { FirmContext } from '../firm-context'

/** Changes the firm's details and settings. Sealed certificates and papers already made keep what they were made with. */
export async function changeFirm(ctx: FirmContext, input: FirmChange): Promise<{ done: true }> {
  return ctx.once(input.mutationId, 'change-firm', input, async (tx) => {
    const [before] = await tx.select().from(firm).where(eq(firm.id, ctx.firmId)).for('update')
    if (!before) throw problem('not-found', 'There is no such firm.')
    const { mutationId: _, selfCountersign, depositPercent, quoteDays, vatNumber, ...details } = input
    const settings = { ...before.settings, selfCountersign, depositBp: Math.round(depositPercent * 100), quoteDays }
    await tx.update(firm).set({ ...details, vatNumber: vatNumber || null, settings }).where(eq(firm.id, ctx.firmId))
    const changed = Object.entries({ ...details, vatNumber: vatNumber || null, ...settings }).filter(([key, value]) => ({ ...before, ...before.settings } as Record<string, unknown>)[key] !== value).map(([key]) => key)
    await recordEvent(tx, { type: 'settings-changed', personId: ctx.person.id, detail: { fields: changed, ...(before.settings.selfCountersign === selfCountersign ? {} : { selfCountersign }) } })
    return { done: true as const }
  })
}
