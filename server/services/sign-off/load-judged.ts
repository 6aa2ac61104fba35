import { looseEnds, maySign } from '../../../shared/job/completeness'
import { judgeJob } from '../../../shared/job/judge/judge-job'
import type { Judgement } from '../../../shared/job/judge/types'
import type { JobRecord } from '../../../shared/types/record'
import { londonDay } from '../../../shared/utils/dates'
import { problem } from '../../../shared/utils/problem'
import type { FirmTx } from '../../db/firm-db'
import { findJobRecord } from '../../db/queries/job-record'
import type { FirmContext } from '../firm-context'

/** The record as it stands in this transaction, and what follows from it on the server's day. */
export async function loadJudged(tx: FirmTx, ctx: FirmContext, jobId: string): Promise<{ record: JobRecord, judgement: Judgement, today: string }> {
  const record = await findJobRecord(tx, ctx.firmId, jobId, ctx.person.crewId)
  if (!record) throw problem('not-found', 'There is no such job.')
  const today = londonDay(Date.now())
  return { record, judgement: judgeJob(record, today), today }
}

/** @throws 409 with every reason, where something stops signing */
export function assertMaySign(record: JobRecord, judgement: Judgement, today: string): void {
  const { allowed, reasons } = maySign(record, judgement, today)
  if (allowed) return
  const stops = looseEnds(record, judgement, today).filter(end => end.stops).length
  throw problem('wrong-stage', `${stops === 1 ? 'One loose end stops' : `${stops} loose ends stop`} signing. Each is listed with the page it is on.`, { reasons })
}
