import type { CertificateRecord } from '#shared/schemas/sealed-record'
import { certificateContent, type CertificateContent } from '../certificate/content'
import { inspectionsContent, type InspectionsContent } from '../inspections/content'
import type { OpeningContent } from '../paper/opening'
import { openingOf, type PaperSeal } from '../paper/record-paper'
import { liveWithIt, type Advice, type LiveWithItFacts } from '../plain-words/live-with-it'
import { proveIt, type ProofRow } from '../plain-words/prove-it'
import { testResultsContent, type TestResultsContent } from '../test-results/content'
import { workingContent, type WorkingContent } from '../working/content'

/** A photograph for the appendix: a JPEG as a data address, made small by the file store. */
export interface PackPhotograph { claim: string, taken: string, jpegDataUrl: string }

export interface PackInput {
  record: CertificateRecord
  /** null prints the whole pack as a draft. */
  seal: PaperSeal | null
  liveWith: LiveWithItFacts
  /** The signed head of the firm's audit chain, printed so that a shortened chain is noticed; null where there is none yet. */
  auditHead: string | null
  photographs: PackPhotograph[]
  /** Who was told, by when and with what proof, as sentences. */
  told: string[]
}

export interface PackContent {
  live: { opening: OpeningContent, advice: Advice[] }
  prove: { opening: OpeningContent, rows: ProofRow[] }
  certificate: CertificateContent
  inspections: InspectionsContent | null
  tests: TestResultsContent | null
  working: WorkingContent | null
  photographs: { opening: OpeningContent, shots: PackPhotograph[] } | null
  last: string[]
}

/** Everything a customer gets, in the order in which it is read: plain words first, proof behind. */
export function packContent({ record, seal, liveWith, auditHead, photographs, told }: PackInput): PackContent {
  const opening = (title: string, withCode = false) => openingOf(record, seal, title, { withCode })
  return {
    live: { opening: opening('Live with it', true), advice: liveWithIt(liveWith) },
    prove: { opening: opening('Prove it'), rows: proveIt(record) },
    certificate: certificateContent(record, seal),
    inspections: record.kind === 'installation' ? inspectionsContent(record, seal) : null,
    tests: record.kind === 'installation' ? testResultsContent(record, seal) : null,
    working: workingContent(record, seal),
    photographs: photographs.length ? { opening: opening('Photographs'), shots: photographs } : null,
    last: [
      ...(told.length ? told : ['Nobody outside has been told yet.']),
      auditHead ? `Head of the firm’s record of events when this pack was made: ${auditHead}` : 'Head of the firm’s record of events: none yet.',
    ],
  }
}
