import { isPossiblePhoneNumber } from 'libphonenumber-js/min'
import { isValid } from 'postcode'
import { describe, expect, it } from 'vitest'
import { readIntake } from '../../../shared/job/intake'
import { nationOf, readPhone, readPostcode } from '../../../shared/job/intake/uk-formats'
import { readDay, readHalf, readOutlet, readPhases, readRating } from '../../../shared/job/intake/wishes'

const TODAY = '2026-12-01' // a Tuesday

describe('a postcode', () => {
  it.each([
    ['s118tz', 'S11 8TZ'], ['M1 1AA', 'M1 1AA'], ['b33 8th', 'B33 8TH'], ['CR2 6XH', 'CR2 6XH'], ['DN55 1PT', 'DN55 1PT'], ['W1A 1HQ', 'W1A 1HQ'], ['EC1A 1BB', 'EC1A 1BB'], ['bt9  5ab', 'BT9 5AB'],
  ])('%s is read as %s', (typed, shown) => {
    expect(readPostcode(typed)).toBe(shown)
    expect(isValid(shown)).toBe(true)
  })

  it.each(['Q1 1AA', 'S11 8CZ', 'SI1 8TZ', 'S11', '7.4 kW', 'M1 1A'])('%s is none', typed => expect(readPostcode(typed)).toBeNull())

  it.each([['S11 8TZ', 'England'], ['G12 8QQ', 'Scotland'], ['CF10 1EP', 'Wales'], ['BT9 5AB', 'Northern Ireland'], ['CH5 3HH', null], ['TD15 1AA', null]])('%s lies in %s', (postcode, nation) => expect(nationOf(postcode)).toBe(nation))
})

describe('a telephone number', () => {
  it.each([
    ['07700 900123', '07700 900123'], ['+44 7700 900123', '07700 900123'], ['+44 (0)7700 900123', '07700 900123'], ['0044 114 496 0123', '0114 496 0123'],
    ['01632 960041', '01632 960041'], ['020 7946 0018', '020 7946 0018'], ['(0114) 496-0123', '0114 496 0123'], ['0808 157 0192', '0808 157 0192'],
  ])('%s is read as %s', (typed, shown) => {
    expect(readPhone(typed)).toBe(shown)
    expect(isPossiblePhoneNumber(shown, 'GB')).toBe(true)
  })

  it.each(['0770 900', '07700 90012', '020 7946 001', '0400 123 4567'])('%s is none', typed => expect(readPhone(typed)).toBeNull())
})

describe('what is wished for', () => {
  it.each([['a 7.4 kW charger', 7.4], ['7kw', 7], ['22 KW', 22], ['7,4kW please', 7.4]])('%s is a rating of %s', (text, value) => expect(readRating(text)?.value).toBe(value))
  it.each(['uses 12 kWh a day', '3500 kW', 'number 7'])('%s is no rating', text => expect(readRating(text)).toBeNull())
  it.each([['three-phase supply', '3'], ['3 phase', '3'], ['single phase', '1'], ['in phases', null]])('%s: phases %s', (text, phases) => expect(readPhases(text)).toBe(phases))
  it.each([['tethered', 'tethered'], ['untethered please', 'socket'], ['not tethered', 'socket'], ['a socket in the garage', null]])('%s: outlet %s', (text, outlet) => expect(readOutlet(text)).toBe(outlet))
  it.each([
    ['next Thursday', '2026-12-03'], ['Tuesday', '2026-12-08'], ['tomorrow', '2026-12-02'], ['8/12', '2026-12-08'], ['on the 8th of December', '2026-12-08'], ['5 Jan', '2027-01-05'],
    ['January 5th', '2027-01-05'], ['8.12.2026', '2026-12-08'], ['31/11', null], ['1/11/2026', null], ['7.4 kW', null], ['no day', null],
  ])('%s: day %s', (text, day) => expect(readDay(text, TODAY)).toBe(day))
  it.each([['in the morning', 'am'], ['10 am', 'am'], ['afternoon', 'pm'], ['spam', null], ['2pm', null], ['2 p.m.', 'pm']])('%s: half %s', (text, half) => expect(readHalf(text)).toBe(half))
})

describe('an enquiry', () => {
  it('typed in a call', () => {
    const { fields, wanted, asked, note } = readIntake('jane holt, 14 elm row, sheffield s11 8tz, 07700 900123, 7.4 kW tethered, thursday morning', TODAY)
    expect(fields).toEqual({ name: 'Jane Holt', telephone: '07700 900123', email: '', address: '14 Elm Row', town: 'Sheffield', postcode: 'S11 8TZ', country: 'England', mpan: '' })
    expect(wanted).toEqual({ rating_kW: 7.4, outlet: 'tethered' })
    expect(asked).toEqual({ day: '2026-12-03', half: 'am' })
    expect(note).toBe('7.4 kW tethered, thursday morning')
  })

  it('pasted as a mail', () => {
    const mail = 'Hello,\n\nwe bought a car and would like a charger on the drive. The board is in the garage, about 18 m away.\nOur supply number is 13 1234 5678 907.\n\nKind regards,\nSam O’Neill\nFlat 2, 9 Mill Lane\nChester\nCH2 1AB\nsam.oneill@example.org\n+44 7700 900456'
    const { fields, note } = readIntake(mail, TODAY)
    expect(fields).toMatchObject({ name: 'Sam O’Neill', telephone: '07700 900456', email: 'sam.oneill@example.org', address: 'Flat 2, 9 Mill Lane', town: 'Chester', postcode: 'CH2 1AB', country: 'England', mpan: '1312345678907' })
    expect(note).toContain('The board is in the garage, about 18 m away.')
    expect(note).not.toContain('example.org')
    expect(note).not.toContain('900456')
  })

  it.each([
    ['My name is Ada Quill and I live at 3 Brook Street, York, YO1 7AA', { name: 'Ada Quill', address: '3 Brook Street', postcode: 'YO1 7AA', town: 'York' }],
    ['Mrs P Shah; 22a High Street; Leeds; LS1 4AB; 0113 496 0999', { name: 'Mrs P Shah', address: '22a High Street', town: 'Leeds', telephone: '0113 496 0999' }],
    ['1312345678907', { mpan: '1312345678907', telephone: '' }],
    ['ring 01632 960041 about the quote', { telephone: '01632 960041', name: '' }],
    ['', { name: '', postcode: '' }],
  ])('%s', (text, fields) => expect(readIntake(text, TODAY).fields).toMatchObject(fields))

  it('lists what it understood, so that it can be corrected', () => {
    expect(readIntake('Jane Holt, 14 Elm Row, S11 8TZ, 22 kW three-phase, tomorrow', TODAY).found.map(each => each.field)).toEqual(['name', 'address', 'postcode', 'wanted', 'when'])
  })

  it('loses no word that it did not understand', () => {
    const words = 'The meter hums and the dog bites'
    expect(readIntake(`Jane Holt, 14 Elm Row, S11 8TZ. ${words}`, TODAY).note).toContain(words)
  })
})
