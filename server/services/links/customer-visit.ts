import { and, eq, isNull } from 'drizzle-orm'
import type { CustomerVisit } from '../../../shared/schemas/customer'
import { problem } from '../../../shared/utils/problem'
import { findAddressee, findFirm } from '../../db/queries/quotes'
import { visit } from '../../db/schema/job'
import { readByLink, type FoundLink } from './customer-links'

/** The visit a link is for, as the customer reads it. */
export async function readCustomerVisit(link: FoundLink): Promise<CustomerVisit> {
  return readByLink(link, async (tx) => {
    const [row] = link.subjectId ? await tx.select({ kind: visit.kind, day: visit.day, half: visit.half, state: visit.state }).from(visit).where(and(eq(visit.firmId, link.firmId), eq(visit.id, link.subjectId), eq(visit.jobId, link.jobId), isNull(visit.removedAt))) : []
    if (!row) throw problem('not-found', 'There is no such visit.')
    const firm = await findFirm(tx, link.firmId)
    const to = await findAddressee(tx, link.firmId, link.jobId)
    return { firmName: firm.name, firmTelephone: firm.telephone, address: to.shortAddress, kind: row.kind, day: row.day, half: row.half, state: row.state }
  })
}
