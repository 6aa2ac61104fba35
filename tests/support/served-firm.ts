/** A firm of the test's own in the served database, with a row behind every kind of id that an address may hold. */
import { createHash, randomBytes, randomUUID } from 'node:crypto'
import { Hash } from '@adonisjs/hash'
import { Scrypt } from '@adonisjs/hash/drivers/scrypt'
import type pg from 'pg'
import { signIn, type Caller } from './http'
import { asOwner } from './served-database'

const PASSWORD = 'a password for tests only'
/** Far below what the product hashes with, which its verification reads from the hash: dozens of sign-ins stay cheap. */
const CHEAP = { cost: 1024, blockSize: 8, parallelization: 1, maxMemory: 32 * 1024 * 1024 }

export const ROLES = ['office', 'installer', 'supervisor', 'principal'] as const
export type Role = (typeof ROLES)[number]

export interface ServedFirm {
  id: string
  /** Stands in the names of its customers and nowhere else: found in an answer, it tells whose data that is. */
  canary: string
  people: Record<Role | 'guest', string>
  ids: { jobId: string, otherJobId: string, crewId: string, visitId: string, instrumentId: string, quoteId: string, invoiceId: string, noticeId: string, paperId: string, messageId: string, personId: string, priceId: string, linkId: string }
  /** Customer links as their letters carry them, and the payment service's name for a payment page. */
  tokens: { quote: string, pack: string, withdrawn: string, page: string }
  emailOf: (who: Role | 'guest') => string
  signIn: (who: Role | 'guest') => Promise<Caller>
}

const token = () => randomBytes(32).toString('base64url')
const sha256 = (text: string) => createHash('sha256').update(text).digest('hex')

/** `installer` and `supervisor` are on the crew that visits `jobId`; nobody's crew visits `otherJobId`. */
export async function makeServedFirm(): Promise<ServedFirm> {
  const id = randomUUID()
  const uuids = <K extends string>(...names: K[]) => Object.fromEntries(names.map(name => [name, randomUUID()])) as Record<K, string>
  const people = uuids(...ROLES, 'guest')
  const ids = { ...uuids('jobId', 'otherJobId', 'crewId', 'visitId', 'instrumentId', 'quoteId', 'invoiceId', 'noticeId', 'paperId', 'messageId', 'priceId', 'linkId'), personId: people.guest }
  const emailOf = (who: Role | 'guest') => `${who}@${id}.example`
  const firm: ServedFirm = { id, canary: `canary${id.slice(0, 8)}`, people, ids, tokens: { quote: token(), pack: token(), withdrawn: token(), page: `cs_test_${id}` }, emailOf, signIn: who => signIn(emailOf(who), PASSWORD, who) }
  const passwordHash = await new Hash(new Scrypt(CHEAP)).make(PASSWORD)
  await asOwner(id, async (client) => {
    const insert = inserting(client, id)
    await insertPeople(client, insert, firm, passwordHash)
    await insertWork(insert, firm)
    await insertPapers(insert, firm)
  })
  return firm
}

type Insert = (table: string, row: Record<string, unknown>) => Promise<unknown>

const inserting = (client: pg.Client, firmId: string): Insert => (table, row) => {
  const all = { firm_id: firmId, ...row }
  const names = Object.keys(all)
  return client.query(`insert into ${table} (${names.join(', ')}) values (${names.map((_, at) => `$${at + 1}`).join(', ')})`, Object.values(all))
}

