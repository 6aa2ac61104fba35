import { describe, expect, it } from 'vitest'
import { because, findRule, isInForce, rule, ruleIdOf } from '#shared/job/rules/rule'
import { RULES } from '#shared/job/rules/rules.data'

describe('the rules of the trade', () => {
  it('are 160, each with its own id', () => {
    expect(RULES).toHaveLength(160)
    expect(new Set(RULES.map(each => each.id)).size).toBe(160)
  })

  it('name a source, unless they are known from practice or memory alone', () => {
    const bare = RULES.filter(each => each.source === null)
    expect(bare.length).toBeGreaterThan(0)
    expect(bare.every(each => each.confidence === 'common practice' || each.confidence === 'from memory')).toBe(true)
  })

  it('run from a day to a later one', () => {
    const dated = RULES.filter(each => each.since !== null && each.until !== null)
    expect(dated.length).toBeGreaterThan(0)
    expect(dated.every(each => each.since! < each.until!)).toBe(true)
  })

  it('are found by id', () => {
    expect(rule('DNO-03').topic).toBe('60 A threshold')
    expect(findRule('DNO-99')).toBeNull()
    expect(() => rule('DNO-99')).toThrow('DNO-99')
  })

  it('stand first in a reason, and are read back from it', () => {
    const reason = because('DNO-06', 'The supply is looped.')
    expect(reason).toBe('DNO-06: The supply is looped.')
    expect(ruleIdOf(reason)).toBe('DNO-06')
    expect(ruleIdOf('ABC-99: no such rule')).toBeNull()
    expect(ruleIdOf('No rule at all')).toBeNull()
  })

  it.each([
    ['SUR-18', '2025-05-28', true],
    ['SUR-18', '2025-05-29', false],
    ['SUR-17', '2025-05-28', false],
    ['SUR-17', '2025-05-29', true],
    ['EAR-07', '2023-12-31', false],
    ['EAR-07', '2024-01-01', true],
    ['DNO-02', '1999-01-01', true],
  ] as const)('%s on %s in force: %s', (id, day, expected) => {
    expect(isInForce(rule(id), day)).toBe(expected)
  })
})
