import { beforeAll, describe, expect, it } from 'vitest'
import type pg from 'pg'
import { withRollback } from '../support/db-setup'
import { makeEveryRow } from '../support/build/every-row'

let firmId: string

beforeAll(async () => {
  firmId = (await makeEveryRow()).firmId
})

/** Each statement starts from the same rows: a refused one would otherwise end the transaction for the next. */
async function attempt(client: pg.PoolClient, text: string): Promise<string> {
  await client.query('savepoint attempt')
  const outcome = await client.query(text).then(() => 'done', (error: Error) => error.message)
  await client.query('rollback to savepoint attempt')
  return outcome
}

const inside = (role: 'app' | 'worker' | 'owner', act: (client: pg.PoolClient) => Promise<void>) => withRollback(async ({ client }) => {
  await client.query('select set_config(\'app.firm_id\', $1, true)', [firmId])
  await act(client)
}, role)

const CHANGES = {
  reading: 'update reading set value = 0.1',
  reading_confirmation: 'update reading_confirmation set at = now()',
  payment: 'update payment set pence = 2',
  audit_event: 'update audit_event set type = \'other\'',
  outside_event: 'update outside_event set kind = \'other\'',
}

describe.each(Object.entries(CHANGES))('%s', (table, change) => {
  it('is changed, removed and emptied by nobody, its owner included', () => inside('owner', async (client) => {
    expect(await attempt(client, change)).toContain('only added')
    expect(await attempt(client, `delete from ${table}`)).toContain('only added')
    expect(await attempt(client, `truncate ${table} cascade`)).toContain('only added')
  }))

  it.each(['app', 'worker'] as const)('is not the %s\'s to change or remove', role => inside(role, async (client) => {
    expect(await attempt(client, change)).toContain('permission denied')
    expect(await attempt(client, `delete from ${table}`)).toContain('permission denied')
    expect(await attempt(client, `truncate ${table}`)).toContain('permission denied')
  }))
})

describe('a sealed certificate', () => {
  it('keeps everything but its state', () => inside('app', async (client) => {
    for (const column of ['record = \'{"a":2}\'', 'hash = \'0\'', 'number = \'T-2\'', 'words = \'other\'', 'sealed_at = now()', 'previous_hash = \'1\'', 'chain_number = 2', 'job_id = gen_random_uuid()']) {
      expect(await attempt(client, `update certificate set ${column}`)).toContain('never changed')
    }
    expect(await attempt(client, 'update certificate set state = \'replaced\', words = \'other\'')).toContain('never changed')
  }))

  it('is replaced once and never comes back', () => inside('app', async (client) => {
    await client.query('update certificate set state = \'replaced\'')
    expect(await attempt(client, 'update certificate set state = \'live\'')).toContain('never changed')
  }))

  it('is never removed', async () => {
    await inside('app', async client => expect(await attempt(client, 'delete from certificate')).toContain('permission denied'))
    await inside('owner', async client => expect(await attempt(client, 'delete from certificate')).toContain('never removed'))
  })

  it('stands alone for its job, kind and subject while it is live', () => inside('app', async (client) => {
    const copy = (number: string, chain: number) => `insert into certificate (firm_id, id, job_id, kind, subject, number, record, hash, previous_hash, chain_number, seal, seal_key_id, words, sealed_at)
      select firm_id, gen_random_uuid(), job_id, kind, subject, '${number}', record, gen_random_uuid()::text, hash, ${chain}, seal, seal_key_id, words, sealed_at from certificate where chain_number = 1`
    expect(await attempt(client, copy('T-2', 2))).toContain('certificate_live_once')
    await client.query('update certificate set state = \'replaced\'')
    expect(await attempt(client, copy('T-1', 2))).toContain('certificate_number_once')
    expect(await attempt(client, copy('T-2', 1))).toContain('certificate_chain_once')
    expect(await attempt(client, copy('T-2', 2))).toBe('done')
  }))
})

describe('a signature', () => {
  it('is withdrawn once and otherwise stands as made', () => inside('app', async (client) => {
    expect(await attempt(client, 'update signature set name_shown = \'Other\'')).toContain('withdrawn, never changed')
    expect(await attempt(client, 'update signature set withdrawn_at = now(), statement = \'Other\'')).toContain('withdrawn, never changed')
    await client.query('update signature set withdrawn_at = now()')
    expect(await attempt(client, 'update signature set withdrawn_at = null')).toContain('withdrawn, never changed')
    expect(await attempt(client, 'update signature set withdrawn_at = now()')).toContain('withdrawn, never changed')
  }))

  it('stands once for each capacity of a job; signing again after withdrawal adds a row', () => inside('app', async (client) => {
    const again = 'insert into signature (firm_id, id, job_id, capacity, person_id, name_shown, way, statement, edition, record_version) select firm_id, gen_random_uuid(), job_id, capacity, person_id, name_shown, way, statement, edition, 2 from signature'
    expect(await attempt(client, again)).toContain('signature_standing_once')
    await client.query('update signature set withdrawn_at = now()')
    expect(await attempt(client, again)).toBe('done')
  }))

  it('is never removed', () => inside('owner', async client => expect(await attempt(client, 'delete from signature')).toContain('withdrawn, never changed')))
})

describe('a reading', () => {
  const insert = (columns: Record<string, string>) => {
    const row: Record<string, string> = { test: '\'Ze\'', kind: '\'value\'', shown: '\'0.2\'', value: '0.2', unit: '\'Ω\'', person_id: '(select id from person)', device_at: 'now()', ...columns }
    return `insert into reading (firm_id, id, job_id, ${Object.keys(row).join(', ')}) select firm_id, gen_random_uuid(), id, ${Object.values(row).join(', ')} from job`
  }

  it('is kept as it was shown', () => inside('app', async client => expect(await attempt(client, insert({}))).toBe('done')))

  it.each([
    ['a figure without its number', { value: 'null' }, 'reading_value_has_number'],
    ['LIM without a reason', { kind: '\'limited\'', value: 'null' }, 'reading_excuse_has_reason'],
    ['N/A without a reason', { kind: '\'not-applicable\'', value: 'null' }, 'reading_excuse_has_reason'],
    ['a kind that is none', { kind: '\'guess\'' }, 'reading_kind_known'],
    ['nobody who measured', { person_id: 'gen_random_uuid()' }, 'foreign key'],
    ['an instrument that is not the firm\'s', { instrument_id: 'gen_random_uuid()' }, 'foreign key'],
  ])('is refused with %s', (_, columns, words) => inside('app', async client => expect(await attempt(client, insert(columns))).toContain(words)))
})
