import type { PrintedField } from '#shared/schemas/sealed-record/field'
import type { InstallationRecord } from '#shared/schemas/sealed-record/installation'
import { formatDay } from '#shared/utils/dates'
import type { OpeningContent } from '../paper/opening'
import { openingOf, type PaperSeal } from '../paper/record-paper'
import { fact, fieldMark, fieldText, judgementMark, provenance, sentenceOf, shortMoment, textFact, type FactGroup, type Mark } from '../paper/said'
import { circuitGroup, readingsOf } from './circuit-rows'

/** One figure of the schedule, in the order of testing; earlier readings follow as rows of their own. */
export interface ReadingRow { label: string, found: string, mustBe: string, expected: string, mark: Mark | null, how: string, isEarlier: boolean, sentence: string | null }

export interface CircuitContent { title: string, facts: FactGroup, rows: ReadingRow[] }

export interface TestResultsContent {
  opening: OpeningContent
  board: FactGroup
  circuits: CircuitContent[]
  instruments: string[][]
  tested: FactGroup
}

/** The schedule of test results: the board, then each circuit as installed and as measured. */
export function testResultsContent(record: InstallationRecord, seal: PaperSeal | null): TestResultsContent {
  const { board, circuits, testedBy } = record.tests
  const signed = record.signatures.find(one => one.capacities.includes('inspection-and-test'))
  return {
    opening: openingOf(record, seal, 'Schedule of test results', { withCode: false }),
    board: {
      title: 'Board',
      facts: [
        fact('Designation', board.designation),
        fact('Location', board.location),
        fact('Supplied from', board.suppliedFrom),
        fact('Its protective device', board.device),
        fact('Its RCD', board.rcd),
        fact('Zs at the board', board.zs),
        fact('Ipf at the board', board.faultCurrent),
        fact('Polarity', board.polarity),
        fact('Phase sequence', board.phaseSequence),
        fact('Surge device', board.surgeDevice),
      ],
    },
    circuits: circuits.map(circuit => ({
      title: `Circuit ${fieldText(circuit.number)} · ${fieldText(circuit.description)}`,
      facts: circuitGroup(circuit),
      rows: readingsOf(circuit).flatMap(([label, field]) => toRows(label, field)),
    })),
    instruments: record.instruments.map(one => [one.function, one.description, one.serial, formatDay(one.calibratedUntil), one.validOnUse.shown]),
    tested: {
      title: 'Tested by',
      facts: [
        textFact('Name', testedBy.name),
        textFact('Date', shortMoment(testedBy.at)),
        signed ? textFact('Signature', signed.name, [`${signed.way === 'passkey' ? 'by passkey' : signed.way}, ${shortMoment(signed.at)}`]) : textFact('Signature', 'Not signed'),
      ],
    },
  }
}

function toRows(label: string, field: PrintedField): ReadingRow[] {
  const { judgement } = field
  const row: ReadingRow = {
    label,
    found: fieldText(field),
    mustBe: judgement?.limit ?? 'no limit',
    expected: judgement?.expected ?? 'no figure',
    mark: fieldMark(field),
    how: provenance(field).join(' ') || 'As recorded',
    isEarlier: false,
    sentence: sentenceOf(judgement),
  }
  const earlier = (field.earlier ?? []).map((one): ReadingRow => ({
    label: 'earlier reading, kept',
    found: fieldText(one),
    mustBe: one.judgement?.limit ?? 'no limit',
    expected: one.judgement?.expected ?? 'no figure',
    mark: one.judgement ? judgementMark(one.judgement) : null,
    how: provenance(one).join(' ') || 'As recorded',
    isEarlier: true,
    sentence: sentenceOf(one.judgement),
  }))
  return [...earlier.map((one, at) => ({ ...one, label: `${label}, reading ${at + 1}` })), earlier.length ? { ...row, label: `${label}, reading ${earlier.length + 1}` } : row]
}
