/**
 * Links that let a customer reach one job for one purpose without an account: 32 random bytes in the mail, only their
 * SHA-256 in the database. Reading with one changes nothing; acts go through `customerAct`.
 */
import { createHash, randomBytes } from 'node:crypto'
import { problem } from '../../../shared/utils/problem'
import { changeAsFirm, lookUp, readAsFirm, type FirmTx } from '../../db/firm-db'
import { recordEvent } from '../../db/queries/events'
import { insertLink, noteLinkUsed, type LinkPurpose } from '../../db/queries/links'
import { claimMutation, storeOutcome } from '../firm-context'

export type { LinkPurpose } from '../../db/queries/links'

const TOKEN = /^[A-Za-z0-9_-]{43}$/

/** What a message asks the worker for: the link is made while it is sent, so that its token is never stored. */
export interface NeededLink { kind: 'customer', purpose: LinkPurpose, subjectId: string | null, sentTo: string, days: number | null }

export interface NewLink { firmId: string, jobId: string, purpose: LinkPurpose, subjectId: string | null, sentTo: string, /** How long it opens; null: until it is withdrawn. */ days: number | null }

export interface FoundLink { firmId: string, linkId: string, jobId: string, purpose: LinkPurpose, subjectId: string | null, sentTo: string }

export const linkTokenHash = (token: string) => createHash('sha256').update(token).digest('hex')

/** Where a link of this purpose leads: `https://…/c/quote/<token>`. */
export const linkAddress = (baseUrl: string, purpose: LinkPurpose, token: string) => `${baseUrl}/c/${purpose}/${token}`

/** Makes a link and gives its raw token, which must go into the one message and nowhere else. */
export async function makeCustomerLink(tx: FirmTx, link: NewLink): Promise<string> {
  const token = randomBytes(32).toString('base64url')
  const id = await insertLink(tx, { ...link, tokenHash: linkTokenHash(token) })
  await recordEvent(tx, { type: 'link-sent', jobId: link.jobId, detail: { linkId: id, purpose: link.purpose, subjectId: link.subjectId } })
  return token
}

interface LinkRow extends Record<string, unknown> { firm_id: string, id: string, job_id: string, purpose: string, subject_id: string | null, sent_to: string, expires_at: Date | null, withdrawn_at: Date | null }

/** The row behind a token, whatever has become of it. */
async function lookUpLink(token: string, purpose: LinkPurpose): Promise<LinkRow | null> {
  if (!TOKEN.test(token)) return null
  const [row] = await lookUp<LinkRow>('find-customer-link', 'select * from find_customer_link($1)', [linkTokenHash(token)])
  return row?.purpose === purpose ? row : null
}

const toFound = (row: LinkRow, purpose: LinkPurpose): FoundLink => ({ firmId: row.firm_id, linkId: row.id, jobId: row.job_id, purpose, subjectId: row.subject_id, sentTo: row.sent_to })

/** @throws not-found, one and the same for a wrong, run-out, withdrawn or other-purpose link */
export async function findCustomerLink(token: string, purpose: LinkPurpose): Promise<FoundLink> {
  const row = await lookUpLink(token, purpose)
  if (!row || row.withdrawn_at || (row.expires_at && row.expires_at.getTime() <= Date.now())) throw problem('not-found', 'This link does not open anything now. It may have run out, or been copied only in part. Ask the firm that sent it for a fresh one.')
  return toFound(row, purpose)
}

/** A link that may have run out but was not withdrawn: good only for sending a fresh one to the address held. */
export async function findSpentLink(token: string, purpose: LinkPurpose): Promise<FoundLink | null> {
  const row = await lookUpLink(token, purpose)
  return row && !row.withdrawn_at ? toFound(row, purpose) : null
}

export const readByLink = <T>(link: FoundLink, act: (tx: FirmTx) => Promise<T>) => readAsFirm(link.firmId, act)

/** A customer's act through a link: once per mutation id, whoever sends it again. */
export async function customerAct<T>(link: FoundLink, mutationId: string, kind: string, content: unknown, act: (tx: FirmTx) => Promise<T>): Promise<T> {
  return changeAsFirm(link.firmId, async (tx) => {
    const stored = await claimMutation<T>(tx, { firmId: link.firmId, id: mutationId, kind, personId: null, jobId: link.jobId, content: { linkId: link.linkId, content } })
    if (stored) return stored.outcome
    const outcome = await act(tx)
    await noteLinkUsed(tx, link)
    await storeOutcome(tx, link.firmId, mutationId, outcome)
    return outcome
  })
}
