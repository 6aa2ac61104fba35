import { describe, expect, it } from 'vitest'
import { giveReason, inUnit, isOdd, openPad, padKeyFor, padShown, pressPad, type PadKey, type PadSetup, type PadState } from '../../../app/utils/reading-pad'

const ohms: PadSetup = { units: ['Ω', 'MΩ'], expected: 0.21, resolution: 0.01, topValue: { 'Ω': 1999, 'MΩ': 999 } }

/** Presses keys one after the other: "0.21" and named keys in brackets: "2.1[keep]". */
function press(keys: string, setup: PadSetup = ohms, from: PadState = openPad(setup)): PadState {
  const list = keys.match(/\[\w+\]|./g) ?? []
  return list.reduce((state, key) => pressPad(state, key.replace(/[[\]]/g, '') as PadKey, setup), from)
}

describe('keying', () => {
  it.each([['0.21', '0.21'], ['.21', '0.21'], ['120', '120'], ['0', '0'], ['1.5[back]8', '1.8'], ['1.52[clear]3', '3']])('%s shows %s', (keys, shown) => {
    expect(press(keys).typed).toBe(shown)
  })

  it.each([
    ['0.2.', '0.2', 'There is a point already.'],
    ['0.215', '0.21', 'The tester reads in steps of 0.01\u2009Ω: no further decimal.'],
    ['03', '0', 'After a leading 0 comes the point. Rub out the 0 to key 3.'],
    ['00', '0', 'One leading 0 is enough: the point comes next.'],
    ['1234567', '123456', '6 figures are the most.'],
  ])('%s is refused at %s, with words and one buzz', (keys, typed, message) => {
    expect(press(keys)).toMatchObject({ typed, message, buzz: 1, kept: null })
  })

  it('refuses a point where the tester reads whole steps', () => {
    expect(press('30.', { units: ['ms'], resolution: 1 })).toMatchObject({ typed: '30', buzz: 1 })
  })

  it('takes the message away with the next accepted key', () => {
    expect(press('0.2.1')).toMatchObject({ typed: '0.21', message: null, buzz: 0 })
  })

  it('toggles the unit, and says so where there is only one', () => {
    expect(press('5[unit]').unit).toBe('MΩ')
    expect(press('5[unit][unit]').unit).toBe('Ω')
    expect(press('[unit]', { units: ['mA'] })).toMatchObject({ unit: 'mA', message: 'This reading has one unit: mA.' })
  })
})

describe('keeping', () => {
  it('hands on a plausible figure exactly as keyed', () => {
    expect(press('0.30[keep]').kept).toEqual({ kind: 'value', shown: '0.30', value: 0.3, unit: 'Ω', reason: null })
  })

  it.each([['', 'Key what the tester shows first.'], ['0.', 'Key the figure after the point, or rub the point out.']])('keeps nothing of "%s"', (keys, message) => {
    expect(press(`${keys}[keep]`)).toMatchObject({ kept: null, message, buzz: 1 })
  })

  it('asks for an odd figure again, with two buzzes, and keeps it when both agree', () => {
    const asked = press('2.1[keep]')
    expect(asked).toMatchObject({ kept: null, typed: '', buzz: 2, message: '2.1\u2009Ω is far from the design. Key it again to confirm.' })
    expect(press('2.1[keep]', ohms, asked).kept).toMatchObject({ shown: '2.1', value: 2.1 })
  })

  it('shows both where the second differs, and then keeps the one that fits', () => {
    const differs = press('0.21[keep]', ohms, press('2.1[keep]'))
    expect(differs).toMatchObject({ kept: null, typed: '0.21', confirm: null, message: 'First 2.1\u2009Ω, now 0.21\u2009Ω. Look at the tester, then keep the one it shows.' })
    expect(press('[keep]', ohms, differs).kept).toMatchObject({ value: 0.21 })
  })

  it('does not take the same digits in another unit for a confirmation', () => {
    const asked = press('2.1[keep]')
    expect(press('2.1[unit][keep]', ohms, asked)).toMatchObject({ kept: null, buzz: 2 })
  })

  it.each([[1.04, false], [1.05, true], [1.06, true], [0.043, false], [0.042, true], [0.0419, true], [0, true]])('%d beside a design of 0.21 is odd: %s', (value, odd) => {
    expect(isOdd(value, 'Ω', ohms)).toBe(odd)
  })

  it('sees a slip of the unit', () => {
    expect(isOdd(0.21, 'MΩ', ohms)).toBe(true)
    expect(inUnit(0.5, 'MΩ', 'kΩ')).toBe(500)
  })

  it('guards nothing without a design value', () => {
    expect(press('900[keep]', { units: ['Ω'] }).kept).toMatchObject({ value: 900 })
  })

  it('takes ">" for more than the tester counts, with its own top value', () => {
    expect(padShown(press('[unit]>'))).toBe('>\u2009999\u2009MΩ')
    expect(press('[unit]>[keep]').kept).toEqual({ kind: 'over-range', shown: '>999', value: 999, unit: 'MΩ', reason: null })
    expect(press('>[keep]', { units: ['A'] })).toMatchObject({ kept: null, message: 'Key the top value the tester shows.' })
    expect(press('>>').over).toBe(false)
  })
})

describe('no reading', () => {
  it('asks why before it keeps LIM or N/A', () => {
    const asked = press('[lim]')
    expect(asked).toMatchObject({ asking: 'limited', kept: null })
    expect(giveReason(asked, '  ')).toMatchObject({ kept: null, message: 'Say why in a few words.' })
    expect(giveReason(asked, 'no access').kept).toEqual({ kind: 'limited', shown: 'LIM', value: null, unit: 'Ω', reason: 'no access' })
    expect(giveReason(press('[na]'), 'no such conductor').kept).toMatchObject({ kind: 'not-applicable', shown: 'N/A' })
  })

  it('goes back to the keys with what was keyed', () => {
    expect(press('0.2[lim][keys]')).toMatchObject({ asking: null, typed: '0.2' })
  })
})

describe('a keyboard', () => {
  it.each([['7', '7'], [',', '.'], ['Enter', 'keep'], ['Backspace', 'back'], ['Delete', 'clear'], ['L', 'lim'], ['n', 'na'], ['u', 'unit'], ['>', '>']])('%s is the key %s', (key, pad) => {
    expect(padKeyFor(key)).toBe(pad)
  })

  it('leaves other keys alone', () => {
    expect(['Tab', 'Escape', 'a', 'F2', 'constructor'].map(padKeyFor)).toEqual([null, null, null, null, null])
  })
})
