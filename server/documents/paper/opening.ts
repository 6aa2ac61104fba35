import type { Column, Content } from 'pdfmake/interfaces'
import { qrDrawing } from './qr'
import { LANDSCAPE_WIDTH, PLUM, PORTRAIT_WIDTH, SIZE } from './tokens'

export type Orientation = 'portrait' | 'landscape'

export interface OpeningContent {
  /** The firm, above the title. */
  over: string
  title: string
  /** One line under the title. */
  under: string
  /** The address behind the square code, or null for none. */
  qr: string | null
  /** Said under the code: four words and how to use them. */
  qrWords: string | null
}

/** The top of a paper: firm, title, one line, the code at the right, and the one rule in plum. */
export function openingBlock(content: OpeningContent, page: { orientation: Orientation, first: boolean }): Content[] {
  const width = page.orientation === 'portrait' ? PORTRAIT_WIDTH : LANDSCAPE_WIDTH
  const words: Column = {
    width: '*',
    stack: [
      { text: content.over, fontSize: SIZE.table },
      { text: content.title, fontSize: SIZE.title, bold: true, outline: true, margin: [0, 1, 0, 3] },
      { text: content.under, fontSize: SIZE.body },
    ],
  }
  const code: Column[] = content.qr ? [{ width: 'auto', stack: [qrDrawing(content.qr)] }] : []
  return [
    {
      columns: [words, ...code],
      ...(!page.first && { pageBreak: 'before' as const, pageOrientation: page.orientation }),
    },
    ...(content.qrWords ? [{ text: content.qrWords, fontSize: SIZE.note, alignment: 'right' as const, margin: [0, 0, 0, 2] as [number, number, number, number] }] : []),
    { canvas: [{ type: 'line', x1: 0, y1: 0, x2: width, y2: 0, lineWidth: 1.4, lineColor: PLUM }], margin: [0, 3, 0, 9] },
  ]
}

/** A heading and the first block under it, which stay together. */
export function section(title: string, first: Content, ...rest: Content[]): Content[] {
  return [{ stack: [sectionHead(title), first], unbreakable: true }, ...rest]
}

/** A heading inside a paper. */
export function sectionHead(text: string): Content {
  return { text, fontSize: SIZE.section, bold: true, outline: true, margin: [0, 6, 0, 4] }
}

export function sentence(text: string): Content {
  return { text, margin: [0, 0, 0, 6] }
}

export function note(text: string): Content {
  return { text, fontSize: SIZE.note, margin: [0, 0, 0, 4] }
}
