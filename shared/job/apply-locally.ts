/** What a mutation does to the record on the device, before and without the server: the page shows it at once. */
import type { JobRecord, PartRow, ReadingRow } from '../types/record'
import { mergeFields } from './merge-fields'
import { MUTATION_KINDS, type Mutation, type PartChange, type ReadingPayload } from './mutations'
import type { Part } from './parts'
import { stageAfter } from './stages'

/** What the kinds that are not parts carry, in one shape; each reads only its own. */
interface LocalPayload { fields: object, id: string, readingId: string, claim: string, sha256: string, takenAt: string, answer: string }

/** A new record with the mutation applied; the one given is not changed. */
export function applyLocally(record: JobRecord, mutation: Mutation, personId: string): JobRecord {
  const part = MUTATION_KINDS[mutation.kind]?.part
  if (part && mutation.kind.startsWith('remove-')) return withPart(record, part, record.parts[part].filter(row => row.key !== mutation.payload.key))
  if (part) return changeLocally(record, part, mutation, personId)
  const payload = mutation.payload as unknown as LocalPayload
  switch (mutation.kind) {
    case 'change-customer': return { ...record, customer: { ...record.customer, ...payload.fields } }
    case 'change-premises': return { ...record, premises: { ...record.premises, ...payload.fields } }
    case 'change-job': return { ...record, job: { ...record.job, ...payload.fields } }
    case 'add-reading': return { ...record, readings: [...record.readings, readingRow(mutation, personId)] }
    case 'confirm-reading': return { ...record, readings: record.readings.map(r => (r.id === payload.readingId ? { ...r, confirmedAt: mutation.at } : r)) }
    case 'keep-photograph': return { ...record, photographs: [...record.photographs.filter(p => p.id !== payload.id), { id: payload.id, claim: payload.claim, sha256: payload.sha256, thumbSha256: null, takenAt: payload.takenAt, personId, serverAt: mutation.at }] }
    case 'remove-photograph': return { ...record, photographs: record.photographs.filter(p => p.id !== payload.id) }
    case 'finish-survey': return { ...record, job: { ...record.job, stage: stageAfter(record.job.stage, 'survey-answered') ?? record.job.stage } }
    case 'answer-query': return { ...record, queries: record.queries.map(q => (q.id === payload.id ? { ...q, answer: payload.answer, answeredBy: personId, answeredAt: mutation.at } : q)) }
    default: return record
  }
}

function changeLocally(record: JobRecord, part: Part, mutation: Mutation, personId: string): JobRecord {
  const change = mutation.payload as unknown as PartChange
  const rows = record.parts[part]
  const current = rows.find(row => row.key === change.key) ?? null
  // On its own device a change always shows; whether it clashes is the server's to say.
  const merged = mergeFields(current, { ...change, baseVersion: Number.MAX_SAFE_INTEGER, by: personId, at: mutation.at })
  return withPart(record, part, putRow(rows, merged.row))
}

/** The rows with one put in its place: by position, then as they came. */
export function putRow(rows: PartRow[], row: PartRow): PartRow[] {
  const others = rows.some(r => r.key === row.key) ? rows.map(r => (r.key === row.key ? row : r)) : [...rows, row]
  return others.every((r, i) => i === 0 || others[i - 1]!.position <= r.position) ? others : [...others].sort((a, b) => a.position - b.position)
}

const withPart = (record: JobRecord, part: Part, rows: PartRow[]): JobRecord => ({ ...record, parts: { ...record.parts, [part]: rows } })

/** The record with a row as the server now has it. */
export const withServerRow = (record: JobRecord, part: Part, row: PartRow): JobRecord => withPart(record, part, putRow(record.parts[part], row))

function readingRow(mutation: Mutation, personId: string): ReadingRow {
  const payload = mutation.payload as unknown as ReadingPayload
  const measuredBy = payload.measuredBy ?? personId
  return { id: payload.id, test: payload.test, kind: payload.kind, shown: payload.shown, value: payload.value, unit: payload.unit, resolution: payload.resolution, reason: payload.reason ?? '', context: payload.context ?? {}, instrumentId: payload.instrumentId, personId: measuredBy, typedBy: measuredBy === personId ? null : personId, confirmedAt: null, deviceAt: mutation.at, serverAt: mutation.at }
}
