/**
 * The records of jobs on this device and the changes on their way to the server. Everything a page of a job reads or
 * writes goes through here (by `useJobRecord`). It lives in memory and sends at once; what makes it durable and lets it
 * wait for a signal can come in behind these functions without a page knowing.
 */
import { defineStore } from 'pinia'
import { uuidv7 } from 'uuidv7'
import { applyLocally, withServerRow } from '#shared/job/apply-locally'
import { MUTATION_KINDS, type Mutation, type MutationOutcome } from '#shared/job/mutations'
import type { Part } from '#shared/job/parts'
import type { JobRecord, PartRow } from '#shared/types/record'
import type { Problem } from '#shared/utils/problem'

/** A change the server did not take as it was: what was meant, and what stands there now. */
export interface HeldChange { mutation: Mutation, stale?: Extract<MutationOutcome, { status: 'stale' }>, problem?: Problem }

const RETRY_MS = 3_000

export const useJobRecords = defineStore('jobRecords', () => {
  const records = shallowRef<Record<string, JobRecord>>({})
  const waiting = shallowRef<Mutation[]>([])
  const held = shallowRef<HeldChange[]>([])
  const keptAt = ref<string | null>(null)
  const sentAt = ref<string | null>(null)
  const isOffline = ref(false)
  const signInAgain = useSignInAgain()
  // Asked for here: after an await the framework no longer knows whose request it is.
  const { me } = useMe()
  let sending: Promise<void> | null = null

  const put = (record: JobRecord) => records.value = { ...records.value, [record.job.id]: record }

  async function load(jobId: string): Promise<JobRecord> {
    const fresh = await callApi<JobRecord>(`/api/jobs/${jobId}/record`)
    // What has not been sent yet stays on top of what the server knows.
    put(waiting.value.filter(m => m.jobId === jobId).reduce((record, m) => applyLocally(record, m, me.value?.id ?? ''), fresh))
    return records.value[jobId]!
  }

  function baseVersionOf(jobId: string, kind: string, payload: Record<string, unknown>): number | null {
    const part = MUTATION_KINDS[kind]?.part
    return part ? records.value[jobId]?.parts[part].find(row => row.key === payload.key)?.version ?? null : null
  }

  /** Applies the change here and sends it; resolves once the server has answered for it. */
  async function mutate(jobId: string, kind: string, payload: Record<string, unknown>): Promise<void> {
    const record = records.value[jobId]
    if (!record) return
    const mutation: Mutation = { id: uuidv7(), kind, jobId, baseVersion: baseVersionOf(jobId, kind, payload), at: new Date().toISOString(), payload }
    put(applyLocally(record, mutation, me.value?.id ?? ''))
    waiting.value = [...waiting.value, mutation]
    keptAt.value = mutation.at
    await send()
  }

  function send(): Promise<void> {
    sending ??= sendAll().finally(() => sending = null)
    return sending
  }

  async function sendAll(): Promise<void> {
    while (waiting.value.length) {
      const batch = waiting.value.slice(0, 100)
      try {
        const { outcomes } = await callApi<{ outcomes: MutationOutcome[] }>('/api/mutations', { method: 'POST', body: { items: batch } })
        isOffline.value = false
        sentAt.value = new Date().toISOString()
        waiting.value = waiting.value.slice(batch.length)
        outcomes.forEach((outcome, i) => settle(batch[i]!, outcome))
        if (outcomes.some(outcome => outcome.status === 'refused')) await Promise.all([...new Set(batch.map(m => m.jobId))].map(load))
      }
      catch (error) {
        const { code } = readProblem(error)
        isOffline.value = code === 'try-later'
        if (code === 'not-signed-in') signInAgain.value = true
        if (import.meta.client) setTimeout(send, RETRY_MS)
        return
      }
    }
  }

  function settle(mutation: Mutation, outcome: MutationOutcome): void {
    const record = records.value[mutation.jobId]
    if (outcome.status === 'stale') held.value = [...held.value, { mutation, stale: outcome }]
    if (outcome.status === 'refused') held.value = [...held.value, { mutation, problem: outcome.problem as Problem }]
    if (!record) return
    const row = outcome.status === 'stale' ? outcome.theirs : outcome.status === 'refused' ? undefined : outcome.row
    const laterOnSameRow = row && waiting.value.some(m => m.jobId === mutation.jobId && MUTATION_KINDS[m.kind]?.part === row.part && m.payload.key === (row.row as PartRow).key)
    const rebased = row && !laterOnSameRow ? withServerRow(record, row.part as Part, row.row as PartRow) : record
    put(outcome.status === 'applied' || outcome.status === 'repeated' ? { ...rebased, job: { ...rebased.job, recordVersion: outcome.recordVersion } } : rebased)
  }

  const letGo = (change: HeldChange) => held.value = held.value.filter(other => other !== change)

  return { records, waiting, held, keptAt, sentAt, isOffline, load, mutate, send, letGo }
})
