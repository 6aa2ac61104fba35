const LONGEST_SUBJECT = 150
const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', '\'': '&#39;' }

/** Text that can stand in HTML, in an element or in a quoted attribute. */
export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, sign => ENTITIES[sign] ?? sign)
}

/** A subject that is one line whatever a name holds: no control signs, no line ends (of any script), no changes of direction. */
export function oneLine(text: string): string {
  const line = text.replace(/[\p{Cc}\u2028\u2029\u200e\u200f\u202a-\u202e\u2066-\u2069]+/gu, ' ').replace(/ {2,}/g, ' ').trim()
  const signs = [...line]
  return signs.length > LONGEST_SUBJECT ? `${signs.slice(0, LONGEST_SUBJECT - 1).join('')}…` : line
}

/** An address of our own pages, made by our own code: anything but http(s) is a mistake of the caller. */
export function ownAddress(address: string): string {
  const url = new URL(address)
  if (url.protocol !== 'https:' && url.protocol !== 'http:') throw new TypeError('A message links to a page, nothing else')
  return url.href
}
