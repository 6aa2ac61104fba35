import type { FirmTx } from '../../db/firm-db'
import { findInvoiceContent } from '../../db/queries/payments'
import type { FirmRow } from '../../db/queries/quotes'
import type { InvoiceContent } from '../../documents/invoice/content'
import { invoiceDefinition } from '../../documents/invoice/layout'
import type { FirmOnPaper } from '../../documents/quote/content'

/** An issued invoice as a paper, from the content that was frozen with it. */
export async function invoicePaper(tx: FirmTx, { firmId, jobId, sourceId }: { firmId: string, jobId: string, sourceId: string }) {
  const content = await findInvoiceContent(tx, firmId, jobId, sourceId) as InvoiceContent | null
  if (!content) throw new Error('The invoice of this paper is not there')
  return invoiceDefinition(content)
}

/** The firm as its money papers name it. */
export const firmOnPaper = (firm: FirmRow): FirmOnPaper => ({ name: firm.name, address: firm.address, telephone: firm.telephone, email: firm.email, vatNumber: firm.vatNumber, companyNumber: null })
