import { looseEnds as listLooseEnds, type LooseEnd } from '#shared/job/completeness'
import { judgeJob } from '#shared/job/judge/judge-job'
import { changeKind, removeKind, type ReadingPayload } from '#shared/job/mutations'
import { partSpec, type Part } from '#shared/job/parts'
import { mayDo, type Act } from '#shared/job/permissions'
import { mayChangeWork } from '#shared/job/stages'
import type { FieldValue } from '#shared/job/fields/field'
import type { HeldChange } from '~/stores/jobRecords'
import { londonDay } from '#shared/utils/dates'

/**
 * A job's record for one page: what it holds, what follows from it, and the only ways to change it.
 * No page or component of a job fetches or sends by itself.
 */
export function useJobRecord(jobId: string) {
  const store = useJobRecords()
  const { me } = useMe()
  const today = useState('today', () => londonDay(Date.now()))

  const record = computed(() => store.records[jobId] ?? null)
  const judgement = computed(() => record.value ? judgeJob(record.value, today.value) : null)
  const looseEnds = computed<LooseEnd[]>(() => record.value && judgement.value ? listLooseEnds(record.value, judgement.value, today.value) : [])

  const may = (act: Act) => me.value !== null && mayDo(me.value, act, record.value?.isOwn ?? false)

  /** Why the part cannot be changed just now, as a sentence, or null where it can. */
  function lockOf(part: Part): string | null {
    if (!record.value) return 'The job is being fetched.'
    if (partSpec(part).isWork && !mayChangeWork(record.value.job.stage)) return 'This work has been signed. A supervisor can send it back.'
    return may(partSpec(part).may) ? null : 'You can read this; changing it is for others in the firm.'
  }

  const rows = (part: Part) => record.value?.parts[part] ?? []
  const row = (part: Part, key: string) => rows(part).find(r => r.key === key) ?? null
  const value = (part: Part, key: string, field: string): FieldValue => row(part, key)?.content[field] ?? null

  const change = (part: Part, key: string, fields: Record<string, FieldValue>, position?: number) =>
    store.mutate(jobId, changeKind(part), { key, ...(position === undefined ? {} : { position }), fields })
  const remove = (part: Part, key: string) => store.mutate(jobId, removeKind(part), { key })
  const mutate = (kind: string, payload: Record<string, unknown>) => store.mutate(jobId, kind, payload)
  const addReading = (reading: Omit<ReadingPayload, 'deviceId'>) => store.mutate(jobId, 'add-reading', reading)

  /** What was entered here is put in over what stands there now, as a new change on the newest row. */
  async function useMine(change: HeldChange): Promise<void> {
    store.letGo(change)
    await store.mutate(jobId, change.mutation.kind, change.mutation.payload)
  }

  const held = computed(() => store.held.filter(change => change.mutation.jobId === jobId))
  const waiting = computed(() => store.waiting.filter(mutation => mutation.jobId === jobId).length)

  return { record, judgement, looseEnds, today, may, lockOf, rows, row, value, change, remove, mutate, addReading, held, waiting, keptAt: computed(() => store.keptAt), sentAt: computed(() => store.sentAt), isOffline: computed(() => store.isOffline), letGo: store.letGo, useMine, load: () => store.load(jobId) }
}
