/** Pairs: what was designed beside what was found, the odd ones first, the ordinary ones folded. */
import type { JobRecord, PhotographRow } from '../types/record'
import { formatAmps, formatMetres, formatPercent, formatSquareMillimetres } from '../utils/figures'
import { VERDICT_WORDS, type Verdict } from '../utils/verdict'
import { contentOf, installedContent, isAnswered, numberOf } from './judge/facts'
import { fieldRef, readingRef } from './judge/field-refs'
import { shownReading } from './judge/readings/words'
import type { JobPage, JudgedReading, Judgement } from './judge/types'
import { INSPECTIONS } from './inspections.data'
import { PARTS, PART_NAMES } from './parts'
import { TEST_KEYS } from './tests.data'

export interface Pair {
  id: string
  label: string
  /** What the design says, as printed; null where nothing is expected. */
  designed: string | null
  found: string
  limit: string | null
  verdict: Verdict | null
  /** Verdict in words, or what differs. */
  words: string
  isOdd: boolean
  /** The numbers behind, for bars drawn to one scale. */
  scale: { designed: number | null, found: number | null, limit: number | null } | null
  /** The installer's sentence, where there is one. */
  why: string | null
  /** Earlier readings as printed, oldest first. */
  earlier: string[]
  /** A photograph that bears on it. */
  photographId: string | null
  page: JobPage
  field: string
}

export interface Pairs { odd: Pair[], ordinary: Pair[] }

export function pairs(record: JobRecord, judgement: Judgement): Pairs {
  const all = [
    ...changedSinceSigned(record),
    ...TEST_KEYS.map(test => judgement.readings[test]).filter(each => each.applies && (each.isRequired || each.counted !== null)).map(each => readingPair(record, each)),
    ...fieldPairs(record, judgement),
  ]
  return { odd: all.filter(pair => pair.isOdd), ordinary: all.filter(pair => !pair.isOdd) }
}

function readingPair(record: JobRecord, reading: JudgedReading): Pair {
  const { page, field } = readingRef(reading.test)
  const isOdd = reading.verdict !== 'within' || reading.notCounted !== null || reading.corrected !== null || reading.earlier.length > 0
  return {
    id: `reading:${reading.test}`, label: reading.label,
    designed: reading.expected?.text ?? null, found: reading.shown, limit: reading.limit?.text ?? null,
    verdict: reading.verdict, words: reading.notCounted ?? reading.words, isOdd,
    scale: reading.counted?.value === null || reading.counted?.value === undefined ? null : { designed: reading.expected?.value ?? null, found: reading.counted.value, limit: reading.limit?.value ?? null },
    why: reading.sentence ?? (reading.odd[0] || null),
    earlier: reading.earlier.map(each => `${shownReading(each.reading)}, ${VERDICT_WORDS[each.verdict].toLowerCase()}${each.detail ? `: ${each.detail}` : ''}`),
    photographId: photographFor(record, reading.test)?.id ?? null,
    page, field,
  }
}

/** The photograph that an inspection lets rest beside this test. */
function photographFor(record: JobRecord, test: JudgedReading['test']): PhotographRow | null {
  const claims: readonly string[] = INSPECTIONS.filter(item => item.restsOn.tests.includes(test)).flatMap(item => item.restsOn.shots)
  return record.photographs.find(each => claims.includes(each.claim)) ?? null
}

/** Fields that were both designed and found; different figures are odd, with what became of them. */
function fieldPairs(record: JobRecord, judgement: Judgement): Pair[] {
  const designed = contentOf(record, 'circuit', 'designed')
  const installed = contentOf(record, 'circuit', 'installed')
  const drop = judgement.installedSize ? `volt drop re-worked: ${formatPercent(judgement.installedSize.percent)}` : 'volt drop not re-worked yet'
  const limit = contentOf(record, 'loadLimit', 'limit')
  return [
    figurePair('length', 'Cable length', judgement.designed_m ?? undefined, judgement.fitted_m ?? undefined, formatMetres, fieldRef('circuit', 'installed', 'L_m'), drop),
    figurePair('size', 'Line conductor', numberOf(designed, 'S_mm2'), numberOf(installed, 'S_mm2'), formatSquareMillimetres, fieldRef('circuit', 'installed', 'S_mm2'), drop),
    figurePair('rating', 'Device rating', numberOf(designed, 'In_A'), numberOf(installed, 'In_A'), formatAmps, fieldRef('circuit', 'installed', 'In_A'), 'limit of Zs re-worked'),
    figurePair('current', 'Charger current', numberOf(designed, 'Ib_A'), numberOf(contentOf(record, 'equipment', 'charger'), 'rating_A'), formatAmps, fieldRef('equipment', 'charger', 'rating_A'), 'supply re-worked'),
    figurePair('limit', 'Load limit', numberOf(limit, 'limit_A'), numberOf(limit, 'set_A'), formatAmps, fieldRef('loadLimit', 'limit', 'set_A'), 'differs from what was agreed'),
    ...['device', 'cable', 'rcd_type'].map(field => wordPair(record, field)),
  ].filter(pair => pair !== null)
}

function figurePair(id: string, label: string, designed: number | undefined, found: number | undefined, format: (value: number) => string, { page, field }: { page: JobPage, field: string }, consequence: string): Pair | null {
  if (designed === undefined && found === undefined) return null
  const isOdd = designed !== undefined && found !== undefined && designed !== found
  return {
    id, label, designed: designed === undefined ? null : format(designed), found: found === undefined ? 'as designed' : format(found), limit: null, verdict: null,
    words: isOdd ? consequence : 'as designed', isOdd, scale: designed === undefined || found === undefined ? null : { designed, found, limit: null },
    why: null, earlier: [], photographId: null, page, field,
  }
}

function wordPair(record: JobRecord, field: string): Pair | null {
  const ref = fieldRef('circuit', 'installed', field)
  const words = (value: unknown) => optionWords(field, value)
  const designed = contentOf(record, 'circuit', 'designed')[field]
  const found = installedContent(record)[field]
  if (!isAnswered(designed) || !isAnswered(found)) return null
  const isOdd = designed !== found
  return { id: field, label: ref.words.charAt(0).toUpperCase() + ref.words.slice(1), designed: words(designed), found: words(found), limit: null, verdict: null, words: isOdd ? 'another than designed' : 'as designed', isOdd, scale: null, why: null, earlier: [], photographId: null, page: ref.page, field: ref.field }
}

function optionWords(field: string, value: unknown): string {
  const spec = (PARTS.circuit.fields as Record<string, { options?: readonly { value: string, label: string }[] }>)[field]
  return spec?.options?.find(option => option.value === value)?.label ?? String(value)
}

/** Fields of the work that were written after somebody had signed for it: a send-back was answered, and shows here. */
function changedSinceSigned(record: JobRecord): Pair[] {
  const signedAt = record.signatures.filter(each => each.capacity !== 'supervisor').map(each => each.at).sort()[0]
  if (signedAt === undefined) return []
  return PART_NAMES.filter(part => PARTS[part].isWork).flatMap(part => record.parts[part].flatMap(row => Object.entries(row.stamps)
    .filter(([, stamp]) => Date.parse(stamp.at) > Date.parse(signedAt))
    .map(([field]): Pair => {
      const ref = fieldRef(part, row.key, field)
      return { id: `changed:${ref.field}`, label: `Changed after signing: ${ref.words}`, designed: null, found: String(row.content[field] ?? 'emptied'), limit: null, verdict: null, words: 'changed after signing', isOdd: true, scale: null, why: null, earlier: [], photographId: null, page: ref.page, field: ref.field }
    })))
}
