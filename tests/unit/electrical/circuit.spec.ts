import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { CircuitResult } from '#shared/electrical/circuit'
import { CABLE_WORDS, findRating, methodsOf, sizesOf } from '#shared/electrical/cables'
import { answerTo, issuesOf } from './asking'

const base = { Ib_A: 32, device: 'B', In_A: 32, cable: 'twin-earth-70', Ze_ohm: 0.35 }
const circuit = (input: object) => answerTo<CircuitResult>('circuit', { ...base, legs: [{ method: 'C', L_m: 18 }], ...input })
const sizeOf = (input: object, S_mm2: number) => circuit(input).result.sizes.find(each => each.S_mm2 === S_mm2)!

describe('circuit', () => {
  it('compares every size and takes the smallest that is within', () => {
    const { verdict, result } = circuit({})
    expect(verdict).toBe('within')
    expect(result.sizes.map(each => each.S_mm2)).toEqual([1, 1.5, 2.5, 4, 6, 10, 16])
    expect(result.S_mm2).toBe(4)
    expect(result.sizes[2]!.firstReason).toContain('carries 27 A')
  })

  it('judges one size alone where it is asked to', () => {
    const { verdict, result } = circuit({ S_mm2: 2.5 })
    expect(verdict).toBe('outside')
    expect(result.sizes).toHaveLength(1)
    expect(result.S_mm2).toBeNull()
  })

  it('names the leg that binds and how far each might go', () => {
    const { result } = circuit({ S_mm2: 6, legs: [{ method: 'C', L_m: 10 }, { method: 'C', L_m: 8, insulationLength_mm: 200 }] })
    expect(result.bindingLeg).toBe(1)
    expect(result.legs.map(leg => leg.binding)).toEqual([false, true])
    expect(result.legs[1]!.Iz_A).toBeCloseTo(47 * 0.63, 9)
    expect(result.maxLength_m).toBeCloseTo(11.5 / (7.3 * 0.032), 9)
    expect(result.legs[0]!.maxLength_m).toBeCloseTo(11.5 / (7.3 * 0.032) - 8, 9)
    expect(result.maxLengthBy).toBe('volt drop')
  })

  it('is on the limit at the longest route, and outside just beyond', () => {
    const { maxLength_m } = circuit({ S_mm2: 6 }).result
    const at = (L_m: number) => circuit({ S_mm2: 6, legs: [{ method: 'C', L_m }] }).verdict
    expect([at(maxLength_m - 0.001), at(maxLength_m), at(maxLength_m + 0.001)]).toEqual(['within', 'within', 'outside'])
  })

  it('lets the loop set the longest route where the loop is the tighter', () => {
    const { result } = circuit({ S_mm2: 6, Ze_ohm: 1.2 })
    expect(result.maxLengthBy).toBe('loop impedance')
    expect(result.maxLength_m).toBeCloseTo((1.365625 - 1.2) * 1000 / (10.49 * 1.2), 9)
  })

  it('tests the unrounded volt drop: 11.52 V is outside though it shows 5.0 %', () => {
    const size = sizeOf({ Ib_A: 16, In_A: 16, S_mm2: 2.5, legs: [{ method: 'C', L_m: 40 }] }, 2.5)
    expect(size.volt_drop_V).toBeCloseTo(11.52, 9)
    expect(size.verdict).toBe('outside')
  })

  it('rates 90 °C cable by the 70 °C table unless its terminals stand 90 °C, and keeps its own volt drop', () => {
    const cool = circuit({ cable: 'swa-90', S_mm2: 6, legs: [{ method: 'C', L_m: 20, ambient_C: 40 }] }).result
    const hot = circuit({ cable: 'swa-90', terminals_C: 90, S_mm2: 6, legs: [{ method: 'C', L_m: 20, ambient_C: 40 }] }).result
    expect(cool.legs[0]!.It_A).toBe(49)
    expect(cool.legs[0]!.factors.Ca).toBe(0.87)
    expect(hot.legs[0]!.It_A).toBe(62)
    expect(hot.legs[0]!.factors.Ca).toBe(0.91)
    expect(cool.sizes[0]!.volt_drop_V).toBeCloseTo(7.9 * 32 * 20 / 1000, 12)
    expect(hot.sizes[0]!.volt_drop_V).toBeCloseTo(cool.sizes[0]!.volt_drop_V, 12)
    expect(cool.sizes[0]!.R1R2_ohm).toBeCloseTo(6.16 * 20 * 1.2 / 1000, 12)
    expect(hot.sizes[0]!.R1R2_ohm).toBeCloseTo(6.16 * 20 * 1.28 / 1000, 12)
  })

  it('combines factors only where they meet on one leg', () => {
    const { result } = circuit({ S_mm2: 10, legs: [{ method: 'C', L_m: 5, ambient_C: 40 }, { method: 'C', L_m: 5, circuits: 3, arrangement: 'bunched' }] })
    expect(result.legs[0]!.Iz_A).toBeCloseTo(64 * 0.87, 12)
    expect(result.legs[1]!.Iz_A).toBeCloseTo(64 * 0.7, 12)
  })

  it.each(['101', '103'])('takes no Ci on top of a method %s rating', (method) => {
    const { result, notes } = circuit({ S_mm2: 10, legs: [{ method, L_m: 5, insulationLength_mm: 500 }] })
    expect(result.legs[0]!.factors.Ci).toBe(1)
    expect(notes.join(' ')).toContain('no Ci')
  })

  it('takes ground figures on buried legs only, and air figures on the others', () => {
    const { result } = circuit({ cable: 'swa-70', S_mm2: 6, Cc: 0.9, legs: [{ method: 'D', L_m: 5, ground_C: 10, ambient_C: 60 }, { method: 'C', L_m: 5, ground_C: 60 }] })
    expect(result.legs[0]!.factors).toMatchObject({ Ca: 1.1, Cc: 0.9 })
    expect(result.legs[1]!.factors).toMatchObject({ Ca: 1, Cc: 1 })
  })

  it('brings in the factor of a semi-enclosed fuse', () => {
    expect(circuit({ device: 'BS3036', In_A: 30, Ib_A: 20, S_mm2: 6 }).result.legs[0]!.Iz_A).toBeCloseTo(47 * 0.725, 12)
  })

  it('waits for Ze, yet says already what is outside', () => {
    const { verdict, missing, result } = circuit({ Ze_ohm: undefined })
    expect(verdict).toBe('waiting')
    expect(missing).toEqual(['Ze_ohm'])
    expect(result.sizes.map(each => each.verdict)).toEqual(['outside', 'outside', 'outside', 'waiting', 'waiting', 'waiting', 'waiting'])
    expect(result.S_mm2).toBeNull()
  })

  it('waits for whatever is missing, by key', () => {
    expect(answerTo('circuit', {}).missing).toEqual(['Ib_A', 'In_A', 'cable', 'legs'])
    expect(answerTo('circuit', { ...base, legs: [{ method: 'C' }, { L_m: 3 }] }).missing).toEqual(['legs.0.L_m', 'legs.1.method'])
  })

  it('judges TT by the residual current device', () => {
    const tt = { system: 'TT', RA_ohm: 100, IdeltaN_A: 0.03, Ze_ohm: undefined, S_mm2: 6 }
    const { verdict, result, working } = circuit(tt)
    expect(verdict).toBe('within')
    expect(result.ZsMax_ohm).toBeCloseTo(50 / 0.03, 9)
    expect(result.sizes[0]!.Zs_ohm).toBeCloseTo(100.226584, 9)
    expect(working.some(each => each.symbol.includes('information only'))).toBe(true)
    expect(circuit({ ...tt, RA_ohm: 1667 }).verdict).toBe('outside')
    expect(circuit({ ...tt, RA_ohm: undefined, IdeltaN_A: undefined }).missing).toEqual(['RA_ohm', 'IdeltaN_A'])
  })

  it('uses the let-through at the near end where it is known, and says so where it is not', () => {
    const near = circuit({ S_mm2: 6, Ipf_kA: 5, device_kA: 10, energyClass: 3 })
    expect(near.result.sizes[0]!.nearEnd_mm2).toBeCloseTo(Math.sqrt(90_000) / 115, 12)
    expect(near.verdict).toBe('outside')
    expect(circuit({ S_mm2: 6, Ipf_kA: 5, device_kA: 6, energyClass: 3 }).verdict).toBe('within')
    expect(circuit({ S_mm2: 6 }).notes.join(' ')).toContain('not checked at the near end')
  })

  it('refuses what the tables have not', () => {
    expect(issuesOf('circuit', { ...base, legs: [{ method: 'D', L_m: 1 }] })[0]!.path).toBe('legs.0.method')
    expect(issuesOf('circuit', { ...base, S_mm2: 3, legs: [{ method: 'C', L_m: 1 }] })[0]!.path).toBe('S_mm2')
    expect(issuesOf('circuit', { ...base, phases: 3, legs: [{ method: 'C', L_m: 1 }] })[0]!.path).toBe('phases')
    expect(issuesOf('circuit', { ...base, legs: [{ method: 'C', L_m: -1 }] })[0]!.path).toBe('legs.0.L_m')
    expect(issuesOf('circuit', { ...base, legs: [{ method: 'C', L_m: 1, ambient_C: 65 }] })[0]!.path).toBe('legs.0.ambient_C')
  })
})

