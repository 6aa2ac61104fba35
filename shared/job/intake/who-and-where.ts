/** Who writes and where the work is: the parts of a text that follow no fixed format, found by where they stand. */

const STREET = /\b(?:street|st|road|rd|avenue|ave|lane|ln|close|cl|drive|dr|way|row|court|ct|crescent|cres|place|pl|terrace|gardens?|gdns|grove|hill|park|square|sq|mews|walk|view|rise|green|mount|parade|path|yard|wharf|quay|gate|brow|bank|fold|croft|vale|end|cottages?|house|farm|barn|lodge)\b\.?$/i
const NUMBERED = /^(?:(?:flat|apartment|apt|unit)\s*\w+[, ]+)?\d+[a-z]?(?:\s?[-/]\s?\d+[a-z]?)?\s+[a-z]/i
/** A house and street within a sentence: "we live at 3 Brook Street". */
const WITHIN = /(?<![\d.])\d{1,4}[a-z]?(?:[-/]\d{1,4}[a-z]?)?(?: [\p{L}'’-]+){0,3}? (?:street|road|avenue|lane|close|drive|way|row|court|crescent|place|terrace|gardens|grove|hill|park|square|mews|walk|rise|green)\b/iu
const GREETING = /^(?:hi|hello|hey|dear|good (?:morning|afternoon|evening)|thanks?|thank you|regards|kind regards|best|best wishes|cheers|sent from|from|to|subject|date|re|fwd?)\b/i
const NAME_WORDS = /^(?:(?:mr|mrs|ms|miss|mx|dr|prof)\.?\s+)?\p{L}[\p{L}'’-]*\.?(?:\s+(?:(?:de|van|von|der|la|al|bin|mc|o)\s+)*\p{L}[\p{L}'’-]*\.?){1,3}$/iu
const NOT_A_NAME = /\b(?:charger|charge|point|quote|survey|install|installation|house|car|vehicle|phone|email|mobile|tel|address|asap|please|wants?|needs?|would|like|call|from|the|for|with|and|is|are|has|socket|tethered|phase|phases|morning|afternoon|next|week|driveway|garage|parking|owner|tenant|today|tomorrow|monday|tuesday|wednesday|thursday|friday|saturday|sunday)\b/i
const SAID = /(?:[Mm]y name is|[Nn]ame\s*:|[Tt]his is|I am|I'm|I’m)\s+((?:(?:mr|mrs|ms|miss|mx|dr)\.?\s+)?\p{Lu}[\p{L}'’-]+(?:\s+\p{Lu}[\p{L}'’-]+){1,2})/u
const SIGNED = /(?:regards|wishes|thanks|thank you|cheers|sincerely|faithfully)[,.!]?\s*\n+\s*([^\n]{3,40})/i

/** A stretch of the text with its place, so that what is taken from the note is exactly what was understood. */
export interface Piece { text: string, from: number, to: number }

/** The text cut at commas, semicolons and line ends, without the blanks around each piece. */
export function piecesOf(text: string): Piece[] {
  return [...text.matchAll(/[^,;\n]+/g)].map((found) => {
    const lead = /^\s*/.exec(found[0])![0].length
    const trimmed = found[0].trim()
    return { text: trimmed, from: found.index + lead, to: found.index + lead + trimmed.length }
  }).filter(piece => piece.text)
}

/** The piece that is a house and street: "14 Elm Row". A flat before the number belongs to it. */
export function findAddress(pieces: readonly Piece[]): Piece | null {
  const isNumbered = (piece: Piece) => NUMBERED.test(piece.text) && piece.text.split(/\s+/).length <= 7 && !/\b(?:kw|phase|metres?|am|pm|year|amp)\b/i.test(piece.text)
  const named = (piece: Piece) => !/\d/.test(piece.text) && piece.text.split(/\s+/).length <= 4 && piece.text.split(/\s+/).length >= 2 && STREET.test(piece.text) && !NOT_A_NAME.test(piece.text.replace(STREET, ''))
  const found = pieces.find(piece => isNumbered(piece) && STREET.test(piece.text)) ?? pieces.find(isNumbered) ?? pieces.find(named)
  if (!found) return findWithin(pieces)
  const before = pieces[pieces.indexOf(found) - 1]
  return before && /^(?:flat|apartment|apt|unit)\s*\w+$/i.test(before.text) ? { text: `${before.text}, ${found.text}`, from: before.from, to: found.to } : found
}

function findWithin(pieces: readonly Piece[]): Piece | null {
  for (const piece of pieces) {
    const found = WITHIN.exec(piece.text)
    if (found) return { text: found[0], from: piece.from + found.index, to: piece.from + found.index + found[0].length }
  }
  return null
}

/** The town: the last piece of words between the address and the postcode. */
export function findTown(pieces: readonly Piece[], address: Piece | null, postcodeAt: number | null): Piece | null {
  if (!address || postcodeAt === null || postcodeAt < address.to) return null
  const between = pieces.filter(piece => piece.from >= address.to && piece.to <= postcodeAt && /^[\p{L}][\p{L} .'’-]*$/u.test(piece.text) && piece.text.split(/\s+/).length <= 4)
  return between.at(-1) ?? null
}

/** The name: said as such, signed under the text, or standing first. */
export function findName(text: string, pieces: readonly Piece[], taken: readonly (Piece | null)[]): Piece | null {
  const said = SAID.exec(text)
  if (said) return pieceAt(text, said[1]!, said.index)
  const signed = SIGNED.exec(text)
  const signature = signed?.[1]?.trim()
  if (signature && isName(signature)) return pieceAt(text, signature, signed!.index)
  return pieces.slice(0, 3).find(piece => !taken.some(other => other && piece.from < other.to && piece.to > other.from) && isName(piece.text)) ?? null
}

const isName = (words: string) => NAME_WORDS.test(words) && !GREETING.test(words) && !NOT_A_NAME.test(words)
function pieceAt(text: string, words: string, after: number): Piece {
  const from = text.indexOf(words, after)
  return { text: words, from, to: from + words.length }
}

/** Words typed all in small letters get their capitals: "jane holt" -> "Jane Holt". Anything else stays as typed. */
export function withCapitals(words: string): string {
  return words === words.toLowerCase() ? words.replace(/(^|[\s'’-])(\p{L})/gu, (_, gap: string, letter: string) => gap + letter.toUpperCase()) : words
}
