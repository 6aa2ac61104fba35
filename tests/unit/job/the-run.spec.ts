import { describe, expect, it } from 'vitest'
import { looseEnds } from '#shared/job/completeness'
import { judgeJob } from '#shared/job/judge/judge-job'
import { pairs } from '#shared/job/pairs'
import { officeMatters, runParts } from '#shared/job/the-run'
import { INSPECTIONS } from '#shared/job/inspections.data'
import { SHOTS } from '#shared/job/shots.data'
import type { JobRecord } from '#shared/types/record'
import { jobRecord, signatures, withFields, withoutReading, withReading, WORK_DAY } from '../../support/build/job-record'

function run(record: JobRecord) {
  const judgement = judgeJob(record, WORK_DAY)
  const parts = runParts(record, judgement, looseEnds(record, judgement, WORK_DAY))
  return Object.fromEntries(parts.map(part => [part.key, part]))
}
const pairsOf = (record: JobRecord) => pairs(record, judgeJob(record, WORK_DAY))

describe('The Run', () => {
  it('shows each part\'s own facts', () => {
    const parts = run(jobRecord())
    expect(parts.supply!.facts).toEqual(['Main fuse 100\u2009A', 'TN-C-S', 'Ze 0.21\u2009Ω', 'Fits'])
    expect(parts.cable!.facts).toEqual(['18.0\u2009m', 'clipped', '6\u2009mm²', 'Armoured, 90 °C', 'volt drop 2.0\u2009%'])
    expect(parts.dead!.facts).toEqual(['5 of 5'])
  })

  it('is ready where nothing is left, and leaves the signatures to Leave', () => {
    const parts = run(jobRecord())
    expect(Object.values(parts).filter(part => part.state === 'ready').map(part => part.key)).toEqual(['supply', 'board', 'cable', 'point', 'dead', 'live'])
    expect(parts.leave).toMatchObject({ state: 'started', left: 3 })
    expect(run({ ...jobRecord(), signatures: signatures(false) }).leave).toMatchObject({ state: 'ready', left: 0 })
  })

  it('locks Live while dead tests are open, and says why', () => {
    expect(run(jobRecord()).live!.lock).toBeUndefined()
    const locked = run(withoutReading(jobRecord(), 'polarity'))
    expect(locked.live!.lock).toBe('dead tests come first')
    expect(locked.dead).toMatchObject({ left: 1, total: 5, state: 'started' })
    expect(run(withFields(jobRecord(), 'putBack', 'bonding', { done: null })).live!.lock).toContain('main bonding back on'.slice(5))
  })

  it('says so where the fuse is assumed', () => {
    expect(run(withFields(jobRecord(), 'survey', 'survey', { cutout_A_how: 'assumed' })).supply!.facts[0]).toBe('Main fuse 100\u2009A, assumed')
  })

  it('links the office matters', () => {
    expect(officeMatters(jobRecord()).map(each => each.href)).toEqual(['enquiry', 'quote', 'visits', 'notices', 'promises'].map(page => `/jobs/j-1/${page}`))
  })
})

describe('Pairs', () => {
  it('folds the ordinary', () => {
    const { odd, ordinary } = pairsOf(jobRecord())
    expect(odd).toEqual([])
    expect(ordinary.length).toBeGreaterThan(20)
    expect(ordinary.find(pair => pair.id === 'reading:Zs')).toMatchObject({ designed: '0.32\u2009Ω', found: '0.33\u2009Ω', limit: '≤ 0.87\u2009Ω', scale: { found: 0.33 } })
  })

  it('opens what does not fit, with the sentence and the earlier reading', () => {
    const record = withFields(withReading(withoutReading(jobRecord(), 'R1Rn'), 'R1R2', '0.16'), 'unexpected', 'R1R2', { sentence: 'Round the extension.' })
    expect(pairsOf(record).odd).toMatchObject([{ id: 'reading:R1R2', verdict: 'unexpected', why: 'Round the extension.', earlier: ['0.11\u2009Ω, within limit: 0.55\u2009Ω inside'] }])
  })

  it('opens a length found other than designed, and what became of the volt drop', () => {
    expect(pairsOf(withFields(jobRecord(), 'circuit', 'installed', { L_m: 19 })).odd).toMatchObject([{ id: 'length', designed: '18\u2009m', found: '19\u2009m', words: 'volt drop re-worked: 2.1\u2009%' }])
  })

  it('opens what was changed after signing', () => {
    const record = { ...jobRecord(), signatures: signatures(false) }
    const charger = record.parts.equipment[0]!
    const changed = { ...charger, stamps: { ...charger.stamps, serial: { v: 2, by: 'p-tester', at: `${WORK_DAY}T17:00:00Z` } } }
    expect(pairsOf(record).odd).toEqual([])
    expect(pairsOf({ ...record, parts: { ...record.parts, equipment: [changed] } }).odd).toMatchObject([{ id: 'changed:equipment.charger.serial', words: 'changed after signing' }])
  })
})

describe('the lists', () => {
  it('hold each shot and each inspection once', () => {
    expect(new Set(SHOTS.map(shot => shot.claim)).size).toBe(SHOTS.length)
    expect(INSPECTIONS.filter(item => !item.isSub)).toHaveLength(14)
    expect(INSPECTIONS.filter(item => item.isSub).every(item => item.key.startsWith('13.'))).toBe(true)
  })
})
