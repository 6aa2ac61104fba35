import { describe, expect, it } from 'vitest'
import { cancellation } from '#shared/pricing/cancellation'

describe('cancellation', () => {
  it.each([
    ['goods', '2026-12-03', '2026-12-10', '2026-12-24'],
    ['goods-and-service', '2026-12-03', '2026-12-18', '2027-01-01'],
    ['goods received before the contract', '2026-12-03', '2026-12-01', '2026-12-17'],
  ])('%s', (kind, agreed, goodsReceived, expected) => {
    expect(cancellation({ kind: kind === 'goods-and-service' ? kind : 'goods', agreed, goodsReceived }).result.cancel_until).toBe(expected)
  })

  it('counts a service from the contract, whenever goods came', () => {
    expect(cancellation({ kind: 'service', agreed: '2026-12-03', goodsReceived: '2026-12-20' }).result.cancel_until).toBe('2026-12-17')
  })

  it('waits for the goods, and says that the right stays open', () => {
    const answer = cancellation({ kind: 'goods-and-service', agreed: '2026-12-03' })
    expect(answer).toMatchObject({ verdict: 'waiting', missing: ['goodsReceived'] })
    expect(answer.notes[0]).toContain('COM-01')
    expect(cancellation({}).missing).toEqual(['agreed', 'kind'])
  })
})
