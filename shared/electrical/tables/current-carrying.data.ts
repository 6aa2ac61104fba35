/** How much current each size of cable carries, by reference method. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const table4D5 = {
  id: '4D5',
  title: 'Flat cable with protective conductor (twin and earth), 70 C thermoplastic, copper: current-carrying capacity and voltage drop',
  source: {
    title: 'BS 7671:2018 Table 4D5; cells in seen_cells as printed on a trade page, a training blog and in forum threads',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
    more_urls: ['https://engx.theiet.org/f/wiring-and-regulations/24214/i-just-thought-of-something/103458'],
    seen_cells: {
      'two sources': { M100: [10] },
      'one source': { M100: [1, 1.5, 4, 16], M101: [1, 1.5, 10], M102: [1, 1.5], M103: [1, 1.5, 10], C: [1, 1.5, 2.5, 4, 6], A: [1, 1.5] },
    },
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', M100: 'A', M101: 'A', M102: 'A', M103: 'A', C: 'A', A: 'A', mV_per_A_m: 'mV/A/m (single-phase a.c.)' },
  notes: 'Seen in print: rows 1 and 1.5 mm2 in full; method 100 of 4, 10 and 16 mm2 (27, 45, 57); methods 101 and 103 of 10 mm2 (36, 32); column C of 2.5, 4 and 6 mm2. From memory: 2.5 mm2 methods 100 to 103 and A; 4 mm2 101 to 103 and A; 6 mm2 100 to 103 and A; 10 mm2 102, C and A; 16 mm2 101 to 103, C and A. mV/A/m equals the printed single-phase columns of 4D1B and 4D2B. A forum post says 4 mm2 gives at least 20 A by 100, 101, 102 and A, which fits. Method 100: above a plasterboard ceiling, insulation up to 100 mm; 101: insulation over 100 mm; 102: stud wall, insulated, cable touching the inner wall; 103: stud wall, not touching; C: clipped direct; A: conduit in an insulated wall. Ambient 30 C, conductor 70 C. cpc_mm2 is the usual cpc of this cable.',
  checked: 'power law I = a S^m (IEC 60364-5-52 Annex D) fits within 3.1 %',
  rows: [
    { size_mm2: 1, M100: 13, M101: 10.5, M102: 13, M103: 8, C: 16, A: 11.5, mV_per_A_m: 44, cpc_mm2: 1 },
    { size_mm2: 1.5, M100: 16, M101: 13, M102: 16, M103: 10, C: 20, A: 14.5, mV_per_A_m: 29, cpc_mm2: 1 },
    { size_mm2: 2.5, M100: 21, M101: 17, M102: 21, M103: 13.5, C: 27, A: 20, mV_per_A_m: 18, cpc_mm2: 1.5 },
    { size_mm2: 4, M100: 27, M101: 22, M102: 27, M103: 17.5, C: 37, A: 26, mV_per_A_m: 11, cpc_mm2: 1.5 },
    { size_mm2: 6, M100: 34, M101: 27, M102: 35, M103: 23.5, C: 47, A: 32, mV_per_A_m: 7.3, cpc_mm2: 2.5 },
    { size_mm2: 10, M100: 45, M101: 36, M102: 47, M103: 32, C: 64, A: 44, mV_per_A_m: 4.4, cpc_mm2: 4 },
    { size_mm2: 16, M100: 57, M101: 46, M102: 63, M103: 42.5, C: 85, A: 57, mV_per_A_m: 2.8, cpc_mm2: 6 },
  ],
} satisfies ReferenceTable

export const table4D1A = {
  id: '4D1A',
  title: 'Single-core 70 C thermoplastic non-armoured, copper: current-carrying capacity',
  source: {
    title: 'BS 7671 Table 4D1A, as reprinted in two cable-size documents',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: '_2 = two loaded cables single-phase a.c./d.c.; _3 = three or four cables three-phase. Second source prints 59 for 16 mm2 A_3; 56 is right (IEC 60364-5-52 and first source).',
  checked: 'power law I = a S^m (IEC 60364-5-52 Annex D) fits within 1.4 %',
  rows: [
    { size_mm2: 1.5, A_2: 14.5, A_3: 13.5, B_2: 17.5, B_3: 15.5, C_2: 20, C_3: 18 },
    { size_mm2: 2.5, A_2: 20, A_3: 18, B_2: 24, B_3: 21, C_2: 27, C_3: 25 },
    { size_mm2: 4, A_2: 26, A_3: 24, B_2: 32, B_3: 28, C_2: 37, C_3: 33 },
    { size_mm2: 6, A_2: 34, A_3: 31, B_2: 41, B_3: 36, C_2: 47, C_3: 43 },
    { size_mm2: 10, A_2: 46, A_3: 42, B_2: 57, B_3: 50, C_2: 65, C_3: 59 },
    { size_mm2: 16, A_2: 61, A_3: 56, B_2: 76, B_3: 68, C_2: 87, C_3: 79 },
    { size_mm2: 25, A_2: 80, A_3: 73, B_2: 101, B_3: 89, C_2: 114, C_3: 104 },
    { size_mm2: 35, A_2: 99, A_3: 89, B_2: 125, B_3: 110, C_2: 141, C_3: 129 },
  ],
} satisfies ReferenceTable

export const table4D2A = {
  id: '4D2A',
  title: 'Multicore 70 C thermoplastic (PVC) non-armoured, copper: current-carrying capacity',
  source: {
    title: 'BS 7671:2018 Table 4D2A; cells in seen_cells as printed in a Brazilian reprint of the IEC table (NBR 5410), a shower maker\'s installation manual and a compressor maker\'s instruction books (makers withheld)',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted); same figures as IEC 60364-5-52 tables B.52.2, B.52.4, B.52.10',
    seen_cells: {
      'two sources': { A_2: [6, 10, 16], B_2: [6, 10, 16], B_3: [1.5, 2.5, 4, 6, 10, 16] },
      'one source': { A_2: [1, 1.5, 2.5, 4, 25, 35], B_2: [1, 1.5, 2.5, 4, 25, 35], B_3: [25, 35], C_2: [6, 10, 16], C_3: [2.5, 4, 6, 10, 16, 25, 35] },
    },
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: 'A_2, B_2, B_3 and C_3 seen in print almost whole, C_2 for 6, 10 and 16 mm2; A_3, E_2, E_3 and the rest from memory. Differences: the Brazilian reprint has B_3 12 at 1 mm2 (its own rounding; 11.5 kept) and 81 and 96 at 25 and 35 mm2 (taken as misprints: the instruction books print 80 and 99); the instruction books round C_3 17.5 down to 17. A and B here are methods A2 and B2 of the IEC table.',
  checked: 'power law I = a S^m (IEC 60364-5-52 Annex D) fits within 2.0 %',
  rows: [
    { size_mm2: 1, A_2: 11, A_3: 10, B_2: 13, B_3: 11.5, C_2: 15, C_3: 13.5, E_2: 17, E_3: 14.5 },
    { size_mm2: 1.5, A_2: 14, A_3: 13, B_2: 16.5, B_3: 15, C_2: 19.5, C_3: 17.5, E_2: 22, E_3: 18.5 },
    { size_mm2: 2.5, A_2: 18.5, A_3: 17.5, B_2: 23, B_3: 20, C_2: 27, C_3: 24, E_2: 30, E_3: 25 },
    { size_mm2: 4, A_2: 25, A_3: 23, B_2: 30, B_3: 27, C_2: 36, C_3: 32, E_2: 40, E_3: 34 },
    { size_mm2: 6, A_2: 32, A_3: 29, B_2: 38, B_3: 34, C_2: 46, C_3: 41, E_2: 51, E_3: 43 },
    { size_mm2: 10, A_2: 43, A_3: 39, B_2: 52, B_3: 46, C_2: 63, C_3: 57, E_2: 70, E_3: 60 },
    { size_mm2: 16, A_2: 57, A_3: 52, B_2: 69, B_3: 62, C_2: 85, C_3: 76, E_2: 94, E_3: 80 },
    { size_mm2: 25, A_2: 75, A_3: 68, B_2: 90, B_3: 80, C_2: 112, C_3: 96, E_2: 119, E_3: 101 },
    { size_mm2: 35, A_2: 92, A_3: 83, B_2: 111, B_3: 99, C_2: 138, C_3: 119, E_2: 148, E_3: 126 },
  ],
} satisfies ReferenceTable

export const table4D4A = {
  id: '4D4A',
  title: 'Multicore armoured 70 C thermoplastic (PVC SWA), copper: current-carrying capacity',
  source: {
    title: 'BS 7671:2018 Table 4D4A',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted); method D column = IEC 60364-5-52 B.52.2/B.52.4 method D1, PVC',
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: 'Method D: ground 20 C, 2.5 K.m/W, 0.7-0.8 m. Use these for a 90 C cable whose terminations are limited to 70 C (Reg. 512.1.2 and table notes).',
  checked: 'power law I = a S^m (IEC 60364-5-52 Annex D) fits within 1.7 %',
  rows: [
    { size_mm2: 1.5, C_2: 21, C_3: 18, D_2: 22, D_3: 18, E_2: 22, E_3: 19 },
    { size_mm2: 2.5, C_2: 28, C_3: 25, D_2: 29, D_3: 24, E_2: 31, E_3: 26 },
    { size_mm2: 4, C_2: 38, C_3: 33, D_2: 37, D_3: 30, E_2: 41, E_3: 35 },
    { size_mm2: 6, C_2: 49, C_3: 42, D_2: 46, D_3: 38, E_2: 53, E_3: 45 },
    { size_mm2: 10, C_2: 67, C_3: 58, D_2: 60, D_3: 50, E_2: 72, E_3: 62 },
    { size_mm2: 16, C_2: 89, C_3: 77, D_2: 78, D_3: 64, E_2: 97, E_3: 83 },
    { size_mm2: 25, C_2: 118, C_3: 102, D_2: 99, D_3: 82, E_2: 128, E_3: 110 },
    { size_mm2: 35, C_2: 145, C_3: 125, D_2: 119, D_3: 98, E_2: 157, E_3: 135 },
  ],
} satisfies ReferenceTable

export const table4E4A = {
  id: '4E4A',
  title: 'Multicore armoured 90 C thermosetting (XLPE SWA), copper: current-carrying capacity',
  source: {
    title: 'BS 7671 Table 4E4A, as reprinted on a wholesaler\'s page and in a wholesaler\'s catalogue',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: '4 mm2 D_2: first source 43, second prints 46; 43 taken (equals IEC 60364-5-52 B.52.3 D1, and 46 breaks the run of ratios). A forum quote of 10 mm2 D_2 = 71 A agrees.',
  checked: 'power law I = a S^m (IEC 60364-5-52 Annex D) fits within 2.3 %',
  rows: [
    { size_mm2: 1.5, C_2: 27, C_3: 23, D_2: 25, D_3: 21, E_2: 29, E_3: 25 },
    { size_mm2: 2.5, C_2: 36, C_3: 31, D_2: 33, D_3: 28, E_2: 39, E_3: 33 },
    { size_mm2: 4, C_2: 49, C_3: 42, D_2: 43, D_3: 36, E_2: 52, E_3: 44 },
    { size_mm2: 6, C_2: 62, C_3: 53, D_2: 53, D_3: 44, E_2: 66, E_3: 56 },
    { size_mm2: 10, C_2: 85, C_3: 73, D_2: 71, D_3: 58, E_2: 90, E_3: 78 },
    { size_mm2: 16, C_2: 110, C_3: 94, D_2: 91, D_3: 75, E_2: 115, E_3: 99 },
    { size_mm2: 25, C_2: 146, C_3: 124, D_2: 116, D_3: 96, E_2: 152, E_3: 131 },
    { size_mm2: 35, C_2: 180, C_3: 154, D_2: 139, D_3: 115, E_2: 188, E_3: 162 },
  ],
} satisfies ReferenceTable

export const table4E2A = {
  id: '4E2A',
  title: 'Multicore 90 C thermosetting non-armoured, copper: current-carrying capacity',
  source: {
    title: 'BS 7671:2018 Table 4E2A',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted); same figures as IEC 60364-5-52 B.52.3, B.52.5, B.52.12',
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: '',
  checked: 'power law I = a S^m (IEC 60364-5-52 Annex D) fits within 3.3 %',
  rows: [
    { size_mm2: 1.5, A_2: 18.5, A_3: 16.5, B_2: 22, B_3: 19.5, C_2: 24, C_3: 22, E_2: 26, E_3: 23 },
    { size_mm2: 2.5, A_2: 25, A_3: 22, B_2: 30, B_3: 26, C_2: 33, C_3: 30, E_2: 36, E_3: 32 },
    { size_mm2: 4, A_2: 33, A_3: 30, B_2: 40, B_3: 35, C_2: 45, C_3: 40, E_2: 49, E_3: 42 },
    { size_mm2: 6, A_2: 42, A_3: 38, B_2: 51, B_3: 44, C_2: 58, C_3: 52, E_2: 63, E_3: 54 },
    { size_mm2: 10, A_2: 57, A_3: 51, B_2: 69, B_3: 60, C_2: 80, C_3: 71, E_2: 86, E_3: 75 },
    { size_mm2: 16, A_2: 76, A_3: 68, B_2: 91, B_3: 80, C_2: 107, C_3: 96, E_2: 115, E_3: 100 },
    { size_mm2: 25, A_2: 99, A_3: 89, B_2: 119, B_3: 105, C_2: 138, C_3: 119, E_2: 149, E_3: 127 },
    { size_mm2: 35, A_2: 121, A_3: 109, B_2: 146, B_3: 128, C_2: 171, C_3: 147, E_2: 185, E_3: 158 },
  ],
} satisfies ReferenceTable

export const table4F1A = {
  id: '4F1A',
  title: '60 C thermosetting flexible cable with sheath, non-armoured, copper: current-carrying capacity',
  source: {
    title: 'BS 7671 Table 4F1A, as reprinted on a cable distributor\'s page and in a cable maker\'s current-ratings booklet (17th edition)',
    edition: '17th/18th edition',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: 'Free air; also used for cable resting on a surface.',
  rows: [
    { size_mm2: 4, two_core_1ph: 30, multi_3ph: 26 },
    { size_mm2: 6, two_core_1ph: 39, multi_3ph: 34 },
    { size_mm2: 10, two_core_1ph: 51, multi_3ph: 47 },
    { size_mm2: 16, two_core_1ph: 73, multi_3ph: 63 },
    { size_mm2: 25, two_core_1ph: 97, multi_3ph: 83 },
    { size_mm2: 35, two_core_1ph: null, multi_3ph: 102 },
  ],
} satisfies ReferenceTable

export const table4F2A = {
  id: '4F2A',
  title: '90 C thermosetting flexible cable with sheath (e.g. H07RN-F type heat-resisting), copper: current-carrying capacity',
  source: {
    title: 'BS 7671 Table 4F2A, as reprinted on a cable distributor\'s page; cells in seen_cells also in a cable maker\'s current-ratings booklet (17th edition)',
    edition: '17th/18th edition',
    seen_cells: {
      'two sources': { two_core_1ph: [4, 6, 10, 16, 25], multi_3ph: [4] },
      'one source': { multi_3ph: [6, 10, 16, 25, 35] },
    },
  },
  confidence: 'one source',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: 'Drum factors: ventilated radial drum 0.85, unventilated 0.75; cylindrical drum 1/2/3/4 layers 0.85/0.65/0.45/0.35.',
  rows: [
    { size_mm2: 4, two_core_1ph: 42, multi_3ph: 37 },
    { size_mm2: 6, two_core_1ph: 55, multi_3ph: 49 },
    { size_mm2: 10, two_core_1ph: 76, multi_3ph: 66 },
    { size_mm2: 16, two_core_1ph: 103, multi_3ph: 89 },
    { size_mm2: 25, two_core_1ph: 136, multi_3ph: 119 },
    { size_mm2: 35, two_core_1ph: null, multi_3ph: 146 },
  ],
} satisfies ReferenceTable

export const table4F3A = {
  id: '4F3A',
  title: 'Flexible cords non-armoured, copper: current-carrying capacity',
  source: {
    title: 'BS 7671 Table 4F3A, as reprinted on a wholesaler\'s page',
    edition: '17th edition',
  },
  confidence: 'one source',
  units: { size_mm2: 'mm2', '*': 'A' },
  notes: '',
  rows: [
    { size_mm2: 0.5, one_phase: 3, three_phase: 3 },
    { size_mm2: 0.75, one_phase: 6, three_phase: 6 },
    { size_mm2: 1, one_phase: 10, three_phase: 10 },
    { size_mm2: 1.25, one_phase: 13, three_phase: null },
    { size_mm2: 1.5, one_phase: 16, three_phase: 16 },
    { size_mm2: 2.5, one_phase: 25, three_phase: 20 },
    { size_mm2: 4, one_phase: 32, three_phase: 25 },
  ],
} satisfies ReferenceTable
