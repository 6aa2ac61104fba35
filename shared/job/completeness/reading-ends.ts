/** Loose ends of the readings: gaps, figures outside their limit, and those that do not fit. */
import { TEST_KEYS } from '../tests.data'
import { readingRef } from '../judge/field-refs'
import type { Judgement, JudgedReading } from '../judge/types'
import type { LooseEnd } from './types'

export function readingEnds({ readings }: Judgement): LooseEnd[] {
  return TEST_KEYS.map(test => readings[test]).flatMap(readingEnd)
}

function readingEnd(reading: JudgedReading): LooseEnd[] {
  const { page, field } = readingRef(reading.test)
  const end = (stops: boolean, sentence: string, rest: Partial<LooseEnd> = {}): LooseEnd[] => [{ id: `reading:${reading.test}`, stops, sentence, page, field, with: 'installer', ...rest }]
  if (!reading.applies) return []
  if (reading.notCounted !== null) return end(true, `${reading.label}: the latest reading does not count. ${reading.notCounted}`)
  const { title, label, detail } = reading
  switch (reading.verdict) {
    case 'within': return []
    case 'not-entered': return reading.stops ? end(true, `Take the reading: ${lower(title)}.`) : []
    case 'outside': return end(reading.stops, `${label} is outside its limit${detail ? `, ${detail}` : ''}. ${cure(reading)}`)
    case 'waiting': return end(reading.stops, `${label} cannot be judged yet: ${detail || 'something is missing'}.`)
    case 'limited': return reading.stops
      ? end(true, `Take the reading: ${lower(title)}. LIM cannot stand on a new circuit.`)
      : end(false, `${label} is LIM: ${detail}.`)
    case 'not-applicable': return reading.stops
      ? end(true, `Take the reading: ${lower(title)}. N/A cannot stand here.`)
      : reading.isRequired ? end(false, `${label} is N/A: ${detail}.`) : []
    case 'unexpected': return reading.stops ? end(true, `Say why ${label} does not fit: ${reading.odd[0] ?? detail}`) : []
    default: return reading.verdict satisfies never
  }
}

/** What lifts an outside figure: a re-test within, an assessment by temperature, or a change of design; never a sentence. */
function cure({ test, counted }: JudgedReading): string {
  if (test !== 'Zs') return 'Find the cause and test again, or change the design.'
  return counted?.context.ambient_C === undefined
    ? 'Find the cause and test again; enter R1+R2 and the temperature to have it assessed by temperature; or change the design.'
    : 'Find the cause and test again, or change the design.'
}

const lower = (title: string) => (/^[A-Z][a-z]/.test(title) ? title.charAt(0).toLowerCase() + title.slice(1) : title)
