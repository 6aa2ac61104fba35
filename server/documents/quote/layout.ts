import type { Content, TDocumentDefinitions } from 'pdfmake/interfaces'
import { definePaper } from '../paper/define-paper'
import { openingBlock, section } from '../paper/opening'
import { factTable, headCell, ROWS, textCell } from '../paper/tables'
import { SIZE, TABLE_LINE } from '../paper/tokens'
import { quoteWords, type MoneyWords, type QuoteContent } from './content'

export function quoteDefinition(quote: QuoteContent): TDocumentDefinitions {
  return definePaper({
    title: `Quote ${quote.number}, ${quote.premises.shortAddress}`,
    firm: quote.firm.name,
    orientation: 'portrait',
    foot: { number: quote.number, shortAddress: quote.premises.shortAddress, fourWords: null, replaces: null },
    isDraft: false,
    at: quote.at,
    pages: moneyPages(quoteWords(quote)),
  })
}

/** Parties, lines with figures at the right, sums, then what else must be said: the shape of a quote and of an invoice. */
export function moneyPages(words: MoneyWords): Content[] {
  return [
    ...openingBlock(words.opening, { orientation: 'portrait', first: true }),
    factTable(words.parties),
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        dontBreakRows: true,
        widths: ['*', 62, 78, 52, 72],
        body: [words.heads.map((head, at) => ({ ...headCell(head) as object, text: head, alignment: at ? 'right' as const : 'left' as const })), ...words.lines.map(toCells)],
      },
      layout: ROWS,
      fontSize: SIZE.table,
      lineHeight: TABLE_LINE,
      margin: [0, 0, 0, 4],
    },
    {
      table: { widths: ['*', 190, 84], dontBreakRows: true, body: words.totals.map(([label, sum]) => [{ text: '', border: [false, false, false, false] }, textCell(label), { ...figure(sum), bold: true }]) },
      layout: ROWS,
      unbreakable: true,
      margin: [0, 0, 0, 10],
    },
    ...words.paragraphs.flatMap(part => section(part.title, { ul: part.sentences, margin: [0, 0, 0, 8] })),
  ]
}

const figure = (text: string) => ({ text, alignment: 'right' as const, fontFeatures: ['tnum' as const], border: [false, true, false, true] as [boolean, boolean, boolean, boolean] })

const toCells = (row: string[]) => row.map((text, at) => (at ? figure(text) : textCell(text)))
