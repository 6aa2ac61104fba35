import { describe, expect, it } from 'vitest'
import { grant, type GrantInput } from '#shared/pricing/grant'

const renter: GrantInput = { who: 'renter', applied: '2026-06-02', costIncVat_pence: 110_000, sockets: 1 }
const granted = (change: Partial<GrantInput>) => grant({ ...renter, ...change }).result.grant_pence

describe('grant', () => {
  it.each([
    ['2022-03-31', 0], ['2022-04-01', 35_000], ['2026-03-31', 35_000], ['2026-04-01', 50_000], ['2027-03-31', 50_000], ['2027-04-01', 0],
  ])('applied for on %s: %d p', (applied, expected) => {
    expect(granted({ applied })).toBe(expected)
  })

  it.each([
    ['below the cap, three quarters', 60_000, 45_000],
    ['just below', 66_666, 49_999],
    ['a part of a penny is not claimed', 66_665, 49_998],
    ['on the cap', 66_667, 50_000],
    ['nothing', 0, 0],
  ])('%s', (_, costIncVat_pence, expected) => {
    expect(granted({ costIncVat_pence })).toBe(expected)
  })

  it('counts the cap for each socket', () => {
    expect(granted({ who: 'landlord', sockets: 3, costIncVat_pence: 300_000 })).toBe(150_000)
    expect(granted({ who: 'landlord', sockets: 0 })).toBe(0)
  })

  it('asks before a second socket is promised to one applicant', () => {
    expect(grant({ ...renter, sockets: 2 }).notes.some(note => note.startsWith('GRT-07'))).toBe(true)
  })

  it('gives a house owner nothing, whatever else is known', () => {
    expect(grant({ who: 'house-owner' })).toMatchObject({ verdict: null, result: { grant_pence: 0 } })
  })

  it('waits for what it lacks', () => {
    expect(grant({ who: 'renter' }).missing).toEqual(['applied', 'costIncVat_pence', 'sockets'])
  })
})
