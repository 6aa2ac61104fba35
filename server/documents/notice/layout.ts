import type { TDocumentDefinitions } from 'pdfmake/interfaces'
import { definePaper } from '../paper/define-paper'
import { openingBlock, section } from '../paper/opening'
import { factTable } from '../paper/tables'
import { noticeWords, type NoticeContent } from './content'

/** The network operator's data sheet, in our own layout. */
export function noticeDefinition(notice: NoticeContent): TDocumentDefinitions {
  const words = noticeWords(notice)
  return definePaper({
    title: `${words.opening.title}, ${notice.premises.shortAddress}`,
    firm: notice.firm.name,
    orientation: 'portrait',
    foot: { number: notice.reference, shortAddress: notice.premises.shortAddress, fourWords: null, replaces: null },
    isDraft: false,
    at: notice.at,
    pages: [
      ...openingBlock(words.opening, { orientation: 'portrait', first: true }),
      factTable(words.heading),
      ...section('Why this route', { ul: words.reasons, margin: [0, 0, 0, 8] }),
      ...words.groups.map(group => factTable(group)),
      ...section('Declared', { ul: words.declarations, margin: [0, 0, 0, 8] }),
      ...section('Enclosed', { ul: words.enclosed }),
    ],
  })
}
