import { describe, expect, it } from 'vitest'
import { judgeJob } from '#shared/job/judge/judge-job'
import { pairs, type Pair } from '#shared/job/pairs'
import { certificateName } from '#shared/job/certificate-name'
import { looseEndLink } from '~/utils/loose-end-link'
import { pairBars, pickToOpen, whyNotOpened } from '~/utils/pairs-page'
import { shrunkSize } from '~/utils/shrink-picture'
import { jobRecord, WORK_DAY } from '../../support/build/job-record'

const record = jobRecord()
const { ordinary } = pairs(record, judgeJob(record, WORK_DAY))

describe('the picks', () => {
  it('are the same for the same job, whatever order the rows come in', () => {
    const picks = pickToOpen(ordinary, 'job-1').map(pair => pair.id)
    expect(picks).toHaveLength(2)
    expect(pickToOpen([...ordinary].reverse(), 'job-1').map(pair => pair.id)).toEqual(picks)
  })
  it('differ from job to job', () => {
    const seen = new Set(Array.from({ length: 20 }, (_, at) => pickToOpen(ordinary, `job-${at}`).map(pair => pair.id).join()))
    expect(seen.size).toBeGreaterThan(5)
  })
  it('hold countersigning until all are opened', () => {
    const picks = pickToOpen(ordinary, 'job-1')
    const odd = [{ ...ordinary[0]!, id: 'odd' }]
    expect(whyNotOpened(odd, picks, new Set())).toBe('Still to do: 1 odd row not accepted, 2 picks not opened.')
    expect(whyNotOpened(odd, picks, new Set(['odd', ...picks.map(pair => pair.id)]))).toBeNull()
  })
})

it('draws the bars of a row to one scale', () => {
  const bars = pairBars({ scale: { designed: 0.4, found: 0.8, limit: 1.6 } } as Pair)
  expect(bars.map(bar => [bar.key, bar.percent])).toEqual([['designed', 25], ['found', 50], ['limit', 100]])
  expect(pairBars({ scale: null } as Pair)).toEqual([])
})

it.each([
  [{ page: 'supply', field: 'survey.survey.cutout_A' }, '/jobs/j/supply#survey.survey.cutout_A'],
  [{ page: 'point', field: 'inspection.13.4.outcome' }, '/jobs/j/leave#inspection.13.4.outcome'],
  [{ page: 'supply', field: undefined }, '/jobs/j/supply'],
] as const)('leads from a loose end to its field: %o', (end, link) => {
  expect(looseEndLink('j', end)).toBe(link)
})

it.each([[4000, 3000, 2000, 1500], [800, 600, 800, 600], [3000, 6000, 1000, 2000]])('shrinks %i × %i to %i × %i', (w, h, width, height) => {
  expect(shrunkSize(w, h)).toEqual({ width, height })
})

it.each([[0, 'Q-1 A'], [25, 'Q-1 Z'], [26, 'Q-1 AA']])('calls revision %i by letters', (revision, name) => {
  expect(certificateName({ number: 'Q-1', revision })).toBe(name)
})
