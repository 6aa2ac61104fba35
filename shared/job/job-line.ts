/** How one job reads in a list: its state and whose turn it is, in words. */
import { compareDays, daysBetween, formatDay, londonDay, type Day } from '../utils/dates'
import { STAGE_WORDS, type Stage } from './stages'

interface Line { stage: Stage, sideState: string | null, withWhom: string, nextDay: Day | null, changedAt: string }

const SIDE_WORDS: Record<string, string> = { 'sent-back': 'Sent back', 'waiting': 'Waiting', 'cancelled': 'Cancelled' }
/** People by their part in the work, as they stand after "With:". */
const HOLDER_WORDS: Record<string, string> = { 'office': 'the office', 'installer': 'the installer', 'supervisor': 'the supervisor', 'customer': 'the customer', 'network operator': 'the network operator', 'nobody': 'nobody' }

/** "On site", or "On site, sent back". */
export function stateWords({ stage, sideState }: Pick<Line, 'stage' | 'sideState'>): string {
  const side = sideState ? SIDE_WORDS[sideState] ?? sideState : null
  return side ? side === 'Cancelled' ? side : `${STAGE_WORDS[stage].words}, ${side.toLowerCase()}` : STAGE_WORDS[stage].words
}

export const holderWords = (withWhom: string): string => HOLDER_WORDS[withWhom] ?? withWhom

/** A day near today in few words: "today", "tomorrow", "Tue 8 Dec"; the year only where it is another. */
export function nearDay(day: Day, today: Day): string {
  const away = daysBetween(today, day)
  if (away === 0) return 'today'
  if (away === 1) return 'tomorrow'
  if (away === -1) return 'yesterday'
  return day.slice(0, 4) === today.slice(0, 4) ? formatDay(day).replace(/ \d{4}$/, '') : formatDay(day)
}

/** The next visit in words; one that lies behind and is not marked done says so. */
export function nextWords({ nextDay }: Pick<Line, 'nextDay'>, today: Day): string {
  if (!nextDay) return ''
  return compareDays(nextDay, today) < 0 ? `was ${nearDay(nextDay, today)}` : nearDay(nextDay, today)
}

export const changedWords = ({ changedAt }: Pick<Line, 'changedAt'>, today: Day): string => nearDay(londonDay(isoOf(changedAt)), today)

/** PostgreSQL writes "2026-12-01 09:30:00.123456+00"; every engine reads the form with T and minutes of offset. */
const isoOf = (moment: string) => moment.replace(' ', 'T').replace(/([+-]\d\d)$/, '$1:00')
