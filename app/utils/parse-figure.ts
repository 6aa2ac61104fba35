/** What a person typed, read as a figure; blank reads as null. A problem is a sentence for the person. */
export type ReadFigure = { value: number | null } | { problem: string }

const FIGURE = /^([+\-\u2212]?)(\d*)(?:[.,](\d*))?\s*(?:[a-zµμωΩ%²/° ().]*)$/iu
const ASK = 'Type a figure, for example 0.35.'

/**
 * Reads "0.35", "0,35", ".35", "0.35 ohm" and "0.35Ω". A comma before exactly three digits could mean thousands or
 * thousandths, so it is asked about rather than guessed.
 *
 * @example parseFigure('0,35 ohm') -> { value: 0.35 }
 */
export function parseFigure(text: string): ReadFigure {
  const trimmed = text.trim()
  if (!trimmed) return { value: null }
  if ((trimmed.match(/[.,]/g) ?? []).length > 1 && /\d[.,]\d*[.,]/.test(trimmed)) return { problem: 'This has two points. Type the figure again.' }
  const found = FIGURE.exec(trimmed)
  const [, sign = '', whole = '', part = ''] = found ?? []
  if (!found || (!whole && !part)) return { problem: ASK }
  if (/^[1-9]\d{0,2},\d{3}(?!\d)/.test(trimmed.replace(/^[+\-\u2212]/, ''))) return { problem: `Type ${whole}${part} or ${whole}.${part}: the comma could mean either.` }
  const value = Number(`${whole || '0'}.${part || '0'}`)
  return { value: sign && sign !== '+' ? -value : value }
}

/** A figure as text: leading nought, true minus sign, at most six places and none beyond what the figure has. */
export function showFigure(value: number): string {
  const text = String(Number(value.toFixed(6)))
  return text.replace('-', '\u2212')
}
