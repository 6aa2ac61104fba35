import { median, quantile } from './statistics.mjs'

/**
 * So many askers, each asking again as soon as it is answered, until the time is over or `until` says stop.
 * Every latency is kept, so a p95 is exact.
 */
export async function closedLoop(ask, { clients, ms = Infinity, until = () => false }) {
  const latencies = []
  const began = performance.now()
  const asker = async () => {
    while (performance.now() - began < ms && !until()) {
      const at = performance.now()
      await ask()
      latencies.push(performance.now() - at)
    }
  }
  await Promise.all(Array.from({ length: clients }, asker))
  return { latencies, perSecond: latencies.length / (performance.now() - began) * 1000, p95: quantile(latencies, 0.95) }
}

/** Asks until two windows in a row have nearly the same median, for two seconds at most. */
export async function warmUp(ask, { clients }) {
  let before = 0
  for (let window = 0; window < 7; window++) {
    const { latencies } = await closedLoop(ask, { clients, ms: 300 })
    const now = median(latencies)
    if (Math.abs(now - before) < before * 0.1) return
    before = now
  }
}
