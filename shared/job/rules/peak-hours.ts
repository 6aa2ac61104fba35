/** The weekday peak, and where a charging window meets it. Minutes are counted from Monday 00:00 through the week. */
import type { ChargingWindow } from './smart-window'

/** Minutes after midnight, Monday to Friday (rule SMT-02). */
export const PEAKS = [
  { name: 'morning', from: 8 * 60, to: 11 * 60 },
  { name: 'evening', from: 16 * 60, to: 22 * 60 },
] as const

export interface PeakOverlap {
  window: number
  from: string
  to: string
}

const MINUTES_PER_DAY = 1440
const DAYS_PER_WEEK = 7
const WEEKDAYS = [0, 1, 2, 3, 4]
const DAYS_OF: Record<ChargingWindow['days'], readonly number[]> = {
  'weekday': WEEKDAYS,
  'weekend': [5, 6],
  'every-day': [0, 1, 2, 3, 4, 5, 6],
  'mon': [0],
  'tue': [1],
  'wed': [2],
  'thu': [3],
  'fri': [4],
  'sat': [5],
  'sun': [6],
}

/** Where one window meets each peak, as times of day; one entry for each peak it meets. */
export function overlapsOf(window: ChargingWindow, at: number): PeakOverlap[] {
  return PEAKS.flatMap((peak) => {
    const pieces = DAYS_OF[window.days].flatMap(day => piecesOn(day, window, peak))
    if (!pieces.length) return []
    const from = Math.min(...pieces.map(piece => piece.from))
    const to = Math.max(...pieces.map(piece => piece.to))
    return [{ window: at, from: clockText(from), to: clockText(to) }]
  })
}

/** The stretches, in minutes after midnight, that a window begun on that day shares with the peak of that day and the next. */
function piecesOn(day: number, window: ChargingWindow, peak: { from: number, to: number }) {
  const from = minutesOf(window.from)
  const until = minutesOf(window.to)
  const end = until > from ? until : until + MINUTES_PER_DAY
  return [0, 1]
    .filter(later => WEEKDAYS.includes((day + later) % DAYS_PER_WEEK))
    .map(later => ({
      from: Math.max(from - later * MINUTES_PER_DAY, peak.from),
      to: Math.min(end - later * MINUTES_PER_DAY, peak.to),
    }))
    .filter(piece => piece.from < piece.to)
}

const minutesOf = (clock: string) => Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3))

/** Minutes after midnight as a time of day. @example 480 -> '08:00' */
export function clockText(minutes: number): string {
  return `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`
}
