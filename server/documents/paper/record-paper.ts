import type { CertificateRecord } from '#shared/schemas/sealed-record'
import { canonicalText } from '#shared/seal/canonical-text'
import { fourWords } from '#shared/seal/four-words'
import { formatMoment } from '#shared/utils/dates'
import type { FootContent } from './foot'
import type { OpeningContent } from './opening'

/** What is known of a record's seal when it is printed; null while it is a draft. */
export interface PaperSeal {
  /** SHA-256 of the record's canonical bytes, lower-case hexadecimal. */
  hash: string
  /** The address behind the square code, where anyone can check the paper. */
  checkUrl: string
}

export const PAPER_KINDS: Record<CertificateRecord['kind'], string> = {
  'installation': 'Electrical installation certificate',
  'minor-works': 'Minor electrical works certificate',
}

/** `WRN-2027-00042 A`; a draft has no number yet. */
export function numberOf(record: CertificateRecord, seal: PaperSeal | null): string {
  return seal ? `${record.certificate.number} ${record.certificate.revision}` : `Draft for job ${record.jobReference}`
}

export const wordsOf = (seal: PaperSeal | null): string | null => seal && fourWords(seal.hash).join(' · ')

export function footOf(record: CertificateRecord, seal: PaperSeal | null): FootContent {
  const { replaces } = record.certificate
  return { number: numberOf(record, seal), shortAddress: record.installation.shortAddress, fourWords: wordsOf(seal), replaces: replaces && `Replaces ${replaces.number} ${replaces.revision}` }
}

/** The top of a paper made from a record; the square code stands on its first page only. */
export function openingOf(record: CertificateRecord, seal: PaperSeal | null, title: string, more: { under?: string, withCode: boolean }): OpeningContent {
  const when = seal ? `sealed ${formatMoment(record.certificate.at)}` : `drawn up ${formatMoment(record.certificate.at)}`
  return {
    over: record.firm.name,
    title,
    under: more.under ?? `${numberOf(record, seal)}  ·  ${record.installation.shortAddress}  ·  ${when}`,
    qr: more.withCode && seal ? seal.checkUrl : null,
    qrWords: more.withCode && seal ? `Check: ${seal.checkUrl}  ·  ${wordsOf(seal)}` : null,
  }
}

/** The record as a file inside its own paper: the very bytes that the hash is of. */
export function recordFile(record: CertificateRecord): { name: string, text: string, description: string } {
  return { name: `${record.certificate.number}-${record.certificate.revision}.json`, text: canonicalText(record), description: 'The sealed record: the hash is the SHA-256 of these bytes' }
}
