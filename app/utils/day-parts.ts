/** The three boxes of a typed date, as text. */
export interface DayParts { day: string, month: string, year: string }

/** Splits YYYY-MM-DD for the boxes; anything else gives empty boxes. */
export function partsOfDay(day: string | null | undefined): DayParts {
  const [, year = '', month = '', date = ''] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(day ?? '') ?? []
  return { day: date && String(Number(date)), month: month && String(Number(month)), year }
}

/** Reads the boxes: a real day as YYYY-MM-DD, or null with the sentence for the person (no sentence while all are empty). */
export function dayFromParts(parts: DayParts): { day: string | null, problem?: string } {
  const [date, month, year] = [parts.day, parts.month, parts.year].map(part => part.trim())
  if (!date && !month && !year) return { day: null }
  const missing = [!date && 'the day', !month && 'the month', !year && 'the year'].filter(Boolean)
  if (missing.length) return { day: null, problem: `Add ${missing.join(' and ')}.` }
  if (![date, month, year].every(part => /^\d+$/.test(part ?? ''))) return { day: null, problem: 'Use figures, for example 9 3 2027.' }
  const fullYear = Number(year) < 100 ? 2000 + Number(year) : Number(year)
  const text = `${String(fullYear).padStart(4, '0')}-${String(Number(month)).padStart(2, '0')}-${String(Number(date)).padStart(2, '0')}`
  const instant = new Date(`${text}T00:00:00Z`)
  const isReal = !Number.isNaN(instant.getTime()) && instant.toISOString().startsWith(text)
  return isReal ? { day: text } : { day: null, problem: 'There is no such day. Look at the day and the month again.' }
}

/** A day a number of days later, as civil days (no time zone enters). */
export function addDays(day: string, days: number): string {
  return new Date(Date.parse(`${day}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10)
}
