import { describe, expect, it } from 'vitest'
import { mounting } from '#shared/job/rules/mounting'

describe('mounting', () => {
  it.each([
    ['socket', 0.499, 'outside'], ['socket', 0.5, 'within'], ['socket', 1.5, 'within'], ['socket', 1.501, 'outside'],
    ['controls', 0.749, 'outside'], ['controls', 0.75, 'within'], ['controls', 1.2, 'within'], ['controls', 1.201, 'outside'],
  ] as const)('%s at %d m is %s', (kind, lowest_m, verdict) => {
    expect(mounting({ kind, lowest_m }).verdict).toBe(verdict)
  })

  it('never writes a height outside as the limit itself', () => {
    expect(mounting({ kind: 'socket', lowest_m: 0.4999 }).reasons[0]).toContain('0.4999')
  })

  it('adds the height for easy access to a socket that is merely allowed', () => {
    expect(mounting({ kind: 'socket', lowest_m: 0.6 }).notes[0]).toContain('EAR-20')
    expect(mounting({ kind: 'socket', lowest_m: 0.9 }).notes).toEqual([])
  })

  it('waits for what it lacks', () => {
    expect(mounting({ kind: 'socket' })).toMatchObject({ verdict: 'waiting', missing: ['lowest_m'] })
  })
})
