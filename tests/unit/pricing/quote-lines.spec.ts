import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { judgeJob } from '#shared/job/judge/judge-job'
import { suggestQuoteLines } from '#shared/pricing/quote-lines'
import { quoteTotal } from '#shared/pricing/quote-total'
import type { PriceItem } from '#shared/schemas/quote'
import type { JobRecord } from '#shared/types/record'
import { jobRecord, partRow, withFields, WORK_DAY } from '../../support/build/job-record'

const price = (code: string, netPence: number, rest: Partial<PriceItem> = {}): PriceItem => ({ id: code, code, description: `From the list: ${code}`, unit: 'each', netPence, vatBp: 2000, active: true, ...rest })
const PRICES = [price('CABLE-6-SWA', 1450, { unit: 'm' }), price('LABOUR', 8400, { unit: 'hour' }), price('CHARGER-7S', 58_500), price('SPD', 9200, { active: false })]
const suggest = (record: JobRecord, prices = PRICES) => suggestQuoteLines(record, judgeJob(record, WORK_DAY), prices)
const lineOf = (record: JobRecord, code: string) => suggest(record).find(line => line.code === code)

describe('the lines a design asks for', () => {
  it('prices cable by the legs, rounded up to a whole metre, at the size chosen', () => {
    const record = jobRecord()
    record.parts.leg = [partRow('a', { name: 'Along the wall', method: 'C', L_m: 12.2 }), partRow('b', { name: 'Over the drive', method: 'C', L_m: 5.9 })]
    expect(lineOf(record, 'CABLE-6-SWA')).toMatchObject({ quantityThousandths: 19_000, unit: 'm', unitNetPence: 1450, description: 'From the list: CABLE-6-SWA' })
  })
  it('keeps a whole sum whole', () => {
    const record = jobRecord()
    record.parts.leg = [partRow('a', { method: 'C', L_m: 3.3 }), partRow('b', { method: 'C', L_m: 2.7 })]
    expect(lineOf(record, 'CABLE-6-SWA')?.quantityThousandths).toBe(6000)
  })
  it('asks for a trench only for what lies in the ground', () => {
    const record = jobRecord()
    expect(lineOf(record, 'TRENCH')).toBeUndefined()
    record.parts.leg = [partRow('a', { method: 'C', L_m: 4 }), partRow('b', { method: 'D', L_m: 7.5, ground_C: 15, depth_m: 0.6, rho_Km_per_W: 2.5 })]
    expect(lineOf(record, 'TRENCH')?.quantityThousandths).toBe(8000)
  })
  it('asks for no cable while a leg has no length', () => {
    const record = jobRecord()
    record.parts.leg = [partRow('a', { method: 'C', L_m: 4 }), partRow('b', { method: 'C' })]
    expect(suggest(record).some(line => line.code.startsWith('CABLE') || line.code === 'LABOUR')).toBe(false)
  })
  it('leaves a price empty that the list has not, or no longer has', () => {
    const record = jobRecord()
    expect(lineOf(record, 'RCBO-40')?.unitNetPence).toBeNull()
    expect(lineOf(record, 'SPD')?.unitNetPence).toBeNull()
  })
  it('names the device by where the residual-current protection is', () => {
    expect(lineOf(jobRecord(), 'RCBO-40')?.description).toContain('30 mA')
    expect(lineOf(withFields(jobRecord(), 'circuit', 'designed', { rcd_where: 'charger' }), 'MCB-40')).toBeDefined()
  })
  it('takes an electrode, a limiter, a board and bonds from what was found', () => {
    let record = withFields(jobRecord(), 'earthing', 'earthing', { method: 'TT' })
    record = withFields(record, 'loadLimit', 'limit', { state: 'planned', limit_A: 60 })
    record = withFields(record, 'survey', 'survey', { spare_ways: 0, bond_gas: 'missing', bond_water: 'missing' })
    expect(lineOf(record, 'ELECTRODE')).toBeDefined()
    expect(lineOf(record, 'LIMITER')?.why).toContain('60 A')
    expect(lineOf(record, 'BOARD')).toBeDefined()
    expect(lineOf(record, 'BOND')).toMatchObject({ quantityThousandths: 2000, description: 'Main bonding to water, gas' })
  })
  it('tells a notice from an application to the network operator', () => {
    expect(lineOf(jobRecord(), 'NOTICE')?.description).toBe('Notice to the network operator')
    expect(lineOf(withFields(jobRecord(), 'survey', 'survey', { looped: 'yes' }), 'NOTICE')?.description).toBe('Application to the network operator')
  })
  it('says why each line stands there', () => {
    expect(suggest(jobRecord()).every(line => line.why.length > 5 && line.quantityThousandths > 0)).toBe(true)
  })
})

const anyLine = fc.record({ description: fc.constant('x'), quantityThousandths: fc.integer({ min: 1, max: 100_000 }), unitNetPence: fc.integer({ min: -50_000, max: 500_000 }), vatBp: fc.constantFrom(0, 500, 2000) })

describe('what a quote comes to', () => {
  it('adds up: lines to net, rates to VAT, both to the price, always in whole pence', () => {
    fc.assert(fc.property(fc.array(anyLine, { minLength: 1, maxLength: 20 }), fc.integer({ min: 0, max: 10_000 }), (lines, depositBp) => {
      const total = quoteTotal(lines, true, depositBp)
      expect(total.lineNetPence.reduce((sum, net) => sum + net, 0)).toBe(total.netPence)
      expect(total.rates.reduce((sum, rate) => sum + rate.vat_pence, 0)).toBe(total.vatPence)
      expect(total.netPence + total.vatPence).toBe(total.grossPence)
      expect([...total.lineNetPence, total.vatPence, total.depositPence].every(Number.isInteger)).toBe(true)
      if (total.grossPence >= 0) expect(total.depositPence).toBeLessThanOrEqual(total.grossPence)
    }))
  })
  it('charges no VAT for a firm that is not registered', () => {
    fc.assert(fc.property(fc.array(anyLine, { minLength: 1, maxLength: 8 }), (lines) => {
      const total = quoteTotal(lines, false, 2500)
      expect(total.vatPence).toBe(0)
      expect(total.grossPence).toBe(total.netPence)
    }))
  })
  it('works the deposit to the nearest penny, a half upwards', () => {
    expect(quoteTotal([{ description: 'x', quantityThousandths: 1000, unitNetPence: 90_002, vatBp: 0 }], true, 2500).depositPence).toBe(22_501)
  })
  it('comes to nothing without lines', () => {
    expect(quoteTotal([], true, 2500)).toMatchObject({ netPence: 0, grossPence: 0, depositPence: 0 })
  })
})
