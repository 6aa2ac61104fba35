import { describe, expect, it } from 'vitest'
import { circuit } from '#shared/electrical/circuit'
import { supply } from '#shared/electrical/supply'
import { judgeJob } from '#shared/job/judge/judge-job'
import { jobRecord, partRow, threePhaseJob, ttJob, withFields, withoutReading, withReading, WORK_DAY } from '../../support/build/job-record'
import type { JobRecord } from '#shared/types/record'

const judge = (record: JobRecord) => judgeJob(record, WORK_DAY)
const house = (record: JobRecord, amps: number): JobRecord => ({ ...record, parts: { ...record.parts, appliance: [partRow('house', { use: 'fixed', I_A: amps })] } })
const fuse = (record: JobRecord, amps: number, how = 'told') => withFields(record, 'survey', 'survey', { cutout_A: amps, cutout_A_how: how })

describe('judgeJob', () => {
  it('judges the same figures as the engine', () => {
    const judgement = judge(jobRecord())
    const direct = circuit({ Ib_A: 32, device: 'B', In_A: 40, phases: 1, cable: 'swa-90', terminals_C: 70, legs: [{ method: 'C', L_m: 18, ambient_C: 30 }], Ze_ohm: 0.21, Ipf_kA: 1.1, device_kA: 6, energyClass: 3, S_mm2: 6, cpc_mm2: 6, system: 'TN' })
    expect(judgement.installed.answer).toEqual(direct)
    expect(judgement.supply.answer).toEqual(supply({ fuse_A: 100, fuseKnown: 'told', house_A: 20, ev_A: 32 }))
    // 7.9 mV/A/m × 32 A × 18 m
    expect(judgement.installedSize?.volt_drop_V).toBeCloseTo(4.5504, 4)
  })

  it.each([['single-phase TN-C-S', jobRecord()], ['TT', ttJob()], ['three-phase', threePhaseJob()]])('finds every safety figure of a sound %s job within its limit', (_, record) => {
    const figures = judge(record).safety.filter(each => each.id !== 'IR-charger')
    expect(figures.filter(each => each.verdict !== 'within' && each.verdict !== 'not-applicable')).toEqual([])
    expect(figures.map(each => each.id)).toEqual(expect.arrayContaining(['supply', 'cable', 'earthing-method', 'breaking-capacity', 'R1R2', 'IR-live-earth', 'polarity', 'Zs', 'RCD-time', 'RCD-dc', 'RA']))
  })

  it('gives the same answer twice and changes nothing in the record', () => {
    const record = jobRecord()
    const before = structuredClone(record)
    expect(judge(record)).toEqual(judge(record))
    expect(record).toEqual(before)
  })

  it('says that figures rest on memory, and which', () => {
    const { confidence } = judge(jobRecord())
    expect(confidence.isFromMemory).toBe(true)
    expect(confidence.fromMemory.length).toBeGreaterThan(0)
  })
})

describe('the supply', () => {
  const limited = (record: JobRecord, set_A: number) => withFields(record, 'loadLimit', 'limit', { state: 'fitted', limit_A: set_A, set_A, set_where: 'dial', ct_checked: 'yes', fails_safe: 'yes' })

  it('leaves 10 A for a 32 A charger on a 60 A fuse with 50 A of house, and 32 A once the house falls', () => {
    const at50 = judge(limited(house(fuse(jobRecord(), 60), 50), 60))
    expect(at50.supply.answer.result.evAllowed_A).toBe(10)
    expect(at50.capacity).toMatchObject({ code: 'fits-if-managed', words: 'Fits if load-managed' })
    expect(at50.capacity.sentence).toContain('the charger gets 10.0\u2009A')
    expect(judge(limited(house(fuse(jobRecord(), 60), 28), 60)).supply.answer.result.evAllowed_A).toBe(32)
  })

  it('waits for the limiter\'s test, and is within by the tested limiter', () => {
    const untested = limited(house(fuse(jobRecord(), 60), 50), 60)
    expect(judge(untested).supply.answer).toMatchObject({ verdict: 'waiting', missing: ['limiterTested'] })
    expect(judge(untested).supply.waitsFor).toMatchObject([{ page: 'live', field: 'reading.limiter' }])
    const tested = judge(withReading(untested, 'limiter', 'correct'))
    expect(tested.supply.answer.verdict).toBe('within')
    expect(tested.supply.answer.result.demandAfter_A).toBe(60)
    expect(tested.capacity.code).toBe('fits-if-managed')
  })

  it('does not take a person\'s word for a limiter that nobody saw limit', () => {
    const said = withFields(limited(house(fuse(jobRecord(), 60), 50), 60), 'loadLimit', 'limit', { state: 'tested' })
    expect(judge(said).supply.answer.verdict).toBe('waiting')
  })

  it.each([
    [60, 28, 'fits'], [60, 28.01, 'does-not-fit'], [80, 48, 'fits'], [80, 48.01, 'does-not-fit'], [100, 68, 'fits'], [100, 68.01, 'does-not-fit'],
  ])('on a %s A fuse with %s A of house says %s', (fuse_A, house_A, code) => {
    expect(judge(house(fuse(jobRecord(), fuse_A), house_A)).capacity.code).toBe(code)
  })

  it('cannot tell on an assumed fuse', () => {
    const { supply: { answer }, capacity } = judge(fuse(jobRecord(), 100, 'assumed'))
    expect(answer.verdict).toBe('waiting')
    expect(capacity.words).toBe('Cannot tell yet')
  })

  it('asks the network operator first above 60 A, whatever the fuse', () => {
    expect(judge(house(jobRecord(), 28)).route.answer.result.route).toBe('tell-after')
    expect(judge(house(jobRecord(), 28.01)).route.answer.result.route).toBe('ask-first')
  })

  it('shows both demands and counts the greater', () => {
    const recorded = withFields(jobRecord(), 'recordedDemand', 'recorded', { max_A: 41 })
    expect(judge(recorded).houseDemand).toMatchObject({ allowances_A: 20, recorded_A: 41, used_A: 41, way: 'recorded' })
    const less = withFields(jobRecord(), 'recordedDemand', 'recorded', { max_A: 12 })
    expect(judge(less).houseDemand).toMatchObject({ used_A: 20, way: 'allowances' })
  })

  it('takes an allowance once for all socket circuits', () => {
    const record = { ...jobRecord(), parts: { ...jobRecord().parts, appliance: [partRow('a', { use: 'sockets', I_A: 32 }), partRow('b', { use: 'sockets', I_A: 32 })] } }
    expect(judge(record).houseDemand.used_A).toBeCloseTo(44.8)
  })

  it('gives no sum while one appliance has no figure, and leads to it', () => {
    const record = { ...jobRecord(), parts: { ...jobRecord().parts, appliance: [partRow('a', { use: 'fixed', I_A: 10 }), partRow('b', { use: 'cooker' })] } }
    expect(judge(record).demand.waitsFor).toMatchObject([{ field: 'appliance.b.I_A' }])
    expect(judge(record).capacity.code).toBe('cannot-tell')
  })
})

