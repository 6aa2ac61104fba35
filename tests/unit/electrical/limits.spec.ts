import { describe, expect, it } from 'vitest'
import { answerTo, issuesOf } from './asking'

const verdict = (name: string, input: object) => answerTo(name, input).verdict
const A4 = 'BS 7671:2018+A4:2026'
const rcd = (input: object) => ({ type: 'A', IdeltaN_mA: 30, delay: false, edition: A4, ...input })

/** Just under, on and just over each limit. */
const EDGES: [string, string, (value: number) => object, number, number, 'most' | 'least'][] = [
  ['volt drop', 'volt-drop', mV => ({ stages: [{ I_A: 10, L_m: 100, mV_per_A_m: mV }] }), 11.5, 0.0001, 'most'],
  ['volt drop, lighting', 'volt-drop', mV => ({ use: 'lighting', stages: [{ I_A: 10, L_m: 100, mV_per_A_m: mV }] }), 6.9, 0.0001, 'most'],
  ['loop reading', 'zs-limit', ohm => ({ device: 'B', In_A: 32, measured_ohm: ohm }), 1.0925, 0.00001, 'most'],
  ['loop in TT', 'zs-limit', ohm => ({ system: 'TT', IdeltaN_A: 0.1, measured_ohm: ohm }), 500, 0.01, 'most'],
  ['electrode', 'tt-electrode', ohm => ({ IdeltaN_A: 0.1, RA_ohm: ohm }), 500, 0.01, 'most'],
  ['RCD at its rating', 'rcd-test', ms => rcd({ trip_ms: ms }), 300, 0.1, 'most'],
  ['RCD at five times, older edition', 'rcd-test', ms => rcd({ edition: 'BS 7671:2018', multiple: 5, trip_ms: ms }), 40, 0.1, 'most'],
  ['6 mA d.c.', 'rcd-test', s => rcd({ trip_ms: 20, dc: { trip_s: s, at_mA: 6 } }), 10, 0.01, 'most'],
  ['60 mA d.c.', 'rcd-test', s => rcd({ trip_ms: 20, dc: { trip_s: s, at_mA: 60 } }), 0.3, 0.001, 'most'],
  ['insulation', 'insulation-test', Mohm => ({ test_V: 500, stage: 'cable', readings_Mohm: [200, Mohm] }), 1, 0.001, 'least'],
  ['main fuse', 'supply', house => ({ fuse_A: 100, fuseKnown: 'read', house_A: house, ev_A: 32 }), 68, 0.001, 'most'],
  ['cable against device', 'cable-size', In => ({ In_A: In, cable: 'twin-earth-70', method: 'C', S_mm2: 6 }), 47, 0.001, 'most'],
  ['load against device', 'cable-size', Ib => ({ In_A: 32, Ib_A: Ib, cable: 'twin-earth-70', method: 'C', S_mm2: 6 }), 32, 0.001, 'most'],
  ['breaking capacity', 'breaking-capacity', kA => ({ device_kA: 6, Ipf_kA: kA }), 6, 0.001, 'most'],
  ['protective conductor by table', 'protective-conductor', mm2 => ({ line_mm2: 25, actual_mm2: mm2 }), 16, 0.001, 'least'],
  ['adiabatic', 'adiabatic', mm2 => ({ If_A: 1000, t_s: 1, k: 100, cpc_mm2: mm2 }), 10, 0.0001, 'least'],
]

describe('limits', () => {
  it.each(EDGES)('%s: within up to the limit, outside beyond', (_what, name, input, limit, little, kind) => {
    const [good, bad] = kind === 'most' ? [limit - little, limit + little] : [limit + little, limit - little]
    expect([verdict(name, input(good)), verdict(name, input(limit)), verdict(name, input(bad))]).toEqual(['within', 'within', 'outside'])
  })
})

