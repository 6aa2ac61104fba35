import { describe, expect, it } from 'vitest'
import { earthingMethod } from '#shared/job/rules/earthing-method'

describe('earthing-method', () => {
  it.each([
    ['PME', 1, true, 'none', 1, 'outside', 'EAR-01'],
    ['PME', 1, false, 'none', 1, 'within', 'EAR-01'],
    ['TN-S', 1, true, 'none', 1, 'within', 'EAR-01'],
    ['TT', 1, true, 'none', 1, 'within', 'EAR-01'],
    ['PME', 1, true, 'i', 1, 'outside', 'EAR-02'],
    ['PME', 3, true, 'i', 3, 'within', 'EAR-02'],
    ['PME', 1, true, 'ii', 1, 'within', 'EAR-03'],
    ['PME', 3, true, 'iii', 3, 'within', 'EAR-04'],
    ['PME', 1, true, 'iv', 1, 'within', 'EAR-05'],
    ['PME', 3, true, 'iv', 1, 'outside', 'EAR-05'],
    ['PME', 3, true, 'iv', 3, 'outside', 'EAR-05'],
    ['PME', 1, true, 'v', 1, 'within', 'EAR-06'],
    ['PME', 1, true, 'TT', 1, 'within', 'EAR-10'],
  ] as const)('%s, %d-phase, outdoors %s, method %s, %d-phase charger: %s', (supply, phases, outdoors, method, chargerPhases, verdict, id) => {
    const answer = earthingMethod({ supply, phases, outdoors, method, chargerPhases })
    expect(answer.verdict).toBe(verdict)
    expect(answer.reasons[0]).toContain(`${id}:`)
  })

  it('refuses a three-phase charger on a single-phase supply', () => {
    const answer = earthingMethod({ supply: 'TT', phases: 1, outdoors: true, method: 'TT', chargerPhases: 3 })
    expect(answer.verdict).toBe('outside')
  })

  it('warns of an old TN-S service', () => {
    const { notes } = earthingMethod({ supply: 'TN-S', phases: 1, outdoors: true, method: 'none', chargerPhases: 1 })
    expect(notes[0]).toContain('SUR-13')
  })

  it('waits for what it lacks', () => {
    expect(earthingMethod({}).missing).toEqual(['supply', 'phases', 'outdoors', 'method', 'chargerPhases'])
  })
})
