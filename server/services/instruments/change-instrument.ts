import { and, eq } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import type { NewCalibration } from '../../../shared/schemas/instruments'
import { recordEvent } from '../../db/queries/events'
import { lockInstrument } from '../../db/queries/instruments'
import { calibration, instrument } from '../../db/schema/reading'
import type { FirmContext } from '../firm-context'

/** Adds a calibration. Earlier ones stay: readings of their days rest on them. */
export async function recordCalibration(ctx: FirmContext, instrumentId: string, input: NewCalibration): Promise<{ done: true }> {
  return ctx.once(input.mutationId, 'record-calibration', { instrumentId, ...input }, async (tx) => {
    await lockInstrument(tx, ctx.firmId, instrumentId)
    const { doneOn, goodUntil, reference } = input
    await tx.insert(calibration).values({ firmId: ctx.firmId, id: uuidv7(), instrumentId, doneOn, goodUntil, reference })
    await recordEvent(tx, { type: 'instrument-changed', personId: ctx.person.id, detail: { instrumentId, what: 'calibrated', doneOn, goodUntil } })
    return { done: true as const }
  })
}

/** Takes an instrument out of use, or back into it. */
export async function switchInstrument(ctx: FirmContext, instrumentId: string, input: { mutationId: string, active: boolean }): Promise<{ done: true }> {
  return ctx.once(input.mutationId, 'switch-instrument', { instrumentId, ...input }, async (tx) => {
    await lockInstrument(tx, ctx.firmId, instrumentId)
    await tx.update(instrument).set({ active: input.active }).where(and(eq(instrument.firmId, ctx.firmId), eq(instrument.id, instrumentId)))
    await recordEvent(tx, { type: 'instrument-changed', personId: ctx.person.id, detail: { instrumentId, what: input.active ? 'into use' : 'out of use' } })
    return { done: true as const }
  })
}