describe('volt drop', () => {
  it('forgives the dust of binary fractions and nothing more', () => {
    const stages = [0.1, 0.2].map(volts => ({ I_A: 1, R1Rn_ohm: volts }))
    expect(verdict('volt-drop', { stages, limit_V: 0.3 })).toBe('within')
    expect(verdict('volt-drop', { stages, limit_V: 0.2999999999 })).toBe('outside')
  })

  it('uses the single-phase column for a single-phase load in any cable', () => {
    const stage = { I_A: 20, L_m: 10, cable: 'swa-90', S_mm2: 6, method: 'C' }
    expect(answerTo<{ total_V: number }>('volt-drop', { stages: [stage] }).result.total_V).toBeCloseTo(7.9 * 0.2, 12)
    expect(answerTo<{ total_V: number, limit_V: number }>('volt-drop', { stages: [stage], phases: 3 }).result).toMatchObject({ limit_V: 20 })
  })

  it('multiplies the 60 °C cord table by 1.09 for 90 °C cords, and names where that table ends', () => {
    expect(answerTo<{ total_V: number }>('volt-drop', { stages: [{ I_A: 10, L_m: 10, cable: 'flex-90', S_mm2: 4 }] }).result.total_V).toBeCloseTo(12 * 1.09 * 0.1, 12)
    expect(issuesOf('volt-drop', { stages: [{ I_A: 10, L_m: 10, cable: 'flex-90', S_mm2: 6 }] })[0]!.path).toBe('stages.0.S_mm2')
  })

  it('gives the longest route and the mV/A/m needed for one stage', () => {
    const { result } = answerTo('volt-drop', { stages: [{ I_A: 32, L_m: 18, mV_per_A_m: 7.3 }] })
    expect(result.maxLength_m).toBeCloseTo(49.2295, 4)
    expect(result.required_mV_per_A_m).toBeCloseTo(19.9653, 4)
  })
})

describe('factors', () => {
  const factor = (input: object) => answerTo('factor', input).result.factor
  it('step to the worse row between two', () => {
    expect(factor({ symbol: 'Ca', ambient_C: 31, insulation_C: 70 })).toBe(0.94)
    expect(factor({ symbol: 'Ca', ambient_C: 26, insulation_C: 70 })).toBe(1)
    expect(factor({ symbol: 'Ca', ambient_C: 10, insulation_C: 70 })).toBe(1.03)
    expect(factor({ symbol: 'Cg', circuits: 10, arrangement: 'bunched' })).toBe(0.45)
    expect(factor({ symbol: 'Ci', insulationLength_mm: 101 })).toBe(0.63)
    expect(factor({ symbol: 'Ci', insulationLength_mm: 3000 })).toBe(0.5)
    expect(factor({ symbol: 'Ca', ground_C: 21, insulation_C: 90 })).toBe(0.96)
  })

  it('take the lower laying where it is not said', () => {
    expect(factor({ symbol: 'Cs', rho_Km_per_W: 1 })).toBe(1.18)
    expect(factor({ symbol: 'Cs', rho_Km_per_W: 1, laying: 'direct' })).toBe(1.5)
    expect(factor({ symbol: 'Cd', depth_m: 1 })).toBe(0.97)
  })

  it('end where the table ends', () => {
    expect(issuesOf('factor', { symbol: 'Ca', ambient_C: 61, insulation_C: 70 })[0]!.path).toBe('ambient_C')
    expect(issuesOf('factor', { symbol: 'Cg', circuits: 21, arrangement: 'bunched' })[0]!.path).toBe('circuits')
    expect(issuesOf('factor', { symbol: 'Cg', circuits: 7, arrangement: 'buried-touching' })[0]!.path).toBe('circuits')
  })
})

