/** What a load limiter asks of the one who counts on it (rule DNO-11). */
import type { NetworkRouteInput } from './network-route'
import { because } from './rule'

/** Conditions while the limiter is planned or fitted; a tested one has met them. */
export function limiterConditions({ limiter }: NetworkRouteInput): string[] {
  if (limiter !== 'planned' && limiter !== 'fitted') return []
  return [
    because('DNO-11', 'The load limiter fails safe: a lost sensor or signal lowers the charge or stops it.'),
    because('DNO-11', 'The load limiter and its set limit are declared on the form.'),
    because('DNO-11', 'The load limiter is commissioned and tested before the charger is used.'),
  ]
}

export function limiterReason({ limiter }: NetworkRouteInput): string[] {
  if (!limiter || limiter === 'none') return []
  const sentence = {
    planned: 'The demand counts on a load limiter that is planned. It counts on the conditions named.',
    fitted: 'The demand counts on a load limiter that is fitted and not yet tested. It counts on the conditions named.',
    tested: 'The demand counts on a load limiter that is tested. Declare it on the form with its set limit.',
  }[limiter]
  return [because('DNO-11', sentence)]
}
