import type { Content, TableCell } from 'pdfmake/interfaces'
import { ALONE, EDGE_WIDTH, markBox } from '../paper/marks'
import { openingBlock, sectionHead, sentence, type OpeningContent } from '../paper/opening'
import { headCell, markEdge, rowsWithEdges, stackCell, textCell } from '../paper/tables'
import { SIZE, TABLE_LINE } from '../paper/tokens'
import type { Advice } from './live-with-it'
import type { ProofRow } from './prove-it'

/** "Live with it": four short pages of advice, each kept whole. */
export function liveWithItPages(opening: OpeningContent, advice: Advice[], page: { first: boolean }): Content[] {
  return [
    ...openingBlock(opening, { orientation: 'portrait', first: page.first }),
    ...advice.map((one): Content => ({
      stack: [sectionHead(one.title), sentence(one.lead), { ol: one.steps.map((step): Content => ({ text: step, margin: [0, 0, 0, 3] })) }],
      unbreakable: true,
      margin: [0, 0, 0, 8],
    })),
  ]
}

/** "Prove it": what was checked, found, must be, and what that means. */
export function proveItPages(opening: OpeningContent, rows: ProofRow[], page: { first: boolean }): Content[] {
  return [
    ...openingBlock(opening, { orientation: 'portrait', first: page.first }),
    sentence('Each row is one check made at your house. The figures and marks are those of the certificate.'),
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        dontBreakRows: true,
        widths: [104, EDGE_WIDTH, 84, 62, 96, '*'],
        body: [['What we checked', '', 'What we found', 'What it must be', 'Verdict', 'In short'].map(headCell), ...rows.map(toCells)],
      },
      layout: { ...rowsWithEdges([1]), paddingTop: () => 2, paddingBottom: () => 2 },
      fontSize: SIZE.table,
      lineHeight: TABLE_LINE,
    },
  ]
}

function toCells(row: ProofRow): TableCell[] {
  return [
    textCell(row.checked),
    markEdge(row.mark),
    textCell(row.found, { bold: row.mustBe !== 'N/A', ...(/\d/.test(row.found) && { fontFeatures: ['tnum'] }) }),
    textCell(row.mustBe),
    stackCell([row.mark ? markBox(row.mark, ALONE) : 'N/A']),
    textCell(row.inShort),
  ]
}
