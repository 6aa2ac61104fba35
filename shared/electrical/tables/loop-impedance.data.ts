/** The largest earth fault loop impedance each device allows, and the times behind it. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const table41_3_B = {
  id: '41.3-B',
  title: 'Maximum earth fault loop impedance, circuit-breaker / RCBO type B (BS EN 60898, 61009), 230 V',
  source: {
    title: 'BS 7671:2018 Table 41.3, by formula; B 32 A as printed on two revision pages',
    edition: 'BS 7671:2018 table 41.3',
  },
  confidence: 'two sources',
  units: { In_A: 'A', Zs_ohm: 'ohm' },
  notes: 'Zs = 0.95 x 230 / (5 In), rounded to two places; the same for 0.4 s and 5 s. The last column is 80 % of the unrounded value.',
  rows: [
    { In_A: 6, Zs_ohm: 7.28, Zs_measured_80pct: 5.827 },
    { In_A: 10, Zs_ohm: 4.37, Zs_measured_80pct: 3.496 },
    { In_A: 16, Zs_ohm: 2.73, Zs_measured_80pct: 2.185 },
    { In_A: 20, Zs_ohm: 2.19, Zs_measured_80pct: 1.748 },
    { In_A: 25, Zs_ohm: 1.75, Zs_measured_80pct: 1.398 },
    { In_A: 32, Zs_ohm: 1.37, Zs_measured_80pct: 1.093 },
    { In_A: 40, Zs_ohm: 1.09, Zs_measured_80pct: 0.874 },
    { In_A: 50, Zs_ohm: 0.87, Zs_measured_80pct: 0.699 },
    { In_A: 63, Zs_ohm: 0.69, Zs_measured_80pct: 0.555 },
    { In_A: 80, Zs_ohm: 0.55, Zs_measured_80pct: 0.437 },
    { In_A: 100, Zs_ohm: 0.44, Zs_measured_80pct: 0.35 },
  ],
} satisfies ReferenceTable

export const table41_3_C = {
  id: '41.3-C',
  title: 'Maximum earth fault loop impedance, circuit-breaker / RCBO type C (BS EN 60898, 61009), 230 V',
  source: {
    title: 'BS 7671:2018 Table 41.3: every value as printed on a trade table page; by formula from the multiple 10 printed in Basic Electrical Installation Work (textbook, 5th ed.), p. 246',
    edition: 'BS 7671:2018 table 41.3',
  },
  confidence: 'two sources',
  units: { In_A: 'A', Zs_ohm: 'ohm' },
  notes: 'Zs = 0.95 x 230 / (10 In), rounded to two places; the same for 0.4 s and 5 s. The last column is 80 % of the unrounded value.',
  rows: [
    { In_A: 6, Zs_ohm: 3.64, Zs_measured_80pct: 2.913 },
    { In_A: 10, Zs_ohm: 2.19, Zs_measured_80pct: 1.748 },
    { In_A: 16, Zs_ohm: 1.37, Zs_measured_80pct: 1.093 },
    { In_A: 20, Zs_ohm: 1.09, Zs_measured_80pct: 0.874 },
    { In_A: 25, Zs_ohm: 0.87, Zs_measured_80pct: 0.699 },
    { In_A: 32, Zs_ohm: 0.68, Zs_measured_80pct: 0.546 },
    { In_A: 40, Zs_ohm: 0.55, Zs_measured_80pct: 0.437 },
    { In_A: 50, Zs_ohm: 0.44, Zs_measured_80pct: 0.35 },
    { In_A: 63, Zs_ohm: 0.35, Zs_measured_80pct: 0.277 },
    { In_A: 80, Zs_ohm: 0.27, Zs_measured_80pct: 0.219 },
    { In_A: 100, Zs_ohm: 0.22, Zs_measured_80pct: 0.175 },
  ],
} satisfies ReferenceTable

export const table41_3_D = {
  id: '41.3-D',
  title: 'Maximum earth fault loop impedance, circuit-breaker / RCBO type D (BS EN 60898, 61009), 230 V',
  source: {
    title: 'BS 7671:2018 Table 41.3, as printed on a trade table page; 0.4 s also by formula from the multiple 20 printed in Basic Electrical Installation Work (textbook, 5th ed.), p. 246',
    edition: 'BS 7671:2018 table 41.3',
    seen_cells: {
      'two sources': { Zs_ohm: [6, 10, 16, 20, 25, 32, 40, 50, 63, 80, 100] },
      'one source': { Zs_5s_ohm: [10, 16, 20, 25, 32, 40, 50, 63, 80, 100] },
    },
  },
  confidence: 'one source',
  units: { In_A: 'A', Zs_ohm: 'ohm' },
  notes: 'Zs_ohm (0.4 s) = 0.95 x 230 / (20 In). Zs_5s_ohm = 0.95 x 230 / (10 In); the trade page prints the same 5 s values except 6 A, where its 0.36 is a misprint of 3.64.',
  rows: [
    { In_A: 6, Zs_ohm: 1.82, Zs_measured_80pct: 1.457, Zs_5s_ohm: 3.64 },
    { In_A: 10, Zs_ohm: 1.09, Zs_measured_80pct: 0.874, Zs_5s_ohm: 2.19 },
    { In_A: 16, Zs_ohm: 0.68, Zs_measured_80pct: 0.546, Zs_5s_ohm: 1.37 },
    { In_A: 20, Zs_ohm: 0.55, Zs_measured_80pct: 0.437, Zs_5s_ohm: 1.09 },
    { In_A: 25, Zs_ohm: 0.44, Zs_measured_80pct: 0.35, Zs_5s_ohm: 0.87 },
    { In_A: 32, Zs_ohm: 0.34, Zs_measured_80pct: 0.273, Zs_5s_ohm: 0.68 },
    { In_A: 40, Zs_ohm: 0.27, Zs_measured_80pct: 0.219, Zs_5s_ohm: 0.55 },
    { In_A: 50, Zs_ohm: 0.22, Zs_measured_80pct: 0.175, Zs_5s_ohm: 0.44 },
    { In_A: 63, Zs_ohm: 0.17, Zs_measured_80pct: 0.139, Zs_5s_ohm: 0.35 },
    { In_A: 80, Zs_ohm: 0.14, Zs_measured_80pct: 0.109, Zs_5s_ohm: 0.27 },
    { In_A: 100, Zs_ohm: 0.11, Zs_measured_80pct: 0.087, Zs_5s_ohm: 0.22 },
  ],
} satisfies ReferenceTable

export const table41_2_BS88_2 = {
  id: '41.2-BS88-2',
  title: 'BS 88-2 (systems E and G) fuse, 0.4 s',
  source: {
    title: 'BS 7671 Table 41.2, as printed in a trade-body magazine, winter 2011-12, p. 60, times 0.95, and on a trade table page (2018 values)',
    edition: 'BS 7671:2018 table 41.2',
  },
  confidence: 'two sources',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'Zs_amd1_2011 is printed in the trade-body magazine article (before Cmin). Zs_ohm is the 2018 value as printed on the table page; it equals 0.95 x the older value except 25 A, corrected here from 1.28 to 1.29: the product starts from an already rounded 1.35, while 218.5/170 A (current from memory) = 1.285.',
  rows: [
    { In_A: 6, Zs_amd1_2011: 8.21, Zs_ohm: 7.8 },
    { In_A: 10, Zs_amd1_2011: 4.89, Zs_ohm: 4.65 },
    { In_A: 16, Zs_amd1_2011: 2.56, Zs_ohm: 2.43 },
    { In_A: 20, Zs_amd1_2011: 1.77, Zs_ohm: 1.68 },
    { In_A: 25, Zs_amd1_2011: 1.35, Zs_ohm: 1.29 },
    { In_A: 32, Zs_amd1_2011: 1.04, Zs_ohm: 0.99 },
  ],
} satisfies ReferenceTable

export const table41_4_BS88_2_5s = {
  id: '41.4-BS88-2-5s',
  title: 'BS 88-2 fuse, 5 s',
  source: {
    title: 'BS 7671:2018 Table 41.4, as printed on a trade table page',
    edition: 'BS 7671:2018 table 41.4',
  },
  confidence: 'one source',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'Every value agrees with the page.',
  rows: [
    { In_A: 6, Zs_ohm: 12 },
    { In_A: 10, Zs_ohm: 6.8 },
    { In_A: 16, Zs_ohm: 4 },
    { In_A: 20, Zs_ohm: 2.8 },
    { In_A: 25, Zs_ohm: 2.2 },
    { In_A: 32, Zs_ohm: 1.7 },
    { In_A: 40, Zs_ohm: 1.3 },
    { In_A: 50, Zs_ohm: 0.99 },
    { In_A: 63, Zs_ohm: 0.78 },
    { In_A: 80, Zs_ohm: 0.55 },
    { In_A: 100, Zs_ohm: 0.42 },
  ],
} satisfies ReferenceTable

export const table41_2_BS88_3 = {
  id: '41.2-BS88-3',
  title: 'BS 88-3 system C fuse, 0.4 s',
  source: {
    title: 'BS 7671 Table 41.2, as printed on a trade table page; 32 A also in a trade-body magazine, spring 2015, p. 61',
    edition: 'BS 7671:2018 table 41.2',
    seen_cells: {
      'two sources': { Zs_ohm: [32] },
      'one source': { Zs_ohm: [5, 16, 20] },
    },
  },
  confidence: 'one source',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'Every value agrees with the page; 32 A also from the magazine (measured limit 0.72 = 0.8 x 0.91 rounded down).',
  rows: [
    { In_A: 5, Zs_ohm: 9.93 },
    { In_A: 16, Zs_ohm: 2.3 },
    { In_A: 20, Zs_ohm: 1.93 },
    { In_A: 32, Zs_ohm: 0.91 },
  ],
} satisfies ReferenceTable

export const table41_4_BS88_3_5s = {
  id: '41.4-BS88-3-5s',
  title: 'BS 88-3 system C fuse, 5 s',
  source: {
    title: 'BS 7671:2018 Table 41.4, as printed on a trade table page',
    edition: 'BS 7671:2018 table 41.4',
  },
  confidence: 'one source',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'Every value agrees with the page, which heads the column BS 1361 / BS 88-3. No second print found.',
  rows: [
    { In_A: 5, Zs_ohm: 14.6 },
    { In_A: 16, Zs_ohm: 3.9 },
    { In_A: 20, Zs_ohm: 3.2 },
    { In_A: 32, Zs_ohm: 1.6 },
    { In_A: 45, Zs_ohm: 1 },
    { In_A: 63, Zs_ohm: 0.68 },
    { In_A: 80, Zs_ohm: 0.51 },
    { In_A: 100, Zs_ohm: 0.38 },
  ],
} satisfies ReferenceTable

export const table41_2_BS3036 = {
  id: '41.2-BS3036',
  title: 'BS 3036 semi-enclosed fuse, 0.4 s',
  source: {
    title: 'BS 7671:2018 Table 41.2, as printed on a trade table page; one current from Basic Electrical Installation Work (textbook, 5th ed., 17th edition regulations), p. 251',
    edition: 'BS 7671:2018 table 41.2',
  },
  confidence: 'one source',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'Ia from the 17th edition curves (15 A = 90 A is printed in the textbook page; the others from memory); Zs = 218.5/Ia, and every Zs agrees with the page.',
  rows: [
    { In_A: 5, Ia_A: 24, Zs_ohm: 9.1 },
    { In_A: 15, Ia_A: 90, Zs_ohm: 2.43 },
    { In_A: 20, Ia_A: 130, Zs_ohm: 1.68 },
    { In_A: 30, Ia_A: 210, Zs_ohm: 1.04 },
  ],
} satisfies ReferenceTable

export const table41_4_BS3036_5s = {
  id: '41.4-BS3036-5s',
  title: 'BS 3036 semi-enclosed fuse, 5 s',
  source: {
    title: 'BS 7671:2018 Table 41.4, as printed on a trade table page',
    edition: 'BS 7671:2018 table 41.4',
  },
  confidence: 'one source',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'Every value agrees with the page except 100 A, corrected here from 0.50 to 0.51: 0.50 came from 0.95 x an already rounded 0.53, while 218.5/430 A (current from memory) = 0.508.',
  rows: [
    { In_A: 5, Zs_ohm: 16.8 },
    { In_A: 15, Zs_ohm: 5.08 },
    { In_A: 20, Zs_ohm: 3.64 },
    { In_A: 30, Zs_ohm: 2.51 },
    { In_A: 45, Zs_ohm: 1.51 },
    { In_A: 60, Zs_ohm: 1.07 },
    { In_A: 100, Zs_ohm: 0.51 },
  ],
} satisfies ReferenceTable

export const tableBS1361_0_4s = {
  id: 'BS1361-0.4s',
  title: 'BS 1361 fuse (withdrawn, existing installations), 0.4 s',
  source: {
    title: '17th edition Appendix 3 curves',
    edition: '17th edition Ia with Cmin',
  },
  confidence: 'from memory',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'From memory; formula 218.5/Ia. A trade page prints other values for 15 to 100 A under a joint heading BS 1361 / BS 88-3: those are BS 88-3\'s and were not taken.',
  rows: [
    { In_A: 5, Ia_A: 22, Zs_ohm: 9.93 },
    { In_A: 15, Ia_A: 70, Zs_ohm: 3.12 },
    { In_A: 20, Ia_A: 135, Zs_ohm: 1.62 },
    { In_A: 30, Ia_A: 200, Zs_ohm: 1.09 },
  ],
} satisfies ReferenceTable

export const tableBS1361_5s = {
  id: 'BS1361-5s',
  title: 'BS 1361 fuse (withdrawn), 5 s',
  source: {
    title: '17th edition Appendix 3 curves',
    edition: '17th edition Ia with Cmin',
  },
  confidence: 'from memory',
  units: { In_A: 'A', Ia_A: 'A (time/current curve)', Zs_ohm: 'ohm' },
  notes: 'From memory; formula 218.5/Ia. A trade page prints other values for 15 to 100 A under a joint heading BS 1361 / BS 88-3: those are BS 88-3\'s and were not taken.',
  rows: [
    { In_A: 15, Ia_A: 46, Zs_ohm: 4.75 },
    { In_A: 20, Ia_A: 82, Zs_ohm: 2.66 },
    { In_A: 30, Ia_A: 125, Zs_ohm: 1.75 },
    { In_A: 45, Ia_A: 240, Zs_ohm: 0.91 },
    { In_A: 60, Ia_A: 330, Zs_ohm: 0.66 },
    { In_A: 80, Ia_A: 460, Zs_ohm: 0.47 },
    { In_A: 100, Ia_A: 630, Zs_ohm: 0.35 },
  ],
} satisfies ReferenceTable

export const tableZs_rules = {
  id: 'Zs-rules',
  title: 'Disconnection and Zs rules',
  source: {
    title: 'BS 7671:2018 Chapter 41 and Appendix 3, as summarised on two revision pages',
    edition: 'BS 7671:2018 Chapter 41, Appendix 3; Guidance Note 3',
  },
  confidence: 'two sources',
  units: {},
  notes: '63 A socket wording follows the 2018 edition; TT 1 s and 21 ohm from memory.',
  rows: [
    { rule: 'TN final circuit with socket-outlets not exceeding 63 A, or fixed equipment not exceeding 32 A', time_s: 0.4, reg: '411.3.2.2, table 41.1' },
    { rule: 'TN other final circuits and distribution circuits', time_s: 5, reg: '411.3.2.3' },
    { rule: 'TT final circuit as above', time_s: 0.2, reg: 'table 41.1' },
    { rule: 'TT distribution and other circuits', time_s: 1, reg: '411.3.2.4' },
    { rule: 'Design check TN', formula: 'Zs x Ia <= Cmin x U0', Cmin: 0.95, U0: 230, reg: '411.4.4 / 411.4.5' },
    { rule: 'Measured value check (conductors at ambient)', formula: 'Zs(measured) <= 0.8 x tabulated Zs', reg: 'Appendix 3, Guidance Note 3' },
    { rule: 'TT with RCD', formula: 'RA x Idn <= 50 V', reg: '411.5.3', Idn_mA_RA_ohm: { '30': 1667, '100': 500, '300': 167, '500': 100 }, advice: 'RA above 200 ohm may not be stable (note to table 41.5)' },
    { rule: 'Typical declared maximum external impedance', Ze: { 'TN-C-S': 0.35, 'TN-S': 0.8, 'TT electrode at source': 21 }, reg: 'On-Site Guide; distributors\' figures' },
    { rule: 'Newer distributor guidance quoted in an institution\'s forum', text: '0.35/0.8 are no longer tied to earthing type: 90 % of premises below 0.34 ohm, 98 % below 0.64 ohm', url: 'https://engx.theiet.org/f/wiring-and-regulations/29061/r1-r2-for-3-core-10mm-xlpe/129280' },
  ],
} satisfies ReferenceTable
