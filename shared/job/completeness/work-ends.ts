/** Loose ends of the work around the figures: put back, inspections, photographs, questions, papers from outside. */
import type { JobRecord } from '../../types/record'
import { formatAmps } from '../../utils/figures'
import { contentOf, jobFacts, numberOf, textOf, type JobFacts } from '../judge/facts'
import type { JobPage, Judgement } from '../judge/types'
import { INSPECTIONS } from '../inspections.data'
import { openPutBacks } from '../put-back'
import { SHOTS, type ShotSpec } from '../shots.data'
import type { LooseEnd } from './types'

export function putBackEnds(record: JobRecord): LooseEnd[] {
  return openPutBacks(record).map(item => ({
    id: `put-back:${item.key}`, stops: true, page: 'point', field: `putBack.${item.key}.done`, with: 'installer',
    sentence: `Put back before ${item.before === 'energising' ? 'energising' : 'signing'}: ${item.words.charAt(0).toLowerCase()}${item.words.slice(1)}.`,
  }))
}

export function inspectionEnds(record: JobRecord): LooseEnd[] {
  const open = INSPECTIONS.filter(item => !textOf(contentOf(record, 'inspection', item.key), 'outcome'))
  const [first] = open
  const unanswered: LooseEnd[] = first
    ? [{ id: 'inspections', stops: true, page: 'point', field: `inspection.${first.key}.outcome`, with: 'installer', sentence: open.length === 1 ? `Answer inspection ${first.key}: ${first.label}.` : `Answer the inspections: ${open.length} of ${INSPECTIONS.length} are open, the first is ${first.key}, ${first.label}.` }]
    : []
  const bad = INSPECTIONS.flatMap((item): LooseEnd[] => {
    const content = contentOf(record, 'inspection', item.key)
    const at = { page: 'point' as const, with: 'installer' as const }
    if (content.outcome === 'unsatisfactory') return [{ ...at, id: `inspection:${item.key}`, stops: true, field: `inspection.${item.key}.outcome`, sentence: `Put right what inspection ${item.key} found: ${item.label}.` }]
    if (content.outcome === 'not-applicable' && !textOf(content, 'reason')) return [{ ...at, id: `inspection:${item.key}`, stops: true, field: `inspection.${item.key}.reason`, sentence: `Say why inspection ${item.key} does not apply: ${item.label}.` }]
    return []
  })
  return [...unanswered, ...bad]
}

/** The shots this job owes. */
export function shotsOwed(record: JobRecord, facts: JobFacts = jobFacts(record)): ShotSpec[] {
  return SHOTS.filter((shot: ShotSpec) => {
    switch (shot.when) {
      case undefined: return true
      case 'TT': return facts.needsElectrode
      case 'limiter': return facts.hasLimiter
      case 'open-PEN': return facts.hasOpenPen
      case 'surge-device': return facts.hasSurgeDevice
      case 'isolator': return facts.hasIsolator
      case 'transcribed': return facts.isTranscribed
      case 'exceptions': return facts.hasExceptions
      default: return shot.when satisfies never
    }
  })
}

export function shotEnds(record: JobRecord): LooseEnd[] {
  const taken = new Set(record.photographs.map(each => each.claim))
  const missing = shotsOwed(record).filter(shot => !taken.has(shot.claim))
  const must = missing.filter(shot => shot.isMust).map((shot): LooseEnd => ({ id: `shot:${shot.claim}`, stops: true, page: shot.page, field: `shot.${shot.claim}`, with: 'installer', sentence: `Photograph missing: ${shot.label}. ${shot.visible}.` }))
  const nice = missing.filter(shot => !shot.isMust)
  const [first] = nice
  if (!first) return must
  const names = nice.map(shot => shot.label).join(', ')
  return [...must, { id: 'shots', stops: false, page: first.page, field: `shot.${first.claim}`, with: 'installer', sentence: nice.length === 1 ? `Photograph missing: ${names}.` : `${nice.length} photographs missing: ${names}.` }]
}

const PAGES: readonly JobPage[] = ['enquiry', 'supply', 'board', 'cable', 'point', 'dead', 'live', 'leave']

export function queryEnds(record: JobRecord): LooseEnd[] {
  return record.queries.filter(query => query.answeredAt === null).map(query => ({
    id: `query:${query.id}`, stops: true, page: PAGES.find(page => page === query.part) ?? 'leave', field: query.field, with: 'installer',
    sentence: `Answer the supervisor's question: ${query.question}`,
  }))
}

/** Words of a reply that lets the work go ahead, and of one that does not. */
const AGREED = /^(agreed|accepted|approved|allowed|ok|yes)/i

/** Whether the network operator must be asked before anything is energised, and has not agreed. */
export function isNetworkReplyOpen(record: JobRecord, { route }: Pick<Judgement, 'route'>): boolean {
  const { result } = route.answer
  if (result.route === undefined || result.installAllowed === true) return false
  return !record.notices.some(notice => notice.kind !== 'building-control' && AGREED.test(notice.replies.at(-1)?.outcome ?? ''))
}

export function networkEnds(record: JobRecord, judgement: Judgement): LooseEnd[] {
  const { supply } = judgement
  const fuse_A = numberOf(contentOf(record, 'survey', 'survey'), 'cutout_A')
  const demand_A = supply.answer.result.demandAfter_A
  const isRead = contentOf(record, 'survey', 'survey').cutout_A_how === 'read'
  const reply: LooseEnd[] = isNetworkReplyOpen(record, judgement)
    ? [{ id: 'network-reply', stops: true, page: 'supply', with: 'office', sentence: `Get the network operator's agreement before the charger is energised, and record the reply. ${judgement.route.answer.reasons[0] ?? ''}`.trim() }]
    : []
  // A carrier marked 80 A may hold a 60 A fuse: its mark is the most it may hold.
  const carrier: LooseEnd[] = isRead && fuse_A !== undefined && demand_A !== undefined && fuse_A > 60 && demand_A > 60
    ? [{ id: 'carrier-mark', stops: false, page: 'supply', field: 'survey.survey.cutout_A', with: 'office', sentence: `Have the fuse itself looked at: the carrier's ${formatAmps(fuse_A, 0)} is the most it may hold, and the demand is ${formatAmps(demand_A)}.` }]
    : []
  return [...reply, ...carrier]
}

/** An exception without its risk assessment is caught by the shot list; a departure needs all three of its sentences. */
export function departureEnds(record: JobRecord): LooseEnd[] {
  return record.parts.departure.flatMap(({ key, content }): LooseEnd[] => {
    const field = (['regulation', 'differs', 'why'] as const).find(each => !textOf(content, each))
    return field ? [{ id: `departure:${key}`, stops: true, page: 'leave', field: `departure.${key}.${field}`, with: 'installer', sentence: 'Finish the departure: it needs its regulation, what differs and why it is no less safe.' }] : []
  })
}
