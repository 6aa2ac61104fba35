/** Printed fields out of a job's record: a value with who wrote it, N/A with its reason, or (drafts only) not entered. */
import { isAnswered } from '../../../../shared/job/judge/facts'
import type { JudgedReading } from '../../../../shared/job/judge/types'
import { HOW_WORDS, type Field, type FieldValue, type HowKnown } from '../../../../shared/job/fields/field'
import { PARTS, type Part } from '../../../../shared/job/parts'
import { testSpec, type TestKey } from '../../../../shared/job/tests.data'
import { limited, notApplicable, notEntered, textField, type Judgement as PrintedJudgement, type PrintedField } from '../../../../shared/schemas/sealed-record/field'
import type { PartRow, ReadingRow } from '../../../../shared/types/record'
import { formatNumber } from '../../../../shared/utils/figures'
import type { Verdict } from '../../../../shared/utils/verdict'
import type { AssembleInput } from './input'

/** A moment as a UTC instant, whatever offset the database wrote. */
export const instant = (at: string): string => new Date(at).toISOString()

export const personName = ({ record }: AssembleInput, id: string): string => record.people.find(person => person.id === id)?.name ?? 'a person no longer in the firm'

export function rowOf({ record }: AssembleInput, part: Part, key: string): PartRow | undefined {
  return record.parts[part].find(row => row.key === key)
}

/** The row that holds a field of the circuit as installed: what was not recorded as installed is the design's. */
export function circuitRow(input: AssembleInput, field: string): PartRow | undefined {
  const installed = rowOf(input, 'circuit', 'installed')
  return isAnswered(installed?.content[field]) ? installed : rowOf(input, 'circuit', 'designed')
}

/** A field of the record as printed, or not entered. */
export function recorded(input: AssembleInput, part: Part, key: string, field: string, rest: Partial<PrintedField> = {}): PrintedField {
  const row = part === 'circuit' ? circuitRow(input, field) : rowOf(input, part, key)
  const value = row?.content[field]
  if (!row || !isAnswered(value) || value === undefined || value === null) return notEntered()
  const spec: Field | undefined = (PARTS[part].fields as Record<string, Field>)[field]
  const how = row.content[`${field}_how`] as HowKnown | undefined
  return textField(shownValue(spec, value), {
    ...(typeof value === 'number' && { value }),
    ...(spec?.unit && typeof value === 'number' && { unit: spec.unit }),
    ...(how && HOW_WORDS[how] && { howKnown: HOW_WORDS[how] }),
    ...writtenBy(input, row, field),
    ...rest,
  })
}

function shownValue(spec: Field | undefined, value: NonNullable<FieldValue>): string {
  const label = (one: string) => spec?.options?.find(option => option.value === one)?.label ?? one
  if (typeof value === 'number') return formatNumber(value)
  return Array.isArray(value) ? value.map(label).join(', ') : label(value)
}

export function writtenBy(input: AssembleInput, row: PartRow, field: string): Partial<PrintedField> {
  const stamp = row.stamps[field]
  return stamp ? { personId: stamp.by, personName: personName(input, stamp.by), at: instant(stamp.at) } : {}
}

/** Text put together from the record; blank text is not entered. */
export const composed = (text: string | undefined, rest: Partial<PrintedField> = {}): PrintedField => (text?.trim() ? textField(text.trim(), rest) : notEntered())

/** "Verified" where somebody said yes; "not verified" is outside, and stops. */
export function verified(input: AssembleInput, field: string): PrintedField {
  const found = recorded(input, 'survey', 'survey', field)
  if (found.kind !== 'value') return found
  const isYes = rowOf(input, 'survey', 'survey')?.content[field] === 'yes'
  return { ...found, shown: isYes ? 'Verified' : 'Not verified', judgement: { verdict: isYes ? 'within' : 'outside' } }
}

/** A test's reading with its verdict, its limit and every earlier reading. */
export function reading(input: AssembleInput, test: TestKey, optional?: string): PrintedField {
  const judged = input.judgement.readings[test]
  if (!judged.applies) return notApplicable(judged.reason ?? 'does not apply')
  const earlier = judged.earlier.map(each => readingShape(input, each.reading, { verdict: each.verdict, ...(each.detail && { margin: each.detail }) }))
  const kept = earlier.length ? { earlier } : {}
  if (!judged.counted) return optional !== undefined && !judged.isRequired && !earlier.length ? notApplicable(optional) : { ...notEntered(), ...kept }
  const who = madeBy(input, judged.counted)
  if (judged.verdict === 'limited') return limited(judged.counted.reason || 'no reason given', { ...who, ...kept })
  if (judged.verdict === 'not-applicable') return { ...notApplicable(judged.counted.reason || 'no reason given'), ...who, ...kept }
  return { ...readingShape(input, judged.counted, judgementOf(input, judged)), ...kept }
}

function judgementOf(input: AssembleInput, judged: JudgedReading): PrintedJudgement {
  const sentenceRow = rowOf(input, 'unexpected', judged.test)
  const writer = sentenceRow?.stamps.sentence?.by
  const supervisor = input.signatures.find(each => each.capacity === 'supervisor')
  const isExplained = judged.verdict === 'unexpected' && judged.sentence !== null
  return {
    verdict: judged.verdict,
    ...(judged.limit && { limit: judged.limit.text }),
    ...(judged.expected && { expected: judged.expected.text }),
    ...(judged.detail && { margin: judged.detail }),
    ...(isExplained && { sentence: judged.sentence!, ...(writer && { sentenceBy: personName(input, writer) }), ...(supervisor && { acceptedBy: supervisor.nameShown }) }),
  }
}

type ReadingShape = Omit<PrintedField, 'earlier'>

function readingShape(input: AssembleInput, row: ReadingRow, judgement: PrintedJudgement & { verdict: Verdict }): ReadingShape {
  const who = madeBy(input, row)
  if (row.kind === 'limited') return { kind: 'limited', shown: 'LIM', reason: row.reason || 'no reason given', ...who }
  if (row.kind === 'not-applicable') return { kind: 'not-applicable', shown: 'N/A', reason: row.reason || 'no reason given', ...who }
  if (row.kind === 'seen') return { kind: 'value', shown: row.shown === 'correct' ? 'Correct' : 'Wrong', howKnown: 'tried', ...who, judgement }
  const unit = row.unit || testSpec(row.test).unit
  return {
    kind: row.kind, shown: row.shown,
    ...(row.value !== null && { value: row.value }), ...(unit && { unit }), ...(row.resolution !== null && { resolution: row.resolution }),
    howKnown: row.context.byEnquiry ? 'by enquiry' : 'measured', ...who, judgement,
  }
}

function madeBy(input: AssembleInput, row: ReadingRow) {
  const instrument = input.record.instruments.find(each => each.id === row.instrumentId)
  return { personId: row.personId, personName: personName(input, row.personId), at: instant(row.serverAt), ...(instrument && { instrumentSerial: instrument.serial }) }
}
