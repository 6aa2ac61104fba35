import type { CertificateRecord } from '#shared/schemas/sealed-record'
import type { SealedCalculation } from '#shared/schemas/sealed-record/parts'
import { formatNumber } from '#shared/utils/figures'
import { VERDICT_WORDS } from '#shared/utils/verdict'
import type { OpeningContent } from '../paper/opening'
import { openingOf, type PaperSeal } from '../paper/record-paper'
import type { Mark } from '../paper/said'

export interface WorkingRow { symbol: string, expression: string, value: string, source: string, confidence: string, isFromMemory: boolean }
export interface WorkingSheet {
  title: string
  mark: Mark | null
  rows: WorkingRow[]
  /** Every size that was compared, with the first rule it fails. */
  sizes: string[][]
  reasons: string[]
  notes: string[]
  /** What to type to get the same figures, and what to feed it. */
  command: string
  input: string
}
export interface WorkingContent { opening: OpeningContent, caution: string, sheets: WorkingSheet[] }

export const CAUTION = 'This sheet supports a decision and gives no permission to work. It yields to the current edition of the wiring regulations, local codes, the maker’s instructions and the judgement of a competent, registered person. Isolate, prove dead and lock off before work; test live only if you are competent to.'
export const MEMORY_SENTENCE = 'From memory: check it against the printed standard before you rely on it.'

/** The design behind a record as sheets that a person can follow and reproduce; null where the record holds none. */
export function workingContent(record: CertificateRecord, seal: PaperSeal | null): WorkingContent | null {
  const { design } = record
  if (!design) return null
  return {
    opening: openingOf(record, seal, 'Design working', { withCode: false }),
    caution: CAUTION,
    sheets: [design.circuit, design.supplyCheck, ...design.others].map(toSheet),
  }
}

function toSheet(calculation: SealedCalculation): WorkingSheet {
  return {
    title: calculation.title,
    mark: calculation.verdict && { verdict: calculation.verdict, words: VERDICT_WORDS[calculation.verdict] },
    rows: calculation.working.map(step => ({
      symbol: step.symbol,
      expression: step.expression || 'as given',
      value: typeof step.value === 'number' ? figureOf(step.value, step.unit) : [step.value, step.unit].filter(Boolean).join('\u202f'),
      source: step.source || 'no source named',
      confidence: step.confidence,
      isFromMemory: step.confidence === 'from memory',
    })),
    sizes: sizesOf(calculation.result.sizes),
    reasons: calculation.reasons,
    notes: calculation.notes,
    command: `npm run --silent calc -- ${calculation.name}`,
    input: spacedJson(calculation.input),
  }
}

/** Rounded once, here: three places from one upward, four figures below one. */
function figureOf(value: number, unit: string): string {
  const small = value !== 0 && Math.abs(value) < 1
  const shown = small ? formatNumber(Number(value.toPrecision(4)), Math.min(8, 3 - Math.floor(Math.log10(Math.abs(value))))).replace(/0+$/, '') : formatNumber(value)
  return unit ? `${shown}\u202f${unit}` : shown
}

interface SizeRow { S_mm2?: number, Iz_A?: number, volt_drop_V?: number, percent?: number, Zs_ohm?: number, verdict?: string | null, firstReason?: string | null }

function sizesOf(sizes: unknown): string[][] {
  if (!Array.isArray(sizes)) return []
  return (sizes as SizeRow[]).map(size => [
    known(size.S_mm2, 'mm²'),
    known(size.Iz_A, 'A'),
    known(size.volt_drop_V, 'V'),
    known(size.percent, '%'),
    known(size.Zs_ohm, 'Ω'),
    size.firstReason ?? (size.verdict === 'within' ? VERDICT_WORDS.within : 'no reason given'),
  ])
}

const known = (value: unknown, unit: string) => (typeof value === 'number' ? figureOf(value, unit) : 'no figure')

/** JSON on one line with room to break after each comma. */
const spacedJson = (value: unknown): string => JSON.stringify(value, null, 1).replace(/\n\s*/g, ' ')
