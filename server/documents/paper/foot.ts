import type { Content } from 'pdfmake/interfaces'
import { MARGIN, SIZE } from './tokens'

/** What the foot of every page says besides its own number. */
export interface FootContent {
  /** The paper's number with its revision, or what a draft is called. */
  number: string
  shortAddress: string
  /** The seal's four words; null on a draft and on papers without a seal. */
  fourWords: string | null
  /** `Replaces WRN-2027-00042 A`, or null. */
  replaces: string | null
}

/** One line: number · page n of m · address · four words · replaces. */
export function footText(foot: FootContent, page: number, pages: number): string {
  return [foot.number, `page ${page} of ${pages}`, foot.shortAddress, foot.fourWords, foot.replaces].filter(Boolean).join('  ·  ')
}

export function footLine(foot: FootContent) {
  return (page: number, pages: number): Content => ({ text: footText(foot, page, pages), fontSize: SIZE.note, margin: [MARGIN, 10, MARGIN, 0] })
}
