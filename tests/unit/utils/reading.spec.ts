import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatReading, parseReading, type ReadingUnit } from '#shared/utils/reading'

describe('parseReading', () => {
  it.each([
    ['0,35', 'Ω', '0.35', 0.35, 0.01],
    ['.35', 'Ω', '0.35', 0.35, 0.01],
    ['0.350', 'Ω', '0.350', 0.35, 0.001],
    ['0.35 ohm', 'Ω', '0.35', 0.35, 0.01],
    ['0.35\u2009Ω', 'Ω', '0.35', 0.35, 0.01],
    ['0.35 \u2126', 'Ω', '0.35', 0.35, 0.01],
    ['28ms', 'ms', '28', 28, 1],
    [' 230.1 V ', 'V', '230.1', 230.1, 0.1],
    ['0', 'Ω', '0', 0, 1],
    ['0,350', 'Ω', '0.350', 0.35, 0.001],
  ] as const)('%j in %s shows %s', (text, unit, shown, value, resolution) => {
    expect(parseReading(text, unit).reading).toEqual({ kind: 'value', shown, value, unit, resolution })
  })

  it.each([
    ['>999', '>999', 999], ['> 299 MΩ', '>299', 299], ['OL', 'OL', null],
  ])('%j is over the range', (text, shown, value) => {
    expect(parseReading(text, 'MΩ').reading).toMatchObject({ kind: 'over-range', shown, value })
  })

  it.each([
    ['LIM', 'limited', 'LIM', undefined], ['lim: no access to the socket', 'limited', 'LIM', 'no access to the socket'],
    ['LIM · no access', 'limited', 'LIM', 'no access'], ['N/A', 'not-applicable', 'N/A', undefined], ['n/a not a ring', 'not-applicable', 'N/A', 'not a ring'],
  ] as const)('%j is %s', (text, kind, shown, reason) => {
    const { reading } = parseReading(text, 'Ω')
    expect(reading).toMatchObject({ kind, shown, value: null, resolution: null })
    expect(reading?.reason).toBe(reason)
  })

  it.each([
    ['0.3.5', 'more than one point'], ['1,234.5', 'more than one point'], ['035', 'two ways'], ['00.35', 'two ways'], ['1,234', '1.234 or as 1234'],
    ['5.', 'stops at the point'], ['.', 'stops at the point'], ['-0.01', 'below zero'], ['\u22120.01', 'below zero'], ['+0.35', 'plus sign'],
    ['0.35 kΩ', 'this reading is in Ω'], ['0.35 mΩ', 'this reading is in Ω'], ['0.35x', 'this reading is in Ω'], ['0.35 ~', 'this reading is in Ω'],
    ['0x10', 'this reading is in Ω'], ['1e3', 'this reading is in Ω'], ['<0.01', 'not a reading'], ['', 'Enter what the meter shows'], ['1234567', 'more digits'],
    ['limit', 'LIM or N/A'], ['NaN', 'not a reading'], ['0 .35', 'this reading is in Ω'],
  ])('%j is refused with a sentence', (text, part) => {
    const { reading, problem } = parseReading(text, 'Ω')
    expect(reading).toBeUndefined()
    expect(problem).toContain(part)
  })

  it('never takes a thousandth of a unit for a million', () => {
    expect(parseReading('2 mohm', 'MΩ').problem).toContain('MΩ')
    expect(parseReading('2 mΩ', 'MΩ').problem).toContain('MΩ')
  })

  it('reads back what it shows, in every unit', () => {
    const units = fc.constantFrom<ReadingUnit>('Ω', 'MΩ', 'V', 'A', 'mA', 'kA', 'ms', 's')
    const digits = fc.tuple(fc.integer({ min: 0, max: 999_999 }), fc.integer({ min: 0, max: 4 })).map(([n, places]) => (n / 10 ** places).toFixed(places))
    fc.assert(fc.property(digits, units, fc.boolean(), (shown, unit, isOver) => {
      const { reading } = parseReading(`${isOver ? '>' : ''}${shown} ${unit}`, unit)
      expect(reading?.value).toBe(Number(shown))
      expect(parseReading(formatReading(reading!), unit).reading).toEqual(reading)
    }))
  })

  it('keeps or refuses every character typed, and never throws', () => {
    fc.assert(fc.property(fc.string({ maxLength: 12 }), (text) => {
      const { reading, problem } = parseReading(text, 'V')
      expect((reading === undefined) !== (problem === undefined)).toBe(true)
      if (reading?.kind === 'value') expect(reading.value).not.toBeNaN()
    }), { numRuns: 500 })
  })
})

describe('formatReading', () => {
  it.each([
    ['0.350', 'Ω', '0.350\u2009Ω'], ['>999', 'MΩ', '>999\u2009MΩ'], ['LIM: no access', 'Ω', 'LIM · no access'], ['N/A', 'Ω', 'N/A'], ['OL', 'MΩ', 'OL'],
  ] as const)('%s in %s', (text, unit, shown) => {
    expect(formatReading(parseReading(text, unit).reading!)).toBe(shown)
  })
})
