/** The Run: the parts of a job in the order of the circuit, how far each is, and the facts that it shows once. */
import type { JobRecord } from '../types/record'
import { formatDay } from '../utils/dates'
import { formatAmps, formatMetres, formatPercent } from '../utils/figures'
import { mayEnergise, type LooseEnd } from './completeness'
import { REQUIRED_FIELDS } from './completeness/required-fields'
import { INSPECTIONS } from './inspections.data'
import { CABLE_OPTIONS } from './fields/work'
import { contentOf, installedContent, isAnswered, jobFacts, numberOf, textOf } from './judge/facts'
import { pageOf } from './judge/field-refs'
import type { JobPage, Judgement } from './judge/types'
import { openPutBacks, putBackItems } from './put-back'
import { STAGES } from './stages'
import { TEST_KEYS } from './tests.data'

export type RunPartKey = Exclude<JobPage, 'enquiry'>
export type StepState = 'not-started' | 'started' | 'ready' | 'checked' | 'not-needed'

export interface RunPart {
  key: RunPartKey
  label: string
  href: string
  state: StepState
  left: number
  total: number
  facts: string[]
  /** Why it cannot be filled yet, as the end of a sentence: "dead tests come first". */
  lock?: string
}

export interface OfficeMatter { label: string, href: string, state: string }

const LABELS: Record<RunPartKey, string> = { supply: 'Supply', board: 'Board', cable: 'Cable', point: 'Point', dead: 'Dead', live: 'Live', leave: 'Leave' }
const CAPACITIES = ['designer', 'constructor', 'inspector'] as const

export function runParts(record: JobRecord, judgement: Judgement, ends: readonly LooseEnd[]): RunPart[] {
  return (Object.keys(LABELS) as RunPartKey[]).map((key) => {
    const { left, total } = countOf(key, record, judgement, ends)
    const lock = key === 'live' ? lockOfLive(record, judgement) : undefined
    return { key, label: LABELS[key], href: `/jobs/${record.job.id}/${key}`, state: stateOf(record, left, total), left, total, facts: factsOf(key, record, judgement), ...(lock !== undefined && { lock }) }
  })
}

function stateOf(record: JobRecord, left: number, total: number): StepState {
  if (STAGES.indexOf(record.job.stage) >= STAGES.indexOf('countersigned')) return 'checked'
  return left === 0 ? 'ready' : left < total ? 'started' : 'not-started'
}

function lockOfLive(record: JobRecord, judgement: Judgement): string | undefined {
  const { allowed, reasons } = mayEnergise(record, judgement)
  if (allowed) return undefined
  const isDeadOpen = TEST_KEYS.some(test => judgement.readings[test].page === 'dead' && judgement.readings[test].applies && judgement.readings[test].stops && judgement.readings[test].verdict === 'not-entered')
  return isDeadOpen ? 'dead tests come first' : (reasons[0] ?? '').replace(/\.$/, '').replace(/^[A-Z](?=[a-z ])/, letter => letter.toLowerCase())
}

function countOf(page: RunPartKey, record: JobRecord, { readings }: Judgement, ends: readonly LooseEnd[]): { left: number, total: number } {
  const tests = TEST_KEYS.map(test => readings[test]).filter(each => each.page === page && each.applies && each.isRequired)
  const testsLeft = tests.filter(each => each.stops).length
  const other = ends.filter(end => end.stops && end.page === page && !end.id.startsWith('reading:')).length
  if (page === 'dead' || page === 'live') return { left: testsLeft + other, total: tests.length + other }
  const facts = jobFacts(record)
  const required = REQUIRED_FIELDS.filter(each => !each.isNice && pageOf(each.part, each.field) === page && (!each.when || each.when(facts, contentOf(record, each.part, each.key)))).length
  const unsigned = page === 'leave' ? CAPACITIES.filter(capacity => !record.signatures.some(each => each.capacity === capacity)).length : 0
  const extra = page === 'point' ? putBackItems(record).length + INSPECTIONS.length : page === 'leave' ? CAPACITIES.length : 0
  const total = required + tests.length + extra
  const left = testsLeft + unsigned + (page === 'point' ? pointLeft(record, ends, page) : other)
  return { left: Math.min(left, Math.max(total, left)), total: Math.max(total, left) }
}

/** On the point's page the one sentence about open inspections stands for each of them. */
function pointLeft(record: JobRecord, ends: readonly LooseEnd[], page: RunPartKey): number {
  const inspections = INSPECTIONS.filter(item => !textOf(contentOf(record, 'inspection', item.key), 'outcome')).length
  const other = ends.filter(end => end.stops && end.page === page && end.id !== 'inspections' && !end.id.startsWith('put-back:') && !end.id.startsWith('reading:')).length
  return inspections + openPutBacks(record).length + other
}

