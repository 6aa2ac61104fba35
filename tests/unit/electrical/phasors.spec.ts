import fc from 'fast-check'
import { abs, add, complex, multiply } from 'mathjs'
import type { Complex } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { table60228 } from '#shared/electrical/tables/conductors.data'
import { table4E4B } from '#shared/electrical/tables/volt-drop.data'
import { answerTo } from './asking'

const third = (amps: number, turn: number) => complex({ r: amps, phi: turn * 2 * Math.PI / 3 })

describe('against complex phasors', () => {
  it('the neutral of three unequal loads is the sum of their phasors', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 0, max: 100, noNaN: true }), { minLength: 3, maxLength: 3 }), (IL_A) => {
      const sum = IL_A.reduce<Complex>((total, amps, index) => add(total, third(amps, index)) as Complex, complex(0, 0))
      expect(answerTo('pen-three-phase', { IL_A }).result.IN_A).toBeCloseTo(abs(sum) as unknown as number, 9)
    }))
  })

  it('a measured loop loses √3 ÷ 2 of its drop between the lines of a balanced circuit', () => {
    const R1_ohm = 0.1
    const lines = [third(32, 0), third(32, -1)].map(current => multiply(current, R1_ohm) as Complex)
    const between = abs(add(lines[0]!, multiply(lines[1]!, -1) as Complex) as Complex) as unknown as number
    const { result } = answerTo('volt-drop', { phases: 3, stages: [{ I_A: 32, R1Rn_ohm: 2 * R1_ohm }] })
    expect(result.total_V).toBeCloseTo(between, 9)
  })

  it.each([6, 10, 16])('the table\'s drop of %s mm² is that of hot copper at unity power factor', (size) => {
    const loop = complex(2 * table60228.rows.find(row => row.size_mm2 === size)!.class1_2 * 1.28, 0)
    const volts = abs(multiply(complex(32, 0), multiply(loop, 20 / 1000)) as Complex) as unknown as number
    const { result } = answerTo('volt-drop', { stages: [{ I_A: 32, L_m: 20, cable: 'swa-90', S_mm2: size, method: 'C' }] })
    expect(Math.abs(result.total_V! / volts - 1)).toBeLessThan(0.035)
  })

  it('impedance of the large sizes is the length of r + jx, as printed', () => {
    for (const row of table4E4B.rows.slice(-2)) {
      const { r, x, z } = row.one_phase as { r: number, x: number, z: number }
      expect(Math.abs(z - (abs(complex(r, x)) as unknown as number))).toBeLessThan(0.05)
    }
  })
})