describe('the circuit', () => {
  it('falls back on the design field by field', () => {
    const { installed } = judge(withFields(jobRecord(), 'circuit', 'installed', { S_mm2: 10, device: null }))
    expect(installed.input).toMatchObject({ S_mm2: 10, device: 'B', In_A: 40 })
  })

  it('works the volt drop again at the length found', () => {
    const longer = judge(withFields(jobRecord(), 'circuit', 'installed', { L_m: 36 }))
    expect(longer.designedSize?.volt_drop_V).toBeCloseTo(4.5504, 4)
    expect(longer.installedSize?.volt_drop_V).toBeCloseTo(9.1008, 4)
  })

  it('reads the length from the marks on the sheath, whichever way the cable ran', () => {
    const marked = withFields(jobRecord(), 'circuit', 'installed', { L_m: null, start_mark_m: 138, end_mark_m: 120 })
    expect(judge(marked).fitted_m).toBe(18)
  })

  it('compares every size on the designed figures', () => {
    const { designed, chosen } = judge(jobRecord())
    expect(designed.answer.result.sizes!.length).toBeGreaterThan(3)
    expect(chosen.answer.result.sizes).toHaveLength(1)
  })

  it('is outside where no limit of volt drop is kept', () => {
    const { safety } = judge(withFields(jobRecord(), 'circuit', 'installed', { L_m: 60 }))
    expect(safety.find(each => each.id === 'cable')).toMatchObject({ verdict: 'outside', sentence: expect.stringContaining('volt drop') as string })
  })

  it('names a missing leg, cable or rating by its field', () => {
    const record = withFields(jobRecord(), 'leg', 'l-1', { L_m: null })
    expect(judge(record).installed.waitsFor).toMatchObject([{ page: 'cable', field: 'leg.l-1.L_m', words: 'the length of leg 1' }])
  })

  it('waits, with the reason, on a cable that cannot be what it is said to be', () => {
    const record = withFields(threePhaseJob(), 'circuit', 'installed', { cable: 'twin-earth-70' })
    expect(judge(record).installed.answer).toMatchObject({ verdict: 'waiting', reasons: [expect.stringContaining('three phases') as string] })
  })

  it('takes the declared Ze until somebody measures, and says so', () => {
    expect(judge(withoutReading(jobRecord(), 'Ze')).Ze).toEqual({ value: 0.35, how: 'declared' })
    expect(judge(jobRecord()).Ze).toEqual({ value: 0.21, how: 'measured' })
  })

  it('waits for the arrangement where it is only assumed', () => {
    const { earthing } = judge(withFields(jobRecord(), 'survey', 'survey', { earthing_how: 'assumed' }))
    expect(earthing.answer.verdict).toBe('waiting')
    expect(earthing.waitsFor).toMatchObject([{ field: 'survey.survey.earthing' }])
  })

  it('refuses a PME earth out of doors without a listed method', () => {
    expect(judge(withFields(jobRecord(), 'earthing', 'earthing', { method: 'none' })).safety.find(each => each.id === 'earthing-method')?.verdict).toBe('outside')
  })

  it('refuses a type AC device upstream', () => {
    expect(judge(withFields(jobRecord(), 'survey', 'survey', { upstream_rcd: 'type-AC' })).safety.find(each => each.id === 'upstream-rcd')?.verdict).toBe('outside')
  })

  it('holds the breaking capacity back until the fault current is known', () => {
    expect(judge(withoutReading(jobRecord(), 'Ipf')).safety.find(each => each.id === 'breaking-capacity')).toMatchObject({ verdict: 'waiting', field: 'reading.Ipf' })
  })
})
