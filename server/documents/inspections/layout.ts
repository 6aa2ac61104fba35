import type { Content, TableCell } from 'pdfmake/interfaces'
import { EDGE_WIDTH } from '../paper/marks'
import { note, openingBlock } from '../paper/opening'
import { headCell, markEdge, rowsWithEdges, textCell } from '../paper/tables'
import { SIZE, TABLE_LINE } from '../paper/tokens'
import type { InspectionRow, InspectionsContent } from './content'

/** The schedule of inspections, landscape: one row an item, the edge before its outcome. */
export function inspectionsPages(content: InspectionsContent, page: { first: boolean }): Content[] {
  return [
    ...openingBlock(content.opening, { orientation: 'landscape', first: page.first }),
    note(`List of items: ${content.edition}. An item that is unsatisfactory, or not entered, stops signing.`),
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        dontBreakRows: true,
        widths: [26, '*', EDGE_WIDTH, 150, 190, 126],
        body: [['No.', 'What was looked at', '', 'Outcome', 'Rests on', 'Who and when'].map(headCell), ...content.rows.map(toCells)],
      },
      layout: { ...rowsWithEdges([2]), paddingTop: () => 1.7, paddingBottom: () => 1.7 },
      fontSize: SIZE.table,
      lineHeight: TABLE_LINE,
      margin: [0, 0, 0, 6],
    },
  ]
}

function toCells(row: InspectionRow): TableCell[] {
  const isPart = row.number.includes('.')
  return [
    textCell(row.number),
    textCell(row.words, { margin: [isPart ? 10 : 0, 0, 0, 0] }),
    markEdge(row.mark),
    textCell(row.outcome, { bold: row.mark.verdict !== 'not-applicable' }),
    textCell(row.restsOn),
    textCell(row.by, { fontSize: SIZE.note }),
  ]
}
