/** How a notice is said: which, to whom, by when, and how pressing that is. */
import type { Country } from '../types/firm'
import { daysBetween, formatDay, type Day } from '../utils/dates'
import { workingDaysBetween } from './working-days'

export const SENT_WAYS = ['portal', 'e-mail', 'post'] as const
export type SentWay = (typeof SENT_WAYS)[number]
export const SENT_WAY_WORDS: Record<SentWay, string> = { 'portal': 'On their portal', 'e-mail': 'By e-mail', 'post': 'By post' }

export const REPLY_OUTCOMES = ['accepted', 'conditions', 'question', 'refused'] as const
export type ReplyOutcome = (typeof REPLY_OUTCOMES)[number]
export const REPLY_WORDS: Record<ReplyOutcome, string> = { accepted: 'Accepted', conditions: 'Accepted with conditions', question: 'They ask for more', refused: 'Refused' }

export interface NoticeLine {
  id: string
  jobId: string
  ref: string
  kind: string
  recipient: string
  reasons: string[]
  lastDay: Day | null
  state: 'not-needed' | 'to-prepare' | 'sent' | 'answered'
  sentOn: Day | null
  sentHow: string | null
  reference: string
  customer: string
  address: string
  postcode: string
  country: Country
  /** The data sheet, once it has been asked for. */
  paperId: string | null
  paperState: string | null
  replies: { outcome: string, note: string, repliedOn: Day }[]
}

const KIND_WORDS: Record<string, string> = { 'network-operator': 'the network operator', 'building-control': 'building control', 'grant': 'the grant body' }

/** "Tell the network operator about the charger at 14 Elm Row". */
export function noticeSentence(line: Pick<NoticeLine, 'kind' | 'recipient' | 'state' | 'address' | 'sentOn' | 'lastDay'>, today: Day): string {
  const whom = KIND_WORDS[line.kind] ?? line.recipient
  switch (line.state) {
    case 'to-prepare': return isOverdue(line, today) ? `Tell ${whom} about ${line.address}: the last day has gone by` : `Tell ${whom} about ${line.address}`
    case 'sent': return `${capital(whom)} was told about ${line.address}${line.sentOn ? ` on ${formatDay(line.sentOn)}` : ''}`
    case 'answered': return `${capital(whom)} has answered about ${line.address}`
    case 'not-needed': return `${capital(whom)} need not be told about ${line.address}`
    default: return line.state satisfies never
  }
}

const capital = (words: string) => words[0]!.toUpperCase() + words.slice(1)

export const isOverdue = (line: Pick<NoticeLine, 'state' | 'lastDay'>, today: Day): boolean => line.state === 'to-prepare' && line.lastDay !== null && daysBetween(line.lastDay, today) > 0

/** "by Tue 29 Dec 2026 · 18 working days left"; how it stands to its last day. */
export function lastDayWords(line: Pick<NoticeLine, 'state' | 'lastDay' | 'country'>, today: Day): string {
  if (!line.lastDay) return 'No last day'
  const left = workingDaysBetween(today, line.lastDay, line.country)
  const words = `Last day ${formatDay(line.lastDay)}`
  if (line.state !== 'to-prepare') return words
  if (isOverdue(line, today)) return `${words} · ${Math.abs(left) === 1 ? '1 working day' : `${Math.abs(left)} working days`} late`
  return `${words} · ${left === 1 ? '1 working day' : `${left} working days`} left`
}
