/** What the Pairs page asks of a supervisor before the certificate may be countersigned. */
import type { Pair } from '#shared/job/pairs'

const PICKS = 2

/** A number from text, the same on every machine (FNV-1a): which ordinary rows a job picks must not change with each look. */
function numberFrom(text: string): number {
  let hash = 0x811C9DC5
  for (const letter of text) hash = Math.imul(hash ^ letter.codePointAt(0)!, 0x01000193) >>> 0
  return hash
}

/** Two of the ordinary rows, picked by the job's id: nobody chooses them, and everybody gets the same. */
export function pickToOpen(ordinary: readonly Pair[], jobId: string): Pair[] {
  return [...ordinary].sort((a, b) => numberFrom(jobId + a.id) - numberFrom(jobId + b.id)).slice(0, PICKS)
}

/** Why countersigning must wait for the rows, as a sentence, or null. */
export function whyNotOpened(asked: readonly Pair[], picked: readonly Pair[], opened: ReadonlySet<string>): string | null {
  const odd = asked.filter(pair => !opened.has(pair.id)).length
  const picks = picked.filter(pair => !opened.has(pair.id)).length
  const parts = [odd && `${odd} odd ${odd === 1 ? 'row' : 'rows'} not accepted`, picks && `${picks} ${picks === 1 ? 'pick' : 'picks'} not opened`].filter(Boolean)
  return parts.length ? `Still to do: ${parts.join(', ')}.` : null
}

export interface Bar { key: 'designed' | 'found' | 'limit', label: string, percent: number }

/** The lengths of a row's bars, all to one scale: the longest of the three is 100. */
export function pairBars({ scale }: Pair): Bar[] {
  if (!scale) return []
  const given = ([['designed', 'design', scale.designed], ['found', 'found', scale.found], ['limit', 'limit', scale.limit]] as const).filter(([, , value]) => value !== null && value >= 0)
  const longest = Math.max(...given.map(([, , value]) => value!), 0)
  return longest > 0 ? given.map(([key, label, value]) => ({ key, label, percent: 100 * value! / longest })) : []
}
