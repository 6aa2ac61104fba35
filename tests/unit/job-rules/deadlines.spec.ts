import { describe, expect, it } from 'vitest'
import { deadlines } from '#shared/job/rules/deadlines'

describe('deadlines', () => {
  it('counts over the end of a leap February', () => {
    expect(deadlines({ completed: '2028-02-10', country: 'Wales', schemeMember: true }).result).toMatchObject({
      network_operator_by: '2028-03-09', building_control_by: '2028-03-11', occupier_certificate_by: '2028-03-11', scheme_told_by: null, successor_by: null,
    })
  })

  it.each([
    ['Scotland', true, 'DOC-12'],
    ['Northern Ireland', true, 'DOC-13'],
    ['England', false, 'DOC-11'],
  ] as const)('%s, in a scheme %s: no last day for building control', (country, schemeMember, id) => {
    const { result, reasons } = deadlines({ completed: '2026-12-01', country, schemeMember })
    expect(result.building_control_by).toBeNull()
    expect(result.occupier_certificate_by).toBeNull()
    expect(result.network_operator_by).toBe('2026-12-29')
    expect(reasons.some(reason => reason.startsWith(id))).toBe(true)
  })

  it('counts 30 and 120 days from a supervisor who left', () => {
    expect(deadlines({ supervisorLeft: '2026-12-01', country: 'England', schemeMember: true }).result).toEqual({
      network_operator_by: null, building_control_by: null, occupier_certificate_by: null, scheme_told_by: '2026-12-31', successor_by: '2027-03-31',
    })
    expect(deadlines({ supervisorLeft: '2026-12-01', schemeMember: false }).result.scheme_told_by).toBeNull()
  })

  it('says which last day nobody works on, and the working day before it', () => {
    // 28 days after 27 November 2026 is Christmas Day, a Friday.
    const { notes } = deadlines({ completed: '2026-11-27', country: 'England', schemeMember: true })
    expect(notes).toContain('Fri 25 Dec 2026 is not a working day. The last working day before it is Thu 24 Dec 2026.')
  })

  it('waits for what it lacks', () => {
    expect(deadlines({}).missing).toEqual(['completed', 'country', 'schemeMember'])
    expect(deadlines({ completed: '2026-12-01', country: 'Scotland' }).missing).toEqual([])
    expect(deadlines({ completed: '2026-12-01' }).missing).toEqual(['country', 'schemeMember'])
  })
})
