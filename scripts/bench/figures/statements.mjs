/** P-18: how often a request asks the database and waits, counted on the wire between them. Exact. */
import { nextFree } from '../../lib/ports.mjs'
import { stopChild } from '../../lib/children.mjs'
import { startWeb, waitForAll } from '../../lib/serve.mjs'
import { countingProxy } from '../lib/counting-proxy.mjs'
import { count, figure } from '../lib/figure.mjs'
import { insideFirm } from '../lib/inside-firm.mjs'
import { requester } from '../lib/requests.mjs'

export const ids = ['P-18']

const LEGS = 50

/** Two jobs of the small firm, one with a single leg of its cable and one with fifty. */
async function jobsWithLegs(owner, firmId) {
  return insideFirm(owner, firmId, async () => {
    const { rows } = await owner.query('select id from job where firm_id = $1 order by ref limit 2', [firmId])
    for (const [at, legs] of [1, LEGS].entries()) {
      await owner.query('insert into leg (firm_id, job_id, key, position, content) select $1, $2, \'leg-\' || i, i, \'{"method":"C","L_m":3}\' from generate_series(1, $3::int) i on conflict do nothing', [firmId, rows[at].id, legs])
    }
    return rows.map(row => row.id)
  })
}

const firstWords = text => text.trim().split(/\s+/).slice(0, 3).join(' ')

export async function measure(world) {
  const { addresses, owner, parts, firms, signIn } = await world.served()
  const cookie = await signIn(firms.small)
  const [one, fifty] = await jobsWithLegs(owner, firms.small.id)
  const proxy = await countingProxy(addresses.DATABASE_URL)
  const port = await nextFree(34_700)
  const baseUrl = `http://127.0.0.1:${port}`
  const web = startWeb({ ...parts, env: { ...parts.env, DATABASE_URL: proxy.url }, name: 'web-counted', port, baseUrl })
  await waitForAll([web])
  const ask = requester(baseUrl, { accept: 'application/json', cookie })
  // Asked twice: the first opens the connection and looks the session up, which is then known for a second.
  const counted = async (path) => {
    await ask(path)
    return proxy.during(() => ask(path))
  }
  const [list, short, long] = [await counted('/api/jobs'), await counted(`/api/jobs/${one}/record`), await counted(`/api/jobs/${fifty}/record`)]
  await stopChild(web.child)
  proxy.close()
  const told = seen => `exact; ${seen.statements.map(firstWords).join(' / ')}; the session's own look-up comes at most once a second`
  return [
    count({ id: 'P-18', what: 'Round trips to the database for a page of the job list', ours: list.waits, atMost: 1, note: told(list) }),
    count({ id: 'P-18', what: 'Round trips to the database for a job\'s record', ours: long.waits, atMost: 3, note: told(long) }),
    figure({ id: 'P-18', what: `Round trips for a job with ${LEGS} legs against one with a single leg`, ours: long.waits, anchor: short.waits, atMost: 1, note: 'exact' }),
  ]
}
