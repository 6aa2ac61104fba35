/** Whether a test belongs to this job, whether N/A or LIM may stand on it, and in whose words. */
import { testSpec, type TestKey } from '../../tests.data'
import type { JobFacts } from '../facts'

/** Why the test is not for this job; null where it is. */
export function whyNotApplicable(test: TestKey, facts: JobFacts): string | null {
  const { when } = testSpec(test)
  switch (when) {
    case undefined: return null
    case 'TT': return facts.needsElectrode ? null : 'No electrode: the distributor\'s earth is used'
    case 'three-phase': return facts.isThreePhase ? null : 'Single-phase circuit'
    case 'open-PEN': return facts.hasOpenPen ? null : 'No open-PEN device'
    case 'limiter': return facts.hasLimiter ? null : 'No load limiter'
    case 'rcd-main-switch': return facts.isMainSwitchRcd ? null : 'The main switch is no residual-current device'
    case 'dc-detection': return facts.needsDcTest ? null : 'Type B device: no separate d.c. detection'
    default: return when satisfies never
  }
}

/** Required tests on which a person may still say N/A with a reason: some d.c. devices only test themselves (rule TST-14), and not every charger's delay was switched off. */
const MAY_BE_NOT_APPLICABLE: readonly TestKey[] = ['RCD-dc', 'delay-restored']
/** LIM stands only against parts that were there before: the board that the new circuit is fed from. */
const MAY_BE_LIMITED: readonly TestKey[] = ['Zs-board', 'Ipf-board']

export function mayBeNotApplicable(test: TestKey): boolean {
  return testSpec(test).isOptional === true || MAY_BE_NOT_APPLICABLE.includes(test)
}

export function mayBeLimited(test: TestKey): boolean {
  return testSpec(test).isOptional === true || MAY_BE_LIMITED.includes(test)
}
