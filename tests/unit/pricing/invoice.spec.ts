import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { invoice, type InvoiceLine } from '#shared/pricing/invoice'

const line = (change: Partial<InvoiceLine> = {}): InvoiceLine => ({ description: 'cable', quantity: 1, unitNet_pence: 1000, vat_bp: 2000, ...change })
const totals = (lines: InvoiceLine[], rest = {}) => invoice({ lines, vatRegistered: true, ...rest }).result

describe('invoice', () => {
  it('rounds VAT once for each rate, not for each line', () => {
    // 3 × 33 p at 20 %: 19.8 p together, but 3 × 7 p line by line.
    const result = totals([line({ unitNet_pence: 33 }), line({ unitNet_pence: 33 }), line({ unitNet_pence: 33 })])
    expect(result).toMatchObject({ net_pence: 99, vat_pence: 20, gross_pence: 119 })
  })

  it.each([
    ['a half goes up', 50, 500, 3],
    ['under a half goes down', 49, 500, 2],
    ['a discount goes the same way, away from zero', -50, 500, -3],
  ])('%s', (_, unitNet_pence, vat_bp, expected) => {
    expect(totals([line({ unitNet_pence, vat_bp })]).vat_pence).toBe(expected)
  })

  it('works a line to the nearest penny, exactly', () => {
    expect(totals([line({ quantity: 1.005, unitNet_pence: 100 })]).line_net_pence).toEqual([101])
    expect(totals([line({ quantity: 12.5, unitNet_pence: 185 })]).line_net_pence).toEqual([2313])
  })

  it('gives a table by rate, the highest first', () => {
    expect(totals([line({ vat_bp: 500 }), line(), line({ vat_bp: 0 }), line()]).rates).toEqual([
      { vat_bp: 2000, net_pence: 2000, vat_pence: 400, gross_pence: 2400 },
      { vat_bp: 500, net_pence: 1000, vat_pence: 50, gross_pence: 1050 },
      { vat_bp: 0, net_pence: 1000, vat_pence: 0, gross_pence: 1000 },
    ])
  })

  it('takes grant and deposit off the price with VAT', () => {
    expect(totals([line({ unitNet_pence: 90_000 })], { deposit_pence: 20_000, grant_pence: 35_000 })).toMatchObject({ vat_pence: 18_000, due_pence: 53_000 })
  })

  it('says where more was paid than is owed', () => {
    const answer = invoice({ lines: [line()], vatRegistered: true, deposit_pence: 1300 })
    expect(answer.result.due_pence).toBe(-100)
    expect(answer.notes[0]).toContain('£1.00 more')
  })

  it.each([[20_833, 25_000, true], [20_834, 25_001, false]])('a net of %d p comes to %d p: simplified %s', (unitNet_pence, gross_pence, simplifiedAllowed) => {
    expect(totals([line({ unitNet_pence })])).toMatchObject({ gross_pence, simplifiedAllowed })
  })

  it('charges no VAT where the firm is not registered', () => {
    expect(totals([line()], { vatRegistered: false })).toMatchObject({ net_pence: 1000, vat_pence: 0, gross_pence: 1000, simplifiedAllowed: false })
  })

  it('waits for what it lacks', () => {
    expect(invoice({ lines: [] }).missing).toEqual(['lines', 'vatRegistered'])
  })

  it('always adds up, whatever the lines', () => {
    const anyLine = fc.record({
      description: fc.constant('x'),
      quantity: fc.integer({ min: 0, max: 10_000_000 }).map(parts => parts / 10_000),
      unitNet_pence: fc.integer({ min: -1_000_000, max: 1_000_000 }),
      vat_bp: fc.constantFrom(0, 500, 2000),
    })
    fc.assert(fc.property(fc.array(anyLine, { minLength: 1, maxLength: 12 }), (lines) => {
      const result = totals(lines) as Required<ReturnType<typeof totals>>
      expect(result.gross_pence).toBe(result.net_pence! + result.vat_pence!)
      expect(result.line_net_pence!.reduce((sum, net) => sum + net, 0)).toBe(result.net_pence)
      expect(result.rates!.reduce((sum, row) => sum + row.gross_pence, 0)).toBe(result.gross_pence)
    }))
  })
})
