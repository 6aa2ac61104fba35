import { VERDICT_WORDS, type Verdict } from '#shared/utils/verdict'

/** The pattern of the left edge, one per verdict, so that the seven stay apart in grey and for any eye. N/A has none. */
const EDGES: Record<Verdict, string> = {
  'within': 'edge-solid',
  'outside': 'edge-hatch',
  'unexpected': 'edge-dash',
  'waiting': 'edge-double',
  'limited': 'edge-dot',
  'not-applicable': '',
  'not-entered': 'edge-bracket',
}

/** CSS class of a verdict's edge pattern; empty for none. */
export const edgeOf = (verdict: Verdict): string => EDGES[verdict]

const SAID: Partial<Record<Verdict, string>> = { 'limited': 'limited', 'not-applicable': 'not applicable' }

/** Units and signs as they are said: "0.79 Ω inside" -> "0.79 ohms inside". */
export function sayUnits(text: string): string {
  return text
    .replace(/MΩ/g, 'megohms').replace(/kΩ/g, 'kilohms').replace(/[\u03A9\u2126]/g, 'ohms')
    .replace(/(\d)[\s\u2009\u00A0]?mA\b/g, '$1 milliamps').replace(/(\d)[\s\u2009\u00A0]?kA\b/g, '$1 kiloamps').replace(/(\d)[\s\u2009\u00A0]?A\b/g, '$1 amps')
    .replace(/(\d)[\s\u2009\u00A0]?mm²/g, '$1 square millimetres').replace(/(\d)[\s\u2009\u00A0]?ms\b/g, '$1 milliseconds').replace(/(\d)[\s\u2009\u00A0]?m\b/g, '$1 metres')
    .replace(/(\d)[\s\u2009\u00A0]?V\b/g, '$1 volts').replace(/×/g, 'times').replace(/\u2212/g, 'minus ').replace(/≤/g, 'at most').replace(/≥/g, 'at least')
    .replace(/[\u2009\u00A0]/g, ' ')
}

/** What a screen reader says for a verdict: "outside limit, by 0.12 ohms"; "limited, reason: board locked". */
export function speak(verdict: Verdict, detail?: string): string {
  const word = SAID[verdict] ?? VERDICT_WORDS[verdict].toLowerCase()
  if (!detail) return word
  const joint = verdict === 'limited' || verdict === 'not-applicable' ? ', reason: ' : ', '
  return word + joint + sayUnits(detail)
}
