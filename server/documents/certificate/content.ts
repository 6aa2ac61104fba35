import type { CertificateRecord } from '#shared/schemas/sealed-record'
import type { Capacity, Signature } from '#shared/schemas/sealed-record/parts'
import { formatDay, formatMoment } from '#shared/utils/dates'
import type { OpeningContent } from '../paper/opening'
import { numberOf, openingOf, PAPER_KINDS, wordsOf, type PaperSeal } from '../paper/record-paper'
import { codeFact, sayText, shortMoment, textFact, type FactGroup, type Said } from '../paper/said'
import { installationGroups } from './installation-groups'
import { minorWorksGroups } from './minor-works-groups'

export interface SignatureContent {
  capacities: string
  name: string
  firm: string
  statement: string
  /** How and when signed, under which edition. */
  signed: string
  drawing: Signature['drawing'] | null
}

export interface CertificateContent {
  opening: OpeningContent
  heading: FactGroup
  groups: FactGroup[]
  departures: string[][]
  exceptions: string[][]
  signatures: SignatureContent[]
  /** Said under the signatures: one for all three, self-countersigned, or what is still missing. */
  signatureNotes: string[]
  instruments: string[][]
  photographs: (string | Said)[][]
  seal: FactGroup
}

const CAPACITY_WORDS: Record<Capacity, string> = {
  'design': 'Design',
  'second-design': 'Design (second designer)',
  'construction': 'Construction',
  'inspection-and-test': 'Inspection and test',
  'minor-works': 'The work, its inspection and test',
  'checked-for-the-firm': 'Checked for the firm',
}

const WAY_WORDS: Record<Signature['way'], string> = { passkey: 'by passkey', typed: 'by typed name', drawn: 'by a drawn signature' }

/** A record in the words and rows of its certificate. */
export function certificateContent(record: CertificateRecord, seal: PaperSeal | null): CertificateContent {
  return {
    opening: openingOf(record, seal, PAPER_KINDS[record.kind], { withCode: true }),
    heading: headingGroup(record, seal),
    groups: record.kind === 'installation' ? installationGroups(record) : minorWorksGroups(record),
    departures: record.departures.map(one => [one.regulation, one.differs, one.whySafe, one.designer]),
    exceptions: record.exceptions.map(one => [one.omitted, one.reason, `${one.riskAssessment.title}, SHA-256 ${one.riskAssessment.sha256}`, one.designer]),
    signatures: record.signatures.map(toSignature),
    signatureNotes: signatureNotes(record),
    instruments: record.instruments.map(one => [one.function, one.description, one.serial, one.calibratedOn ? formatDay(one.calibratedOn) : 'Not stated', formatDay(one.calibratedUntil), one.validOnUse.shown]),
    photographs: record.photographs.map(one => [sayText(one.claim, [`SHA-256 ${one.sha256}`]), [one.personName, one.at && shortMoment(one.at)].filter(Boolean).join(' · ') || 'Not stated']),
    seal: sealGroup(record, seal),
  }
}

function headingGroup(record: CertificateRecord, seal: PaperSeal | null): FactGroup {
  const { certificate, firm } = record
  const { replaces } = certificate
  return {
    title: 'This certificate',
    facts: [
      textFact('Number', numberOf(record, seal), [`revision ${certificate.revision}`]),
      textFact('Edition of the rules', certificate.edition, [`form: ${certificate.formEdition}`]),
      replaces ? textFact('Replaces', `${replaces.number} ${replaces.revision}`, [replaces.why]) : textFact('Replaces', 'Nothing: first issue'),
      textFact('Pages and schedules', scheduleCount(record), ['pages are counted at the foot of each']),
      textFact('Firm', firm.name, [firm.address]),
      textFact('Scheme and registration', firm.scheme, [firm.registration]),
      textFact('State', seal ? 'Sealed' : 'DRAFT, not sealed'),
      textFact('Job', record.jobReference),
    ],
  }
}

function scheduleCount(record: CertificateRecord): string {
  if (record.kind === 'minor-works') return 'No schedules: the tests are on this certificate'
  const circuits = record.tests.circuits.length
  return `1 schedule of inspections, 1 schedule of test results (${circuits} ${circuits === 1 ? 'circuit' : 'circuits'})`
}

function toSignature(one: Signature): SignatureContent {
  return {
    capacities: one.capacities.map(capacity => CAPACITY_WORDS[capacity]).join(' · '),
    name: one.name,
    firm: `${one.firm}, ${one.address}, telephone ${one.telephone}`,
    statement: one.statement,
    signed: `Signed ${WAY_WORDS[one.way]} on ${formatMoment(one.at)}, to ${one.edition}`,
    drawing: one.drawing ?? null,
  }
}

function signatureNotes(record: CertificateRecord): string[] {
  const signed = new Set(record.signatures.flatMap(one => one.capacities))
  const three: Capacity[] = ['design', 'construction', 'inspection-and-test']
  const isOneForAll = record.signatures.some(one => three.every(capacity => one.capacities.includes(capacity)))
  const needed: Capacity[] = record.kind === 'installation' ? [...three, 'checked-for-the-firm'] : ['minor-works', 'checked-for-the-firm']
  return [
    ...(isOneForAll ? ['One person designed, built, inspected and tested this work: one signature stands for the three declarations.'] : []),
    ...(record.kind === 'installation' ? [signed.has('second-design') ? 'Two designers answer for the design.' : 'Second designer: N/A · one designer.'] : []),
    ...(record.selfCountersigned ? ['Self-countersigned: the person who checked this for the firm also did the work.'] : []),
    ...needed.filter(capacity => !signed.has(capacity)).map(capacity => `${CAPACITY_WORDS[capacity]}: not signed.`),
  ]
}

function sealGroup(record: CertificateRecord, seal: PaperSeal | null): FactGroup {
  return {
    title: 'Seal',
    facts: seal
      ? [
          textFact('Four words', wordsOf(seal) ?? 'None'),
          textFact('Sealed', formatMoment(record.certificate.at)),
          codeFact('SHA-256 of the record', seal.hash),
          record.previousHash ? codeFact('Hash before it', record.previousHash) : textFact('Hash before it', 'None: the firm’s first'),
          textFact('Rule data', record.certificate.ruleDataVersion),
          textFact('Where to check', seal.checkUrl, ['The page says whether this paper is genuine, and whether it is replaced. It shows nothing private.']),
        ]
      : [textFact('State', 'Not sealed: a draft proves nothing'), textFact('Rule data', record.certificate.ruleDataVersion)],
  }
}
