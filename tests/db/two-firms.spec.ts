import { beforeAll, describe, expect, it } from 'vitest'
import { findJobRecord } from '#server/db/queries/job-record'
import { findJob } from '#server/db/queries/jobs'
import { listJobs } from '#server/services/jobs/list-jobs'
import { bookVisit } from '#server/services/visits/book-visit'
import { pools, withRollback } from '../support/db-setup'
import { makeEveryRow } from '../support/build/every-row'
import { makeFirm, makeJob, makeOwnJob, readingOf, send, type TestFirm } from '../support/build/firm'

let a: TestFirm
let b: { firmId: string, tables: string[] }

beforeAll(async () => {
  a = await makeFirm()
  b = await makeEveryRow()
})

const enter = (firmId: string) => ({ text: 'select set_config(\'app.firm_id\', $1, true)', values: [firmId] })

describe('another firm\'s rows', () => {
  it('stand in every table of the schema, so that none is left out below', async () => {
    const { rows } = await pools.owner.query<{ name: string }>('select table_name as name from information_schema.columns where table_schema = \'public\' and column_name = \'firm_id\' and table_name in (select relname from pg_class where relkind = \'r\')')
    expect(b.tables.toSorted()).toEqual(rows.map(row => row.name).sort())
  })

  it.each(['app', 'worker'] as const)('are not there for the %s inside its own firm', role => withRollback(async ({ client }) => {
    await client.query(enter(a.id))
    for (const table of b.tables) {
      const { rows } = await client.query('select count(*)::int as n from ' + table + ' where firm_id = $1', [b.firmId])
      expect([table, rows[0].n]).toEqual([table, 0])
    }
    expect((await client.query('select id from firm')).rows).toEqual([{ id: a.id }])
  }, role))

  it.each(['app', 'worker'] as const)('are there for the %s inside that firm', role => withRollback(async ({ client }) => {
    await client.query(enter(b.firmId))
    for (const table of b.tables) {
      const { rows } = await client.query('select count(*)::int as n from ' + table)
      expect([table, rows[0].n]).toEqual([table, 1])
    }
  }, role))

  it.each(['app', 'worker', 'owner'] as const)('are closed to the %s that has named no firm, beyond the look-ups', role => withRollback(async ({ client }) => {
    const { rows: looked } = await client.query<{ name: string }>('select c.relname as name from pg_policy p join pg_class c on c.oid = p.polrelid where p.polname = \'look_up\'')
    const closed = b.tables.filter(table => role !== 'owner' || !looked.some(row => row.name === table))
    for (const table of closed) {
      const { rows } = await client.query('select count(*)::int as n from ' + table)
      expect([table, rows[0].n]).toEqual([table, 0])
    }
  }, role))

  it('are neither changed nor written from inside one\'s own', () => withRollback(async ({ client }) => {
    await client.query(enter(a.id))
    for (const table of b.tables) {
      await client.query('savepoint attempt')
      const changed = await client.query('update ' + table + ' set firm_id = firm_id where firm_id = $1', [b.firmId]).then(result => result.rowCount, (error: Error) => error.message)
      expect([table, changed === 0 || `${changed}`.startsWith('permission denied')]).toEqual([table, true])
      await client.query('rollback to savepoint attempt')
    }
    await expect(client.query('insert into crew (firm_id, id, name) values ($1, gen_random_uuid(), \'Intruder\')', [b.firmId])).rejects.toThrow('row-level security')
  }))

  it('are not taken over by moving a row', () => withRollback(async ({ client }) => {
    await client.query(enter(a.id))
    await expect(client.query('update crew set firm_id = $1', [b.firmId])).rejects.toThrow('row-level security')
  }))

  it('are no parents for one\'s own rows, even past row security', () => withRollback(async ({ client }) => {
    await client.query(enter(b.firmId))
    const { rows: [job] } = await client.query<{ id: string }>('select id from job')
    await client.query(enter(a.id))
    await expect(client.query('insert into visit (firm_id, id, job_id, kind, day, half, crew_id) values ($1, gen_random_uuid(), $2, \'survey\', \'2027-03-02\', \'am\', $3)', [a.id, job!.id, a.crewId])).rejects.toMatchObject({ code: '23503' })
  }, 'owner'))
})

describe('services of one firm', () => {
  it('find nothing of another\'s job', async () => {
    const other = await makeFirm()
    const theirs = await makeOwnJob(other)
    const { office, installer, supervisor } = a.people
    expect(await office.read(tx => findJob(tx, a.id, theirs))).toBeNull()
    expect(await office.read(tx => findJobRecord(tx, a.id, theirs, null))).toBeNull()
    // Even a query that named the other firm by mistake finds nothing.
    expect(await office.read(tx => findJob(tx, other.id, theirs))).toBeNull()
    expect((await listJobs(office, {})).lines.map(line => line.id)).not.toContain(theirs)
    expect(await send(installer, 'add-reading', theirs, readingOf(a))).toMatchObject({ status: 'refused', problem: { code: 'not-found' } })
    expect(await send(supervisor, 'change-survey', theirs, { key: 'survey', fields: { cutout_A: 80 } })).toMatchObject({ status: 'refused', problem: { code: 'not-found' } })
  })

  it('refuse another\'s crew and instrument', async () => {
    const other = await makeFirm()
    const job = await makeJob(a)
    await expect(bookVisit(a.people.office, { mutationId: crypto.randomUUID(), jobId: job, kind: 'survey', day: '2027-03-02', half: 'am', crewId: other.crewId, hours: 1, note: '' })).rejects.toThrow('crew')
    const own = await makeOwnJob(a)
    expect(await send(a.people.installer, 'add-reading', own, readingOf(a, { instrumentId: other.instruments.tester }))).toMatchObject({ status: 'refused', problem: { code: 'check-answers' } })
  })

  it('keep numbers and events apart', async () => {
    const [one, two] = [await makeFirm(), await makeFirm()]
    await makeJob(one)
    await makeJob(two)
    const refs = await Promise.all([one, two].map(async firm => (await listJobs(firm.people.office, {})).lines.map(line => line.ref)))
    expect(refs).toEqual([['J0001'], ['J0001']])
  })
})
