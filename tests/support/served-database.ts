/** The served build's database as its owner: to put a firm's rows there and to look at what came of a request. */
import { inject } from 'vitest'
import pg from 'pg'

/** Works inside one firm in one transaction; row security holds the owner too. */
export async function asOwner<T>(firmId: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: inject('server').TEST_DATABASE_URL_OWNER })
  await client.connect()
  try {
    await client.query('begin')
    await client.query('select set_config(\'app.firm_id\', $1, true)', [firmId])
    const result = await work(client)
    await client.query('commit')
    return result
  }
  finally {
    await client.end()
  }
}

/** How many acts of people the firm's chain holds: it does not move while nobody changes anything. (The worker's own events come when they come.) */
export async function countEvents(firmId: string): Promise<number> {
  return asOwner(firmId, async (client) => {
    const { rows } = await client.query<{ number: string }>('select count(*) as number from audit_event where firm_id = $1 and person_id is not null', [firmId])
    return Number(rows[0]!.number)
  })
}

/** Failed sign-ins are counted by address as well, and every test comes from one. */
export async function forgetFailedSignIns(): Promise<void> {
  await asOwner('00000000-0000-4000-8000-000000000000', client => client.query('delete from rate_limit'))
}
