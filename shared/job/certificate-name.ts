/** What a certificate is called: its number and the letters of its revision, A for the first issue. */

/** @example 0 -> 'A', 1 -> 'B', 26 -> 'AA' */
export function revisionLetters(revision: number): string {
  const last = String.fromCharCode(65 + revision % 26)
  return revision < 26 ? last : revisionLetters(Math.floor(revision / 26) - 1) + last
}

/** @example { number: 'Q-2027-00042', revision: 0 } -> 'Q-2027-00042 A' */
export const certificateName = ({ number, revision }: { number: string, revision: number }): string => `${number} ${revisionLetters(revision)}`