describe('loop limits', () => {
  const zs = (input: object) => answerTo<{ Ia_A: number, ZsMax_ohm: number, ZsMeasuredMax_ohm: number, ZsCorrected_ohm?: number }>('zs-limit', input)
  it('notes a reading between 80 % and the limit', () => {
    const reply = zs({ device: 'B', In_A: 32, measured_ohm: 1.2 })
    expect(reply.verdict).toBe('outside')
    expect(reply.notes.join(' ')).toContain('still under the limit')
    expect(zs({ device: 'B', In_A: 32, measured_ohm: 1.4 }).notes).toEqual([])
  })

  it('assesses by temperature only with all three figures', () => {
    const three = { R1R2_ohm: 0.3, ambient_C: 10, multiplier: 1.2 }
    const reply = zs({ device: 'B', In_A: 32, measured_ohm: 1.2, ...three })
    expect(reply.result.ZsCorrected_ohm).toBeCloseTo(1.2 + 0.3 * (1.2 / 0.96 - 1), 12)
    expect(reply.verdict).toBe('within')
    for (const key of Object.keys(three)) {
      const two = zs({ device: 'B', In_A: 32, measured_ohm: 1.2, ...three, [key]: undefined })
      expect(two.verdict).toBe('outside')
      expect(two.result.ZsCorrected_ohm).toBeUndefined()
    }
  })

  it('scales a fuse\'s table by Cmin, and finds its current', () => {
    expect(zs({ device: 'BS88-2', In_A: 32 }).result.ZsMax_ohm).toBeCloseTo(0.99, 12)
    expect(zs({ device: 'BS88-2', In_A: 32, Cmin: 1 }).result.ZsMax_ohm).toBeCloseTo(0.99 / 0.95, 12)
    expect(zs({ device: 'BS3036', In_A: 30 }).result.Ia_A).toBe(210)
    expect(zs({ device: 'BS3036', In_A: 30, time_s: 5 }).result.ZsMax_ohm).toBeCloseTo(2.51, 12)
    expect(issuesOf('zs-limit', { device: 'BS88-3', In_A: 10 })[0]!.path).toBe('In_A')
  })

  it('lets type D take ten times its rating at 5 s', () => {
    expect(zs({ device: 'D', In_A: 32 }).result.Ia_A).toBe(640)
    expect(zs({ device: 'D', In_A: 32, time_s: 5 }).result.Ia_A).toBe(320)
  })

  it('takes no 80 % in TT, waits for the residual current, and doubts a high electrode', () => {
    expect(zs({ system: 'TT' }).missing).toEqual(['IdeltaN_A'])
    const reply = zs({ system: 'TT', IdeltaN_A: 0.03, measured_ohm: 201 })
    expect(reply.verdict).toBe('within')
    expect(reply.result.ZsMeasuredMax_ohm).toBeUndefined()
    expect(reply.notes.join(' ')).toContain('200')
  })
})

describe('supply', () => {
  const supply = (input: object) => answerTo('supply', { fuse_A: 80, fuseKnown: 'read', house_A: 60, ev_A: 32, ...input })
  it('waits on an assumed fuse, whatever the figures', () => {
    expect(supply({ house_A: 10, fuseKnown: 'assumed' })).toMatchObject({ verdict: 'waiting', missing: ['fuseKnown'] })
  })

  it('waits on the limiter\'s test where only the limit brings it within', () => {
    expect(supply({}).verdict).toBe('outside')
    expect(supply({ loadLimit_A: 80 })).toMatchObject({ verdict: 'waiting', missing: ['limiterTested'] })
    expect(supply({ limiterTested: false })).toMatchObject({ verdict: 'waiting', missing: ['limiterTested'] })
    expect(supply({ limiterTested: true, loadLimit_A: 80 })).toMatchObject({ verdict: 'within', result: { demandAfter_A: 80 } })
  })

  it('knows that a limiter cannot shed the house', () => {
    const reply = supply({ house_A: 85, limiterTested: true, loadLimit_A: 80 })
    expect(reply.verdict).toBe('outside')
    expect(reply.result.demandAfter_A).toBe(85)
    expect(reply.reasons[0]).toContain('alone')
  })

  it('lets the charger draw the fuse less the house, and pauses it below 6 A', () => {
    expect(supply({ house_A: 74 }).result.evAllowed_A).toBe(6)
    expect(supply({ house_A: 74.01 }).result.evAllowed_A).toBe(0)
    expect(supply({ house_A: 10 }).result.evAllowed_A).toBe(32)
  })

  it('sets the limit at the main fuse or the lower figure', () => {
    expect(supply({}).result.limitSetting_A).toBe(80)
    expect(supply({ loadLimit_A: 60 }).result.limitSetting_A).toBe(60)
    expect(supply({ loadLimit_A: 100 }).result.limitSetting_A).toBe(80)
    expect(supply({ loadLimit_A: 100, limiterTested: true }).verdict).toBe('outside')
  })
})

