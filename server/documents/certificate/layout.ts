import type { Content, TDocumentDefinitions } from 'pdfmake/interfaces'
import type { CertificateRecord } from '#shared/schemas/sealed-record'
import { inspectionsContent } from '../inspections/content'
import { inspectionsPages } from '../inspections/layout'
import { definePaper } from '../paper/define-paper'
import { note, openingBlock, section, sentence } from '../paper/opening'
import { footOf, PAPER_KINDS, recordFile, type PaperSeal } from '../paper/record-paper'
import { factTable, listTable, NO_UPRIGHTS, ROWS } from '../paper/tables'
import { SIZE, TABLE_LINE } from '../paper/tokens'
import { testResultsContent } from '../test-results/content'
import { testResultsPages } from '../test-results/layout'
import { certificateContent, type CertificateContent, type SignatureContent } from './content'

/** The certificate with its schedules, as it is issued; the sealed record travels inside. */
export function certificateDefinition(record: CertificateRecord, seal: PaperSeal | null): TDocumentDefinitions {
  const next = { first: false }
  const schedules = record.kind === 'installation' ? [...inspectionsPages(inspectionsContent(record, seal), next), ...testResultsPages(testResultsContent(record, seal), next)] : []
  return definePaper({
    title: `${PAPER_KINDS[record.kind]}, ${record.installation.shortAddress}`,
    firm: record.firm.name,
    orientation: 'portrait',
    foot: footOf(record, seal),
    isDraft: seal === null,
    at: record.certificate.at,
    pages: [...certificatePages(certificateContent(record, seal), { first: true }), ...schedules],
    ...(seal && { attached: [recordFile(record)] }),
  })
}

export function certificatePages(content: CertificateContent, page: { first: boolean }): Content[] {
  return [
    ...openingBlock(content.opening, { orientation: 'portrait', first: page.first }),
    factTable(content.heading),
    ...content.groups.map(group => factTable(group)),
    ...departures(content),
    ...declarations(content),
    ...section('Instruments', content.instruments.length ? listTable(['Used for', 'Instrument', 'Serial', 'Calibrated', 'Valid until', 'On the day of each reading'], [92, '*', 62, 66, 66, 92], content.instruments) : sentence('None recorded.')),
    ...section('Seal and photographs', factTable(content.seal), content.photographs.length ? listTable(['What the photograph shows', 'Taken'], ['*', 130], content.photographs) : sentence('No photographs.')),
  ]
}

function departures({ departures: differing, exceptions }: CertificateContent): Content[] {
  const title = 'Departures and permitted exceptions'
  const none = [...(differing.length ? [] : ['Departures: none.']), ...(exceptions.length ? [] : ['Permitted exceptions: none.'])]
  const tables = [
    ...(differing.length ? [listTable(['Regulation', 'What differs', 'Why it is no less safe', 'Designer'], [80, '*', '*', 90], differing)] : []),
    ...(exceptions.length ? [listTable(['Left out', 'Why', 'Risk assessment attached', 'Designer'], [100, '*', 190, 80], exceptions)] : []),
  ]
  const [first = sentence('None.'), ...rest] = [...tables, ...(none.length ? [sentence(none.join(' '))] : [])]
  return section(title, first, ...rest)
}

function declarations(content: CertificateContent): Content[] {
  const blocks = content.signatures.length ? content.signatures.map(signatureBlock) : [sentence('Not signed yet.')]
  const [first = sentence('Not signed yet.'), ...rest] = blocks
  return section('Declarations', first, ...rest, ...content.signatureNotes.map(note))
}

/** One person's declaration: capacities, statement, name and firm, the way of signing, and the strokes where drawn. */
function signatureBlock(one: SignatureContent): Content {
  const drawing: Content = one.drawing
    ? { svg: `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${one.drawing.width} ${one.drawing.height}"><path d="${one.drawing.path}" fill="none" stroke="#000000" stroke-width="2"/></svg>`, fit: [110, 36] }
    : { text: one.name, fontSize: SIZE.body }
  return {
    table: {
      widths: [86, '*', 120],
      dontBreakRows: true,
      body: [[
        { text: one.capacities, bold: true, border: NO_UPRIGHTS },
        { stack: [{ text: one.statement }, { text: one.name, bold: true, margin: [0, 3, 0, 0] }, { text: one.firm, fontSize: SIZE.note }], border: NO_UPRIGHTS },
        { stack: [drawing, { text: one.signed, fontSize: SIZE.note, margin: [0, 2, 0, 0] }], border: NO_UPRIGHTS },
      ]],
    },
    layout: ROWS,
    fontSize: SIZE.table,
    lineHeight: TABLE_LINE,
    margin: [0, 0, 0, 5],
  }
}
