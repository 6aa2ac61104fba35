/**
 * What is missing or open on a job, in one list of sentences that lead to their field, and whether the circuit may be
 * energised and the certificate signed. A plain function of the record: page and server refuse with the same words.
 */
import type { JobRecord } from '../types/record'
import type { Day } from '../utils/dates'
import { answerEnds, fieldEnds } from './completeness/field-ends'
import { readingEnds } from './completeness/reading-ends'
import { safetyEnds } from './completeness/safety-ends'
import { departureEnds, inspectionEnds, isNetworkReplyOpen, networkEnds, putBackEnds, queryEnds, shotEnds } from './completeness/work-ends'
import type { Leave, LooseEnd } from './completeness/types'
import { contentOf } from './judge/facts'
import type { JobPage, Judgement } from './judge/types'
import { openPutBacks } from './put-back'
import { TEST_KEYS } from './tests.data'

export type { Holder, Leave, LooseEnd } from './completeness/types'

const PAGE_ORDER: readonly JobPage[] = ['enquiry', 'supply', 'board', 'cable', 'point', 'dead', 'live', 'leave']

/** Everything open: what stops you finishing first, then what is worth a look, each in the order of the job. */
export function looseEnds(record: JobRecord, judgement: Judgement, today: Day): LooseEnd[] {
  const found = [
    ...answerEnds(record, today), ...fieldEnds(record), ...readingEnds(judgement), ...networkEnds(record, judgement),
    ...putBackEnds(record), ...inspectionEnds(record), ...queryEnds(record), ...departureEnds(record), ...shotEnds(record),
  ]
  const all = [...found, ...safetyEnds(record, judgement, found)]
  const rank = (end: LooseEnd) => (end.stops ? 0 : PAGE_ORDER.length) + PAGE_ORDER.indexOf(end.page)
  return all.sort((a, b) => rank(a) - rank(b))
}

/** Whether the new circuit may be energised and live-tested. The page that says yes still defers to the person on site. */
export function mayEnergise(record: JobRecord, judgement: Judgement): Leave {
  const blocked = TEST_KEYS.map(test => judgement.readings[test])
    .filter(each => each.page !== 'live' && each.applies && each.stops && each.verdict !== 'unexpected')
  const gaps = blocked.filter(each => each.verdict === 'not-entered' || each.notCounted !== null)
  const reasons = [
    ...(contentOf(record, 'survey', 'survey').service_ok === 'unsafe' ? ['The service equipment is not safe.'] : []),
    ...(gaps.length ? [`Not yet taken: ${gaps.map(each => each.label).join(', ')}.`] : []),
    ...blocked.filter(each => !gaps.includes(each)).map(each => `${each.label}: ${each.words}.`),
    ...judgement.safety.filter(each => ['cable', 'earthing-method', 'supply', 'breaking-capacity', 'upstream-rcd'].includes(each.id) && each.verdict === 'outside').map(each => each.sentence),
    ...openPutBacks(record).filter(item => item.before === 'energising').map(item => `Not yet put back: ${item.words}.`),
    ...(isNetworkReplyOpen(record, judgement) ? ['The network operator has not agreed yet.'] : []),
  ]
  return { allowed: reasons.length === 0, reasons }
}

/** Whether the capacities may sign: only with nothing left that stops. */
export function maySign(record: JobRecord, judgement: Judgement, today: Day): Leave {
  const reasons = looseEnds(record, judgement, today).filter(end => end.stops).map(end => end.sentence)
  return { allowed: reasons.length === 0, reasons }
}
