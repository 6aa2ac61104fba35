/** The shapes in which a job's whole record crosses the wire. */
import type { FieldValue } from '../job/fields/field'
import type { Part } from '../job/parts'
import type { SideState, Stage } from '../job/stages'
import type { TestKey } from '../job/tests.data'
import type { Country } from './firm'

export type PartContent = Record<string, FieldValue>

/** One row of a part. `stamps` says who last wrote each field and at which version of the row. */
export interface PartRow {
  key: string
  position: number
  content: PartContent
  stamps: Record<string, { v: number, by: string, at: string }>
  version: number
}

/** What surrounds a reading: enough to judge it and to say how it was taken. */
export interface ReadingContext {
  /** Known by enquiry rather than measured. */
  byEnquiry?: boolean
  testVoltage_V?: number
  ambient_C?: number
  /** No current for so long (s): waiting while the charger's random delay may still run. */
  waited_s?: number
  /** Why the first reading was outside: connection, cable, device, other. */
  cause?: 'connection' | 'cable' | 'device' | 'other'
}

export type ReadingKind = 'value' | 'over-range' | 'limited' | 'not-applicable' | 'seen'

export interface ReadingRow {
  id: string
  test: TestKey
  kind: ReadingKind
  /** As the meter showed it; for `seen` "correct" or "wrong". */
  shown: string
  value: number | null
  unit: string
  resolution: number | null
  reason: string
  context: ReadingContext
  instrumentId: string | null
  personId: string
  typedBy: string | null
  /** For a transcribed reading: the measurer's word for it. Until then it counts as not entered. */
  confirmedAt: string | null
  deviceAt: string
  serverAt: string
}

export interface InstrumentRow {
  id: string
  name: string
  description: string
  serial: string
  functions: string[]
  active: boolean
  calibrations: { doneOn: string, goodUntil: string, reference: string }[]
}

export interface PhotographRow { id: string, claim: string, sha256: string, thumbSha256: string | null, takenAt: string, personId: string | null, serverAt: string }
export interface QueryRow { id: string, part: string, field: string, question: string, askedBy: string, askedAt: string, answer: string | null, answeredBy: string | null, answeredAt: string | null }
export interface SignatureRow { id: string, capacity: 'designer' | 'constructor' | 'inspector' | 'supervisor', personId: string, nameShown: string, way: string, statement: string, edition: string, at: string }
export interface VisitRow { id: string, kind: 'survey' | 'install' | 'return', day: string, half: 'am' | 'pm', crewId: string, crewName: string, hours: number, state: 'booked' | 'done' | 'cancelled', note: string, version: number }
export interface CertificateRow { id: string, kind: 'installation' | 'minor-works', number: string, revision: number, state: 'live' | 'replaced', hash: string, words: string, sealedAt: string, replacesId: string | null }
export interface NoticeRow { id: string, kind: string, recipient: string, route: string, reasons: string[], lastDay: string | null, state: string, sentOn: string | null, sentHow: string | null, reference: string, replies: { outcome: string, note: string, repliedOn: string }[] }
export interface QuoteRow { id: string, number: string, state: string, expiresOn: string | null, netPence: number, vatPence: number, grossPence: number, depositPence: number, sentAt: string | null, acceptedAt: string | null, acceptedName: string | null, version: number, lines: QuoteLineRow[] }
export interface QuoteLineRow { id: string, position: number, description: string, quantityThousandths: number, unit: string, unitNetPence: number, vatBp: number }
export interface MessageRow { id: string, message: string, recipient: string, state: string, problem: string | null, madeAt: string, sentAt: string | null }
export interface PaperRow { id: string, kind: string, sourceId: string, state: string, sha256: string | null, pages: number | null }
export interface EventRow { number: number, type: string, personId: string | null, at: string, detail: Record<string, unknown> }
export interface PersonRow { id: string, name: string, roles: string[], qualifications: { title: string, number: string, capacities: string[], validTo: string | null }[] }

export interface JobHead {
  id: string
  ref: string
  stage: Stage
  stageSince: string
  sideState: SideState | null
  sideNote: string
  note: string
  withWhom: string
  nextDay: string | null
  recordVersion: number
}

export interface JobRecord {
  job: JobHead
  /** Whether the reader is on one of the job's visits. */
  isOwn: boolean
  customer: { id: string, name: string, email: string, telephone: string, version: number }
  premises: { id: string, address: string, town: string, postcode: string, country: Country, mpan: string, occupier: string, tenure: string, parking: string, version: number }
  parts: Record<Part, PartRow[]>
  readings: ReadingRow[]
  instruments: InstrumentRow[]
  photographs: PhotographRow[]
  queries: QueryRow[]
  signatures: SignatureRow[]
  visits: VisitRow[]
  certificates: CertificateRow[]
  notices: NoticeRow[]
  quotes: QuoteRow[]
  messages: MessageRow[]
  papers: PaperRow[]
  story: EventRow[]
  people: PersonRow[]
}
