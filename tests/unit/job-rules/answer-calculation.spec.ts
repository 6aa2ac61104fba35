import { describe, expect, it } from 'vitest'
import { answerCalculation, findCalculation, listCalculations } from '#shared/calculations/answer-calculation'

const SOCKET = { lowest_m: 1, kind: 'socket' }

describe('answerCalculation', () => {
  it.each([
    ['a wrong type', { ...SOCKET, lowest_m: 'high' }, 'lowest_m'],
    ['a negative height', { ...SOCKET, lowest_m: -1 }, 'lowest_m'],
    ['NaN', { ...SOCKET, lowest_m: Number.NaN }, 'lowest_m'],
    ['Infinity', { ...SOCKET, lowest_m: Number.POSITIVE_INFINITY }, 'lowest_m'],
    ['an unknown word', { ...SOCKET, kind: 'lamp' }, 'kind'],
    ['a misspelt key', { ...SOCKET, lowest: 1 }, ''],
    ['a bare number', 5, ''],
    ['nothing', null, ''],
  ])('refuses %s', (_, body, path) => {
    expect(answerCalculation('mounting', body)).toMatchObject({ isAnswered: false, reply: { error: { issues: [{ path }] } } })
  })

  it('refuses an unknown name, and one that every object has', () => {
    expect(answerCalculation('nothing-of-the-kind', {}).isAnswered).toBe(false)
    expect(findCalculation('constructor')).toBeNull()
    expect(findCalculation('__proto__')).toBeNull()
  })

  it('answers each item of an array in its own place', () => {
    const { isAnswered, reply } = answerCalculation('mounting', [SOCKET, { ...SOCKET, lowest_m: 'high' }, 5, []])
    expect(isAnswered).toBe(true)
    expect(reply).toMatchObject([{ verdict: 'within' }, { error: {} }, { error: {} }, { error: {} }])
    expect(answerCalculation('mounting', []).reply).toEqual([])
  })
})

describe('listCalculations', () => {
  it('gives JSON Schema that refuses keys it does not name', () => {
    const listed = listCalculations()
    expect(listed.length).toBeGreaterThanOrEqual(10)
    expect(listed.every(each => 'additionalProperties' in each.input && each.input.additionalProperties === false)).toBe(true)
    expect(JSON.parse(JSON.stringify(listed))).toEqual(listed)
  })
})
