import { createHash } from 'node:crypto'
import { canonicalText } from '#shared/seal/canonical-text'

/** SHA-256, in lower-case hexadecimal, of a record's canonical UTF-8 bytes. */
export function hashRecord(record: unknown): string {
  return createHash('sha256').update(canonicalText(record), 'utf8').digest('hex')
}