describe('residual current devices', () => {
  it.each([
    ['type AC', { type: 'AC', trip_ms: 20 }, 'EAR-16'],
    ['shared', { shared: true, trip_ms: 20 }, 'EAR-14'],
    ['more than 30 mA', { IdeltaN_mA: 100, trip_ms: 20 }, 'EAR-14'],
    ['delayed', { delay: true, trip_ms: 200 }, 'TST-13'],
    ['type AC before any test', { type: 'AC' }, 'EAR-16'],
  ])('%s is refused', (_what, input, rule) => {
    const reply = answerTo('rcd-test', rcd(input))
    expect(reply.verdict).toBe('outside')
    expect(reply.reasons[0]).toMatch(new RegExp(`^${rule}: `))
  })

  it('wait while the charger may still be waiting, and no longer', () => {
    expect(verdict('rcd-test', rcd({ waited_s: 599 }))).toBe('waiting')
    expect(verdict('rcd-test', rcd({ waited_s: 600 }))).toBe('outside')
    expect(verdict('rcd-test', rcd({ waited_s: 600, randomDelay_s: 1800 }))).toBe('waiting')
    expect(verdict('rcd-test', rcd({ waited_s: 40, trip_ms: 25 }))).toBe('within')
  })

  it('are not proved at 6 mA by a larger direct current', () => {
    expect(verdict('rcd-test', rcd({ trip_ms: 20, dc: { trip_s: 1, at_mA: 8 } }))).toBe('outside')
    expect(verdict('rcd-test', rcd({ trip_ms: 20, dc: { trip_s: 9, at_mA: 4.5 } }))).toBe('within')
  })

  it('go by the edition given, in full', () => {
    expect(issuesOf('rcd-test', rcd({ edition: '18th' }))[0]!.path).toBe('edition')
    expect(answerTo('rcd-test', rcd({ edition: 'BS 7671:2018+A1:2020', trip_ms: 20 })).notes[0]).toContain('TST-12')
    expect(answerTo('rcd-test', rcd({ edition: 'BS 7671:2018+A2:2022', trip_ms: 20 })).notes[0]).toContain('EAR-15')
  })
})

