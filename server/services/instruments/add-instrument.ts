import { uuidv7 } from 'uuidv7'
import type { NewInstrument } from '../../../shared/schemas/instruments'
import { recordEvent } from '../../db/queries/events'
import { calibration, instrument } from '../../db/schema/reading'
import type { FirmContext } from '../firm-context'

/** Puts an instrument on file with the calibration it came with: without one it could not be used. */
export async function addInstrument(ctx: FirmContext, input: NewInstrument): Promise<{ id: string }> {
  return ctx.once(input.mutationId, 'add-instrument', input, async (tx) => {
    const { name, description, serial, functions, doneOn, goodUntil, reference } = input
    const id = uuidv7()
    await tx.insert(instrument).values({ firmId: ctx.firmId, id, name, description, serial, functions })
    await tx.insert(calibration).values({ firmId: ctx.firmId, id: uuidv7(), instrumentId: id, doneOn, goodUntil, reference })
    await recordEvent(tx, { type: 'instrument-changed', personId: ctx.person.id, detail: { instrumentId: id, what: 'added', goodUntil } })
    return { id }
  })
}
