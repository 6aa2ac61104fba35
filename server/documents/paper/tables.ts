import type { Content, CustomTableLayout, TableCell } from 'pdfmake/interfaces'
import { edgeCell, EDGE_WIDTH, markBox } from './marks'
import type { Fact, FactGroup, Mark, Said } from './said'
import { GREY, HAIRLINE, INK, SIZE, TABLE_LINE } from './tokens'

/** Hairlines between rows, none between columns: the patterned edge is the only upright. */
export const ROWS: CustomTableLayout = {
  hLineWidth: () => HAIRLINE,
  vLineWidth: () => 0,
  hLineColor: () => INK,
  paddingLeft: () => 4,
  paddingRight: () => 4,
  paddingTop: () => 2.5,
  paddingBottom: () => 2.5,
}

/** The same, with the edge columns closed up to their figure. */
export function rowsWithEdges(edges: readonly number[]): CustomTableLayout {
  return { ...ROWS, paddingLeft: at => (edges.includes(at) ? 0 : 4), paddingRight: at => (edges.includes(at) ? 0 : 4), vLineWidth: at => (edges.includes(at) ? 0.7 : 0) }
}

export function headCell(text: string): TableCell {
  return { text, bold: true, fontSize: SIZE.note, fillColor: GREY, border: NO_UPRIGHTS }
}

/** No line at the left or right. */
export const NO_UPRIGHTS: [boolean, boolean, boolean, boolean] = [false, true, false, true]

/** A bare figure, whose digits line up with those above and below; hyphens would become wide, so words are left alone. */
const FIGURE = /^[><≤≥]?\s?\d[\d.,]*(\s?[A-Za-zΩµ°²%]{1,4})?$/

/** A cell's words, its box and its small print, one under the other. */
export function saidStack(said: Said, bold = true): Content {
  const { mark } = said
  // LIM and a gap are said once, in their box.
  const isBoxAlone = mark?.verdict === 'limited' || mark?.verdict === 'not-entered'
  const words: Content = { text: said.text, bold: bold && !said.isCode, ...(said.isCode && { fontSize: SIZE.note }), ...(FIGURE.test(said.text) && { fontFeatures: ['tnum'] }) }
  return {
    stack: [
      ...(isBoxAlone ? [] : [words]),
      ...(mark ? [markBox(mark)] : []),
      ...said.notes.map((note): Content => ({ text: note, fontSize: SIZE.note })),
    ],
  }
}

/** Edge columns keep an upright for the open bracket only; every other cell gives it up. */
const cellOf = (cell: object): TableCell => ({ border: NO_UPRIGHTS, ...cell }) as TableCell

export const saidCell = (said: Said, bold = true): TableCell => cellOf(saidStack(said, bold) as object)
export const textCell = (text: string, more: Partial<{ bold: boolean, fontSize: number, margin: [number, number, number, number], fontFeatures: ['tnum'] }> = {}): TableCell => cellOf({ text, ...more })
export const stackCell = (stack: Content[], fontSize: number = SIZE.table): TableCell => cellOf({ stack, fontSize })
export const markEdge = (mark: Mark | null): TableCell => cellOf(edgeCell(mark) as object)

const SIDE_HEAD_WIDTH = 74
const LABEL_WIDTH = 78
const LABEL_WIDTH_WIDE_PAGE = 70

/** A group of facts, two (or on a wide page four) abreast, its name in the margin at the left; a group stays on one page. */
export function factTable(group: FactGroup, abreast = 2): Content {
  const edges = Array.from({ length: abreast }, (_, at) => 2 + 3 * at)
  return {
    table: {
      widths: [SIDE_HEAD_WIDTH, ...edges.flatMap(() => [abreast > 2 ? LABEL_WIDTH_WIDE_PAGE : LABEL_WIDTH, EDGE_WIDTH, '*'])],
      body: rowsOf(group.facts, abreast).map((row, at) => [
        at === 0 ? { text: group.title, bold: true, border: [false, true, false, false] } : { text: '', border: [false, false, false, false] },
        ...row.slice(0, -1).flatMap(factCells),
        ...lastCells(row, abreast),
      ]),
    },
    layout: { ...rowsWithEdges(edges), paddingLeft: at => (at === 0 || edges.includes(at) ? 0 : 4) },
    fontSize: SIZE.table,
    lineHeight: TABLE_LINE,
    margin: [0, 0, 0, 8],
    unbreakable: true,
  }
}

function factCells(one: Fact): TableCell[] {
  return [textCell(one.label), markEdge(one.said.mark), saidCell(one.said)]
}

/** The last fact of a row takes what room is left, so that no cell stays empty. */
function lastCells(row: Fact[], abreast: number): TableCell[] {
  const last = row.at(-1)
  if (!last) return []
  const spare = 3 * (abreast - row.length)
  const [label, edge, said] = factCells(last) as [TableCell, TableCell, object]
  return [label, edge, spare ? { ...said, colSpan: 1 + spare } as TableCell : said as TableCell, ...Array.from({ length: spare }, () => '')]
}

const LONG = 48

/** Facts side by side, left to right; a long one stands alone so that it has room. */
export function rowsOf(facts: Fact[], abreast: number): Fact[][] {
  const rows: Fact[][] = []
  let open: Fact[] = []
  const close = () => {
    if (open.length) rows.push(open)
    open = []
  }
  for (const one of facts) {
    const isLong = one.said.text.length > LONG
    if (isLong) close()
    open.push(one)
    if (isLong || open.length === abreast) close()
  }
  close()
  return rows
}

/** A plain table with a grey head that repeats on each page; a row never splits. */
export function listTable(heads: string[], widths: (number | string)[], rows: (string | Said)[][], more: { boldFirst?: boolean } = {}): Content {
  return {
    table: {
      headerRows: 1,
      keepWithHeaderRows: 1,
      dontBreakRows: true,
      widths,
      body: [heads.map(headCell), ...rows.map(row => row.map((one, at) => (typeof one === 'string' ? textCell(one, { bold: more.boldFirst === true && at === 0 }) : saidCell(one, false))))],
    },
    layout: ROWS,
    fontSize: SIZE.table,
    lineHeight: TABLE_LINE,
    margin: [0, 0, 0, 9],
  }
}
