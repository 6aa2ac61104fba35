/** From an outbox row to a letter: which builder writes it, and which link it carries. */
import { eq } from 'drizzle-orm'
import type { FirmTx } from '../db/firm-db'
import { auditHead } from '../db/schema/message'
import { firm } from '../db/schema/firm'
import { depositReceivedMessage } from '../messages/deposit-received'
import type { Message, Sender } from '../messages/frame/compose-message'
import { invitationMessage } from '../messages/invitation'
import { noticeCoverMessage } from '../messages/notice-cover'
import { packSentMessage } from '../messages/pack-sent'
import { passwordResetMessage } from '../messages/password-reset'
import { quoteSentMessage } from '../messages/quote-sent'
import { sentBackMessage } from '../messages/sent-back'
import { visitConfirmedMessage } from '../messages/visit-confirmed'
import { makeCustomerLink } from '../services/links/customer-links'
import { customerNoteMessage } from '../services/links/tell-firm'
import { makePersonToken } from '../services/people/tokens'
import { config } from '../utils/config'

/** What a message's link must be made from; its token exists only in the letter. */
export type NeedsLink
  = { kind: 'customer', purpose: 'quote' | 'pack' | 'photographs' | 'visit', subjectId: string | null, sentTo: string, days: number }
    | { kind: 'person', purpose: 'invitation' | 'password-reset', personId: string }

// Each builder takes what its services put into the outbox, plus `from` and `url`; the row is data, so its shape is theirs to keep.
const BUILDERS: Record<string, (input: never) => Message> = {
  'customer-note': customerNoteMessage,
  'deposit-received': depositReceivedMessage,
  'invitation': invitationMessage,
  'notice-cover': noticeCoverMessage,
  'pack-sent': packSentMessage,
  'password-reset': passwordResetMessage,
  'quote-sent': quoteSentMessage,
  'sent-back': sentBackMessage,
  'visit-confirmed': visitConfirmedMessage,
}

const PATHS = { 'invitation': '/welcome#', 'password-reset': '/new-password#' } as const

export async function senderOf(tx: FirmTx, firmId: string): Promise<Sender> {
  const [row] = await tx.select({ name: firm.name, telephone: firm.telephone, number: auditHead.number, hash: auditHead.hash }).from(firm).leftJoin(auditHead, eq(auditHead.firmId, firm.id)).where(eq(firm.id, firmId))
  return { firmName: row!.name, firmTelephone: row!.telephone, auditHead: row!.hash ? `${row!.number} ${row!.hash}` : null }
}

/** Writes the message; makes its link's token where it needs one (inside the transaction given). */
export async function composeOutboxMessage(tx: FirmTx, row: { firmId: string, jobId: string | null, message: string, content: Record<string, unknown> }): Promise<Message> {
  const build = BUILDERS[row.message]
  if (!build) throw new Error(`Nobody writes the message "${row.message}"`)
  const { needsLink, ...content } = row.content as { needsLink?: NeedsLink } & Record<string, unknown>
  // Our own pages are named by path, so that a message carries the address this server has now.
  const url = needsLink ? await linkOf(tx, row, needsLink) : typeof content.path === 'string' ? `${config().baseUrl}${content.path}` : content.url
  return build({ ...content, url, from: await senderOf(tx, row.firmId) } as never)
}

async function linkOf(tx: FirmTx, { firmId, jobId }: { firmId: string, jobId: string | null }, needs: NeedsLink): Promise<string> {
  if (needs.kind === 'person') return `${config().baseUrl}${PATHS[needs.purpose]}${await makePersonToken(tx, firmId, needs.personId, needs.purpose)}`
  const token = await makeCustomerLink(tx, { firmId, jobId: jobId!, purpose: needs.purpose, subjectId: needs.subjectId, sentTo: needs.sentTo, days: needs.days })
  return `${config().baseUrl}/c/${needs.purpose}/${token}`
}

/** How long a message is tried before it is given up, and how the tries spread. */
export const GIVE_UP_AFTER_MS = 72 * 3_600_000
export const nextTrySeconds = (attempts: number) => Math.min(15 * 2 ** attempts, 3600)
