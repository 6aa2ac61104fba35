/** A firm of the test's own: nothing another test makes or leaves is in it. */
import { randomUUID } from 'node:crypto'
import { changeAsFirm } from '#server/db/firm-db'
import { crew, membership, person } from '#server/db/schema/firm'
import { calibration, instrument } from '#server/db/schema/reading'
import { firmContext, type FirmContext } from '#server/services/firm-context'
import { addJob } from '#server/services/jobs/add-job'
import { applyMutation } from '#server/services/record/apply-mutation'
import { bookVisit } from '#server/services/visits/book-visit'
import type { Mutation, MutationOutcome } from '#shared/job/mutations'
import type { FirmSettings, Role } from '#shared/types/firm'
import { pools } from '../db-setup'

export const SETTINGS: FirmSettings = { selfCountersign: false, depositBp: 2500, vatBp: 2000, quoteDays: 30, schemeMember: true }
/** The day on which the tests' readings are taken. */
export const READ_AT = '2027-03-02T11:00:00.000Z'

const ROLES = { office: ['office'], installer: ['installer'], other: ['installer'], supervisor: ['supervisor'], principal: ['principal'] } as const satisfies Record<string, Role[]>
type Who = keyof typeof ROLES

const FUNCTIONS = ['continuity', 'insulation', 'loop', 'rcd', 'electrode']
const INSTRUMENTS = { tester: { functions: FUNCTIONS, goodUntil: '2027-09-01' }, expired: { functions: FUNCTIONS, goodUntil: '2027-03-01' }, adapter: { functions: ['vehicle-adapter'], goodUntil: '2027-09-01' } }

export interface TestFirm {
  id: string
  people: Record<Who, FirmContext>
  crewId: string
  instruments: Record<keyof typeof INSTRUMENTS, string>
}

/** The firm's row, which only the owner may make; row security holds the owner too. */
export async function insertFirm(id: string, settings = SETTINGS): Promise<void> {
  const client = await pools.owner.connect()
  try {
    await client.query('begin')
    await client.query('select set_config(\'app.firm_id\', $1, true)', [id])
    await client.query('insert into firm (id, name, address, telephone, email, certificate_prefix, settings) values ($1, $2, $3, $4, $5, $6, $7)', [id, 'Test Fitters Ltd', '1 Test Yard, Quillham, UX4 1AA', '01632 960000', 'office@test.example', 'T', JSON.stringify(settings)])
    await client.query('commit')
  }
  finally {
    client.release()
  }
}

/** A firm with one person for each role (installer on a crew, "other" on none) and three instruments, one out of calibration. */
export async function makeFirm(): Promise<TestFirm> {
  const id = randomUUID()
  await insertFirm(id)
  const crewId = randomUUID()
  const ids = Object.fromEntries(Object.keys(ROLES).map(who => [who, randomUUID()])) as Record<Who, string>
  const instruments = { tester: randomUUID(), expired: randomUUID(), adapter: randomUUID() }
  await changeAsFirm(id, async (tx) => {
    await tx.insert(crew).values({ firmId: id, id: crewId, name: 'Crew A' })
    for (const who of Object.keys(ROLES) as Who[]) {
      await tx.insert(person).values({ firmId: id, id: ids[who], name: who, email: `${who}@${id}.example` })
      await tx.insert(membership).values({ firmId: id, personId: ids[who], roles: [...ROLES[who]], crewId: who === 'installer' ? crewId : null })
    }
    for (const [name, { functions, goodUntil }] of Object.entries(INSTRUMENTS) as [keyof typeof INSTRUMENTS, typeof INSTRUMENTS.tester][]) {
      await tx.insert(instrument).values({ firmId: id, id: instruments[name], name, serial: name, functions })
      await tx.insert(calibration).values({ firmId: id, id: randomUUID(), instrumentId: instruments[name], doneOn: '2026-09-01', goodUntil })
    }
  })
  const context = (who: Who) => firmContext(id, { id: ids[who], name: who, email: `${who}@${id}.example`, roles: [...ROLES[who]], firmId: id, firmName: 'Test Fitters Ltd', selfCountersign: false, crewId: who === 'installer' ? crewId : null })
  const people = Object.fromEntries((Object.keys(ROLES) as Who[]).map(who => [who, context(who)])) as Record<Who, FirmContext>
  return { id, people, crewId, instruments }
}

/** An enquiry, as the office takes it. */
export async function makeJob(firm: TestFirm): Promise<string> {
  const { id } = await addJob(firm.people.office, {
    mutationId: randomUUID(), customer: { name: 'Ada Test', email: '', telephone: '' }, premises: { address: '2 Test Row', town: 'Quillham', postcode: 'UX4 2AA', country: 'England', mpan: '' }, wanted: {}, note: '',
  })
  return id
}

/** A job on which the installer's crew has a visit, so that it is the installer's own. */
export async function makeOwnJob(firm: TestFirm): Promise<string> {
  const jobId = await makeJob(firm)
  await bookVisit(firm.people.office, { mutationId: randomUUID(), jobId, kind: 'install', day: '2027-03-02', half: 'am', crewId: firm.crewId, hours: 4, note: '' })
  return jobId
}

/** One change on its way, with an id of its own unless one is given. */
export function mutation(kind: string, jobId: string, payload: Record<string, unknown>, rest: Partial<Mutation> = {}): Mutation {
  return { id: randomUUID(), kind, jobId, baseVersion: null, at: READ_AT, payload, ...rest }
}

/** An R1+R2 reading, or what is said otherwise. */
export function readingOf(firm: TestFirm, rest: Record<string, unknown> = {}): Record<string, unknown> {
  return { id: randomUUID(), test: 'R1R2', kind: 'value', shown: '0.19', value: 0.19, unit: 'Ω', resolution: 0.01, instrumentId: firm.instruments.tester, ...rest }
}

export const send = (ctx: FirmContext, kind: string, jobId: string, payload: Record<string, unknown>, rest: Partial<Mutation> = {}): Promise<MutationOutcome> =>
  applyMutation(ctx, mutation(kind, jobId, payload, rest))

/** Runs raw SQL inside the firm as one of the database's roles and commits. */
export async function inFirm<T extends Record<string, unknown>>(firmId: string, text: string, values: unknown[] = [], role: keyof typeof pools = 'app'): Promise<T[]> {
  const client = await pools[role].connect()
  try {
    await client.query('begin')
    await client.query('select set_config(\'app.firm_id\', $1, true)', [firmId])
    const { rows } = await client.query<T>(text, values)
    await client.query('commit')
    return rows
  }
  catch (error) {
    await client.query('rollback')
    throw error
  }
  finally {
    client.release()
  }
}
