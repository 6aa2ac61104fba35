/** The safety figures of a job in one list: what PRODUCT calls the figures on which Outside limit always stops signing. */
import { VERDICT_WORDS, type Verdict } from '../../utils/verdict'
import { TEST_KEYS, type TestKey } from '../tests.data'
import { fieldRef, readingRef } from './field-refs'
import { listWords } from './judged'
import type { Judged, JudgedReading, Judgement, SafetyFigure } from './types'

type Sheets = Pick<Judgement, 'supply' | 'earthing' | 'breakingCapacity' | 'installed' | 'system'> & { upstreamRcd: string | undefined }

export function safetyFigures(sheets: Sheets, readings: Record<TestKey, JudgedReading>): SafetyFigure[] {
  const { supply, earthing, breakingCapacity, installed } = sheets
  return [
    sheetFigure('supply', 'Supply', supply, 'supply', 'survey.survey.cutout_A'),
    sheetFigure('cable', 'Cable', installed, 'cable', 'circuit.installed.S_mm2'),
    sheetFigure('earthing-method', 'Earthing method', earthing, 'point', 'earthing.earthing.method'),
    breaking(breakingCapacity),
    upstream(sheets.upstreamRcd),
    ...TEST_KEYS.map(test => readings[test]).filter(each => each.isSafety).map(readingFigure),
  ]
}

function sheetFigure(id: string, label: string, sheet: Judged<unknown>, page: SafetyFigure['page'], field: string): SafetyFigure {
  const { answer, waitsFor } = sheet
  const verdict: Verdict = answer.verdict ?? 'waiting'
  const [first] = waitsFor
  const needs = verdict === 'waiting' && waitsFor.length ? [`Needs ${listWords(waitsFor)}.`] : []
  const why = [...needs, ...answer.reasons].join(' ')
  return { id, label, verdict, sentence: sentence(label, verdict, why), page: verdict === 'waiting' && first ? first.page : page, field: verdict === 'waiting' && first ? first.field : field }
}

/** Until somebody measured or asked, the fault current is a convention: nothing is signed on it. */
function breaking(sheet: Judged<unknown>): SafetyFigure {
  if (sheet.input.Ipf_kA !== undefined) return sheetFigure('breaking-capacity', 'Breaking capacity', sheet, 'board', 'circuit.installed.device_kA')
  const ref = readingRef('Ipf')
  return { id: 'breaking-capacity', label: 'Breaking capacity', verdict: 'waiting', sentence: sentence('Breaking capacity', 'waiting', `Needs ${ref.words}.`), page: ref.page, field: ref.field, waitsFor: [ref] }
}

/** A type AC device upstream can be blinded by d.c. from the vehicle (rule EAR-16). */
function upstream(type: string | undefined): SafetyFigure {
  const verdict: Verdict = type === undefined ? 'waiting' : type === 'type-AC' ? 'outside' : type === 'none' ? 'not-applicable' : 'within'
  const why = verdict === 'waiting' ? 'Needs what residual-current device is upstream.' : verdict === 'outside' ? 'EAR-16: a type AC device upstream can be blinded by direct current. Feed the circuit from before it, or change it.' : ''
  return { id: 'upstream-rcd', label: 'Residual-current device upstream', verdict, sentence: sentence('Residual-current device upstream', verdict, why), page: 'board', field: 'survey.survey.upstream_rcd', waitsFor: [fieldRef('survey', 'survey', 'upstream_rcd')] }
}

function readingFigure(reading: JudgedReading): SafetyFigure {
  const { page, field } = readingRef(reading.test)
  return { id: reading.test, label: reading.label, verdict: reading.verdict, sentence: sentence(reading.label, reading.verdict, reading.detail), page, field }
}

function sentence(label: string, verdict: Verdict, why: string): string {
  const words = `${label}: ${VERDICT_WORDS[verdict]}`
  return why ? `${words}. ${why.charAt(0).toUpperCase()}${why.slice(1)}${/[.!?]$/.test(why) ? '' : '.'}` : `${words}.`
}
