import { randomUUID } from 'node:crypto'
import { Hash } from '@adonisjs/hash'
import { Scrypt } from '@adonisjs/hash/drivers/scrypt'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readAsFirm } from '#server/db/firm-db'
import { findJobRecord } from '#server/db/queries/job-record'
import { findDiary } from '#server/db/queries/diary'
import { verifySeal } from '#server/services/seal/verify-seal'
import { maySign } from '#shared/job/completeness'
import { judgeJob } from '#shared/job/judge/judge-job'
import { STAGES } from '#shared/job/stages'
import type { SealedRecord } from '#shared/schemas/sealed-record'
import type { JobRecord } from '#shared/types/record'
import { addDays, londonDay } from '#shared/utils/dates'
import { DEMO_PASSWORD, demoSignIns } from '../../scripts/demo-sign-ins.mjs'
import { seedDemo } from '../../scripts/seed/demo.mjs'
import { loadServices } from '../../scripts/seed/services.mjs'
import { pools } from '../support/db-setup'
import { inFirm } from '../support/build/firm'

/** Many services act some thousand times; a busy machine takes its time over them. */
const SEED_MS = 240_000

let firmId: string
let services: { closeDatabase(): Promise<void> }
const ids: Record<string, string> = {}
const today = londonDay(Date.now())

beforeAll(async () => {
  services = await loadServices() as typeof services
  const owner = await pools.owner.connect()
  try {
    const made = await seedDemo({ services, owner, now: new Date().toISOString(), domain: `${randomUUID()}.example` })
    firmId = made.firm.id
    for (const [name, job] of Object.entries<{ id: string }>(made.byName)) ids[name] = job.id
  }
  finally {
    owner.release()
  }
}, SEED_MS)

afterAll(() => services.closeDatabase())

async function recordOf(name: string): Promise<JobRecord> {
  const record = await readAsFirm(firmId, tx => findJobRecord(tx, firmId, ids[name]!, null))
  expect(record).not.toBeNull()
  return record!
}

async function judgementOf(name: string) {
  const record = await recordOf(name)
  return judgeJob(record, today)
}

describe('the demo', () => {
  it('has a job in each state that people alone bring about', async () => {
    const rows = await inFirm<{ stage: string }>(firmId, 'select distinct stage from job')
    // "Handed over" and "closed" follow when the worker has sent the pack.
    expect(STAGES.filter(stage => !rows.some(row => row.stage === stage))).toEqual(['handed-over', 'closed'])
  })

  it('leaves a chain of events without a fault', async () => {
    expect(await inFirm(firmId, 'select first_broken_event() as broken')).toEqual([{ broken: null }])
  })

  it('numbers its jobs without a gap, the oldest first', async () => {
    const rows = await inFirm<{ ref: string, made_at: Date }>(firmId, 'select ref, made_at from job order by ref')
    expect(rows.map(row => row.ref)).toEqual(rows.map((_, at) => `J${String(at + 1).padStart(4, '0')}`))
    expect(rows.map(row => row.made_at.getTime())).toEqual(rows.map(row => row.made_at.getTime()).sort((a, b) => a - b))
  })

  it.each([
    ['fitsWell', 'fits', 'tell-after'],
    ['smallFuse', 'fits-if-managed', 'tell-after'],
    ['askFirst', 'fits', 'ask-first'],
    ['looped', 'cannot-tell', 'ask-first'],
    ['unsafeService', 'does-not-fit', 'contact'],
    ['bungalow', 'fits', 'tell-after'],
  ])('shows a supply: %s', async (name, capacity, route) => {
    const judgement = await judgementOf(name)
    expect([judgement.capacity.code, judgement.route.answer.result.route]).toEqual([capacity, route])
  })

  it.each([
    ['readyToSign', true],
    ['limiterOnSite', true],
    ['loopOutside', false],
    ['unexpected', false],
    ['paperSheet', false],
    ['deadTests', false],
    ['sentBack', false],
  ])('shows work: %s may be signed: %s', async (name, may) => {
    const record = await recordOf(name)
    expect(maySign(record, judgeJob(record, today), today).allowed).toBe(may)
  })

  it('stops two jobs by what their names say alone', async () => {
    expect((await judgementOf('loopOutside')).readings.Zs.verdict).toBe('outside')
    const { readings } = await judgementOf('unexpected')
    expect(Object.values(readings).filter(each => each.stops).map(each => [each.test, each.verdict])).toEqual([['R1R2', 'unexpected'], ['R1Rn', 'unexpected']])
  })

  it('seals three certificates that are genuine and follow each other', async () => {
    const rows = await inFirm<{ record: SealedRecord, hash: string, previous_hash: string, seal: string, public_key: string }>(firmId, 'select c.record, c.hash, c.previous_hash, c.seal, k.public_key from certificate c join seal_key k on k.firm_id = c.firm_id and k.id = c.seal_key_id order by c.chain_number')
    expect(rows).toHaveLength(3)
    for (const [at, row] of rows.entries()) {
      const previous = at === 0 ? null : rows[at - 1]!.hash
      expect(row.previous_hash).toBe(previous ?? '')
      expect(verifySeal(row.record, { hash: row.hash, signature: row.seal, publicKeyPem: row.public_key }, previous)).toEqual({ genuine: true, faults: [] })
    }
  })

  it('fills the diary of both crews before and after today', async () => {
    const { crews, visits } = await readAsFirm(firmId, tx => findDiary(tx, firmId, addDays(today, -45), addDays(today, 46)))
    const all = await inFirm<{ n: number }>(firmId, 'select count(*)::int as n from visit')
    expect(visits).toHaveLength(all[0]!.n)
    for (const crew of crews) {
      const days = visits.filter(visit => visit.crewId === crew.id).map(visit => visit.day)
      expect([days.some(day => day < today), days.some(day => day > today)]).toEqual([true, true])
    }
  })

  it('names nobody who could be reached', async () => {
    const addresses = await inFirm<{ email: string }>(firmId, 'select email from customer where email <> \'\' union all select email from person union all select email from firm')
    expect(addresses.filter(row => !/@([a-z0-9-]+\.)*(example|example\.org)$/.test(row.email))).toEqual([])
    const telephones = await inFirm<{ telephone: string }>(firmId, 'select telephone from customer union all select telephone from person union all select telephone from firm')
    expect(telephones.filter(row => !/^(01632 960\d{3}|07700 900\d{3})$/.test(row.telephone))).toEqual([])
  })

  it('lets its people sign in with the password it prints', async () => {
    const [row] = await inFirm<{ password_hash: string }>(firmId, 'select password_hash from person limit 1')
    const hash = new Hash(new Scrypt({ cost: 131_072, blockSize: 8, parallelization: 1, maxMemory: 256 * 1024 * 1024 }))
    expect(await hash.verify(row!.password_hash, DEMO_PASSWORD)).toBe(true)
    const mailboxes = (await inFirm<{ email: string }>(firmId, 'select email from person')).map(person => person.email.split('@')[0])
    expect(demoSignIns.filter(each => !mailboxes.includes(each.email.split('@')[0]))).toEqual([])
  })
})
