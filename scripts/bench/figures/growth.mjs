/** P-22: pages of the list in a firm of 100,000 jobs against one of 100, through HTTP. */
import { figure } from '../lib/figure.mjs'
import { insideFirm } from '../lib/inside-firm.mjs'
import { middleOfList } from '../lib/load-data.mjs'
import { jobsAsker } from '../lib/requests.mjs'
import { inGroups, median } from '../lib/statistics.mjs'

export const ids = ['P-22']

const TIMES = 210
const GROUPS = 7

/** Both firms in turn, so that whatever else the machine does falls on both. */
async function alternate(asks) {
  const latencies = asks.map(() => [])
  for (let count = -20; count < TIMES; count++) {
    for (const [at, ask] of asks.entries()) {
      const began = performance.now()
      await ask()
      if (count >= 0) latencies[at].push(performance.now() - began)
    }
  }
  return latencies
}

async function pagesOf({ baseUrl, owner, signIn }, firm) {
  const cookie = await signIn(firm)
  const middle = await insideFirm(owner, firm.id, () => middleOfList(owner, firm))
  const page = jobsAsker(baseUrl, cookie)
  const stage = jobsAsker(baseUrl, cookie, { lines: Math.min(25, Math.floor(firm.jobs / 11)) })
  return { 'the first page': () => page(), 'a page from the middle': () => page(`?before=${middle}`), 'the first page of one stage': () => stage('?stage=closed') }
}

export async function measure(world, { million }) {
  const served = await world.served()
  const { small, large, million: largest } = served.firms
  const bigger = [[large, 1.25], ...(million ? [[largest, 1.4]] : [])]
  const anchor = await pagesOf(served, small)
  const figures = []
  for (const [firm, atMost] of bigger) {
    const ours = await pagesOf(served, firm)
    for (const what of Object.keys(anchor)) {
      const [few, many] = await alternate([anchor[what], ours[what]])
      const groups = inGroups(many, GROUPS).map((group, at) => median(group) / median(inGroups(few, GROUPS)[at]))
      const note = `${TIMES} requests each in turn, one client${what.includes('stage') ? '; the small firm has 9 such jobs, so its page is shorter' : ''}`
      figures.push(figure({ id: 'P-22', what: `${what} with ${firm.jobs} jobs against 100, ms`, ours: median(many), anchor: median(few), ratios: groups, atMost: what.includes('stage') ? undefined : atMost, note }))
    }
  }
  return figures
}