describe('other tests', () => {
  it('insulation is tested at the voltage of its stage', () => {
    const at = (stage: string, test_V: number) => verdict('insulation-test', { stage, test_V, readings_Mohm: [100] })
    expect([at('cable', 500), at('cable', 250), at('charger-connected', 250), at('charger-connected', 500)]).toEqual(['within', 'outside', 'within', 'outside'])
  })

  it('a 6 kA device is covered by the unit behind at most 100 A only', () => {
    const unit = { device_kA: 6, serviceCable_m: 3, consumerUnitConditional_kA: 16 }
    expect(verdict('breaking-capacity', { ...unit, serviceFuse_A: 100 })).toBe('within')
    expect(verdict('breaking-capacity', { ...unit, serviceFuse_A: 125, Ipf_kA: 12 })).toBe('outside')
    expect(verdict('breaking-capacity', { ...unit, device_kA: 4.5, serviceFuse_A: 100 })).toBe('outside')
    expect(verdict('breaking-capacity', { ...unit, serviceCable_m: 1.9, serviceFuse_A: 100 })).toBe('outside')
  })

  it('a very short fault is noted as the device\'s to say', () => {
    expect(answerTo('adiabatic', { If_A: 1000, t_s: 0.09, k: 115 }).notes[0]).toContain('I²t')
    expect(answerTo('adiabatic', { If_A: 1000, t_s: 0.1, k: 115 }).notes).toEqual([])
  })

  it('k follows from material, insulation and arrangement', () => {
    const k = (material: string, insulation: string, arrangement: string) => answerTo('adiabatic', { I2t_A2s: 1e6, material, insulation, arrangement }).working.find(each => each.symbol === 'k')!.value
    expect([k('copper', '70 C thermoplastic', 'in-cable'), k('copper', '70 C thermoplastic', 'separate'), k('steel', '90 C thermosetting', 'armour'), k('copper', 'bare', 'bare-normal')]).toEqual([115, 143, 46, 159])
    expect(issuesOf('adiabatic', { I2t_A2s: 1, material: 'aluminium', insulation: '85 C rubber', arrangement: 'armour' })[0]!.path).toBe('insulation')
  })

  it('pilot duty and current go there and back', () => {
    for (const I_A of [6, 10, 16, 32, 51, 60, 80]) {
      const duty_percent = answerTo('pilot', { I_A }).result.duty_percent
      expect(answerTo('pilot', { duty_percent }).result.I_A).toBeCloseTo(I_A, 9)
    }
    expect(answerTo('pilot', { duty_percent: 5 }).result.I_A).toBeNull()
    expect(answerTo('pilot', { duty_percent: 2 }).result.I_A).toBe(0)
    expect(issuesOf('pilot', { I_A: 5 })[0]!.message).toContain('6 A')
  })

  it('PME bonding steps just above each neutral size', () => {
    const at = (neutral_mm2: number) => answerTo('bonding', { system: 'PME', neutral_mm2 }).result.bonding_mm2
    expect([35, 35.1, 50, 50.1, 95.1, 150.1].map(at)).toEqual([10, 16, 16, 25, 35, 50])
    expect(answerTo('bonding', { system: 'TN-S', earthing_mm2: 70 }).result.bonding_mm2).toBe(25)
  })
})

describe('readings that do not fit', () => {
  const fits = (input: object) => answerTo<{ odd: string[] }>('reading-fits', { line_mm2: 6, cpc_mm2: 2.5, L_m: 18, ambient_C: 20, ...input }).result.odd
  it('are those no cable of that size and length gives', () => {
    expect(fits({ R1R2_ohm: 0.19 })).toEqual([])
    expect(fits({ R1R2_ohm: 0.35 })).toHaveLength(1)
    expect(fits({ R1R2_ohm: 0.08 })).toHaveLength(1)
    expect(fits({ R1Rn_ohm: 0.11 })).toEqual([])
    expect(fits({ R1Rn_ohm: 0.19 })).toHaveLength(1)
  })

  it('are loops below Ze + R1+R2 by more than the instrument\'s error', () => {
    const loop = { R1R2_ohm: 0.19, Ze_ohm: 0.2, instrument_ohm: 0.05 }
    expect(fits({ ...loop, Zs_ohm: 0.34 })).toEqual([])
    expect(fits({ ...loop, Zs_ohm: 0.33 })).toHaveLength(1)
    expect(fits({ ...loop, Zs_ohm: 0.9 })).toHaveLength(1)
  })

  it('are R1+R2 and R1+Rn that differ where all conductors are alike', () => {
    const alike = { line_mm2: 6, cpc_mm2: 6, L_m: 30 }
    expect(fits({ ...alike, R1R2_ohm: 0.185, R1Rn_ohm: 0.18 })).toEqual([])
    expect(fits({ ...alike, R1R2_ohm: 0.22, R1Rn_ohm: 0.15 }).join(' ')).toContain('of one size')
  })
})
