/** The editions of the wiring regulations and the days on which a certificate may cite each. */
import type { RuleConfidence, RuleId } from './rule-types'

export interface WiringEdition {
  /** Written in full, as certificates cite it. */
  edition: string
  /** First day on which it may be cited. */
  from: string
  /** Last day on which it may be cited; null: the current one. */
  lastDay: string | null
  rule: RuleId | null
  confidence: RuleConfidence
}

/** Oldest first; where two may be cited, the later one is the one to prefer. */
export const WIRING_EDITIONS: readonly WiringEdition[] = [
  { edition: 'BS 7671:2018', from: '2018-07-02', lastDay: '2020-07-31', rule: null, confidence: 'from memory' },
  { edition: 'BS 7671:2018+A1:2020', from: '2020-02-03', lastDay: '2022-09-27', rule: 'TST-12', confidence: 'two sources' },
  { edition: 'BS 7671:2018+A2:2022', from: '2022-03-28', lastDay: '2024-07-30', rule: null, confidence: 'from memory' },
  // Withdrawn on 15 October 2026, so the day before is the last on which it may be cited.
  { edition: 'BS 7671:2018+A2:2022+A3:2024', from: '2024-07-31', lastDay: '2026-10-14', rule: 'EAR-28', confidence: 'two sources' },
  { edition: 'BS 7671:2018+A4:2026', from: '2026-04-15', lastDay: null, rule: 'EAR-28', confidence: 'two sources' },
]
