/** What surroundings take off a cable's rating. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const table4B1 = {
  id: '4B1',
  title: 'Ambient air temperature factor Ca (reference 30 C)',
  source: {
    title: 'BS 7671 Table 4B1, as reprinted in three course and summary documents',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'two sources',
  units: { ambient_C: 'C', '*': 'factor' },
  notes: 'Formula: sqrt((tmax-ta)/(tmax-30)). c60 = 60 C rubber flexible; c70 = 70 C thermoplastic; c90 = 90 C thermosetting. Sources also print a 0.35 at 65 C for 70 C PVC which BS 7671:2018 does not tabulate.',
  checked: 'formula within 0.0065 from 30 C upward; at 25 C the standard prints LESS than the formula (1.03 for 1.06; 1.02 for 1.04)',
  rows: [
    { ambient_C: 25, c60: 1.04, c70: 1.03, c90: 1.02 },
    { ambient_C: 30, c60: 1, c70: 1, c90: 1 },
    { ambient_C: 35, c60: 0.91, c70: 0.94, c90: 0.96 },
    { ambient_C: 40, c60: 0.82, c70: 0.87, c90: 0.91 },
    { ambient_C: 45, c60: 0.71, c70: 0.79, c90: 0.87 },
    { ambient_C: 50, c60: 0.58, c70: 0.71, c90: 0.82 },
    { ambient_C: 55, c60: 0.41, c70: 0.61, c90: 0.76 },
    { ambient_C: 60, c60: null, c70: 0.5, c90: 0.71 },
    { ambient_C: 65, c60: null, c70: null, c90: 0.65 },
    { ambient_C: 70, c60: null, c70: null, c90: 0.58 },
    { ambient_C: 75, c60: null, c70: null, c90: 0.5 },
    { ambient_C: 80, c60: null, c70: null, c90: 0.41 },
    { ambient_C: 85, c60: null, c70: null, c90: 0.29 },
  ],
} satisfies ReferenceTable

export const table4B1_BS3036 = {
  id: '4B1-BS3036',
  title: 'Older editions only: ambient factor where overload device is a BS 3036 fuse',
  source: {
    title: '16th edition Table 4C2, as reprinted in two summary documents',
    edition: '16th edition table 4C2',
  },
  confidence: 'two sources',
  units: { ambient_C: 'C', '*': 'factor' },
  notes: 'History: needed only to reproduce old worked examples. 18th edition uses 4B1 for all devices together with Cf = 0.725.',
  rows: [
    { ambient_C: 25, c70: 1.03, c90: 1.02 },
    { ambient_C: 30, c70: 1, c90: 1 },
    { ambient_C: 35, c70: 0.97, c90: 0.98 },
    { ambient_C: 40, c70: 0.94, c90: 0.95 },
    { ambient_C: 45, c70: 0.91, c90: 0.93 },
    { ambient_C: 50, c70: 0.87, c90: 0.91 },
    { ambient_C: 55, c70: 0.84, c90: 0.89 },
    { ambient_C: 60, c70: 0.69, c90: 0.87 },
  ],
} satisfies ReferenceTable

export const table4B2 = {
  id: '4B2',
  title: 'Ground temperature factor Ca for method D (reference 20 C)',
  source: {
    title: 'BS 7671:2018 Table 4B2; IEC 60364-5-52 Table B.52.15, as reprinted in a Brazilian course handout and (70 C column) a cable maker\'s handout',
    edition: 'BS 7671; IEC 60364-5-52 B.52.15',
    seen_cells: {
      'two sources': { c70: [10, 15, 25, 30, 35, 40, 45, 50, 55, 60] },
      'one source': { c90: [10, 15, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70, 75, 80] },
    },
  },
  confidence: 'one source',
  units: { ground_C: 'C', '*': 'factor' },
  notes: 'Every value agrees with the reprints (the Brazilian standard NBR 5410 carries the IEC table) and with the formula sqrt((tmax-tg)/(tmax-20)).',
  checked: 'formula within 0.0065 on every row',
  rows: [
    { ground_C: 10, c70: 1.1, c90: 1.07 },
    { ground_C: 15, c70: 1.05, c90: 1.04 },
    { ground_C: 20, c70: 1, c90: 1 },
    { ground_C: 25, c70: 0.95, c90: 0.96 },
    { ground_C: 30, c70: 0.89, c90: 0.93 },
    { ground_C: 35, c70: 0.84, c90: 0.89 },
    { ground_C: 40, c70: 0.77, c90: 0.85 },
    { ground_C: 45, c70: 0.71, c90: 0.8 },
    { ground_C: 50, c70: 0.63, c90: 0.76 },
    { ground_C: 55, c70: 0.55, c90: 0.71 },
    { ground_C: 60, c70: 0.45, c90: 0.65 },
    { ground_C: 65, c70: null, c90: 0.6 },
    { ground_C: 70, c70: null, c90: 0.53 },
    { ground_C: 75, c70: null, c90: 0.46 },
    { ground_C: 80, c70: null, c90: 0.38 },
  ],
} satisfies ReferenceTable

export const table4B3 = {
  id: '4B3',
  title: 'Soil thermal resistivity factor Cs (reference 2.5 K.m/W)',
  source: {
    title: 'BS 7671:2018 Table 4B3; IEC 60364-5-52 Table B.52.16',
    edition: 'BS 7671 4B3; IEC 60364-5-52 B.52.16',
    more_urls: ['https://engx.theiet.org/f/wiring-and-regulations/32293/soil-thermal-resistivity-and-ambient-temperature/157578'],
  },
  confidence: 'from memory',
  units: { rho_Km_per_W: 'K.m/W', '*': 'factor' },
  notes: 'BS 7671 heads the second row 0.8 where IEC heads it 0.7 (both from memory); the factors are the same. No print of the factors found. An institution\'s forum confirms the 2.5 K.m/W and 20 C reference and says 1.2 K.m/W may be taken in the UK away from buildings where nothing was measured.',
  rows: [
    { rho_Km_per_W: 0.5, ducts: 1.28, direct: 1.88 },
    { rho_Km_per_W: 0.7, ducts: 1.2, direct: 1.62 },
    { rho_Km_per_W: 1, ducts: 1.18, direct: 1.5 },
    { rho_Km_per_W: 1.5, ducts: 1.1, direct: 1.28 },
    { rho_Km_per_W: 2, ducts: 1.05, direct: 1.12 },
    { rho_Km_per_W: 2.5, ducts: 1, direct: 1 },
    { rho_Km_per_W: 3, ducts: 0.96, direct: 0.9 },
  ],
} satisfies ReferenceTable

export const table4B4 = {
  id: '4B4',
  title: 'Depth of laying factor Cd (reference 0.7 m)',
  source: {
    title: 'BS 7671:2018 Table 4B4',
    edition: 'BS 7671:2018 table 4B4',
  },
  confidence: 'from memory',
  units: { depth_m: 'm', '*': 'factor' },
  notes: 'LOW CONFIDENCE: treat depth other than 0.7 m as \'designer enters factor\' until checked against the printed standard.',
  rows: [
    { depth_m: 0.5, direct: 1.04, ducts: 1.03 },
    { depth_m: 0.6, direct: 1.02, ducts: 1.02 },
    { depth_m: 0.7, direct: 1, ducts: 1 },
    { depth_m: 0.8, direct: 0.99, ducts: 0.99 },
    { depth_m: 1, direct: 0.97, ducts: 0.98 },
    { depth_m: 1.25, direct: 0.95, ducts: 0.96 },
    { depth_m: 1.5, direct: 0.94, ducts: 0.95 },
  ],
} satisfies ReferenceTable

export const table4C1 = {
  id: '4C1',
  title: 'Grouping factor Cg for methods A to F',
  source: {
    title: 'BS 7671 Table 4C1, as reprinted in Guide to the Wiring Regulations: 17th Edition (Wiley 2008, ISBN 978-0-470-51685-0) and in a summary document',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'two sources',
  units: { circuits: 'number', '*': 'factor' },
  notes: 'Equally loaded cables, touching. Clear spacing over 2 cable diameters: no factor. Circuits carrying not more than 30 % of their grouped rating may be left out. The second source covers bunched and wall columns to nine circuits.',
  rows: [
    { circuits: 1, bunched: 1, single_layer_wall: 1, perforated_tray: 1, ladder: 1 },
    { circuits: 2, bunched: 0.8, single_layer_wall: 0.85, perforated_tray: 0.88, ladder: 0.87 },
    { circuits: 3, bunched: 0.7, single_layer_wall: 0.79, perforated_tray: 0.82, ladder: 0.82 },
    { circuits: 4, bunched: 0.65, single_layer_wall: 0.75, perforated_tray: 0.77, ladder: 0.8 },
    { circuits: 5, bunched: 0.6, single_layer_wall: 0.73, perforated_tray: 0.75, ladder: 0.8 },
    { circuits: 6, bunched: 0.57, single_layer_wall: 0.72, perforated_tray: 0.73, ladder: 0.79 },
    { circuits: 7, bunched: 0.54, single_layer_wall: 0.72, perforated_tray: 0.73, ladder: 0.79 },
    { circuits: 8, bunched: 0.52, single_layer_wall: 0.71, perforated_tray: 0.72, ladder: 0.78 },
    { circuits: 9, bunched: 0.5, single_layer_wall: 0.7, perforated_tray: 0.72, ladder: 0.78 },
    { circuits: 12, bunched: 0.45, single_layer_wall: 0.7, perforated_tray: 0.72, ladder: 0.78 },
    { circuits: 16, bunched: 0.41, single_layer_wall: 0.7, perforated_tray: 0.72, ladder: 0.78 },
    { circuits: 20, bunched: 0.38, single_layer_wall: 0.7, perforated_tray: 0.72, ladder: 0.78 },
  ],
} satisfies ReferenceTable

export const table4C2 = {
  id: '4C2',
  title: 'Grouping, cables direct buried (method D), multicore, clearance',
  source: {
    title: 'BS 7671:2018 Table 4C2; IEC 60364-5-52 Table B.52.18',
    edition: 'BS 7671 4C2; IEC 60364-5-52 B.52.18',
    more_urls: ['https://engx.theiet.org/f/wiring-and-regulations/23009/cables-buried-directly---grouping-factor-and-spacing/87703'],
    seen_cells: {
      'one source': { m0_5: [4, 5, 6] },
    },
  },
  confidence: 'from memory',
  units: { circuits: 'number', '*': 'factor' },
  notes: 'A forum question quotes 0.8 at 0.5 m for four or more circuits; the rest from memory.',
  rows: [
    { circuits: 2, touching: 0.75, one_diameter: 0.8, m0_125: 0.85, m0_25: 0.9, m0_5: 0.9 },
    { circuits: 3, touching: 0.65, one_diameter: 0.7, m0_125: 0.75, m0_25: 0.8, m0_5: 0.85 },
    { circuits: 4, touching: 0.6, one_diameter: 0.6, m0_125: 0.7, m0_25: 0.75, m0_5: 0.8 },
    { circuits: 5, touching: 0.55, one_diameter: 0.55, m0_125: 0.65, m0_25: 0.7, m0_5: 0.8 },
    { circuits: 6, touching: 0.5, one_diameter: 0.55, m0_125: 0.6, m0_25: 0.7, m0_5: 0.8 },
  ],
} satisfies ReferenceTable

export const table4C3 = {
  id: '4C3',
  title: 'Grouping, cables in separate ducts in ground, multicore',
  source: {
    title: 'BS 7671:2018 Table 4C3; IEC 60364-5-52 Table B.52.19',
    edition: 'BS 7671 4C3; IEC 60364-5-52 B.52.19',
    more_urls: ['https://engx.theiet.org/f/wiring-and-regulations/29961/grouping-factors/137033'],
    seen_cells: {
      'one source': { touching: [6] },
    },
  },
  confidence: 'from memory',
  units: { circuits: 'number', '*': 'factor' },
  notes: 'A forum question quotes 0.60 for six ducts touching; the rest from memory.',
  rows: [
    { circuits: 2, touching: 0.85, m0_25: 0.9, m0_5: 0.95, m1_0: 0.95 },
    { circuits: 3, touching: 0.75, m0_25: 0.85, m0_5: 0.9, m1_0: 0.95 },
    { circuits: 4, touching: 0.7, m0_25: 0.8, m0_5: 0.85, m1_0: 0.9 },
    { circuits: 5, touching: 0.65, m0_25: 0.8, m0_5: 0.85, m1_0: 0.9 },
    { circuits: 6, touching: 0.6, m0_25: 0.8, m0_5: 0.8, m1_0: 0.9 },
  ],
} satisfies ReferenceTable

export const table52_2 = {
  id: '52.2',
  title: 'Thermal insulation factor Ci for cable totally surrounded',
  source: {
    title: 'BS 7671:2018 Table 52.2',
    edition: 'BS 7671:2008 onward table 52.2',
  },
  confidence: 'from memory',
  units: { length_mm: 'mm', Ci: 'factor' },
  notes: '500 mm or more: 0.5 (Reg. 523.9). Cables to 10 mm2. No citable print found: 0.88, 0.78 and 0.63 stand in a public text without a name, which gives 0.50 from 400 mm.',
  rows: [
    { length_mm: 50, Ci: 0.88 },
    { length_mm: 100, Ci: 0.78 },
    { length_mm: 200, Ci: 0.63 },
    { length_mm: 400, Ci: 0.51 },
    { length_mm: 500, Ci: 0.5 },
  ],
} satisfies ReferenceTable

export const table52_2_16th = {
  id: '52.2-16th',
  title: 'Older editions only: thermal insulation factor',
  source: {
    title: 'The Electrician\'s Guide to the 16th Edition (handbook, 5th ed.), 4.3.6',
    edition: '16th edition',
  },
  confidence: 'one source',
  units: { length_mm: 'mm', Ci: 'factor' },
  notes: 'History, to reproduce old examples only.',
  rows: [
    { length_mm: 50, Ci: 0.89 },
    { length_mm: 100, Ci: 0.81 },
    { length_mm: 200, Ci: 0.68 },
    { length_mm: 400, Ci: 0.55 },
    { length_mm: 500, Ci: 0.5 },
  ],
} satisfies ReferenceTable

export const tableCf_Cc = {
  id: 'Cf-Cc',
  title: 'Other rating factors',
  source: {
    title: 'The Electrician\'s Guide to the 16th Edition (handbook, 5th ed.), 4.3.8; BS 7671:2018 Appendix 4 clause 5',
    edition: 'BS 7671 Appendix 4 clause 5, Reg. 433.1',
  },
  confidence: 'one source',
  units: { factor: '' },
  notes: '0.725 by source (1.45 / 2, since such a fuse operates at twice its rating); Cc = 0.9 from memory (a forum exam thread uses the same figure).',
  rows: [
    { symbol: 'Cf', value: 0.725, use: 'overload protection by semi-enclosed fuse to BS 3036' },
    { symbol: 'Cc', value: 0.9, use: 'buried circuit sized by method D: apply where protection follows a ground rating (Appendix 4: 0.9 with BS 88/MCB etc.; with BS 3036 Cf x Cc = 0.653)' },
    { symbol: 'Cs', value: 'table 4B3', use: 'soil resistivity' },
    { symbol: 'Cd', value: 'table 4B4', use: 'depth' },
  ],
} satisfies ReferenceTable
