/** What each earthing method asks of the supply and of the charger, and what must be shown besides. */
import { because } from './rule'
import type { RuleId } from './rule-types'

interface MethodRule {
  rule: RuleId
  /** A sentence for each thing that does not suit; none where the method may be used. */
  suits(given: { phases: 1 | 3, chargerPhases: 1 | 3 }): string[]
  notes: readonly string[]
}

const always = () => []

export const METHOD_RULES: Record<'none' | 'i' | 'ii' | 'iii' | 'iv' | 'v' | 'TT', MethodRule> = {
  none: { rule: 'EAR-01', suits: always, notes: [] },
  i: {
    rule: 'EAR-02',
    suits: ({ phases }) => (phases === 3 ? [] : [because('EAR-02', 'Method i is for a three-phase installation with other loads, never for a single-phase home.')]),
    notes: [because('EAR-02', 'Show by calculation that an open PEN brings at most 70 V. Whether this method is still listed after A2:2022 is not verified.')],
  },
  ii: {
    rule: 'EAR-03',
    suits: always,
    notes: [because('EAR-03', 'Show by measurement that the electrode holds an open PEN to 70 V. At 60 A that is about 1.5 Ω, seldom reached.')],
  },
  iii: {
    rule: 'EAR-04',
    suits: always,
    notes: [because('EAR-04', 'The device disconnects live conductors and earth within 5 s above 70 V to Earth, and cannot be closed while it lasts.')],
  },
  iv: {
    rule: 'EAR-05',
    suits: ({ phases, chargerPhases }) => [
      ...(phases === 3 ? [because('EAR-05', 'A device that watches 207 V to 253 V is for single-phase supplies only, not for a charger in a three-phase installation.')] : []),
      ...(phases === 1 && chargerPhases === 3 ? [because('EAR-05', 'A device that watches 207 V to 253 V serves single-phase chargers only.')] : []),
    ],
    notes: [because('EAR-05', 'The device disconnects live conductors and earth within 5 s outside 207 V to 253 V, and does not close by itself onto the fault.')],
  },
  v: {
    rule: 'EAR-06',
    suits: always,
    notes: [because('EAR-06', 'Keep the evidence that the device is no less safe than methods iii and iv.')],
  },
  TT: {
    rule: 'EAR-10',
    suits: always,
    notes: [
      because('EAR-10', 'Keep at least 2.5 m above ground between metal on this electrode and metal on another earth, and the electrode apart from buried metal bonded to PME. The distance below ground is not verified.'),
      because('EAR-09', 'With 30 mA the electrode is at most 1667 Ω, and under 200 Ω to be stable.'),
    ],
  },
}
