/** An MPAN as typed, without the spaces and strokes people put in it. */
export const canonicalMpan = (typed: string) => typed.replace(/[\s\-/]/g, '')
