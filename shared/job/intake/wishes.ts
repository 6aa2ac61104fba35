/** What a text asks for: the charger's rating, phases and outlet, and when somebody may come. */
import { addDays, daysBetween, isDay, weekdayOf, type Day } from '../../utils/dates'

export interface Wishes { rating_kW?: number, phases?: '1' | '3', outlet?: 'socket' | 'tethered' }

/** "7.4 kW", "7kw", "22 KW": never kWh, which is energy. */
export function readRating(text: string): { value: number, shown: string } | null {
  for (const found of text.matchAll(/(?<![\d.,])(\d{1,2}(?:[.,]\d{1,2})?)\s?kw(?!\s?h)/gi)) {
    const value = Number(found[1]!.replace(',', '.'))
    if (value >= 1 && value <= 50) return { value, shown: `${value}\u2009kW` }
  }
  return null
}

export function readPhases(text: string): '1' | '3' | null {
  if (/\b(?:3|three)[- ]?ph(?:ase)?s?\b/i.test(text)) return '3'
  return /\b(?:1|one|single)[- ]?ph(?:ase)?\b/i.test(text) ? '1' : null
}

export function readOutlet(text: string): 'socket' | 'tethered' | null {
  if (/\b(?:un-?tethered|not tethered|socketed|with (?:a )?socket)\b/i.test(text)) return 'socket'
  return /\btethered\b/i.test(text) ? 'tethered' : null
}

const WEEKDAYS = ['sun', 'mon', 'tue', 'wed', 'thu', 'fri', 'sat']
const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec']

/** The first day from today on that the text names; null where it names none. */
export function readDay(text: string, today: Day): Day | null {
  const words = text.toLowerCase()
  const dated = readDated(words, today)
  if (dated) return dated
  if (/\btomorrow\b/.test(words)) return addDays(today, 1)
  const named = /\b(?:(next)\s+)?(mon|tues?|wed(?:nes)?|thur?s?|fri|sat(?:ur)?|sun)(?:day)?\b/.exec(words)
  if (!named) return null
  const wanted = WEEKDAYS.indexOf(named[2]!.slice(0, 3))
  const now = WEEKDAYS.indexOf(weekdayOf(today).toLowerCase())
  return addDays(today, ((wanted - now + 7) % 7) || 7)
}

/** "8/12", "8.12.2026", "8 December", "December 8th". */
function readDated(words: string, today: Day): Day | null {
  const spelled = new RegExp(`\\b(\\d{1,2})(?:st|nd|rd|th)?(?: of)? (${MONTHS.join('|')})[a-z]*(?:[ ,]+(20\\d\\d))?`).exec(words)
  if (spelled) return nextOf(Number(spelled[1]), MONTHS.indexOf(spelled[2]!) + 1, spelled[3], today)
  const turned = new RegExp(`\\b(${MONTHS.join('|')})[a-z]* (\\d{1,2})(?:st|nd|rd|th)?\\b`).exec(words)
  if (turned) return nextOf(Number(turned[2]), MONTHS.indexOf(turned[1]!) + 1, undefined, today)
  const figures = /(?<![\d/.])(\d{1,2})[/.](\d{1,2})(?:[/.](20\d\d|\d\d))?(?![\d/]|\.\d|\s?kw)/.exec(words)
  return figures && (figures[0].includes('/') || figures[3]) ? nextOf(Number(figures[1]), Number(figures[2]), figures[3], today) : null
}

/** The day in the year given, or else the next such day from today. A day that does not exist, or lies behind, is none. */
function nextOf(date: number, month: number, year: string | undefined, today: Day): Day | null {
  const text = (y: number) => `${y}-${String(month).padStart(2, '0')}-${String(date).padStart(2, '0')}`
  const thisYear = Number(today.slice(0, 4))
  const candidates = year ? [Number(year) < 100 ? 2000 + Number(year) : Number(year)] : [thisYear, thisYear + 1]
  return candidates.map(text).find(day => isDay(day) && daysBetween(today, day) >= 0) ?? null
}

export function readHalf(text: string): 'am' | 'pm' | null {
  if (/\b(?:morning|a\.?m\.?)(?![a-z])/i.test(text)) return 'am'
  return /\b(?:afternoon|p\.?m\.?)(?![a-z])/i.test(text) ? 'pm' : null
}
