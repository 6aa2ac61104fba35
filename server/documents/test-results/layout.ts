import type { Content, TableCell } from 'pdfmake/interfaces'
import { ALONE, EDGE_WIDTH, markBox } from '../paper/marks'
import { openingBlock, section } from '../paper/opening'
import { factTable, headCell, listTable, markEdge, rowsWithEdges, stackCell, textCell } from '../paper/tables'
import { SIZE, TABLE_LINE } from '../paper/tokens'
import type { CircuitContent, ReadingRow, TestResultsContent } from './content'

/** The schedule of test results, landscape: each circuit a block of facts and a list of readings with their limits beside them. */
export function testResultsPages(content: TestResultsContent, page: { first: boolean }): Content[] {
  return [
    ...openingBlock(content.opening, { orientation: 'landscape', first: page.first }),
    factTable(content.board, 4),
    ...content.circuits.flatMap(circuitBlock),
    ...section('Instruments and tester', listTable(['Used for', 'Instrument', 'Serial', 'Calibrated until', 'On the day of each reading'], [190, '*', 90, 90, 150], content.instruments), factTable(content.tested, 4)),
  ]
}

function circuitBlock(circuit: CircuitContent): Content[] {
  return section(circuit.title, factTable(circuit.facts, 4), {
    table: {
      headerRows: 1,
      keepWithHeaderRows: 1,
      dontBreakRows: true,
      widths: [132, EDGE_WIDTH, 112, 48, 48, 118, '*'],
      body: [['Measured or tried', '', 'Found', 'Must be', 'Design', 'Verdict', 'How known, by whom, with what, when'].map(headCell), ...circuit.rows.map(toCells)],
    },
    layout: { ...rowsWithEdges([1]), paddingTop: () => 1.5, paddingBottom: () => 1.5 },
    fontSize: SIZE.table,
    lineHeight: TABLE_LINE,
    margin: [0, 0, 0, 8],
  })
}

function toCells(row: ReadingRow): TableCell[] {
  const isNA = row.found.startsWith('N/A')
  return [
    textCell(row.label),
    markEdge(row.mark),
    textCell(row.found, { bold: !row.isEarlier && !isNA, ...(/\d/.test(row.found) && { fontFeatures: ['tnum'] }) }),
    figureCell(isNA ? 'N/A' : row.mustBe),
    figureCell(isNA ? 'N/A' : row.expected),
    stackCell([row.mark ? markBox(row.mark, ALONE) : { text: isNA ? 'N/A' : 'no limit', fontSize: SIZE.note }]),
    stackCell([row.how, ...(row.sentence ? [row.sentence] : [])], SIZE.note),
  ]
}

const figureCell = (text: string): TableCell => textCell(text, /\d/.test(text) ? { fontFeatures: ['tnum'] } : { fontSize: SIZE.note })
