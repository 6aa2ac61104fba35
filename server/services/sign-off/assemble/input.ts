import type { Judgement } from '../../../../shared/job/judge/types'
import type { Signature } from '../../../../shared/schemas/sealed-record/parts'
import type { JobRecord, SignatureRow } from '../../../../shared/types/record'

export interface FirmOnPaper { name: string, address: string, telephone: string, scheme: string, registration: string }

/** Everything a certificate is put together from; nothing is fetched and no clock is read. */
export interface AssembleInput {
  record: JobRecord
  judgement: Judgement
  firm: FirmOnPaper
  /** As the table counts them: revision 0 prints as A, 1 as B. */
  certificate: { number: string, revision: number, replaces?: { number: string, revision: number, hash: string, why: string } }
  signatures: (SignatureRow & { drawing?: Signature['drawing'] })[]
  previousHash: string | null
  /** The moment of sealing; of a draft, the moment it is drawn up. */
  sealedAt: string
  edition: string
  ruleDataVersion: string
  /** A draft may hold "not entered"; of a paper to be sealed the schema refuses each gap. */
  draft: boolean
}
