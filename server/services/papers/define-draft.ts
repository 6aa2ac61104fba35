import { eq } from 'drizzle-orm'
import { judgeJob } from '../../../shared/job/judge/judge-job'
import { RULES_VERSION } from '../../../shared/job/rules-version'
import { londonDay } from '../../../shared/utils/dates'
import { findJobRecord } from '../../db/queries/job-record'
import { firm } from '../../db/schema/firm'
import { packDefinition } from '../../documents/pack/layout'
import { assembleSealedRecord } from '../sign-off/assemble-record'
import { editionOn } from '../sign-off/edition'
import type { DefinePaper } from '../../worker/make-paper'
import { packSurroundings } from './define-pack'

/** The papers as they stand now, DRAFT across each page. */
export const defineDraft: DefinePaper = async (tx, { firmId, jobId, madeAt }) => {
  const record = await findJobRecord(tx, firmId, jobId, null)
  const [theFirm] = await tx.select().from(firm).where(eq(firm.id, firmId))
  if (!record || !theFirm) throw new Error('The job of this draft is not there')
  const today = londonDay(madeAt.toISOString())
  const drafted = assembleSealedRecord({ record, judgement: judgeJob(record, today), firm: theFirm, certificate: { number: 'DRAFT', revision: 0 }, previousHash: null, sealedAt: madeAt.toISOString(), edition: editionOn(today), ruleDataVersion: RULES_VERSION, signatures: record.signatures, draft: true })
  return packDefinition({ record: drafted, seal: null, ...await packSurroundings(tx, firmId, jobId, drafted) })
}
