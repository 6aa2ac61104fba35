import type { Content } from 'pdfmake/interfaces'
import { markBox } from '../paper/marks'
import { note, openingBlock, section, sectionHead } from '../paper/opening'
import { headCell, listTable, ROWS, stackCell, textCell } from '../paper/tables'
import { SIZE, TABLE_LINE } from '../paper/tokens'
import { MEMORY_SENTENCE, type WorkingContent, type WorkingRow, type WorkingSheet } from './content'

/** The design working: each step with the numbers in it, its source and how well that is known. */
export function workingPages(content: WorkingContent, page: { first: boolean }): Content[] {
  return [
    ...openingBlock(content.opening, { orientation: 'portrait', first: page.first }),
    { text: content.caution, fontSize: SIZE.table, margin: [0, 0, 0, 6] },
    ...content.sheets.flatMap(sheetBlock),
  ]
}

function sheetBlock(sheet: WorkingSheet): Content[] {
  return [
    { columns: [{ width: 'auto', ...sectionHead(sheet.title) as object } as { text: string, width: 'auto' }, ...(sheet.mark ? [{ width: 'auto', stack: [markBox(sheet.mark)], margin: [10, 5, 0, 0] as [number, number, number, number] }] : [])] },
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        dontBreakRows: true,
        widths: [86, '*', 74, 142, 66],
        body: [['Symbol', 'Numbers put in', 'Result', 'Rests on', 'How known'].map(headCell), ...sheet.rows.map(toCells)],
      },
      layout: ROWS,
      fontSize: SIZE.table,
      lineHeight: TABLE_LINE,
      margin: [0, 0, 0, 5],
    },
    ...[...sheet.reasons, ...sheet.notes].map(note),
    ...(sheet.sizes.length ? section('Sizes compared', listTable(['Size', 'Carries', 'Drop', 'Drop', 'Zs', 'First rule it fails'], [50, 60, 60, 50, 60, '*'], sheet.sizes)) : []),
    { stack: [{ text: 'To get the same figures again, run', fontSize: SIZE.note }, { text: sheet.command, fontSize: SIZE.note, bold: true }, { text: 'and give it', fontSize: SIZE.note }, { text: sheet.input, fontSize: SIZE.note }], unbreakable: true, margin: [0, 2, 0, 8] },
  ]
}

function toCells(row: WorkingRow) {
  return [
    textCell(row.symbol, { bold: true }),
    textCell(row.expression, { fontFeatures: ['tnum'] }),
    textCell(row.value, { bold: true, fontFeatures: ['tnum'] }),
    stackCell([row.source, ...(row.isFromMemory ? [{ text: MEMORY_SENTENCE, fontSize: SIZE.note }] : [])]),
    row.isFromMemory ? stackCell([markBox({ verdict: 'limited', words: row.confidence })]) : textCell(row.confidence),
  ]
}
