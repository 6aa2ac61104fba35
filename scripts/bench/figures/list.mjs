/** P-11, P-12: the list of jobs with session, role, firm and row security, against node:http and pg with the same statement. */
import { inRoot } from '../../lib/paths.mjs'
import { nextFree } from '../../lib/ports.mjs'
import { startChild, stopChild, waitUntilWell } from '../../lib/children.mjs'
import { abba, ratiosOf } from '../lib/abba.mjs'
import { closedLoop, warmUp } from '../lib/closed-loop.mjs'
import { figure } from '../lib/figure.mjs'
import { jobsAsker } from '../lib/requests.mjs'
import { median } from '../lib/statistics.mjs'

export const ids = ['P-11', 'P-12']

const CLIENTS = 8
const MS = 800

export async function measure(world) {
  const { baseUrl, addresses, firms, signIn } = await world.served()
  const port = await nextFree(34_600)
  const raw = startChild({ name: 'bench-raw-http', args: [inRoot('scripts/bench/lib/raw-http.mjs')], env: { ...process.env, NODE_ENV: 'production', DATABASE_URL: addresses.DATABASE_URL, BENCH_FIRM: firms.large.id, PORT: String(port) } })
  const rawUrl = `http://127.0.0.1:${port}`
  await waitUntilWell(raw, `${rawUrl}/health`)
  const ask = { anchor: jobsAsker(rawUrl, null), ours: jobsAsker(baseUrl, await signIn(firms.large)) }
  for (const each of Object.values(ask)) await warmUp(each, { clients: CLIENTS })
  const arm = each => () => closedLoop(each, { clients: CLIENTS, ms: MS })
  const perSecond = measured => measured.perSecond
  const p95 = measured => measured.p95
  const rounds = await abba({ anchor: arm(ask.anchor), ours: arm(ask.ours), pick: perSecond })
  await stopChild(raw)
  const middle = (side, pick) => median(rounds.flatMap(round => round[side].map(pick)))
  const note = 'GET /api/jobs, 25 of 100,000 jobs, 8 clients; anchor: node:http and pg, the same statement'
  return [
    figure({ id: 'P-11', what: 'Throughput of the job list, requests a second', ours: middle('ours', perSecond), anchor: middle('anchor', perSecond), ratios: ratiosOf(rounds, perSecond), atLeast: 0.7, note }),
    figure({ id: 'P-12', what: 'p95 of the job list, ms', ours: middle('ours', p95), anchor: middle('anchor', p95), ratios: ratiosOf(rounds, p95), atMost: 1.6, note }),
  ]
}
