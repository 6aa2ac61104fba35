/** Judges every test of a job: the latest reading that counts, each earlier one, its limit and what was expected of it. */
import type { JobRecord, ReadingRow } from '../../types/record'
import type { Verdict } from '../../utils/verdict'
import { TEST_KEYS, testSpec, type TestKey } from '../tests.data'
import { contentOf, textOf } from './facts'
import { listWords } from './judged'
import { mayBeLimited, mayBeNotApplicable, whyNotApplicable } from './readings/applies'
import { outcome, type Frame, type ReadingBench, type ReadingOutcome } from './readings/outcome'
import { TEST_JUDGES } from './readings/test-judges'
import { lineWords, marginWords, oddWords, shownReading, spokenWords } from './readings/words'
import type { JudgedReading } from './types'
import { valueIn } from './units'

export function judgeReadings(record: JobRecord, bench: ReadingBench): Record<TestKey, JudgedReading> {
  return Object.fromEntries(TEST_KEYS.map(test => [test, judgeTest(record, bench, test)])) as Record<TestKey, JudgedReading>
}

function judgeTest(record: JobRecord, bench: ReadingBench, test: TestKey): JudgedReading {
  const spec = testSpec(test)
  const readings = bench.counted[test]
  const notApplicable = whyNotApplicable(test, bench.inputs.facts)
  const frame = TEST_JUDGES[test].frame(bench)
  const judged = notApplicable === null ? judgeOne(bench, test, readings.counted, frame) : { verdict: 'not-applicable' as const, detail: notApplicable, found: outcome('within') }
  const { verdict, detail, found } = judged
  const sentence = textOf(contentOf(record, 'unexpected', test), 'sentence') ?? null
  return {
    test, page: spec.page, label: spec.label, title: spec.title, unit: spec.unit,
    applies: notApplicable === null,
    isRequired: spec.isOptional !== true,
    isSafety: spec.isSafety,
    verdict, detail,
    words: lineWords(verdict, detail),
    speech: spokenWords(verdict, detail),
    shown: notApplicable === null ? shownReading(readings.counted) : 'N/A',
    counted: readings.counted,
    notCounted: readings.notCounted,
    earlier: readings.others.map(({ reading, notCounted }) => {
      const one = judgeOne(bench, test, reading, frame)
      return notCounted === null
        ? { reading, verdict: one.verdict, detail: one.detail, isCounted: true }
        : { reading, verdict: 'not-entered' as const, detail: notCounted, isCounted: false }
    }),
    limit: frame.limit,
    expected: frame.expected,
    reason: notApplicable ?? (verdict === 'limited' || verdict === 'not-applicable' ? detail : null),
    odd: found.odd,
    sentence,
    corrected: found.corrected,
    waitsFor: found.waitsFor,
    reasons: found.reasons,
    notes: found.notes,
    confidence: [...new Set(found.working.map(step => step.confidence))],
    stops: notApplicable === null && stopsSigning(test, verdict, readings.notCounted !== null, sentence),
  }
}

function judgeOne(bench: ReadingBench, test: TestKey, reading: ReadingRow | null, frame: Frame): { verdict: Verdict, detail: string, found: ReadingOutcome } {
  if (!reading) return { verdict: 'not-entered', detail: '', found: outcome('waiting') }
  if (reading.kind === 'limited') return { verdict: 'limited', detail: reading.reason, found: outcome('waiting') }
  if (reading.kind === 'not-applicable') return { verdict: 'not-applicable', detail: reading.reason, found: outcome('waiting') }
  const { unit, decimals } = testSpec(test)
  const value = valueIn(reading, unit)
  const isReadable = reading.kind === 'seen' || reading.kind === 'over-range' || value !== null
  const found = isReadable ? TEST_JUDGES[test].judge(bench, reading, value, frame) : outcome('waiting', { waitsForWords: `the figure in ${unit}` })
  const verdict: Verdict = found.verdict === 'within' && found.odd.length > 0 ? 'unexpected' : found.verdict
  return { verdict, detail: detailOf(verdict, found, value, frame, unit, placesOf(reading, decimals)), found }
}

function detailOf(verdict: Verdict, found: ReadingOutcome, value: number | null, frame: Frame, unit: string, decimals: number): string {
  if (verdict === 'waiting') return found.waitsForWords ?? (found.waitsFor.length ? `needs ${listWords(found.waitsFor)}` : '')
  if (verdict === 'unexpected') return oddWords(value, frame.expected)
  if (found.corrected) return `${found.corrected.text} hot, against ${found.corrected.limitText}`
  if (value === null || !frame.limit) return verdict === 'outside' ? found.reasons[0] ?? '' : ''
  const isPastLimit = frame.limit.is === 'most' ? value > frame.limit.value : value < frame.limit.value
  // Refused for another reason than the figure: the device's type, the test voltage.
  if (verdict === 'outside' && !isPastLimit) return found.reasons[0] ?? ''
  return marginWords(value, frame.limit, unit, decimals)
}

const placesOf = (reading: ReadingRow, decimals: number) =>
  reading.resolution ? Math.max(0, Math.min(6, Math.round(-Math.log10(reading.resolution)))) : decimals

/** Outside, waiting and a gap on a required test stop; LIM and N/A only where they may not stand; an Unexpected until it is explained. */
function stopsSigning(test: TestKey, verdict: Verdict, isLatestUncounted: boolean, sentence: string | null): boolean {
  if (isLatestUncounted) return true
  switch (verdict) {
    case 'within': return false
    case 'outside':
    case 'waiting': return true
    case 'unexpected': return sentence === null
    case 'limited': return !mayBeLimited(test)
    case 'not-applicable': return !mayBeNotApplicable(test)
    case 'not-entered': return testSpec(test).isOptional !== true
    default: return verdict satisfies never
  }
}
