/** Photographs a customer sends through their link: to the slots that are theirs to fill, and nowhere else. */
import { and, eq, isNull } from 'drizzle-orm'
import { SHOTS, type ShotSpec } from '../../../shared/job/shots.data'
import type { CustomerShots } from '../../../shared/schemas/customer'
import { problem } from '../../../shared/utils/problem'
import { recordEvent } from '../../db/queries/events'
import { touchJob } from '../../db/queries/jobs'
import { findAddressee, findFirm } from '../../db/queries/quotes'
import { photograph } from '../../db/schema/reading'
import type { FirmTx } from '../../db/firm-db'
import { keepFile } from '../photographs/keep-file'
import { customerAct, readByLink, type FoundLink } from './customer-links'

const SLOTS = (SHOTS as readonly ShotSpec[]).filter(shot => shot.mayCustomer)
/** Enough for every slot several times over; more is a mistake or mischief. */
const MOST_PHOTOGRAPHS = 40

async function claimsHeld(tx: FirmTx, link: FoundLink): Promise<string[]> {
  const rows = await tx.select({ claim: photograph.claim }).from(photograph).where(and(eq(photograph.firmId, link.firmId), eq(photograph.jobId, link.jobId), isNull(photograph.personId), isNull(photograph.removedAt)))
  return rows.map(row => row.claim)
}

export async function readCustomerShots(link: FoundLink): Promise<CustomerShots> {
  return readByLink(link, async (tx) => {
    const firm = await findFirm(tx, link.firmId)
    const to = await findAddressee(tx, link.firmId, link.jobId)
    const held = await claimsHeld(tx, link)
    return { firmName: firm.name, firmTelephone: firm.telephone, address: to.shortAddress, slots: SLOTS.map(({ claim, label, visible }) => ({ claim, label, visible, held: held.filter(each => each === claim).length })) }
  })
}

/** Keeps one photograph in its slot; the mutation's id is also the photograph's. */
export async function keepCustomerPhotograph(link: FoundLink, claim: string, mutationId: string, bytes: Buffer): Promise<{ kept: true }> {
  if (!SLOTS.some(slot => slot.claim === claim)) throw problem('not-found', 'There is no such place for a photograph.')
  if (await readByLink(link, tx => claimsHeld(tx, link)).then(held => held.length) >= MOST_PHOTOGRAPHS) throw problem('too-many', 'That is more photographs than this link takes. Ring the firm if there is more to show.')
  const { sha256 } = await keepFile(link.firmId, bytes)
  return customerAct(link, mutationId, 'customer-photograph', { claim, sha256 }, async (tx) => {
    await tx.insert(photograph).values({ firmId: link.firmId, id: mutationId, jobId: link.jobId, claim, sha256, takenAt: new Date(), personId: null })
    await touchJob(tx, link.firmId, link.jobId)
    await recordEvent(tx, { type: 'photograph-kept', jobId: link.jobId, detail: { photographId: mutationId, claim, linkId: link.linkId } })
    return { kept: true as const }
  })
}
