/** What a British postcode, telephone number and supply number look like in running text. */

/**
 * A postcode by its published formats: A9, A99, AA9, AA99, A9A or AA9A before the space, 9AA after it; with the letters
 * each place allows.
 *
 * @source BS 7666 formats as in the Department for Education's and Royal Mail's guides: first letter not Q, V, X; second
 *   not I, J, Z; third (A9A) from ABCDEFGHJKPSTUW; fourth (AA9A) from ABEHMNPRVWXY; last two not C, I, K, M, O, V
 */
const OUTWARD = '(?:[A-PR-UWYZ](?:[0-9]{1,2}|[A-HK-Y][0-9]{1,2}|[0-9][A-HJKPSTUW]|[A-HK-Y][0-9][ABEHMNPRVWXY])|GIR)'
const INWARD = '[0-9][ABD-HJLNP-UW-Z]{2}'
export const POSTCODE_IN_TEXT = new RegExp(`(?<![A-Za-z0-9])(${OUTWARD})[ \\t]{0,2}(${INWARD})(?![A-Za-z0-9])`, 'gi')

/** "s118tz" -> "S11 8TZ"; null where it is no postcode. */
export function readPostcode(typed: string): string | null {
  const parts = new RegExp(`^(${OUTWARD})(${INWARD})$`, 'i').exec(typed.replace(/\s/g, ''))
  return parts ? `${parts[1]} ${parts[2]}`.toUpperCase() : null
}

/** The part before the space: what a crew calls the district. */
export const districtOf = (postcode: string): string => postcode.trim().toUpperCase().split(' ')[0] ?? ''

export const PHONE_IN_TEXT = /(?<![\d+])(?:\+44[ \t]?(?:\(0\))?|0044[ \t]?|\(?0)[\d \t().-]{7,16}\d(?!\d)/g

/**
 * A telephone number as people write it in this country, or null where its digits cannot be one.
 *
 * @source Ofcom, National Telephone Numbering Plan: 02, 03, 055, 056, 07 and 09 with ten digits after the 0, 01 and 08 with nine or ten
 */
export function readPhone(typed: string): string | null {
  const digits = typed.replace(/\(0\)/, '').replace(/\D/g, '').replace(/^(?:0044|44)/, '0')
  if (!/^0(?:[1238]\d{8,9}|5[56]\d{8}|7\d{9}|9\d{9})$/.test(digits) || (/^0[23]/.test(digits) && digits.length !== 11)) return null
  if (digits.startsWith('02')) return `${digits.slice(0, 3)} ${digits.slice(3, 7)} ${digits.slice(7)}`
  if (/^0(?:3|8)/.test(digits) || /^01(?:1\d|\d1)/.test(digits)) return `${digits.slice(0, 4)} ${digits.slice(4, 7)} ${digits.slice(7)}`
  return `${digits.slice(0, 5)} ${digits.slice(5)}`
}

/** 13 digits, or 21 with the upper line, in whatever groups the meter label or a bill prints them. */
export const MPAN_IN_TEXT = /(?:\b(?:mpan|supply(?: number)?|s number)\b[ \t]*(?:is|no\.?|:)?[ \t]*:?[ \t]*)?(?<![\d+])((?:\d[ \t-]?){20}\d|(?:\d[ \t-]?){12}\d)(?!\d)/gi

export const EMAIL_IN_TEXT = /(?:mailto:)?([^\s<>()[\],;:"@]+@[^\s<>()[\],;:"@]+\.[a-z]{2,})/gi

/** Postcode areas that lie in one nation as a whole; the areas that straddle a border are left to the person. */
const AREA_NATIONS: Record<string, 'Scotland' | 'Wales' | 'Northern Ireland'> = {
  AB: 'Scotland', DD: 'Scotland', EH: 'Scotland', FK: 'Scotland', G: 'Scotland', HS: 'Scotland', IV: 'Scotland', KA: 'Scotland', KW: 'Scotland', KY: 'Scotland', ML: 'Scotland', PA: 'Scotland', PH: 'Scotland', ZE: 'Scotland',
  CF: 'Wales', SA: 'Wales', BT: 'Northern Ireland',
}
const BORDER_AREAS = new Set(['CA', 'CH', 'DG', 'GL', 'HR', 'LD', 'LL', 'NE', 'NP', 'SY', 'TD'])

/** The nation a postcode lies in; null where its area straddles a border. */
export function nationOf(postcode: string): 'England' | 'Scotland' | 'Wales' | 'Northern Ireland' | null {
  const area = /^[A-Z]{1,2}/.exec(postcode.toUpperCase())?.[0] ?? ''
  return !area || BORDER_AREAS.has(area) ? null : AREA_NATIONS[area] ?? 'England'
}
