import { describe, expect, it } from 'vitest'
import { counted, countPlaywright, countVitest, countWords, sumOf, withStatus } from '../../../scripts/lib/counts.mjs'

const file = (status: string, ...tests: string[]) => ({ status, assertionResults: tests.map(one => ({ status: one })) })

describe('countVitest', () => {
  it('counts a file that could not be loaded as a failure', () => {
    const report = { numPassedTests: 3, numFailedTests: 1, numPendingTests: 0, testResults: [file('passed', 'passed', 'passed'), file('failed', 'passed', 'failed'), file('failed')] }
    expect(countVitest(report)).toEqual({ passed: 3, failed: 2, skipped: 0 })
  })
})

describe('countPlaywright', () => {
  it('counts errors outside tests', () => {
    expect(countPlaywright({ stats: { expected: 4, flaky: 1, unexpected: 1, skipped: 2 }, errors: [{}] })).toEqual({ passed: 5, failed: 2, skipped: 2 })
  })
})

describe('withStatus', () => {
  it('never calls a stage good that ended badly', () => {
    expect(withStatus(counted(7, 0), 1)).toEqual(counted(7, 1))
    expect(withStatus(counted(7, 2), 1)).toEqual(counted(7, 2))
    expect(withStatus(counted(7, 0), 0)).toEqual(counted(7, 0))
  })
})

describe('sums', () => {
  it('adds stages and says them', () => {
    const sum = sumOf([counted(1, 0), counted(20, 2, 1)])
    expect(countWords(sum)).toBe('21 passed, 2 failed, 1 skipped')
    expect(countWords(counted(2, 0))).toBe('2 passed, 0 failed')
  })
})
