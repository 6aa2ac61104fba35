/** What is measured at the origin and at the board: the loop outside, the fault current, the electrode. */
import { breakingCapacityCalculation } from '../../../electrical/breaking-capacity'
import { faultCurrentCalculation } from '../../../electrical/fault-current'
import { ttElectrodeCalculation } from '../../../electrical/tt-electrode'
import { formatFigure } from '../../../utils/figures'
import { numberOf } from '../facts'
import { fieldRef } from '../field-refs'
import { DECLARED_ZE_OHM, type JobInputs } from '../inputs-from-record'
import { judged } from '../judged'
import { expected, most } from './limits'
import { againstLimit, EMPTY_FRAME, fromAnswer, outcome, overRange, type Frame, type ReadingBench, type TestJudge } from './outcome'

const IDELTA_REF = fieldRef('circuit', 'installed', 'rcd_IdeltaN_mA', 'the rated residual current')

function electrode({ inputs }: ReadingBench, RA_ohm?: number) {
  return judged(ttElectrodeCalculation, { title: 'Whether the electrode is low enough', input: { IdeltaN_A: inputs.IdeltaN_A, RA_ohm }, from: { IdeltaN_A: IDELTA_REF } })
}

/** Above what operators usually declare is odd, not unsafe by itself: Zs decides (common practice). On TT the loop outside is the electrode. */
export const Ze: TestJudge = {
  frame(bench) {
    const { arrangement } = bench.inputs
    if (arrangement === undefined) return { ...EMPTY_FRAME, waitsFor: [fieldRef('survey', 'survey', 'earthing', 'the earthing arrangement')] }
    if (arrangement !== 'TT') return { ...EMPTY_FRAME, limit: most(DECLARED_ZE_OHM[arrangement], 'Ω', 2) }
    const { answer, waitsFor } = electrode(bench)
    return { ...EMPTY_FRAME, limit: answer.result.RA_max_ohm === undefined ? null : most(answer.result.RA_max_ohm, 'Ω', 0), waitsFor }
  },
  judge(bench, reading, value, frame) {
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    const found = againstLimit(value, frame)
    if (found.verdict !== 'outside' || bench.inputs.arrangement === 'TT') return found
    return outcome('within', { notes: ['TST-07: the figures usually declared are known from memory; ask the network operator.'], odd: [`TST-07: Ze reads ${formatFigure(value, 'Ω', 2)}; for this arrangement the network operator usually declares at most ${formatFigure(frame.limit!.value, 'Ω', 2)}.`] })
  },
}

/** The calculation that judges a fault current against the device and the board. */
export function breakingCapacityOf(inputs: JobInputs, Ipf_kA: number | undefined) {
  return judged(breakingCapacityCalculation, {
    title: 'Whether the device can break the fault current',
    input: { device_kA: numberOf(inputs.installed, 'device_kA'), Ipf_kA, consumerUnitConditional_kA: numberOf(inputs.survey, 'board_conditional_kA'), serviceFuse_A: numberOf(inputs.survey, 'cutout_A') },
    from: { device_kA: fieldRef('circuit', 'installed', 'device_kA', 'the device\'s breaking capacity') },
  })
}

/** The most the device, or the device inside its board, may meet: the engine is asked which of the two ratings holds. */
function breakingLimit(inputs: JobInputs): Frame['limit'] {
  const ratings = [numberOf(inputs.survey, 'board_conditional_kA'), numberOf(inputs.installed, 'device_kA')].filter(each => each !== undefined).sort((a, b) => b - a)
  const value = ratings.find(rating => breakingCapacityOf(inputs, rating).answer.verdict === 'within')
  return value === undefined ? null : most(value, 'kA', 1)
}

function faultCurrentAt(place: 'origin' | 'board'): TestJudge {
  return {
    frame({ inputs }) {
      const Ze = inputs.Ze && inputs.Ze.how !== 'declared' && inputs.arrangement !== 'TT' && place === 'origin' ? inputs.Ze.value : undefined
      const Ipf_kA = Ze ? faultCurrentCalculation.run({ Z_ohm: Ze }).result.Ipf_A! / 1000 : undefined
      const missing = numberOf(inputs.installed, 'device_kA') === undefined
      return { limit: breakingLimit(inputs), expected: Ipf_kA === undefined ? null : expected(Ipf_kA, 'kA', 2, 'Ze, line to earth'), waitsFor: missing ? [fieldRef('circuit', 'installed', 'device_kA', 'the device\'s breaking capacity')] : [] }
    },
    judge({ inputs }, reading, value, frame) {
      if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
      const { answer, waitsFor } = breakingCapacityOf(inputs, value)
      return fromAnswer(answer, waitsFor)
    },
  }
}
export const Ipf = faultCurrentAt('origin')
export const IpfBoard = faultCurrentAt('board')

/** TT: against 50 V ÷ IΔn. An additional electrode on a PME earth has the limit that its designer worked out. */
export const RA: TestJudge = {
  frame(bench) {
    if (bench.inputs.facts.system !== 'TT') {
      const designed = numberOf(bench.inputs.earthing, 'RA_max_ohm')
      return { ...EMPTY_FRAME, limit: designed === undefined ? null : most(designed, 'Ω', 2), waitsFor: [fieldRef('earthing', 'earthing', 'RA_max_ohm', 'the electrode\'s highest resistance')] }
    }
    const { answer, waitsFor } = electrode(bench)
    return { ...EMPTY_FRAME, limit: answer.result.RA_max_ohm === undefined ? null : most(answer.result.RA_max_ohm, 'Ω', 0), waitsFor }
  },
  judge(bench, reading, value, frame) {
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    if (bench.inputs.facts.system !== 'TT') return againstLimit(value, frame)
    const { answer, waitsFor } = electrode(bench, value)
    return fromAnswer(answer, waitsFor)
  },
}
