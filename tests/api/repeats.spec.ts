import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, it } from 'vitest'
import { ask, type Caller } from '../support/http'
import { fillRoute } from '../support/route-inventory'
import { asOwner, countEvents } from '../support/served-database'
import { makeServedFirm, type Role, type ServedFirm } from '../support/served-firm'

const TIMES = 5

let firm: ServedFirm
let callers: Partial<Record<Role, Caller>>

beforeAll(async () => {
  firm = await makeServedFirm()
  await asOwner(firm.id, client => client.query('update outbox_message set state = \'sent\'').then(() => client.query('update job set stage = \'surveyed\' where id = $1', [firm.ids.otherJobId])))
  const [office, principal] = await Promise.all([firm.signIn('office'), firm.signIn('principal')])
  callers = { office, principal }
})

const LINE = { description: 'Work', quantityThousandths: 1_000, unit: 'each', unitNetPence: 10_000, vatBp: 2_000 }
const soon = () => new Date(Date.now() + 10 * 86_400_000).toISOString().slice(0, 10)

/** In the order in which they can be done. */
const acts: [string, Role, () => Record<string, unknown>][] = [
  ['POST /api/jobs', 'office', () => ({ customer: { name: 'Bea' }, premises: { address: '3 Test Row', postcode: 'UX4 2AB' } })],
  ['POST /api/visits', 'office', () => ({ jobId: firm.ids.jobId, kind: 'return', day: '2027-04-01', half: 'pm', crewId: firm.ids.crewId })],
  ['PATCH /api/visits/[visitId]', 'office', () => ({ baseVersion: 1, note: 'Ring first' })],
  ['POST /api/notices/[noticeId]/sent', 'office', () => ({ how: 'portal', sentOn: '2026-11-20', reference: 'N-1' })],
  ['POST /api/notices/[noticeId]/reply', 'office', () => ({ outcome: 'question', repliedOn: '2026-11-21' })],
  ['POST /api/messages/[messageId]/send-again', 'office', () => ({})],
  ['POST /api/instruments', 'office', () => ({ name: 'Tester 2', serial: 'T-2', functions: ['loop'], doneOn: '2026-01-01', goodUntil: '2027-01-01' })],
  ['POST /api/instruments/[instrumentId]/calibrations', 'office', () => ({ doneOn: '2026-10-01', goodUntil: '2027-10-01' })],
  ['PATCH /api/instruments/[instrumentId]', 'office', () => ({ active: false })],
  ['POST /api/prices', 'principal', () => ({ code: 'HOUR', description: 'Hour', unit: 'hour', netPence: 5_000, vatBp: 2_000 })],
  ['POST /api/crews', 'principal', () => ({ name: 'Crew Z' })],
  ['POST /api/people', 'principal', () => ({ name: 'Ann', email: `ann@${firm.id}.example`, roles: ['installer'] })],
  ['POST /api/people/[personId]/qualifications', 'principal', () => ({ title: 'Testing', capacities: ['inspector'] })],
  ['PATCH /api/people/[personId]', 'principal', () => ({ roles: ['office', 'installer'] })],
  ['POST /api/jobs/[otherJobId]/quotes', 'office', () => ({ lines: [LINE], expiresOn: soon(), terms: 'Terms' })],
  ['POST /api/jobs/[jobId]/quotes/[quoteId]/send-again', 'office', () => ({})],
  ['POST /api/jobs/[jobId]/quotes/[quoteId]/withdraw', 'office', () => ({})],
  ['POST /api/jobs/[jobId]/draft', 'office', () => ({})],
]

describe('a button pressed five times at once', () => {
  it.each(acts)('%s acts once and answers alike', async (route, role, bodyOf) => {
    const body = { mutationId: randomUUID(), ...bodyOf() }
    const before = await countEvents(firm.id)
    const replies = await Promise.all(Array.from({ length: TIMES }, () => ask(callers[role]!, fillRoute(route, firm.ids), { body })))
    expect(replies.map(reply => [reply.status, reply.text])).toEqual(Array.from({ length: TIMES }, () => [200, replies[0]!.text]))
    const made = await countEvents(firm.id) - before
    expect(made).toBeLessThanOrEqual(1)
    // Sent once more, later, it adds nothing either.
    expect((await ask(callers[role]!, fillRoute(route, firm.ids), { body })).text).toBe(replies[0]!.text)
    expect(await countEvents(firm.id)).toBe(before + made)
  })
})
