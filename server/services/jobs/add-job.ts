import { sql } from 'drizzle-orm'
import { uuidv7 } from 'uuidv7'
import { canonicalMpan } from '../../../shared/job/mpan-text'
import type { NewJob } from '../../../shared/schemas/job'
import { recordEvent } from '../../db/queries/events'
import { customer, premises } from '../../db/schema/customer'
import { job } from '../../db/schema/job'
import { wanted } from '../../db/schema/parts'
import type { FirmContext } from '../firm-context'

/** Takes an enquiry: customer, premises and job in one act. */
export async function addJob(ctx: FirmContext, input: NewJob): Promise<{ id: string, ref: string }> {
  return ctx.once(input.mutationId, 'add-job', input, async (tx) => {
    const { firmId } = ctx
    const [customerId, premisesId, jobId] = [uuidv7(), uuidv7(), uuidv7()] as const
    await tx.insert(customer).values({ firmId, id: customerId, ...input.customer })
    await tx.insert(premises).values({ firmId, id: premisesId, customerId, ...input.premises, mpan: canonicalMpan(input.premises.mpan) })
    const { rows: [number] } = await tx.execute<{ n: number }>(sql`select next_number('job') as n`)
    const ref = `J${String(number!.n).padStart(4, '0')}`
    await tx.insert(job).values({ firmId, id: jobId, ref, customerId, premisesId, stage: 'enquiry', note: input.note })
    if (Object.keys(input.wanted).length) await tx.insert(wanted).values({ firmId, jobId, key: 'wanted', content: input.wanted, stamps: {} })
    await recordEvent(tx, { type: 'job-made', jobId, personId: ctx.person.id })
    return { id: jobId, ref }
  })
}
