import type { PartChange } from '../../shared/job/mutations'
import { measuredHows, type Part } from '../../shared/job/parts'
import { mergeFields } from '../../shared/job/merge-fields'
import { problem } from '../../shared/utils/problem'
import { findPartRow, keepPartRow, removePartRow } from '../db/queries/part-rows'
import type { Apply } from './mutation'

const WORK_PARTS: readonly Part[] = ['equipment', 'putBack', 'inspection']

/** Changes some fields of one row of a part, making the row where there is none. */
export const changePart = (part: Part): Apply<PartChange> => async ({ tx, ctx, job, mutation, payload }) => {
  const onlyOffice = ctx.person.roles.length > 0 && ctx.person.roles.every(role => role === 'office')
  const measured = onlyOffice ? measuredHows(payload.fields) : []
  if (measured.length) throw problem('not-allowed', 'A measured value is entered by the person who measured it.', { fields: Object.fromEntries(measured.map(field => [field, 'Say "read" or "told": the office does not measure'])) })

  const current = await findPartRow(tx, ctx.firmId, job.id, part, payload.key)
  const merged = mergeFields(current, { ...payload, baseVersion: mutation.baseVersion, by: ctx.person.id, at: mutation.at })
  if (merged.stale) return { stale: { mine: payload.fields, theirs: { part, row: merged.row } } }

  await keepPartRow(tx, ctx.firmId, job.id, part, merged.row)
  const moves = WORK_PARTS.includes(part) || (part === 'circuit' && payload.key === 'installed') ? 'work-recorded' as const : undefined
  return { event: 'record-changed', detail: { part, key: payload.key, fields: Object.keys(payload.fields) }, moves, row: { part, row: merged.row } }
}

export const removePart = (part: Part): Apply<{ key: string }> => async ({ tx, ctx, job, payload }) => {
  await removePartRow(tx, ctx.firmId, job.id, part, payload.key)
  return { event: 'record-changed', detail: { part, key: payload.key, removed: true } }
}
