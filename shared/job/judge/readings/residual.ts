/** The residual-current device, its d.c. part, and what is seen rather than measured. */
import { notAbove } from '../../../electrical/compare'
import { rcdTestCalculation } from '../../../electrical/rcd-test'
import { numberOf, textOf } from '../facts'
import { fieldRef } from '../field-refs'
import { judged } from '../judged'
import { most } from './limits'
import { EMPTY_FRAME, fromAnswer, outcome, overRange, type ReadingBench, type TestJudge } from './outcome'

const DC_TEST_MA = 6
/** The longest a charger waits of itself before current flows (rule SMT-03). */
const START_DELAY_S = 600
const installedRef = (field: string, words: string) => fieldRef('circuit', 'installed', field, words)

function ask({ inputs, edition }: ReadingBench, rest: Record<string, unknown>) {
  return judged(rcdTestCalculation, {
    title: 'Whether the residual-current device acts in time and is of a kind that may be used',
    input: { type: textOf(inputs.installed, 'rcd_type'), IdeltaN_mA: numberOf(inputs.installed, 'rcd_IdeltaN_mA'), delay: false, multiple: 1, edition, ...rest },
    from: { type: installedRef('rcd_type', 'the residual-current device\'s type'), IdeltaN_mA: installedRef('rcd_IdeltaN_mA', 'its rated residual current') },
  })
}

export const RcdTime: TestJudge = {
  frame(bench) {
    const { answer, waitsFor } = ask(bench, {})
    return { ...EMPTY_FRAME, limit: answer.result.limit_ms === undefined ? null : most(answer.result.limit_ms, 'ms', 0), waitsFor }
  },
  judge(bench, reading, value, frame) {
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    const { answer, waitsFor } = ask(bench, { trip_ms: value })
    return fromAnswer(answer, waitsFor)
  },
}

export const RcdDc: TestJudge = {
  frame(bench) {
    const { answer, waitsFor } = ask(bench, { dc: { at_mA: DC_TEST_MA } })
    return { ...EMPTY_FRAME, limit: answer.result.dcLimit_s === undefined ? null : most(answer.result.dcLimit_s, 's', 1), waitsFor }
  },
  judge(bench, reading, value, frame) {
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    if (!frame.limit) return outcome('waiting', { waitsFor: frame.waitsFor })
    const { answer } = ask(bench, { dc: { at_mA: DC_TEST_MA, trip_s: value } })
    const fits = notAbove(value, frame.limit.value)
    return outcome(fits ? 'within' : 'outside', { working: answer.working, reasons: answer.reasons.filter(reason => reason.startsWith('EAR-17')) })
  },
}

/** Correct or wrong. "Wrong" while the charger may still be waiting out its start delay is no fault yet (rule TST-19). */
export const Seen: TestJudge = {
  frame: () => EMPTY_FRAME,
  judge(bench, reading) {
    if (reading.shown === 'correct') return outcome('within')
    const { waited_s } = reading.context
    if (waited_s === undefined || waited_s >= START_DELAY_S) return outcome('outside')
    const minutes = Math.ceil((START_DELAY_S - waited_s) / 60)
    return outcome('waiting', { reasons: ask(bench, { waited_s }).answer.reasons, waitsForWords: `the charger's start delay: up to ${minutes} min more` })
  },
}
