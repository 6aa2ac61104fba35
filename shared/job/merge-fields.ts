/** How a change of some fields meets a row that may have moved on: different fields merge, the same field never picks a winner by itself. */
import type { PartContent, PartRow } from '../types/record'

export interface FieldChange {
  key: string
  position?: number
  fields: PartContent
  /** Version of the row the change was based on; null where the sender knew of none. */
  baseVersion: number | null
  by: string
  at: string
}

export type Merged = { stale: false, row: PartRow } | { stale: true, fields: string[], row: PartRow }

const same = (a: unknown, b: unknown) => JSON.stringify(a ?? null) === JSON.stringify(b ?? null)

/**
 * The row after the change. Stale where a field of the change was written by somebody after the version it was based
 * on, and to another value; then nothing is applied and both values go back.
 */
export function mergeFields(current: PartRow | null, change: FieldChange): Merged {
  const base: PartRow = current ?? { key: change.key, position: change.position ?? 0, content: {}, stamps: {}, version: 0 }
  const known = change.baseVersion ?? 0
  const changed = Object.keys(change.fields)
  const clashing = changed.filter((field) => {
    const stamp = base.stamps[field]
    return stamp !== undefined && stamp.v > known && stamp.by !== change.by && !same(base.content[field], change.fields[field])
  })
  if (clashing.length) return { stale: true, fields: clashing, row: base }

  const version = base.version + 1
  const stamps = { ...base.stamps }
  for (const field of changed) stamps[field] = { v: version, by: change.by, at: change.at }
  // An emptied field leaves no value behind; its stamp stays, so that a late change to it is still seen as late.
  const content = Object.fromEntries(Object.entries({ ...base.content, ...change.fields }).filter(([, value]) => value !== null && value !== undefined))
  return { stale: false, row: { key: base.key, position: change.position ?? base.position, content, stamps, version } }
}
