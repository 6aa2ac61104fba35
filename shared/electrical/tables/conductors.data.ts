/** What conductors and armour resist, and how that changes with temperature. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const table60228 = {
  id: '60228',
  title: 'Maximum d.c. conductor resistance at 20 C, plain copper',
  source: {
    title: 'IEC 60228 / BS EN 60228, as reprinted on two cable makers\' pages and in the guide of I1',
    edition: 'IEC 60228 / BS EN 60228 (formerly BS 6360)',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', class1_2: 'milliohm/m', class5_6: 'milliohm/m' },
  notes: '',
  rows: [
    { size_mm2: 0.5, class1_2: 36, class5_6: 39 },
    { size_mm2: 0.75, class1_2: 24.5, class5_6: 26 },
    { size_mm2: 1, class1_2: 18.1, class5_6: 19.5 },
    { size_mm2: 1.5, class1_2: 12.1, class5_6: 13.3 },
    { size_mm2: 2.5, class1_2: 7.41, class5_6: 7.98 },
    { size_mm2: 4, class1_2: 4.61, class5_6: 4.95 },
    { size_mm2: 6, class1_2: 3.08, class5_6: 3.3 },
    { size_mm2: 10, class1_2: 1.83, class5_6: 1.91 },
    { size_mm2: 16, class1_2: 1.15, class5_6: 1.21 },
    { size_mm2: 25, class1_2: 0.727, class5_6: 0.78 },
    { size_mm2: 35, class1_2: 0.524, class5_6: 0.554 },
    { size_mm2: 50, class1_2: 0.387, class5_6: 0.386 },
  ],
} satisfies ReferenceTable

export const tableI1 = {
  id: 'I1',
  title: 'R1 and R1+R2 per metre at 20 C, copper (On-Site Guide Table I1 form)',
  source: {
    title: 'Guide to the Wiring Regulations: 17th Edition (Wiley 2008, ISBN 978-0-470-51685-0), Appendix 4 table 4.3; sums of IEC 60228',
    edition: 'On-Site Guide Appendix I; sums of IEC 60228 values',
  },
  confidence: 'two sources',
  units: { line_mm2: 'mm2', cpc_mm2: 'mm2', R1_R2: 'milliohm/m' },
  notes: 'Sums R1 + R2; the handbook\'s printed values (30.2, 19.51, 16.71, 10.49, 6.44, 4.23, 24.2, 14.82, 9.22, 6.16, 3.66, 2.30, 1.454, 1.048) all agree.',
  rows: [
    { line_mm2: 1, cpc_mm2: null, R1_R2: 18.1 },
    { line_mm2: 1, cpc_mm2: 1, R1_R2: 36.2 },
    { line_mm2: 1.5, cpc_mm2: null, R1_R2: 12.1 },
    { line_mm2: 1.5, cpc_mm2: 1, R1_R2: 30.2 },
    { line_mm2: 1.5, cpc_mm2: 1.5, R1_R2: 24.2 },
    { line_mm2: 2.5, cpc_mm2: null, R1_R2: 7.41 },
    { line_mm2: 2.5, cpc_mm2: 1, R1_R2: 25.51 },
    { line_mm2: 2.5, cpc_mm2: 1.5, R1_R2: 19.51 },
    { line_mm2: 2.5, cpc_mm2: 2.5, R1_R2: 14.82 },
    { line_mm2: 4, cpc_mm2: null, R1_R2: 4.61 },
    { line_mm2: 4, cpc_mm2: 1.5, R1_R2: 16.71 },
    { line_mm2: 4, cpc_mm2: 2.5, R1_R2: 12.02 },
    { line_mm2: 4, cpc_mm2: 4, R1_R2: 9.22 },
    { line_mm2: 6, cpc_mm2: null, R1_R2: 3.08 },
    { line_mm2: 6, cpc_mm2: 2.5, R1_R2: 10.49 },
    { line_mm2: 6, cpc_mm2: 4, R1_R2: 7.69 },
    { line_mm2: 6, cpc_mm2: 6, R1_R2: 6.16 },
    { line_mm2: 10, cpc_mm2: null, R1_R2: 1.83 },
    { line_mm2: 10, cpc_mm2: 4, R1_R2: 6.44 },
    { line_mm2: 10, cpc_mm2: 6, R1_R2: 4.91 },
    { line_mm2: 10, cpc_mm2: 10, R1_R2: 3.66 },
    { line_mm2: 16, cpc_mm2: null, R1_R2: 1.15 },
    { line_mm2: 16, cpc_mm2: 6, R1_R2: 4.23 },
    { line_mm2: 16, cpc_mm2: 10, R1_R2: 2.98 },
    { line_mm2: 16, cpc_mm2: 16, R1_R2: 2.3 },
    { line_mm2: 25, cpc_mm2: null, R1_R2: 0.727 },
    { line_mm2: 25, cpc_mm2: 10, R1_R2: 2.557 },
    { line_mm2: 25, cpc_mm2: 16, R1_R2: 1.877 },
    { line_mm2: 25, cpc_mm2: 25, R1_R2: 1.454 },
    { line_mm2: 35, cpc_mm2: null, R1_R2: 0.524 },
    { line_mm2: 35, cpc_mm2: 16, R1_R2: 1.674 },
    { line_mm2: 35, cpc_mm2: 25, R1_R2: 1.251 },
    { line_mm2: 35, cpc_mm2: 35, R1_R2: 1.048 },
  ],
} satisfies ReferenceTable

export const tableI2 = {
  id: 'I2',
  title: 'Multiplier from 20 C to ambient during a test',
  source: {
    title: 'On-Site Guide Table I2',
    edition: 'On-Site Guide Table I2',
  },
  confidence: 'from memory',
  units: { ambient_C: 'C', factor: '' },
  notes: 'factor = 1 + 0.004 (ta - 20); checked by that formula.',
  rows: [
    { ambient_C: 5, factor: 0.94 },
    { ambient_C: 10, factor: 0.96 },
    { ambient_C: 15, factor: 0.98 },
    { ambient_C: 20, factor: 1 },
    { ambient_C: 25, factor: 1.02 },
  ],
} satisfies ReferenceTable

export const tableI3 = {
  id: 'I3',
  title: 'Multiplier from 20 C to conductor operating temperature',
  source: {
    title: 'On-Site Guide Table I3; the 1.20 as quoted in a trade forum',
    edition: 'On-Site Guide Table I3',
  },
  confidence: 'from memory',
  units: { insulation: '', bunched_or_in_cable: 'factor', not_bunched: 'factor' },
  notes: '1 + 0.004 (tmax - 20): 70 C 1.20, 85 C 1.26, 90 C 1.28; not bunched assumes 30 C, 1.04. The 1.20 is quoted in several trade answers; the rest rests on the formula and memory. For line and cpc alike where the cpc is in the same cable.',
  rows: [
    { insulation: '70 C thermoplastic', bunched_or_in_cable: 1.2, not_bunched: 1.04 },
    { insulation: '85 C rubber', bunched_or_in_cable: 1.26, not_bunched: 1.04 },
    { insulation: '90 C thermosetting', bunched_or_in_cable: 1.28, not_bunched: 1.04 },
  ],
} satisfies ReferenceTable

export const tableAlpha = {
  id: 'alpha',
  title: 'Temperature coefficient of resistance at 20 C',
  source: {
    title: 'On-Site Guide; Guidance Note 3',
    edition: 'On-Site Guide / Guidance Note 3',
  },
  confidence: 'from memory',
  units: { alpha: 'per C' },
  notes: '0.004/C is the rounded figure the guides use (physics value for copper 0.00393). Steel armour is commonly taken as 0.0045/C.',
  rows: [
    { material: 'copper and aluminium', alpha: 0.004 },
  ],
} satisfies ReferenceTable

export const tableSwa_armour = {
  id: 'swa-armour',
  title: 'Steel wire armour: maximum resistance at 20 C of XLPE SWA cable, copper conductors',
  source: {
    title: 'Guide to the Wiring Regulations: 17th Edition (Wiley 2008, ISBN 978-0-470-51685-0), Appendix 4 table 4.4',
    edition: 'Guide to the Wiring Regulations (Wiley 2008, ISBN 978-0-470-51685-0), Appendix 4 table 4.4',
  },
  confidence: 'one source',
  units: { size_mm2: 'mm2', '*': 'milliohm/m' },
  notes: 'To 6 mm2 only; 10 mm2 and above not obtained.',
  rows: [
    { size_mm2: 1.5, core2: 10.2, core3: 9.5, core4: 8.8, core5: 8.2 },
    { size_mm2: 2.5, core2: 8.8, core3: 8.2, core4: 7.7, core5: 6.8 },
    { size_mm2: 4, core2: 7.9, core3: 7.5, core4: 6.8, core5: 6.2 },
    { size_mm2: 6, core2: 7, core3: 6.7, core4: 4.3, core5: 3.9 },
  ],
} satisfies ReferenceTable

export const tableSwa_area = {
  id: 'swa-area',
  title: 'Steel wire armour gross cross-sectional area, XLPE SWA to BS 5467',
  source: {
    title: 'BS 5467 cable data sheet (two-core column); Guidance Note 1 Table D10 and BS 5467, two figures as quoted in trade forum threads',
    edition: 'BS 5467 / Guidance Note 1 table D10 form',
    seen_cells: {
      'two sources': { core2: [10] },
      'one source': { core2: [1.5, 2.5, 4, 6, 16, 25, 35], core4: [2.5] },
    },
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', '*': 'mm2' },
  notes: 'Two-core column printed in a data sheet; 16 mm2 corrected here from 41 to 42 (the sheet\'s 42; a forum\'s copper equivalent of 13.5 mm2 is 42 x 46/143). 10 mm2 two-core = 26 mm2 and 2.5 mm2 four-core = 20 mm2 are each quoted in a forum thread; the same forum\'s 13.5 mm2 for 10 mm2 four-core fits 42, its 16.0 mm2 for 16 mm2 four-core fits 49 or 50. Another thread quotes 46 mm2 for 16 mm2 two-core (PVC type). Three- and four-core figures from memory: use maker\'s data.',
  rows: [
    { size_mm2: 1.5, core2: 15, core3: 16, core4: 17 },
    { size_mm2: 2.5, core2: 17, core3: 19, core4: 20 },
    { size_mm2: 4, core2: 19, core3: 20, core4: 22 },
    { size_mm2: 6, core2: 22, core3: 23, core4: 36 },
    { size_mm2: 10, core2: 26, core3: 39, core4: 42 },
    { size_mm2: 16, core2: 42, core3: 44, core4: 49 },
    { size_mm2: 25, core2: 42, core3: 62, core4: 70 },
    { size_mm2: 35, core2: 60, core3: 68, core4: 78 },
  ],
} satisfies ReferenceTable
