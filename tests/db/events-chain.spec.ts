import { beforeAll, describe, expect, it } from 'vitest'
import type pg from 'pg'
import { withRollback } from '../support/db-setup'
import { inFirm, makeFirm, makeOwnJob, readingOf, send, type TestFirm } from '../support/build/firm'

let firm: TestFirm

beforeAll(async () => {
  firm = await makeFirm()
  const jobId = await makeOwnJob(firm)
  for (const ambient_C of [8, 12, 16]) await send(firm.people.installer, 'add-reading', jobId, readingOf(firm, { context: { ambient_C } }))
})

/** What someone with the owner's powers could do who first lifted the trigger; undone at the end. */
const tampering = (act: (client: pg.PoolClient) => Promise<void>) => withRollback(async ({ client }) => {
  await client.query('select set_config(\'app.firm_id\', $1, true)', [firm.id])
  await client.query('alter table audit_event disable trigger only_added')
  await act(client)
}, 'owner')

async function firstBroken(client: pg.PoolClient): Promise<number | null> {
  const { rows: [row] } = await client.query<{ broken: string | null }>('select first_broken_event() as broken')
  return row!.broken === null ? null : Number(row!.broken)
}

describe('the chain of events', () => {
  it('holds as it was written', async () => {
    expect(await inFirm(firm.id, 'select first_broken_event() as broken, (select count(*)::int from audit_event) as n')).toEqual([{ broken: null, n: 5 }])
  })

  it.each([
    ['its kind', 'type = \'signed-in\''],
    ['who did it', 'person_id = gen_random_uuid()'],
    ['which job', 'job_id = gen_random_uuid()'],
    ['when', 'at = at + interval \'1 microsecond\''],
    ['its detail', 'detail = detail || \'{"test":"Zs"}\''],
    ['its hash', 'hash = repeat(\'0\', 64)'],
  ])('shows a row in which %s was changed', (_, change) => tampering(async (client) => {
    await client.query(`update audit_event set ${change} where number = 3`)
    expect(await firstBroken(client)).toBe(3)
  }))

  it('shows a row taken out', () => tampering(async (client) => {
    await client.query('delete from audit_event where number = 2')
    expect(await firstBroken(client)).toBe(3)
  }))

  it('shows a row put in between by its number', () => tampering(async (client) => {
    await client.query('insert into audit_event (firm_id, number, type, detail, at, previous_hash, hash) select firm_id, 6, type, detail, at, \'x\', \'y\' from audit_event where number = 5')
    expect(await firstBroken(client)).toBe(6)
  }))

  it('shows two rows that changed places', () => tampering(async (client) => {
    await client.query('update audit_event set number = 99 where number = 3')
    await client.query('update audit_event set number = 3 where number = 4')
    await client.query('update audit_event set number = 4 where number = 99')
    expect(await firstBroken(client)).toBe(3)
  }))

  it('shows that its last rows were cut off', () => tampering(async (client) => {
    await client.query('delete from audit_event where number >= 4')
    expect(await firstBroken(client)).toBe(4)
  }))

  it('is written through its one door', () => withRollback(async ({ client }) => {
    await client.query('select set_config(\'app.firm_id\', $1, true)', [firm.id])
    await client.query('savepoint attempt')
    await expect(client.query('insert into audit_event (firm_id, number, type, detail, at, previous_hash, hash) values ($1, 6, \'x\', \'{}\', now(), \'\', \'\')', [firm.id])).rejects.toThrow('permission denied')
    await client.query('rollback to savepoint attempt')
    await expect(client.query('update audit_head set number = 0')).rejects.toThrow('permission denied')
  }))

  it('takes no event outside a firm', () => withRollback(async ({ client }) => {
    await expect(client.query('select record_event(\'signed-in\', null, null, \'{}\')')).rejects.toThrow()
  }))
})
