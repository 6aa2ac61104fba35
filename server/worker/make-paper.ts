/** Makes one paper from its frozen source, keeps the bytes and notes their hash. Asked twice, it finds the paper made. */
import { and, eq } from 'drizzle-orm'
import type { TDocumentDefinitions } from 'pdfmake/interfaces'
import { renderPdf, type LoadFonts } from '../adapters/pdf'
import { fileStore } from '../adapters/files'
import { changeAsFirm, readAsFirm, type FirmTx } from '../db/firm-db'
import { recordEvent } from '../db/queries/events'
import { paper } from '../db/schema/certificate'
import { storedFile } from '../db/schema/reading'
import { definePack } from '../services/papers/define-pack'
import { defineNotice } from '../services/papers/define-notice'
import { defineDraft } from '../services/papers/define-draft'
import { defineInvoice, defineQuote } from '../services/papers/define-money'

type Paper = typeof paper.$inferSelect
/** Reads all that the paper is made from and gives its definition. */
export type DefinePaper = (tx: FirmTx, row: Paper) => Promise<TDocumentDefinitions>

const DEFINERS: Record<string, DefinePaper> = { pack: definePack, draft: defineDraft, notice: defineNotice, quote: defineQuote, invoice: defineInvoice }

export async function makePaper({ firmId, paperId }: { firmId: string, paperId: string }, loadFonts: LoadFonts): Promise<void> {
  const here = and(eq(paper.firmId, firmId), eq(paper.id, paperId))
  const definition = await readAsFirm(firmId, async (tx) => {
    const [row] = await tx.select().from(paper).where(here)
    return row && row.state !== 'made' ? DEFINERS[row.kind]!(tx, row) : null
  }).catch(error => noteFailure(firmId, paperId, error))
  if (!definition) return

  const bytes = await renderPdf(definition, await loadFonts())
  const sha256 = await fileStore().put(bytes)
  await changeAsFirm(firmId, async (tx) => {
    await tx.insert(storedFile).values({ firmId, sha256, mediaType: 'application/pdf', bytes: bytes.length, thumbSha256: null }).onConflictDoNothing()
    const [made] = await tx.update(paper).set({ state: 'made', sha256, pages: countPages(bytes), problem: null }).where(here).returning({ jobId: paper.jobId, kind: paper.kind })
    if (made?.kind === 'pack') await recordEvent(tx, { type: 'pack-made', jobId: made.jobId, detail: { paperId, sha256 } })
  })
}

async function noteFailure(firmId: string, paperId: string, error: Error): Promise<never> {
  await changeAsFirm(firmId, tx => tx.update(paper).set({ problem: error.message.slice(0, 500) }).where(and(eq(paper.firmId, firmId), eq(paper.id, paperId))))
  throw error
}

/** Pages are counted in the file itself: each is one page object. */
function countPages(bytes: Buffer): number {
  return (bytes.toString('latin1').match(/\/Type\s*\/Page\b(?!s)/g) ?? []).length
}
