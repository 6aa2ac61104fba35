import { uuidv7 } from 'uuidv7'
import { mayChangeWork } from '#shared/job/stages'
import { testSpec, type InstrumentFunction, type TestKey, type TestSpec } from '#shared/job/tests.data'
import type { ReadingContext } from '#shared/types/record'
import type { Kept } from '~/utils/reading-pad'

/**
 * One page of tests: its rows, the instruments chosen for it and the ways to keep a reading. `lock` comes from the page
 * (Live before it may be energised); what the person may do is added here.
 */
export function useTestsSheet(page: TestSpec['page'], lockOfPage: () => string | null | undefined) {
  const job = useJobRecord(useJobId())
  const { me } = useMe()
  const { record, judgement } = job
  const picked = useState<ChosenInstruments>(`instruments:${page}`, () => ({}))
  /** What goes with the next reading of a test: by enquiry, temperature, cause. */
  const contexts = ref<Partial<Record<TestKey, ReadingContext>>>({})

  const rows = computed(() => judgement.value ? rowsOfPage(judgement.value, page) : [])
  const uses = computed(() => functionsOf(rows.value))
  const noon = computed(() => `${job.today.value}T12:00:00.000Z`)
  const chosen = computed<ChosenInstruments>(() => {
    if (!record.value) return {}
    const usual = Object.fromEntries(uses.value.map(use => [use, usualInstrument(record.value!, use, noon.value)]).filter(([, id]) => id !== undefined))
    return { ...usual, ...picked.value }
  })
  /** Why this person can only read here; then no row offers anything. */
  const readOnly = computed(() => {
    if (!record.value) return 'The job is being fetched.'
    if (!mayChangeWork(record.value.job.stage)) return 'This work has been signed. A supervisor can send it back.'
    if (!job.may('take-readings') && !job.may('transcribe-readings')) return 'You can read this; readings are taken by those on the job\'s visits.'
    return null
  })
  const lock = computed(() => readOnly.value ?? lockOfPage() ?? null)

  const instrumentOf = (use: InstrumentFunction | null) => use === null ? null : record.value?.instruments.find(each => each.id === chosen.value[use]) ?? null

  /** Why this test cannot be keyed just now, or null. */
  function whyNot(test: TestKey): string | null {
    if (lock.value) return lock.value
    const spec = testSpec(test)
    if (!spec.instrument || spec.answer === 'seen' || contexts.value[test]?.byEnquiry) return null
    if (!instrumentOf(spec.instrument)) return `Choose the instrument for this above.`
    return record.value && kitFor(record.value.instruments, spec.instrument, noon.value).find(each => each.instrument.id === chosen.value[spec.instrument!])?.why || null
  }

  function choose(use: InstrumentFunction, instrumentId: string) {
    const instrument = record.value?.instruments.find(each => each.id === instrumentId)
    if (instrument) picked.value = chooseInstrument(chosen.value, use, instrument, uses.value)
  }

  /** A chosen instrument that is out of calibration is not named for a check either. */
  const around = (test: TestKey, extra: ReadingContext = {}) => {
    const use = testSpec(test).instrument
    const instrument = instrumentOf(use)
    const isGood = instrument !== null && use !== null && kitFor([instrument], use, noon.value)[0]?.why === null
    return { id: uuidv7(), instrumentId: isGood ? instrument.id : null, context: { ...contexts.value[test], ...extra } }
  }
  const setContext = (test: TestKey, context: ReadingContext) => contexts.value = { ...contexts.value, [test]: { ...contexts.value[test], ...context } }
  const afterKeeping = (test: TestKey) => {
    // Known by enquiry stays chosen; temperature and cause belong to one reading.
    contexts.value = { ...contexts.value, [test]: contexts.value[test]?.byEnquiry ? { byEnquiry: true } : {} }
  }

  function keepFigure(test: TestKey, kept: Kept) {
    const reading = figureReading(test, kept, around(test))
    afterKeeping(test)
    void job.addReading(reading)
  }
  function keepSeen(test: TestKey, shown: 'correct' | 'wrong', extra: ReadingContext = {}) {
    const reading = seenReading(test, shown, around(test, extra))
    afterKeeping(test)
    void job.addReading(reading)
  }
  function judge(test: TestKey, value: number) {
    const spec = testSpec(test)
    const judged = judgeWith(record.value!, figureReading(test, { kind: 'value', shown: String(value), value, unit: spec.unit, reason: null }, around(test)), me.value?.id ?? '', new Date().toISOString())
    return { verdict: judged.verdict, detail: judged.detail }
  }
  const confirm = (readingId: string) => job.mutate('confirm-reading', { readingId })

  return { job, me, rows, uses, chosen, noon, lock, readOnly, contexts, setContext, whyNot, choose, keepFigure, keepSeen, judge, confirm, instrumentOf }
}
