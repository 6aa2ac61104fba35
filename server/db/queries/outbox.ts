import { uuidv7 } from 'uuidv7'
import type { FirmTx } from '../firm-db'
import { outboxMessage } from '../schema/message'

export interface NewMessage {
  firmId: string
  jobId?: string
  /** Which of `server/messages` writes it. */
  message: string
  recipient: string
  /** One message for one reason to one address, however often the act is repeated. */
  dedupeKey: string
  content: Record<string, unknown>
  waitsForPaper?: string
}

/** Puts a message in the outbox, in the transaction of what it tells of. Nothing is sent here. */
export async function queueMessage(tx: FirmTx, message: NewMessage): Promise<void> {
  const id = uuidv7()
  await tx.insert(outboxMessage).values({ id, messageId: `<${id}@copperplate.invalid>`, ...message }).onConflictDoNothing()
}
