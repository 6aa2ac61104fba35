/** Volts lost per amp and metre (mV/A/m), and how much may be lost. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const table4D1B = {
  id: '4D1B',
  title: 'Single-core 70 C thermoplastic non-armoured, copper: voltage drop',
  source: {
    title: 'BS 7671 Table 4D1B, as reprinted in a wholesaler\'s catalogue (two editions)',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', '*': 'mV/A/m; r,x,z given for 25 mm2 and above' },
  notes: 'Small sizes also agree with a textbook table.',
  checked: 'mV/A/m = 2 R20 x 1.20 (70 C) or 1.28 (90 C) for single-phase, sqrt3 R20 x the same for three-phase: within 3.5 %',
  rows: [
    { size_mm2: 1, AB_1ph: 44, C_1ph: 44, AB_3ph: 38, C_3ph: 38 },
    { size_mm2: 1.5, AB_1ph: 29, C_1ph: 29, AB_3ph: 25, C_3ph: 25 },
    { size_mm2: 2.5, AB_1ph: 18, C_1ph: 18, AB_3ph: 15, C_3ph: 15 },
    { size_mm2: 4, AB_1ph: 11, C_1ph: 11, AB_3ph: 9.5, C_3ph: 9.5 },
    { size_mm2: 6, AB_1ph: 7.3, C_1ph: 7.3, AB_3ph: 6.4, C_3ph: 6.4 },
    { size_mm2: 10, AB_1ph: 4.4, C_1ph: 4.4, AB_3ph: 3.8, C_3ph: 3.8 },
    { size_mm2: 16, AB_1ph: 2.8, C_1ph: 2.8, AB_3ph: 2.4, C_3ph: 2.4 },
    { size_mm2: 25, AB_1ph: { r: 1.8, x: 0.33, z: 1.8 }, C_1ph: { r: 1.75, x: 0.2, z: 1.75 }, AB_3ph: { r: 1.5, x: 0.29, z: 1.55 }, C_3ph: { r: 1.5, x: 0.175, z: 1.5 } },
    { size_mm2: 35, AB_1ph: { r: 1.3, x: 0.31, z: 1.3 }, C_1ph: { r: 1.25, x: 0.195, z: 1.25 }, AB_3ph: { r: 1.1, x: 0.27, z: 1.1 }, C_3ph: { r: 1.1, x: 0.17, z: 1.1 } },
  ],
} satisfies ReferenceTable

export const table4D2B = {
  id: '4D2B',
  title: 'Multicore 70 C thermoplastic non-armoured, copper: voltage drop',
  source: {
    title: 'BS 7671 Table 4D2B, as reprinted in Basic Electrical Installation Work (textbook, 5th ed., 17th edition regulations)',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'one source',
  units: { size_mm2: 'mm2', '*': 'mV/A/m' },
  notes: '',
  checked: 'mV/A/m = 2 R20 x 1.20 (70 C) or 1.28 (90 C) for single-phase, sqrt3 R20 x the same for three-phase: within 3.5 %',
  rows: [
    { size_mm2: 1, one_phase: 44, three_phase: 38 },
    { size_mm2: 1.5, one_phase: 29, three_phase: 25 },
    { size_mm2: 2.5, one_phase: 18, three_phase: 15 },
    { size_mm2: 4, one_phase: 11, three_phase: 9.5 },
    { size_mm2: 6, one_phase: 7.3, three_phase: 6.4 },
    { size_mm2: 10, one_phase: 4.4, three_phase: 3.8 },
    { size_mm2: 16, one_phase: 2.8, three_phase: 2.4 },
    { size_mm2: 25, one_phase: { r: 1.75, x: 0.17, z: 1.75 }, three_phase: { r: 1.5, x: 0.145, z: 1.5 } },
    { size_mm2: 35, one_phase: { r: 1.25, x: 0.165, z: 1.25 }, three_phase: { r: 1.1, x: 0.145, z: 1.1 } },
  ],
} satisfies ReferenceTable

export const table4D4B = {
  id: '4D4B',
  title: 'Multicore armoured 70 C thermoplastic, copper: voltage drop',
  source: {
    title: 'BS 7671:2018 Table 4D4B',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', '*': 'mV/A/m' },
  notes: '',
  checked: 'mV/A/m = 2 R20 x 1.20 (70 C) or 1.28 (90 C) for single-phase, sqrt3 R20 x the same for three-phase: within 3.5 %',
  rows: [
    { size_mm2: 1.5, one_phase: 29, three_phase: 25 },
    { size_mm2: 2.5, one_phase: 18, three_phase: 15 },
    { size_mm2: 4, one_phase: 11, three_phase: 9.5 },
    { size_mm2: 6, one_phase: 7.3, three_phase: 6.4 },
    { size_mm2: 10, one_phase: 4.4, three_phase: 3.8 },
    { size_mm2: 16, one_phase: 2.8, three_phase: 2.4 },
    { size_mm2: 25, one_phase: { r: 1.75, x: 0.17, z: 1.75 }, three_phase: { r: 1.5, x: 0.145, z: 1.5 } },
    { size_mm2: 35, one_phase: { r: 1.25, x: 0.165, z: 1.25 }, three_phase: { r: 1.1, x: 0.145, z: 1.1 } },
  ],
} satisfies ReferenceTable

export const table4E4B = {
  id: '4E4B',
  title: 'Multicore armoured 90 C thermosetting, copper: voltage drop',
  source: {
    title: 'BS 7671 Table 4E4B, as reprinted on a wholesaler\'s page and in a wholesaler\'s catalogue',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', '*': 'mV/A/m' },
  notes: 'One source prints a shifted column for 25 mm2; z = 1.90 is the rounded root of r^2 + x^2 as printed in the standard (the rounding from memory).',
  checked: 'mV/A/m = 2 R20 x 1.20 (70 C) or 1.28 (90 C) for single-phase, sqrt3 R20 x the same for three-phase: within 3.5 %',
  rows: [
    { size_mm2: 1.5, one_phase: 31, three_phase: 27 },
    { size_mm2: 2.5, one_phase: 19, three_phase: 16 },
    { size_mm2: 4, one_phase: 12, three_phase: 10 },
    { size_mm2: 6, one_phase: 7.9, three_phase: 6.8 },
    { size_mm2: 10, one_phase: 4.7, three_phase: 4 },
    { size_mm2: 16, one_phase: 2.9, three_phase: 2.5 },
    { size_mm2: 25, one_phase: { r: 1.85, x: 0.16, z: 1.9 }, three_phase: { r: 1.6, x: 0.14, z: 1.65 } },
    { size_mm2: 35, one_phase: { r: 1.35, x: 0.155, z: 1.35 }, three_phase: { r: 1.15, x: 0.135, z: 1.15 } },
  ],
} satisfies ReferenceTable

export const table4E2B = {
  id: '4E2B',
  title: 'Multicore 90 C thermosetting non-armoured, copper: voltage drop',
  source: {
    title: 'BS 7671:2018 Table 4E2B',
    edition: 'BS 7671 (values printed unchanged 2008-2018+A2 unless noted)',
  },
  confidence: 'from memory',
  units: { size_mm2: 'mm2', '*': 'mV/A/m' },
  notes: 'Same conductors as 4E4B, so the same mV/A/m. Table 4E1B (single-core), seen in print, has the same figures to 16 mm2.',
  checked: 'mV/A/m = 2 R20 x 1.20 (70 C) or 1.28 (90 C) for single-phase, sqrt3 R20 x the same for three-phase: within 3.5 %',
  rows: [
    { size_mm2: 1.5, one_phase: 31, three_phase: 27 },
    { size_mm2: 2.5, one_phase: 19, three_phase: 16 },
    { size_mm2: 4, one_phase: 12, three_phase: 10 },
    { size_mm2: 6, one_phase: 7.9, three_phase: 6.8 },
    { size_mm2: 10, one_phase: 4.7, three_phase: 4 },
    { size_mm2: 16, one_phase: 2.9, three_phase: 2.5 },
    { size_mm2: 25, one_phase: { r: 1.85, x: 0.16, z: 1.9 }, three_phase: { r: 1.6, x: 0.14, z: 1.65 } },
    { size_mm2: 35, one_phase: { r: 1.35, x: 0.155, z: 1.35 }, three_phase: { r: 1.15, x: 0.135, z: 1.15 } },
  ],
} satisfies ReferenceTable

export const table4F3B = {
  id: '4F3B',
  title: 'Flexible cables/cords: voltage drop at 60 C conductor temperature',
  source: {
    title: 'BS 7671 Table 4F3B, as reprinted on a cable distributor\'s and a wholesaler\'s page',
    edition: '17th edition',
  },
  confidence: 'two sources',
  units: { size_mm2: 'mm2', '*': 'mV/A/m' },
  notes: 'Multiply by 1.09 for 90 C cords.',
  rows: [
    { size_mm2: 0.5, one_phase: 93, three_phase: 80 },
    { size_mm2: 0.75, one_phase: 62, three_phase: 54 },
    { size_mm2: 1, one_phase: 46, three_phase: 40 },
    { size_mm2: 1.25, one_phase: 37, three_phase: null },
    { size_mm2: 1.5, one_phase: 32, three_phase: 27 },
    { size_mm2: 2.5, one_phase: 19, three_phase: 16 },
    { size_mm2: 4, one_phase: 12, three_phase: 10 },
  ],
} satisfies ReferenceTable

export const tableVd_limits = {
  id: 'vd-limits',
  title: 'Voltage drop limits from the origin, public supply',
  source: {
    title: 'BS 7671 525 and Appendix 4, as reprinted in Basic Electrical Installation Work (textbook, 5th ed., 17th edition regulations) and in an exam course',
    edition: 'BS 7671 525, Appendix 4 table 4Ab',
  },
  confidence: 'two sources',
  units: { '*': '' },
  notes: '',
  rows: [
    { use: 'lighting', percent: 3, volts_at_230: 6.9 },
    { use: 'other uses (EV charging included)', percent: 5, volts_at_230: 11.5 },
  ],
} satisfies ReferenceTable
