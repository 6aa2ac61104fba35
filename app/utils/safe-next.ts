/**
 * Where to go after signing in: a path of our own pages, or the first page. Whatever a link says, nobody is sent to
 * another site by it.
 */
export function safeNext(next: unknown): string {
  if (typeof next !== 'string' || !next.startsWith('/') || next.startsWith('//') || [...next].some(sign => sign < ' ' || sign === '\\')) return '/'
  const here = 'https://here.invalid'
  const url = URL.canParse(next, here) ? new URL(next, here) : null
  // Dots in the path are resolved by now, and must not have left two strokes at its start.
  return url?.origin === here && !url.pathname.startsWith('//') ? url.pathname + url.search + url.hash : '/'
}
