/** P-32: what people on other pages feel while the worker makes ten packs. */
import { randomUUID } from 'node:crypto'
import { setTimeout as pause } from 'node:timers/promises'
import { Mendable } from '../../lib/say.mjs'
import { closedLoop, warmUp } from '../lib/closed-loop.mjs'
import { figure } from '../lib/figure.mjs'
import { insideFirm } from '../lib/inside-firm.mjs'
import { jobsAsker, requester } from '../lib/requests.mjs'
import { mean, median } from '../lib/statistics.mjs'

export const ids = ['P-32']

const PACKS = 10
const ROUNDS = 3
const IDLE_MS = 1_500
const PATIENCE_MS = 90_000

async function findFinishedJob(owner, firmId) {
  const { rows } = await insideFirm(owner, firmId, () => owner.query('select id from job where firm_id = $1 and stage in (\'countersigned\', \'handed-over\', \'closed\') limit 1', [firmId]))
  if (!rows[0]) throw new Mendable('The invented firm has no finished job', 'run this with --fresh')
  return rows[0].id
}

/** Asks for ten packs of a finished job, as people do, and waits until the worker has made them. */
async function makePacks({ owner, firms }, ask, jobId) {
  const papers = []
  for (let count = 0; count < PACKS; count++) {
    const { text } = await ask(`/api/jobs/${jobId}/draft`, { method: 'POST', body: { mutationId: randomUUID() } })
    papers.push(JSON.parse(text).paperId)
  }
  const until = performance.now() + PATIENCE_MS
  for (;;) {
    const { rows: [{ made, problem }] } = await insideFirm(owner, firms.demo.id, () => owner.query('select count(*) filter (where state = \'made\')::int as made, max(problem) as problem from paper where id = any($1)', [papers]))
    if (made === PACKS) return
    if (problem || performance.now() > until) throw new Mendable(`The worker made ${made} of ${PACKS} packs`, 'read the line above', problem ?? 'It took too long.')
    await pause(250)
  }
}

export async function measure(world) {
  const served = await world.served()
  const { baseUrl, owner, firms, signIn } = served
  const jobId = await findFinishedJob(owner, firms.demo.id)
  const office = requester(baseUrl, { accept: 'application/json', cookie: await signIn(firms.demo) })
  const jobs = jobsAsker(baseUrl, await signIn(firms.small))
  const other = () => jobs()
  await warmUp(other, { clients: 2 })
  const idle = async () => (await closedLoop(other, { clients: 2, ms: IDLE_MS })).p95
  const busy = async () => {
    let isDone = false
    const packs = makePacks(served, office, jobId).finally(() => {
      isDone = true
    })
    const [{ p95 }] = await Promise.all([closedLoop(other, { clients: 2, until: () => isDone }), packs])
    return p95
  }
  const [ours, anchor, ratios] = [[], [], []]
  for (let round = 0; round < ROUNDS; round++) {
    const before = await idle()
    const during = await busy()
    const after = await idle()
    ours.push(during)
    anchor.push(before, after)
    ratios.push(during / mean([before, after]))
  }
  return [figure({ id: 'P-32', what: `p95 of the job list while the worker makes ${PACKS} packs against idle, ms`, ours: median(ours), anchor: median(anchor), ratios, atMost: 1.4, note: `${ROUNDS} rounds idle, busy, idle; 2 clients; on a machine of two cores the worker, the database and the asker share them` })]
}