function factsOf(page: RunPartKey, record: JobRecord, judgement: Judgement): string[] {
  const survey = contentOf(record, 'survey', 'survey')
  const circuit = installedContent(record)
  const amps = (value: number | undefined) => (value === undefined ? null : formatAmps(value, 0))
  switch (page) {
    case 'supply': return known(
      amps(numberOf(survey, 'cutout_A')) && `Main fuse ${amps(numberOf(survey, 'cutout_A'))}${survey.cutout_A_how === 'read' || survey.cutout_A_how === 'told' ? '' : ', assumed'}`,
      survey.earthing !== 'cannot-see' && textOf(survey, 'earthing'),
      judgement.readings.Ze.counted && `Ze ${judgement.readings.Ze.shown}`,
      judgement.capacity.code !== 'cannot-tell' && judgement.capacity.words,
    )
    case 'board': return known(
      isAnswered(circuit.number) && `Way ${textOf(circuit, 'number')}`,
      numberOf(circuit, 'In_A') !== undefined && `${amps(numberOf(circuit, 'In_A'))}${textOf(circuit, 'device') ? ` ${deviceWords(String(circuit.device))}` : ''}`,
      numberOf(circuit, 'rcd_IdeltaN_mA') !== undefined && `${numberOf(circuit, 'rcd_IdeltaN_mA')}\u2009mA${textOf(circuit, 'rcd_type') ? ` type ${circuit.rcd_type}` : ''}`,
    )
    case 'cable': return cableFacts(record, judgement)
    case 'point': return known(
      textOf(contentOf(record, 'equipment', 'charger'), 'description'),
      judgement.ev_A !== null && formatAmps(judgement.ev_A),
      textOf(contentOf(record, 'earthing', 'earthing'), 'method') && `Earthing ${contentOf(record, 'earthing', 'earthing').method}`,
    )
    case 'dead':
    case 'live': {
      const tests = TEST_KEYS.map(test => judgement.readings[test]).filter(each => each.page === page && each.applies && each.isRequired)
      return [`${tests.filter(each => each.verdict !== 'not-entered').length} of ${tests.length}`]
    }
    case 'leave': return known(record.certificates.at(-1) && `Certificate ${record.certificates.at(-1)!.number}`)
    default: return page satisfies never
  }
}

/** "18.0 m · clipped · 6 mm² · volt drop 1.8 %" in its pieces. */
function cableFacts(record: JobRecord, judgement: Judgement): string[] {
  const size = judgement.installedSize ?? judgement.designedSize
  const length = judgement.fitted_m ?? judgement.designed_m
  const methods = [...new Set(record.parts.leg.map(row => textOf(row.content, 'method')).filter(each => each !== undefined))]
  const cable = textOf(installedContent(record), 'cable') as keyof typeof CABLE_OPTIONS | undefined
  return known(
    length !== null && formatMetres(length, 1),
    methods.length > 0 && methods.map(method => METHOD_WORDS[method] ?? `method ${method}`).join(', '),
    size && `${size.S_mm2}\u2009mm²`,
    cable && CABLE_OPTIONS[cable],
    size && `volt drop ${formatPercent(size.percent)}`,
  )
}

const METHOD_WORDS: Record<string, string> = { A: 'in an insulated wall', B: 'in conduit', C: 'clipped', D: 'in the ground', E: 'in free air' }

const deviceWords = (device: string) => (/^[BCD]$/.test(device) ? `type ${device}` : device.replace(/^BS/, 'BS '))
const known = (...facts: (string | false | null | undefined)[]): string[] => facts.filter((fact): fact is string => typeof fact === 'string' && fact !== '')

/** The office's matters of the same job, each with its state in words. */
export function officeMatters(record: JobRecord): OfficeMatter[] {
  const at = (label: string, page: string, state: string): OfficeMatter => ({ label, href: `/jobs/${record.job.id}/${page}`, state })
  const quote = record.quotes.at(-1)
  const visit = record.visits.filter(each => each.state === 'booked').map(each => each.day).sort()[0]
  const open = record.notices.filter(each => each.state === 'to-prepare').length
  const owed = record.parts.promise.filter(each => (each.content.state ?? 'open') === 'open').length
  return [
    at('Enquiry', 'enquiry', record.customer.name || 'no name yet'),
    at('Quote', 'quote', quote ? quote.state : 'none'),
    at('Visits', 'visits', visit ? `next ${formatDay(visit)}` : record.visits.length ? 'none to come' : 'none'),
    at('Notices', 'notices', record.notices.length === 0 ? 'none' : open ? `${open} to send` : 'sent'),
    at('Promises', 'promises', owed ? `${owed} open` : 'none open'),
  ]
}