describe('laws of a circuit', () => {
  const leg = fc.record({ method: fc.constantFrom('A', 'C', '100', '101', '102', '103'), L_m: fc.double({ min: 0.1, max: 60, noNaN: true }), ambient_C: fc.integer({ min: 20, max: 55 }), circuits: fc.integer({ min: 1, max: 12 }) })
  const legs = fc.array(leg, { minLength: 1, maxLength: 6 })

  it('gives the same whatever the order of the legs', () => {
    fc.assert(fc.property(legs, (list) => {
      const there = circuit({ legs: list })
      const back = circuit({ legs: [...list].reverse() })
      expect(back.result.S_mm2).toBe(there.result.S_mm2)
      there.result.sizes.forEach((size, index) => {
        expect(back.result.sizes[index]!.Iz_A).toBeCloseTo(size.Iz_A, 9)
        expect(back.result.sizes[index]!.volt_drop_V).toBeCloseTo(size.volt_drop_V, 9)
        expect(back.result.sizes[index]!.Zs_ohm).toBeCloseTo(size.Zs_ohm!, 9)
      })
    }))
  })

  it('gives the same when a leg is split in two', () => {
    fc.assert(fc.property(legs, fc.double({ min: 0.05, max: 0.95, noNaN: true }), (list, share) => {
      const [first, ...others] = list
      const split = [{ ...first!, L_m: first!.L_m * share }, { ...first!, L_m: first!.L_m * (1 - share) }, ...others]
      const whole = circuit({ legs: list }).result.sizes
      circuit({ legs: split }).result.sizes.forEach((size, index) => {
        expect(size.Iz_A).toBeCloseTo(whole[index]!.Iz_A, 9)
        expect(size.volt_drop_V).toBeCloseTo(whole[index]!.volt_drop_V, 9)
        expect(size.Zs_ohm).toBeCloseTo(whole[index]!.Zs_ohm!, 9)
      })
    }))
  })

  it('never loses less over a longer route, nor in a smaller cable', () => {
    fc.assert(fc.property(legs, fc.double({ min: 0, max: 30, noNaN: true }), (list, more_m) => {
      const short = circuit({ legs: list }).result.sizes
      const long = circuit({ legs: [{ ...list[0]!, L_m: list[0]!.L_m + more_m }, ...list.slice(1)] }).result.sizes
      short.forEach((size, index) => {
        expect(long[index]!.volt_drop_V).toBeGreaterThanOrEqual(size.volt_drop_V - 1e-12)
        expect(long[index]!.Zs_ohm!).toBeGreaterThanOrEqual(size.Zs_ohm! - 1e-12)
        if (index > 0) {
          expect(size.Iz_A).toBeGreaterThanOrEqual(short[index - 1]!.Iz_A)
          expect(size.volt_drop_V).toBeLessThanOrEqual(short[index - 1]!.volt_drop_V)
        }
      })
    }))
  })

  it('never rates a larger size of any cable lower', () => {
    for (const cable of CABLE_WORDS) {
      for (const method of methodsOf(cable)) {
        for (const phases of cable === 'twin-earth-70' ? [1] as const : [1, 3] as const) {
          const ratings = sizesOf(cable).flatMap(size => findRating(cable, size, method, phases)?.value ?? [])
          expect(ratings.length).toBeGreaterThan(0)
          expect(ratings, `${cable} ${method} ${phases}`).toEqual([...ratings].sort((a, b) => a - b))
        }
      }
    }
  })
})