async function insertPeople(client: pg.Client, insert: Insert, { id, people, ids, emailOf }: ServedFirm, passwordHash: string): Promise<void> {
  await client.query('insert into firm (id, name, address, telephone, email, certificate_prefix, settings) values ($1, $2, $3, $4, $5, $6, $7)', [id, `Firm ${id.slice(0, 8)}`, '1 Test Yard, Quillham, UX4 1AA', '01632 960000', 'office@test.example', 'T', JSON.stringify({ selfCountersign: false, depositBp: 2_500, vatBp: 2_000, quoteDays: 30, schemeMember: true })])
  await insert('crew', { id: ids.crewId, name: 'Crew A' })
  for (const [who, personId] of Object.entries(people) as [Role | 'guest', string][]) {
    await insert('person', { id: personId, name: who, email: emailOf(who), password_hash: passwordHash })
    await insert('membership', { person_id: personId, roles: [who === 'guest' ? 'office' : who], crew_id: who === 'installer' || who === 'supervisor' ? ids.crewId : null })
  }
  await insert('instrument', { id: ids.instrumentId, name: 'Tester', serial: 'T-1', functions: ['continuity', 'insulation', 'loop', 'rcd', 'electrode'] })
  await insert('calibration', { id: randomUUID(), instrument_id: ids.instrumentId, done_on: '2026-01-01', good_until: '2030-01-01' })
}

async function insertWork(insert: Insert, { canary, ids }: ServedFirm): Promise<void> {
  for (const [number, jobId] of [ids.jobId, ids.otherJobId].entries()) {
    const [customerId, premisesId] = [randomUUID(), randomUUID()]
    await insert('customer', { id: customerId, name: `Ada ${canary}`, email: 'ada@example.org' })
    await insert('premises', { id: premisesId, customer_id: customerId, address: '2 Test Row', town: 'Quillham', postcode: 'UX4 2AA' })
    await insert('job', { id: jobId, ref: `T${number + 1}`, customer_id: customerId, premises_id: premisesId, stage: 'install-booked' })
  }
  await insert('visit', { id: ids.visitId, job_id: ids.jobId, kind: 'install', day: '2027-03-02', half: 'am', crew_id: ids.crewId })
  await insert('price_item', { id: ids.priceId, code: 'SURVEY', description: 'Survey', unit: 'visit', net_pence: 9_500 })
  await insert('notice', { id: ids.noticeId, job_id: ids.jobId, kind: 'network-operator', recipient: 'Network operator', route: 'tell-after', reasons: '[]', content: '{}' })
}

async function insertPapers(insert: Insert, { id, ids, tokens }: ServedFirm): Promise<void> {
  const job = { job_id: ids.jobId }
  await insert('quote', { ...job, id: ids.quoteId, number: 'Q1', state: 'sent', expires_on: '2030-01-01', net_pence: 10_000, vat_pence: 2_000, gross_pence: 12_000, deposit_pence: 3_000, sent_at: '2026-11-01T09:00:00Z', terms: 'Terms' })
  await insert('quote_line', { id: randomUUID(), quote_id: ids.quoteId, description: 'Work', quantity_thousandths: 1_000, unit: 'each', unit_net_pence: 10_000, vat_bp: 2_000 })
  await insert('invoice', { ...job, id: ids.invoiceId, number: 'I1', kind: 'deposit', content: '{}', gross_pence: 3_000, due_pence: 3_000, issued_on: '2026-11-02' })
  // Neither to be made nor to be sent: the worker leaves both alone.
  await insert('paper', { ...job, id: ids.paperId, kind: 'notice', source_id: ids.noticeId, state: 'failed' })
  await insert('outbox_message', { ...job, id: ids.messageId, message: 'visit-confirmed', recipient: 'ada@example.org', content: '{}', dedupe_key: 'test', state: 'queued', next_try_at: '2040-01-01T00:00:00Z', message_id: `<${id}@test.example>` })
  await insert('checkout', { ...job, id: randomUUID(), quote_id: ids.quoteId, outside_id: tokens.page, pence: 3_000 })
  const link = { ...job, sent_to: 'ada@example.org' }
  await insert('customer_link', { ...link, id: ids.linkId, purpose: 'quote', subject_id: ids.quoteId, token_hash: sha256(tokens.quote) })
  await insert('customer_link', { ...link, id: randomUUID(), purpose: 'pack', token_hash: sha256(tokens.pack) })
  await insert('customer_link', { ...link, id: randomUUID(), purpose: 'quote', subject_id: ids.quoteId, token_hash: sha256(tokens.withdrawn), withdrawn_at: '2026-11-03T09:00:00Z' })
}
