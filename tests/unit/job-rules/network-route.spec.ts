import { describe, expect, it } from 'vitest'
import { networkRoute, type NetworkRouteInput } from '#shared/job/rules/network-route'

const plain: NetworkRouteInput = {
  md_after_A: 55, cutout_A: 80, cutout_known: 'read', looped: false, service_ok: true, unmetered: false,
  device_standard: true, export_A: 0, total_generation_kW: 0, limiter: 'none', country: 'England',
}
const routeOf = (change: Partial<NetworkRouteInput>) => networkRoute({ ...plain, ...change })

describe('network-route', () => {
  it.each([
    [59.9, 'tell-after'], [60, 'tell-after'], [60.1, 'ask-first'],
  ])('%d A after the work -> %s', (md_after_A, route) => {
    expect(routeOf({ md_after_A }).result.route).toBe(route)
  })

  it.each([
    [44.9, 'tell-after'], [45, 'tell-after'], [45.1, 'ask-first'],
  ])('%d A behind a fuse of 45 A -> %s', (md_after_A, route) => {
    expect(routeOf({ md_after_A, cutout_A: 45 }).result.route).toBe(route)
  })

  it.each([
    ['unsafe service equipment', { service_ok: false, looped: true }, 'contact', 'DNO-07'],
    ['an unmetered supply', { unmetered: true, looped: true }, 'contact', 'DNO-08'],
    ['an export behind a loop', { export_A: 16, total_generation_kW: 3.68, looped: true }, 'generation-application', 'DNO-13'],
    ['a loop behind an assumed fuse', { looped: true, cutout_known: 'assumed' }, 'ask-first', 'DNO-06'],
    ['an assumed fuse with too much demand', { cutout_known: 'assumed', md_after_A: 90 }, 'contact', 'DNO-05'],
    ['a demand over the fuse', { md_after_A: 82 }, 'ask-first', 'DNO-04'],
    ['an unusual device', { device_standard: false }, 'ask-first', 'DNO-09'],
    ['one of many', { clustered: true }, 'contact', 'DNO-10'],
  ] as const)('%s decides', (_, change, route, id) => {
    const { result, reasons } = routeOf(change)
    expect(result.route).toBe(route)
    expect(result.installAllowed).toBe(false)
    expect(reasons[0]).toContain(`${id}:`)
    expect(result.reasons).toEqual(reasons)
  })

  it('never writes a demand over the limit as the limit', () => {
    expect(routeOf({ md_after_A: 60.04 }).reasons[0]).toContain('60.04\u2009A')
    expect(routeOf({ md_after_A: 40.01, cutout_A: 40 }).reasons[0]).toContain('40.01\u2009A')
    expect(routeOf({ export_A: 16.01, total_generation_kW: 3.6823 }).reasons[0]).toContain('16.01\u2009A')
  })

  it('names every further reason, so that no cure meets the next', () => {
    const { reasons } = routeOf({ looped: true, md_after_A: 90 })
    expect(reasons.map(reason => reason.slice(0, 6))).toEqual(['DNO-06', 'SUR-09', 'DNO-04', 'DNO-03'])
  })

  it.each([
    ['16 A', { export_A: 16, total_generation_kW: 3.68 }, 'generation-notice'],
    ['just over 16 A', { export_A: 16.1, total_generation_kW: 3.7 }, 'generation-short'],
    ['a small export beside much other generation', { export_A: 10, total_generation_kW: 6 }, 'generation-short'],
    ['17 kW in all', { export_A: 32, total_generation_kW: 17 }, 'generation-short'],
    ['over 17 kW in all', { export_A: 32, total_generation_kW: 17.1 }, 'generation-full'],
    ['50 kW on three phases', { export_A: 32, total_generation_kW: 50, phases: 3 }, 'generation-short'],
    ['over 50 kW on three phases', { export_A: 32, total_generation_kW: 50.1, phases: 3 }, 'generation-full'],
  ] as const)('an export of %s takes its form', (_, change, form) => {
    expect(routeOf(change).result.forms).toEqual(['demand', form])
  })

  it('adds the limitation form only to an export that is limited', () => {
    expect(routeOf({ export_A: 32, total_generation_kW: 7.36, limiter: 'planned' }).result.forms).toEqual(['demand', 'generation-short', 'limitation'])
    expect(routeOf({ limiter: 'planned' }).result.forms).toEqual(['demand'])
  })

  it.each([
    ['planned', 3], ['fitted', 3], ['tested', 0], ['none', 0],
  ] as const)('a %s limiter puts %d conditions', (limiter, count) => {
    const { result, reasons } = routeOf({ limiter })
    expect(result.conditions).toHaveLength(count)
    expect(reasons.some(reason => reason.startsWith('DNO-11'))).toBe(limiter !== 'none')
    expect(result.installAllowed).toBe(true)
  })

  it('waits for the first fact that could decide, and for the others with it', () => {
    expect(networkRoute({})).toMatchObject({ verdict: 'waiting', result: {} })
    expect(networkRoute({}).missing).toEqual(['service_ok', 'unmetered', 'export_A', 'looped', 'cutout_known', 'md_after_A', 'device_standard', 'limiter'])
    expect(routeOf({ md_after_A: null }).missing).toEqual(['md_after_A'])
    expect(routeOf({ cutout_A: undefined }).missing).toEqual(['cutout_A'])
    expect(routeOf({ limiter: undefined }).missing).toEqual(['limiter'])
  })

  it('does not wait where an earlier fact has decided', () => {
    expect(networkRoute({ service_ok: false }).result.route).toBe('contact')
  })
})
