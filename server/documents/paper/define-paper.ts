import type { Content, TDocumentDefinitions } from 'pdfmake/interfaces'
import { footLine, type FootContent } from './foot'
import { EDGE_PATTERNS } from './marks'
import type { Orientation } from './opening'
import { BODY_LINE, FOOT_HEIGHT, INK, MARGIN, SIZE } from './tokens'

export interface Paper {
  title: string
  firm: string
  orientation: Orientation
  foot: FootContent
  isDraft: boolean
  /** The record's own moment: the file's date, so that the same record gives the same bytes. */
  at: string
  pages: Content[]
  /** Files carried inside the paper, as text. */
  attached?: { name: string, text: string, description: string }[]
}

/** The frame of every paper: A4, 14 mm margins, Inter, tagged archive PDF in British English. */
export function definePaper(paper: Paper): TDocumentDefinitions {
  const date = new Date(paper.at)
  return {
    version: '1.7',
    subset: 'PDF/A-3b',
    tagged: true,
    displayTitle: true,
    language: 'en-GB',
    info: { title: paper.title, author: paper.firm, creator: 'Copperplate', producer: 'Copperplate', creationDate: date, modDate: date },
    pageSize: 'A4',
    pageOrientation: paper.orientation,
    pageMargins: [MARGIN, MARGIN, MARGIN, MARGIN + FOOT_HEIGHT - 20],
    defaultStyle: { font: 'Inter', fontSize: SIZE.body, lineHeight: BODY_LINE, color: INK },
    patterns: EDGE_PATTERNS,
    footer: footLine(paper.foot),
    content: paper.pages,
    ...(paper.isDraft && { watermark: { text: 'DRAFT', color: INK, opacity: 0.09, bold: true, fontSize: 150, angle: -45 } }),
    ...(paper.attached?.length && { files: Object.fromEntries(paper.attached.map(file => [file.name, attachment(file, date)])) }),
  }
}

function attachment(file: { name: string, text: string, description: string }, date: Date) {
  const src = `data:application/json;base64,${Buffer.from(file.text, 'utf8').toString('base64')}`
  return { src, name: file.name, type: 'application/json', description: file.description, creationDate: date, modifiedDate: date, relationship: 'Source' }
}
