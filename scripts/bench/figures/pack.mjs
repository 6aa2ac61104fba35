/** P-29: the processor time a pack takes, against an empty document of as many pages with the same two faces. */
import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { createJiti } from 'jiti'
import { inRoot } from '../../lib/paths.mjs'
import { figure } from '../lib/figure.mjs'
import { median } from '../lib/statistics.mjs'

export const ids = ['P-29']

const BUILDS = 15
const WARM_UPS = 4

async function cpuMs(act) {
  const began = process.cpuUsage()
  const result = await act()
  const { user, system } = process.cpuUsage(began)
  return { ms: (user + system) / 1000, result }
}

const pagesIn = bytes => (bytes.toString('latin1').match(/\/Type\s*\/Page\b(?!s)/g) ?? []).length

/** The very maker of PDFs beneath ours, with nothing laid out: a word in each face on each page. */
function emptyDocument(PDFDocument, faces, pages) {
  return new Promise((resolve, reject) => {
    const document = new PDFDocument({ size: 'A4', autoFirstPage: false, info: { CreationDate: new Date(0) } })
    const chunks = []
    document.on('data', chunk => chunks.push(chunk)).on('error', reject).on('end', () => resolve(Buffer.concat(chunks)))
    document.registerFont('regular', faces.regular).registerFont('bold', faces.bold)
    for (let page = 1; page <= pages; page++) document.addPage().font('regular').text('Page').font('bold').text(String(page))
    document.end()
  })
}

async function loadPapers() {
  const jiti = createJiti(import.meta.url, { alias: { '#shared': inRoot('shared'), '#server': inRoot('server') } })
  const files = ['server/adapters/pdf.ts', 'server/adapters/pdf/plain-face.ts', 'server/documents/pack/layout.ts', 'server/documents/certificate/layout.ts', 'tests/support/build/sealed-record.ts', 'tests/unit/documents/samples.ts']
  return Object.assign({}, ...await Promise.all(files.map(file => jiti.import(inRoot(file)))))
}

async function compare({ id, what, atMost }, ours, empty) {
  const pages = pagesIn(await ours())
  const ratios = []
  const times = { ours: [], anchor: [] }
  for (let build = -WARM_UPS; build < BUILDS; build++) {
    const [anchor, made] = [await cpuMs(() => empty(pages)), await cpuMs(ours)]
    if (build < 0) continue
    times.anchor.push(anchor.ms)
    times.ours.push(made.ms)
    ratios.push(made.ms / anchor.ms)
  }
  return figure({ id, what, ours: median(times.ours), anchor: median(times.anchor), ratios, atMost, note: `${pages} pages, ${BUILDS} builds in turn, processor time of one warm process` })
}

export async function measure() {
  const papers = await loadPapers()
  const PDFDocument = createRequire(createRequire(import.meta.url).resolve('pdfmake'))('pdfkit')
  const face = name => readFileSync(inRoot('server/assets/fonts', name))
  const fonts = { regular: face('Inter-Regular.ttf'), bold: face('Inter-Bold.ttf') }
  const faces = { regular: papers.plainFace(fonts.regular), bold: papers.plainFace(fonts.bold) }
  const empty = pages => emptyDocument(PDFDocument.default ?? PDFDocument, faces, pages)
  return [
    await compare({ id: 'P-29', what: 'A whole pack against an empty document, ms of processor', atMost: 6 }, () => papers.renderPdf(papers.packDefinition(papers.packSample()), fonts), empty),
    await compare({ id: 'P-29', what: 'The certificate alone against an empty document, ms of processor', atMost: 4 }, () => papers.renderPdf(papers.certificateDefinition(papers.installationSample(), papers.SEAL), fonts), empty),
  ]
}
