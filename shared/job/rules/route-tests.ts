/** The tests that lead to a way to the network operator, in the order in which they decide. */
import { formatBesideLimit, formatFigure } from '../../utils/figures'
import { exportReason } from './generation-form'
import { blankKeys } from './inputs'
import type { NetworkRouteInput } from './network-route'
import { because } from './rule'

export type NetworkRoute = 'tell-after' | 'ask-first' | 'contact' | 'generation-application'

/** Above this demand after the work the operator is asked first, whatever the fuse (rule DNO-03). */
export const TELL_AFTER_LIMIT_A = 60

interface RouteTest {
  route: NetworkRoute
  /** `blank` names what the test cannot do without; `reasons` holds a sentence where the test is met. */
  judge(given: NetworkRouteInput): { blank?: string[], reasons?: string[] }
}

/** A test on one yes-or-no answer. */
function whenAnswered(route: NetworkRoute, key: 'service_ok' | 'unmetered' | 'looped' | 'device_standard', met: boolean, reasons: string[]): RouteTest {
  return {
    route,
    judge: (given) => {
      const blank = blankKeys({ [key]: given[key] })
      return blank.length ? { blank } : { reasons: given[key] === met ? reasons : [] }
    },
  }
}

export const ROUTE_TESTS: readonly RouteTest[] = [
  whenAnswered('contact', 'service_ok', false, [because('DNO-07', 'The service equipment is not safe. Install nothing until the network operator has put it right.')]),
  whenAnswered('contact', 'unmetered', true, [because('DNO-08', 'The supply is unmetered. Contact the network operator first.')]),
  { route: 'generation-application', judge: judgeExport },
  whenAnswered('ask-first', 'looped', true, [
    because('DNO-06', 'The supply is looped. Contact the network operator first.'),
    because('SUR-09', 'A looped supply is always applied for before connecting.'),
  ]),
  { route: 'contact', judge: judgeCutoutKnown },
  { route: 'ask-first', judge: judgeFuse },
  { route: 'ask-first', judge: judgeThreshold },
  whenAnswered('ask-first', 'device_standard', false, [because('DNO-09', 'The charger is outside the emission standards or of unusual size. Apply first.')]),
  {
    route: 'contact',
    judge: given => ({ reasons: given.clustered ? [because('DNO-10', 'This is one of many in a close programme. Contact the network operator well in advance.')] : [] }),
  },
]

function judgeExport(given: NetworkRouteInput) {
  const blank = blankKeys({ export_A: given.export_A })
  if (blank.length) return { blank }
  if (!given.export_A) return { reasons: [] }
  const generation = blankKeys({ total_generation_kW: given.total_generation_kW })
  return generation.length ? { blank: generation } : { reasons: [exportReason(given)] }
}

function judgeCutoutKnown(given: NetworkRouteInput) {
  const blank = blankKeys({ cutout_known: given.cutout_known })
  if (blank.length) return { blank }
  if (given.cutout_known !== 'read' && given.cutout_known !== 'told') {
    return { reasons: [because('DNO-05', 'The main fuse rating is neither read nor told by the network operator. Contact them first.')] }
  }
  return { blank: blankKeys({ cutout_A: given.cutout_A }) }
}

function judgeFuse({ md_after_A: demand, cutout_A: fuse, cutout_known: known }: NetworkRouteInput) {
  const blank = blankKeys({ md_after_A: demand })
  // An assumed rating is met by the test before; it is no figure to hold a demand against.
  if (blank.length || typeof demand !== 'number' || typeof fuse !== 'number' || (known !== 'read' && known !== 'told')) return { blank }
  const isOver = demand > fuse
  return { reasons: isOver ? [because('DNO-04', `${formatBesideLimit(demand, fuse, 'A', 1)} after the work is more than the main fuse of ${formatFigure(fuse, 'A')}. Apply, and do not connect.`)] : [] }
}

function judgeThreshold({ md_after_A: demand }: NetworkRouteInput) {
  if (typeof demand !== 'number') return { blank: ['md_after_A'] }
  const isOver = demand > TELL_AFTER_LIMIT_A
  return { reasons: isOver ? [because('DNO-03', `${formatBesideLimit(demand, TELL_AFTER_LIMIT_A, 'A', 1)} after the work is more than ${formatFigure(TELL_AFTER_LIMIT_A, 'A')}. Ask first, whatever the main fuse.`)] : [] }
}
