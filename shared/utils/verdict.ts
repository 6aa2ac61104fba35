/** One vocabulary of verdicts, computed once and shown alike on page, paper and e-mail. */
export const VERDICTS = ['within', 'outside', 'waiting', 'unexpected', 'limited', 'not-applicable', 'not-entered'] as const
export type Verdict = (typeof VERDICTS)[number]

/** The words people see for each verdict. */
export const VERDICT_WORDS: Record<Verdict, string> = {
  'within': 'Within limit',
  'outside': 'Outside limit',
  'waiting': 'Cannot tell yet',
  'unexpected': 'Unexpected',
  'limited': 'LIM',
  'not-applicable': 'N/A',
  'not-entered': 'Not entered',
}
