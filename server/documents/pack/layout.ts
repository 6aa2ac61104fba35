import type { Content, TDocumentDefinitions } from 'pdfmake/interfaces'
import { certificatePages } from '../certificate/layout'
import { inspectionsPages } from '../inspections/layout'
import { definePaper } from '../paper/define-paper'
import { note, openingBlock, section } from '../paper/opening'
import { footOf, recordFile } from '../paper/record-paper'
import { PORTRAIT_WIDTH, SIZE } from '../paper/tokens'
import { liveWithItPages, proveItPages } from '../plain-words/layout'
import { testResultsPages } from '../test-results/layout'
import { workingPages } from '../working/layout'
import { packContent, type PackContent, type PackInput } from './content'

/** The pack as one PDF: live with it, prove it, certificate, schedules, working, photographs; the record travels inside. */
export function packDefinition(input: PackInput): TDocumentDefinitions {
  const content = packContent(input)
  const { record, seal } = input
  return definePaper({
    title: `Your charging point at ${record.installation.shortAddress}`,
    firm: record.firm.name,
    orientation: 'portrait',
    foot: footOf(record, seal),
    isDraft: seal === null,
    at: record.certificate.at,
    pages: packPages(content),
    ...(seal && { attached: [recordFile(record)] }),
  })
}

function packPages(content: PackContent): Content[] {
  const next = { first: false }
  return [
    ...liveWithItPages(content.live.opening, content.live.advice, { first: true }),
    ...proveItPages(content.prove.opening, content.prove.rows, next),
    ...section('Who was told', { stack: content.last.map(note) }),
    ...certificatePages(content.certificate, next),
    ...(content.inspections ? inspectionsPages(content.inspections, next) : []),
    ...(content.tests ? testResultsPages(content.tests, next) : []),
    ...(content.working ? workingPages(content.working, next) : []),
    ...(content.photographs ? photographPages(content.photographs, next) : []),
  ]
}

const GAP = 10
const SHOT_WIDTH = (PORTRAIT_WIDTH - GAP) / 2
const SHOT_HEIGHT = 188

/** Two abreast, three down; each says which claim it answers and when it was taken. */
function photographPages({ opening, shots }: NonNullable<PackContent['photographs']>, page: { first: boolean }): Content[] {
  const rows = Array.from({ length: Math.ceil(shots.length / 2) }, (_, at) => shots.slice(2 * at, 2 * at + 2))
  return [
    ...openingBlock(opening, { orientation: 'portrait', first: page.first }),
    ...rows.map((row): Content => ({
      columns: row.map(shot => ({ width: SHOT_WIDTH, stack: [{ image: shot.jpegDataUrl, fit: [SHOT_WIDTH, SHOT_HEIGHT] as [number, number] }, { text: shot.claim, bold: true, fontSize: SIZE.table, margin: [0, 3, 0, 0] as [number, number, number, number] }, { text: shot.taken, fontSize: SIZE.note }] })),
      columnGap: GAP,
      unbreakable: true,
      margin: [0, 0, 0, 10],
    })),
  ]
}
