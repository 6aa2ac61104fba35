import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { checkMpan, mpanCheckDigit } from '#shared/job/rules/mpan'

describe('mpan', () => {
  it.each([
    ['spaces and dashes are let pass', '13 1234-5678 907', true],
    ['letters in the top line are let pass', '00111A2B1312345678907', true],
    ['a letter in the core is not', '131234567890X', false],
    ['one digit short', '131234567890', false],
    ['20 digits', '01112221312345678907', false],
    ['11 digits without a country', '81234567890', false],
  ])('%s', (_, mpan, valid) => {
    const { result, reasons } = checkMpan({ mpan })
    expect(result.valid).toBe(valid)
    expect(result.reason === null).toBe(valid)
    expect(reasons).toHaveLength(valid ? 0 : 1)
  })

  it('takes a remainder of 10, like one of 0, as check digit 0', () => {
    // 7 × 3 leaves 10 of 21; 1 × 3 + 1 × 41 leaves nothing of 44.
    expect(mpanCheckDigit('700000000000')).toBe(0)
    expect(mpanCheckDigit('100000000010')).toBe(0)
  })

  it('names an independent operator without a region', () => {
    const core = `240000000000${mpanCheckDigit('240000000000')}`
    const { result, notes } = checkMpan({ mpan: core })
    expect(result).toMatchObject({ valid: true, distributor: '24', region: null })
    expect(notes.some(note => note.startsWith('SUR-04'))).toBe(true)
  })

  it('waits for a number', () => {
    expect(checkMpan({ mpan: ' ' })).toMatchObject({ verdict: 'waiting', missing: ['mpan'] })
  })

  it('holds Northern Ireland to 11 digits', () => {
    expect(checkMpan({ mpan: '8123456789', country: 'Northern Ireland' }).reasons[0]).toContain('SUR-05')
    expect(checkMpan({ mpan: '81234567890', country: 'Northern Ireland' }).result.operator).toBe('NIE Networks')
  })

  it('finds every single wrong digit among the first twelve, but where the remainders 0 and 10 share a check digit', () => {
    fc.assert(fc.property(
      fc.stringMatching(/^[0-9]{12}$/), fc.integer({ min: 0, max: 11 }), fc.integer({ min: 1, max: 9 }),
      (digits, place, change) => {
        const wrong = digits.slice(0, place) + String((Number(digits[place]) + change) % 10) + digits.slice(place + 1)
        const checks = [mpanCheckDigit(digits), mpanCheckDigit(wrong)]
        expect(checks[0] === checks[1] && checks[0] !== 0).toBe(false)
      },
    ))
  })
})
