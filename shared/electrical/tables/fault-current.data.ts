/** What devices let through, and the fault currents of dwellings. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const tableI2t_class3 = {
  id: 'I2t-class3',
  title: 'Maximum let-through energy, circuit-breakers of energy limiting class',
  source: {
    title: 'BS EN 60898-1 Annex ZA, as quoted in a trade forum thread (10 kA rows)',
    edition: 'BS EN 60898-1 Annex ZA',
  },
  confidence: 'from memory',
  units: { I2t: 'A2 s' },
  notes: 'Only the 10 kA pairs of class 2 (240 000 / 290 000) and class 3 (70 000 / 84 000) are in the source; the rest, and the 120 % rule for 40 A, from memory. For faults cleared in under 0.1 s: k^2 S^2 >= I2t. k^2 S^2 at k 115: 1.0 mm2 13 225; 1.5 mm2 29 756; 2.5 mm2 82 656; 4 mm2 211 600.',
  rows: [
    { cls: 3, In: '<=16 A', Icn_A: 3000, B: 15000, C: 18000 },
    { cls: 3, In: '<=16 A', Icn_A: 4500, B: 25000, C: 30000 },
    { cls: 3, In: '<=16 A', Icn_A: 6000, B: 35000, C: 42000 },
    { cls: 3, In: '<=16 A', Icn_A: 10000, B: 70000, C: 84000 },
    { cls: 3, In: '>16 to 32 A', Icn_A: 3000, B: 18000, C: 22000 },
    { cls: 3, In: '>16 to 32 A', Icn_A: 4500, B: 32000, C: 39000 },
    { cls: 3, In: '>16 to 32 A', Icn_A: 6000, B: 45000, C: 55000 },
    { cls: 3, In: '>16 to 32 A', Icn_A: 10000, B: 90000, C: 110000 },
    { cls: 3, In: '40 A', Icn_A: 3000, B: 21600, C: 26400 },
    { cls: 3, In: '40 A', Icn_A: 4500, B: 38400, C: 46800 },
    { cls: 3, In: '40 A', Icn_A: 6000, B: 54000, C: 66000 },
    { cls: 3, In: '40 A', Icn_A: 10000, B: 108000, C: 132000 },
    { cls: 2, In: '<=16 A', Icn_A: 10000, B: 240000, C: 290000 },
  ],
} satisfies ReferenceTable

export const tablePFC = {
  id: 'PFC',
  title: 'Prospective fault current in dwellings',
  source: {
    title: 'BS 7671:2018 536.4.201 and Appendix 14, ENA P25 and BS EN 61439-3, as told by a trade information site and a trade-association bulletin',
    edition: 'BS 7671 536.4.201, Appendix 14; ENA P25; BS EN 61439-3 Annex ZB',
  },
  confidence: 'two sources',
  units: { '*': 'kA' },
  notes: '',
  rows: [
    { fact: 'maximum design value at the connection of the service to the main, single-phase supply up to 100 A', kA: 19.6, source: 'ENA P25' },
    { fact: 'taken at the consumer unit where the service is at least 2 m', kA: 16, source: '536.4.201; trade-association bulletin' },
    { fact: 'consumer unit conditional rating (with 100 A service fuse, all parts as the maker specifies)', kA: 16, source: 'BS EN 61439-3 Annex ZB' },
    { fact: 'outgoing devices inside such a consumer unit may be rated', kA: 6, source: '536.4.201' },
    { fact: 'no need to measure or calculate PFC at the origin of a dwelling if the distributor declares 16 kA and the unit is to BS EN 61439-3', kA: null, source: 'Appendix 14' },
    { fact: 'BS 1361 type I / II breaking capacity', kA: '16.5 / 33', source: 'handbook table' },
    { fact: 'Ipf = U0/Ze (line-neutral or line-earth, the greater); three-phase bolted roughly 2 x the line-neutral value (guide rule)', kA: null, source: 'Guidance Note 3, from memory' },
  ],
} satisfies ReferenceTable
