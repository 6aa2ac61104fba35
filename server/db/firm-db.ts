/**
 * The only way to a firm's rows. A transaction names its firm first, so row security lets through that firm alone;
 * `FirmTx` is branded, so that no query can be called with a bare connection.
 */
import { drizzle } from 'drizzle-orm/node-postgres'
import type { NodePgDatabase } from 'drizzle-orm/node-postgres'
import type pg from 'pg'
import { databasePool } from './pool'
import { asRefusal } from './unkeepable'

declare const firmTag: unique symbol
export type FirmTx = NodePgDatabase & { readonly [firmTag]: true }

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/

/** Opens the transaction and names the firm in one round trip; the id is checked because this one text is put together. */
function begin(client: pg.PoolClient, firmId: string, mode: 'read only' | 'read write'): Promise<unknown> {
  if (!UUID.test(firmId)) throw new Error('A firm id is a UUID')
  return client.query(`begin ${mode}; select set_config('app.firm_id', '${firmId}', true)`)
}

async function inTransaction<T>(firmId: string, mode: 'read only' | 'read write', act: (tx: FirmTx) => Promise<T>): Promise<T> {
  const client = await databasePool().connect()
  let broken: Error | undefined
  try {
    await begin(client, firmId, mode)
    const result = await act(drizzle(client) as unknown as FirmTx)
    await client.query('commit')
    return result
  }
  catch (error) {
    await client.query('rollback').catch((lost: Error) => {
      broken = lost
    })
    throw asRefusal(error)
  }
  finally {
    client.release(broken)
  }
}

export const readAsFirm = <T>(firmId: string, act: (tx: FirmTx) => Promise<T>) => inTransaction(firmId, 'read only', act)
export const changeAsFirm = <T>(firmId: string, act: (tx: FirmTx) => Promise<T>) => inTransaction(firmId, 'read write', act)

/** One statement outside any firm: only for the look-up functions that come before the firm is known, and for `job_page`. */
export async function lookUp<Row extends pg.QueryResultRow>(name: string, text: string, values: unknown[]): Promise<Row[]> {
  const { rows } = await databasePool().query<Row>({ name, text, values }).catch((error: unknown) => {
    throw asRefusal(error)
  })
  return rows
}
