import { and, eq, sql } from 'drizzle-orm'
import type { InstrumentLine } from '../../../shared/schemas/instruments'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../firm-db'
import { instrument } from '../schema/reading'

/** The firm's instruments with every calibration, the newest first. */
export async function listInstruments(tx: FirmTx, firmId: string): Promise<InstrumentLine[]> {
  const { rows } = await tx.execute<{ lines: InstrumentLine[] }>(sql`select coalesce(json_agg(json_build_object('id', i.id, 'name', i.name, 'description', i.description, 'serial', i.serial, 'functions', i.functions, 'active', i.active,
    'calibrations', coalesce((select json_agg(json_build_object('doneOn', k.done_on, 'goodUntil', k.good_until, 'reference', k.reference) order by k.good_until desc, k.done_on desc) from calibration k where k.firm_id = i.firm_id and k.instrument_id = i.id), '[]'::json)) order by i.active desc, i.name), '[]'::json) as lines from instrument i where i.firm_id = ${firmId}`)
  return rows[0]!.lines
}

/** The instrument with its row locked. */
export async function lockInstrument(tx: FirmTx, firmId: string, instrumentId: string): Promise<typeof instrument.$inferSelect> {
  const [row] = await tx.select().from(instrument).where(and(eq(instrument.firmId, firmId), eq(instrument.id, instrumentId))).for('update')
  if (!row) throw problem('not-found', 'There is no such instrument.')
  return row
}
