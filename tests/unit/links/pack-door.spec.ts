import { describe, expect, it } from 'vitest'
import { linkAddress, linkTokenHash } from '#server/services/links/customer-links'
import { numberOf } from '#server/services/links/check-certificate'
import { DOOR_HOURS, isDoorKey, makeDoorKey, samePostcode } from '#server/services/links/pack-door'

const SECRET = 'a secret of more than thirty-two characters'
const NOW = Date.UTC(2027, 2, 2, 10)
const LINK = '01890000-0000-7000-8000-000000000001'

describe('the pack’s door', () => {
  it('opens with its own key until it runs out', () => {
    const key = makeDoorKey(SECRET, LINK, NOW)
    expect(isDoorKey(SECRET, LINK, key, NOW + 1)).toBe(true)
    expect(isDoorKey(SECRET, LINK, key, NOW + DOOR_HOURS * 3_600_000)).toBe(false)
  })
  it('opens no other link, and not under another secret', () => {
    const key = makeDoorKey(SECRET, LINK, NOW)
    expect(isDoorKey(SECRET, LINK.replace('1', '2'), key, NOW)).toBe(false)
    expect(isDoorKey(`${SECRET}!`, LINK, key, NOW)).toBe(false)
  })
  it('refuses a key whose time was changed, and what is no key at all', () => {
    const [until, sign] = makeDoorKey(SECRET, LINK, NOW).split('.')
    for (const forged of [`${Number(until) + 1}.${sign}`, `${until}.`, '.', 'x.y', '', `${until}.${sign}x`]) expect(isDoorKey(SECRET, LINK, forged, NOW)).toBe(false)
    expect(isDoorKey(SECRET, LINK, undefined, NOW)).toBe(false)
  })
  it('takes a postcode however it is typed, and never an empty one', () => {
    expect(samePostcode('zz1 1zz', 'ZZ11ZZ')).toBe(true)
    expect(samePostcode('ZZ1 1ZZ', 'ZZ1 1ZY')).toBe(false)
    expect(samePostcode(' ', '')).toBe(false)
  })
})

describe('links', () => {
  it('lead to the page of their purpose', () => {
    expect(linkAddress('https://jobs.example.org', 'pack', 'abc')).toBe('https://jobs.example.org/c/pack/abc')
  })
  it('are known by a hash alone', () => {
    expect(linkTokenHash('abc')).toMatch(/^[0-9a-f]{64}$/)
    expect(linkTokenHash('abc')).not.toBe(linkTokenHash('abd'))
  })
})

describe('a certificate’s number as people type it', () => {
  it('loses the letter of its revision', () => {
    expect(numberOf('wrn-2027-00042 a')).toBe('WRN-2027-00042')
    expect(numberOf('WRN-2027-00042')).toBe('WRN-2027-00042')
    expect(numberOf('  ')).toBeNull()
    expect(numberOf(undefined)).toBeNull()
  })
})
