import { sql } from 'drizzle-orm'
import type { FirmTx } from '../firm-db'

/** What can stand in a job's story and in the firm's chain of events. Personal data stays out of `detail`: ids and field names only. */
export type EventType
  = 'job-made' | 'record-changed' | 'reading-added' | 'reading-confirmed' | 'photograph-kept' | 'photograph-removed' | 'query-answered' | 'visit-booked' | 'visit-changed'
    | 'quote-sent' | 'quote-accepted' | 'quote-declined' | 'quote-not-needed' | 'deposit-asked' | 'payment-received' | 'capacity-signed' | 'sent-back' | 'countersigned' | 'pack-made' | 'pack-sent'
    | 'notice-prepared' | 'notice-sent' | 'notice-answered' | 'link-sent' | 'link-opened' | 'link-withdrawn' | 'message-unclear' | 'message-failed' | 'message-sent-again' | 'invoice-issued'
    | 'signed-in' | 'sign-in-refused' | 'signed-out' | 'password-changed' | 'person-invited' | 'person-changed' | 'instrument-changed' | 'price-changed' | 'settings-changed' | 'revision-opened' | 'survey-answered'

export interface NewEvent { type: EventType, jobId?: string | null, personId?: string | null, detail?: Record<string, unknown> }

/** Adds the event to the firm's chain, in the transaction of what it tells of; if it fails, the act fails. */
export async function recordEvent(tx: FirmTx, event: NewEvent): Promise<void> {
  await tx.execute(sql`select record_event(${event.type}, ${event.jobId ?? null}::uuid, ${event.personId ?? null}::uuid, ${JSON.stringify(event.detail ?? {})}::jsonb)`)
}
