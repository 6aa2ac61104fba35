import type { Judgement, PrintedField } from '#shared/schemas/sealed-record/field'
import { formatMoment } from '#shared/utils/dates'
import { VERDICT_WORDS, type Verdict } from '#shared/utils/verdict'

/** A verdict as printed: its words and number, and the code that chooses the pattern. */
export interface Mark { verdict: Verdict, words: string }

/** One cell: what it says, the small print under it, and its verdict. `text` is never empty. */
export interface Said {
  text: string
  notes: string[]
  mark: Mark | null
  /** A long code (a hash), set small so that it stays on one line. */
  isCode?: true
}

export interface Fact { label: string, said: Said }
export interface FactGroup { title: string, facts: Fact[] }

/** Narrow and unbreakable, so that a figure and its unit stay on one line. */
const NARROW_SPACE = '\u202f'

/** A printed field in words: figure with unit, or N/A or LIM with the reason, or not entered. */
export function sayField(field: PrintedField, more: { withLimit?: boolean } = {}): Said {
  return { text: fieldText(field), notes: [...judgementNotes(field.judgement, more.withLimit ?? true), ...provenance(field), ...earlierNotes(field)], mark: fieldMark(field) }
}

/** Plain words that carry no provenance. */
export const sayText = (text: string, notes: string[] = []): Said => ({ text, notes, mark: null })

export const fact = (label: string, field: PrintedField): Fact => ({ label, said: sayField(field) })
export const textFact = (label: string, text: string, notes: string[] = []): Fact => ({ label, said: sayText(text, notes) })

export const codeFact = (label: string, code: string): Fact => ({ label, said: { text: code, notes: [], mark: null, isCode: true } })

/** A moment without its weekday, for small print: `2 Mar 2027 10:12`. */
export const shortMoment = (at: string) => formatMoment(at).replace(/^\w{3} /, '').replace(',', '')

export function fieldText(field: Pick<PrintedField, 'kind' | 'shown' | 'unit' | 'reason'>): string {
  if (field.kind === 'limited' || field.kind === 'not-applicable') return field.reason ? `${field.shown} · ${field.reason}` : field.shown
  if (field.kind === 'not-entered') return 'not entered'
  return field.unit ? `${field.shown}${NARROW_SPACE}${field.unit}` : field.shown
}

/** The mark of a field: its judgement's, or that of LIM and of a gap; N/A and plain facts have none. */
export function fieldMark(field: PrintedField): Mark | null {
  if (field.kind === 'not-entered') return { verdict: 'not-entered', words: VERDICT_WORDS['not-entered'] }
  if (field.kind === 'limited') return { verdict: 'limited', words: field.reason ? `${VERDICT_WORDS.limited} · ${field.reason}` : VERDICT_WORDS.limited }
  return field.judgement ? judgementMark(field.judgement) : null
}

export function judgementMark(judgement: Judgement): Mark {
  const words = VERDICT_WORDS[judgement.verdict]
  return { verdict: judgement.verdict, words: judgement.margin ? `${words} · ${judgement.margin}` : words }
}

/** The sentence an Unexpected stands on, as printed, or null. */
export function sentenceOf(judgement: Judgement | undefined): string | null {
  if (!judgement?.sentence) return null
  const by = [judgement.sentenceBy, judgement.acceptedBy && `accepted by ${judgement.acceptedBy}`].filter(Boolean).join('; ')
  return `Why it stands: “${judgement.sentence}”${by ? ` (${by})` : ''}`
}

function judgementNotes(judgement: Judgement | undefined, withLimit: boolean): string[] {
  if (!judgement) return []
  const limit = withLimit && judgement.limit ? [`must be ${judgement.limit}${judgement.expected ? `, design ${judgement.expected}` : ''}`] : []
  const sentence = sentenceOf(judgement)
  return sentence ? [...limit, sentence] : limit
}

/** How known, by whom, with what and when, on one line. */
export function provenance(field: Pick<PrintedField, 'howKnown' | 'personName' | 'instrumentSerial' | 'at'>): string[] {
  const parts = [field.howKnown, field.personName, field.instrumentSerial && `instrument ${field.instrumentSerial}`, field.at && shortMoment(field.at)].filter(Boolean)
  return parts.length ? [parts.join(' · ')] : []
}

function earlierNotes(field: PrintedField): string[] {
  return (field.earlier ?? []).map(one => `earlier: ${[fieldText(one), one.judgement && judgementMark(one.judgement).words, one.at && shortMoment(one.at)].filter(Boolean).join(' · ')}`)
}
