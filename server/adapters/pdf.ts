import pdfmake from 'pdfmake'
import type { TDocumentDefinitions } from 'pdfmake/interfaces'
import { plainFace } from './pdf/plain-face'

/** The two faces of paper as TTF bytes. (Web fonts cannot be cut down to a subset here, and lack ≤ ≥ √.) */
export interface PaperFonts { regular: Uint8Array, bold: Uint8Array }

/** Where the faces come from: the worker's bundled assets, or a folder in a test. */
export type LoadFonts = () => Promise<PaperFonts>

export const PAPER_FACE = 'Inter'
const REGULAR = 'Inter-Regular.ttf'
const BOLD = 'Inter-Bold.ttf'

/** Two things of the maker that its type package leaves out. */
interface FileShelf { writeFileSync: (name: string, bytes: Uint8Array) => void }
const shelf = (pdfmake as unknown as { virtualfs: FileShelf }).virtualfs

let shelved: PaperFonts | null = null

/**
 * A definition as PDF bytes: the same bytes each time for the same definition, which must carry its own date.
 * The definition is used up by this and cannot be rendered again: lay the content out anew.
 */
export async function renderPdf(definition: TDocumentDefinitions, fonts: PaperFonts): Promise<Buffer> {
  if (!definition.info?.creationDate) throw new TypeError('A paper carries the date of its record, never the date of printing')
  useFonts(fonts)
  return await pdfmake.createPdf(definition).getBuffer() as unknown as Buffer
}

/** Renders one small page, so that the first real paper does not pay for reading the faces. */
export async function warmUpPdf(fonts: PaperFonts): Promise<void> {
  await renderPdf({
    info: { title: 'Warm-up', creationDate: new Date(0) },
    defaultStyle: { font: PAPER_FACE },
    content: [{ text: 'Ω ≤ ≥ ² √ µ ° − ×' }, { text: '0.39', bold: true, fontFeatures: ['tnum'] }],
  }, fonts)
}

function useFonts(fonts: PaperFonts): void {
  if (shelved?.regular === fonts.regular && shelved.bold === fonts.bold) return
  shelf.writeFileSync(REGULAR, plainFace(fonts.regular))
  shelf.writeFileSync(BOLD, plainFace(fonts.bold))
  // Nothing is fetched and nothing is read from disk while a paper is made, whatever its content says.
  pdfmake.setUrlAccessPolicy(() => false)
  pdfmake.setLocalAccessPolicy(() => false)
  pdfmake.setFonts({ [PAPER_FACE]: { normal: REGULAR, bold: BOLD, italics: REGULAR, bolditalics: BOLD } })
  shelved = fonts
}
