import { composeMessage, type Message, type Sender } from '../../messages/frame/compose-message'
import type { FirmTx } from '../../db/firm-db'
import { queueMessage } from '../../db/queries/outbox'
import { findFirm } from '../../db/queries/quotes'

/** What `customer-note` carries in the outbox: something a customer did on their page, told to the firm's own address. */
export interface CustomerNote { subject: string, sentences: string[], /** Path of the page to look at, such as `/jobs/…/quote`. */ path: string }

export interface CustomerNoteInput { from: Sender, subject: string, sentences: string[], url: string }

/** The mail itself, written by the worker from the outbox's content. */
export function customerNoteMessage({ from, subject, sentences, url }: CustomerNoteInput): Message {
  return composeMessage({ subject, greeting: 'To the office,', from, parts: [...sentences.map(text => ({ kind: 'sentence' as const, text })), { kind: 'button', label: 'Open the job', url }] })
}

/** Tells the firm by mail what a customer did; one mail for each `reason`. */
export async function tellFirm(tx: FirmTx, firmId: string, jobId: string, reason: string, note: CustomerNote): Promise<void> {
  const firm = await findFirm(tx, firmId)
  await queueMessage(tx, { firmId, jobId, message: 'customer-note', recipient: firm.email, dedupeKey: `customer-note:${reason}`, content: { ...note } })
}
