import type { Mutation, MutationOutcome } from '../../shared/job/mutations'
import type { FirmTx } from '../db/firm-db'
import type { LockedJob } from '../db/queries/jobs'
import type { EventType } from '../db/queries/events'
import type { StageEvent } from '../../shared/job/stages'
import type { FirmContext } from '../services/firm-context'

export interface MutationInput<Payload> {
  tx: FirmTx
  ctx: FirmContext
  job: LockedJob
  mutation: Mutation
  payload: Payload
}

/** What applying gave: the row as it now stands and what the job's story says; or both versions where the base was stale. */
export type Applied
  = { event: EventType, detail?: Record<string, unknown>, moves?: StageEvent, row?: Extract<MutationOutcome, { status: 'applied' | 'repeated' }>['row'] }
    | { stale: Omit<Extract<MutationOutcome, { status: 'stale' }>, 'id' | 'status'> }

export type Apply<Payload> = (input: MutationInput<Payload>) => Promise<Applied>
