import { insulationTestCalculation } from '../../../electrical/insulation-test'
import { judged } from '../judged'
import { least } from './limits'
import { fromAnswer, outcome, overRange, type TestJudge } from './outcome'

/** What the test asks for, taken where the person did not note another voltage. */
export const INSULATION_TEST_V = { 'cable': 500, 'charger-connected': 250 } as const

function insulation(stage: keyof typeof INSULATION_TEST_V): TestJudge {
  const ask = (value?: number, test_V: number = INSULATION_TEST_V[stage]) =>
    judged(insulationTestCalculation, { title: 'Whether the insulation is high enough', input: { test_V, stage, ...(value !== undefined && { readings_Mohm: [value] }) }, from: {} }).answer
  return {
    frame: () => ({ limit: least(ask().result.limit_Mohm!, 'MΩ', 1), expected: null, waitsFor: [] }),
    judge(_bench, reading, value, frame) {
      if (reading.kind === 'over-range' && value === null) return overRange(value, frame) ?? outcome('within')
      if (value === null) return outcome('waiting')
      const found = fromAnswer(ask(value, reading.context.testVoltage_V))
      // Of a reading over the range the bound decides only where it reaches the limit.
      return reading.kind === 'over-range' && found.verdict === 'outside' && value < frame.limit!.value ? overRange(value, frame) ?? found : found
    },
  }
}

export const cableInsulation = insulation('cable')
export const chargerInsulation = insulation('charger-connected')
