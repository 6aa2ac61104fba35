import type { Content, CustomTableLayout, Pattern, PatternFill, TableCell } from 'pdfmake/interfaces'
import type { Verdict } from '#shared/utils/verdict'
import type { Mark } from './said'
import { INK, SIZE } from './tokens'

/** The patterns of the left edge, as tiles: hatch, dashes, dots, double rule. They read in black on white and in a photocopy. */
export const EDGE_PATTERNS: Record<string, Pattern> = {
  hatch: { boundingBox: [0, 0, 4, 4], xStep: 4, yStep: 4, pattern: '0.9 w 0 0 m 4 4 l s -1 3 m 1 5 l s 3 -1 m 5 1 l s' },
  dashes: { boundingBox: [0, 0, 10, 5], xStep: 10, yStep: 5, pattern: '0 0 10 3 re f' },
  dots: { boundingBox: [0, 0, 2.4, 3.2], xStep: 2.4, yStep: 3.2, pattern: '0.4 0.4 1.4 1.4 re f' },
  rules: { boundingBox: [0, 0, 2, 8], xStep: 2, yStep: 8, pattern: '0.4 0 0.6 8 re f' },
}

const EDGES: Record<Verdict, string | PatternFill | null> = {
  'within': INK,
  'outside': ['hatch', INK],
  'unexpected': ['dashes', INK],
  'waiting': ['rules', INK],
  'limited': ['dots', INK],
  'not-applicable': null,
  'not-entered': null,
}

export const EDGE_WIDTH = 4

/** The narrow cell at the left of a figure whose pattern says the verdict; plain where there is none. */
export function edgeCell(mark: Mark | null, rowSpan = 1): TableCell {
  const fill = mark ? EDGES[mark.verdict] : null
  const isBracket = mark?.verdict === 'not-entered'
  return { text: '', ...(fill && { fillColor: fill }), ...(isBracket && { border: [true, true, false, true] }), ...(rowSpan > 1 && { rowSpan }) }
}

type Room = [number, number, number, number]
const UNDER_FIGURE: Room = [0, 1.5, 0, 1]
/** For a box that has a cell to itself. */
export const ALONE: Room = [0, 0, 0, 0]

/** The box with the verdict's words: filled, double, dashed, single or bracketed, as the verdict asks; N/A has no box. */
export function markBox(mark: Mark, room: Room = UNDER_FIGURE): Content {
  const isFilled = mark.verdict === 'within'
  const words: Content = { text: mark.words, fontSize: SIZE.note, bold: mark.verdict === 'outside' || isFilled, color: isFilled ? '#ffffff' : INK, fontFeatures: ['tnum'] }
  if (mark.verdict === 'not-applicable') return words
  const inner: Content = { table: { widths: ['auto'], body: [[{ ...words, ...(isFilled && { fillColor: INK }) }]] }, layout: boxLayout(mark.verdict), margin: room }
  if (mark.verdict !== 'outside') return inner
  return { table: { widths: ['auto'], body: [[{ ...inner, margin: 0 }]] }, layout: OUTER_RULE, margin: room }
}

const LINE = 0.7
const frame = (padding: number): CustomTableLayout => ({
  hLineWidth: () => LINE,
  vLineWidth: () => LINE,
  paddingLeft: () => padding,
  paddingRight: () => padding,
  paddingTop: () => Math.min(padding, 1),
  paddingBottom: () => Math.min(padding, 1.2),
})

/** With a single inner frame this makes the double border of Outside limit. */
const OUTER_RULE: CustomTableLayout = { ...frame(1), paddingTop: () => 1, paddingBottom: () => 1 }

function boxLayout(verdict: Verdict): CustomTableLayout {
  const single = frame(3)
  if (verdict === 'unexpected') return { ...single, hLineStyle: () => ({ dash: { length: 2.2, space: 1.6 } }), vLineStyle: () => ({ dash: { length: 2.2, space: 1.6 } }) }
  // Not entered: an open bracket and a rule to write on.
  if (verdict === 'not-entered') return { ...single, hLineWidth: line => (line === 0 ? 0 : LINE), vLineWidth: line => (line === 0 ? LINE : 0) }
  return single
}
