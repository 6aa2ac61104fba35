import { and, eq } from 'drizzle-orm'
import type { ReadingPayload } from '../../shared/job/mutations'
import { mayDo } from '../../shared/job/permissions'
import { testSpec } from '../../shared/job/tests.data'
import { londonDay } from '../../shared/utils/dates'
import { problem } from '../../shared/utils/problem'
import { calibration, instrument, reading, readingConfirmation } from '../db/schema/reading'
import { membership } from '../db/schema/firm'
import type { Apply, MutationInput } from './mutation'

/** Keeps a reading. Its id is its sender's; a second value for a test is a re-test beside the first, never in its place. */
export const addReading: Apply<ReadingPayload> = async (input) => {
  const { tx, ctx, job, mutation, payload } = input
  const measuredBy = payload.measuredBy ?? ctx.person.id
  const isTranscribed = measuredBy !== ctx.person.id
  if (!isTranscribed && !mayDo(ctx.person, 'take-readings', job.isOwn)) throw problem('not-allowed', 'Name who measured: you may type in a paper sheet, and the measurer then confirms it.', { fields: { measuredBy: 'Choose who measured' } })
  if (isTranscribed) await assertColleague(input, measuredBy)
  await assertInstrument(input)
  const kept = await tx.insert(reading).values({
    firmId: ctx.firmId, id: payload.id, jobId: job.id, test: payload.test, kind: payload.kind, shown: payload.shown, value: payload.value, unit: payload.unit, resolution: payload.resolution,
    reason: payload.reason, context: payload.context, instrumentId: payload.instrumentId, personId: measuredBy, typedBy: isTranscribed ? ctx.person.id : null, deviceId: payload.deviceId ?? null, deviceAt: new Date(mutation.at),
  }).onConflictDoNothing().returning({ id: reading.id })
  if (!kept.length) throw problem('check-answers', 'A reading of this id is already kept. Enter the figure again.')
  const page = testSpec(payload.test).page
  return { event: 'reading-added', detail: { readingId: payload.id, test: payload.test }, moves: page === 'supply' ? undefined : 'work-recorded' }
}

async function assertColleague({ tx, ctx }: MutationInput<ReadingPayload>, personId: string): Promise<void> {
  const [colleague] = await tx.select({ id: membership.personId }).from(membership).where(and(eq(membership.firmId, ctx.firmId), eq(membership.personId, personId)))
  if (!colleague) throw problem('check-answers', 'Choose who measured from the firm\'s people.', { fields: { measuredBy: 'Choose who measured' } })
}

/** A reading that needs an instrument names one of the firm's, for that use, in calibration on the day it was taken. */
async function assertInstrument({ tx, ctx, mutation, payload }: MutationInput<ReadingPayload>): Promise<void> {
  const needed = testSpec(payload.test).instrument
  const isMeasured = payload.kind === 'value' || payload.kind === 'over-range'
  if (!isMeasured || !needed || payload.context.byEnquiry) return
  if (!payload.instrumentId) throw problem('check-answers', 'Choose the instrument you measured with.', { fields: { instrumentId: 'Choose the instrument you measured with' } })
  const rows = await tx.select({ functions: instrument.functions, name: instrument.name, doneOn: calibration.doneOn, goodUntil: calibration.goodUntil }).from(instrument)
    .leftJoin(calibration, and(eq(calibration.firmId, instrument.firmId), eq(calibration.instrumentId, instrument.id)))
    .where(and(eq(instrument.firmId, ctx.firmId), eq(instrument.id, payload.instrumentId)))
  const [first] = rows
  if (!first) throw problem('check-answers', 'That instrument is not in your kit.', { fields: { instrumentId: 'Choose an instrument from the kit' } })
  if (!first.functions.includes(needed)) throw problem('check-answers', `${first.name} does not measure this.`, { fields: { instrumentId: `${first.name} does not measure this: choose another` } })
  const day = londonDay(mutation.at)
  if (!rows.some(row => row.doneOn !== null && row.doneOn <= day && row.goodUntil! >= day)) {
    const last = rows.map(row => row.goodUntil ?? '').sort().at(-1)
    throw problem('check-answers', `${first.name} is out of calibration: ${last ? `good until ${last}` : 'no calibration on file'}. Use another instrument.`, { fields: { instrumentId: `${first.name} is out of calibration` } })
  }
}

/** The measurer's word for a reading that somebody else typed in. */
export const confirmReading: Apply<{ readingId: string }> = async ({ tx, ctx, job, payload }) => {
  const [row] = await tx.select({ personId: reading.personId, typedBy: reading.typedBy }).from(reading).where(and(eq(reading.firmId, ctx.firmId), eq(reading.jobId, job.id), eq(reading.id, payload.readingId)))
  if (!row) throw problem('not-found', 'There is no such reading on this job.')
  if (row.personId !== ctx.person.id) throw problem('not-allowed', 'Only the person who measured can confirm the reading.')
  await tx.insert(readingConfirmation).values({ firmId: ctx.firmId, readingId: payload.readingId, personId: ctx.person.id }).onConflictDoNothing()
  return { event: 'reading-confirmed', detail: { readingId: payload.readingId } }
}
