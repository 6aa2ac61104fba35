/** What protective conductors must be: adiabatic constants and least sizes. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const tableK = {
  id: 'k',
  title: 'Adiabatic k factors',
  source: {
    title: 'BS 7671 Tables 43.1 and 54.2 to 54.6; constants and temperatures from a document on the adiabatic constant after IEC 60364-5-54 Annex A',
    edition: 'BS 7671 tables 43.1, 54.2 to 54.6; IEC 60364-5-54 Annex A',
  },
  confidence: 'one source',
  units: { k: 'A s^0.5 / mm2', t: 'C' },
  notes: 'k = sqrt(Qc (beta+20)/rho20 x ln(1+(tf-ti)/(beta+ti))). Temperatures and constants from the source; printed k from memory, all within 1.4 % of the formula. k = 115, 143, 51, 46 also appear in several forum threads.',
  checked: 'every k within 1.5 % of the formula',
  rows: [
    { table: '54.3 / 43.1', use: 'cpc as a core of a cable or bunched; line conductors', material: 'copper', insulation: '70 C thermoplastic', t_initial: 70, t_final: 160, k: 115, k_by_formula: 114.8 },
    { table: '54.3', use: 'same, above 300 mm2', material: 'copper', insulation: '70 C thermoplastic', t_initial: 70, t_final: 140, k: 103, k_by_formula: 102.7 },
    { table: '54.3', use: 'same', material: 'copper', insulation: '90 C thermoplastic', t_initial: 90, t_final: 160, k: 100, k_by_formula: 99.7 },
    { table: '54.3', use: 'same', material: 'copper', insulation: '90 C thermosetting', t_initial: 90, t_final: 250, k: 143, k_by_formula: 142.9 },
    { table: '54.3', use: 'same', material: 'copper', insulation: '60 C rubber', t_initial: 60, t_final: 200, k: 141, k_by_formula: 140.7 },
    { table: '54.3', use: 'same', material: 'copper', insulation: '85 C rubber', t_initial: 85, t_final: 220, k: 134, k_by_formula: 134 },
    { table: '54.3', use: 'same', material: 'aluminium', insulation: '70 C thermoplastic', t_initial: 70, t_final: 160, k: 76, k_by_formula: 76.1 },
    { table: '54.3', use: 'same', material: 'aluminium', insulation: '90 C thermosetting', t_initial: 90, t_final: 250, k: 94, k_by_formula: 94.6 },
    { table: '54.2', use: 'separate cpc, not bunched', material: 'copper', insulation: '70 C thermoplastic', t_initial: 30, t_final: 160, k: 143, k_by_formula: 142.7 },
    { table: '54.2', use: 'same, above 300 mm2', material: 'copper', insulation: '70 C thermoplastic', t_initial: 30, t_final: 140, k: 133, k_by_formula: 133.1 },
    { table: '54.2', use: 'same', material: 'copper', insulation: '90 C thermosetting', t_initial: 30, t_final: 250, k: 176, k_by_formula: 175.6 },
    { table: '54.2', use: 'same', material: 'steel', insulation: '70 C thermoplastic', t_initial: 30, t_final: 160, k: 52, k_by_formula: 52.2 },
    { table: '54.2', use: 'same', material: 'aluminium', insulation: '70 C thermoplastic', t_initial: 30, t_final: 160, k: 95, k_by_formula: 94.6 },
    { table: '54.4', use: 'armour or sheath as cpc', material: 'steel', insulation: '70 C thermoplastic', t_initial: 60, t_final: 200, k: 51, k_by_formula: 51.2 },
    { table: '54.4', use: 'armour or sheath as cpc', material: 'steel', insulation: '90 C thermosetting', t_initial: 80, t_final: 200, k: 46, k_by_formula: 46.6 },
    { table: '54.5', use: 'conduit, trunking', material: 'steel', insulation: '70 C thermoplastic', t_initial: 50, t_final: 160, k: 47, k_by_formula: 47.1 },
    { table: '54.6', use: 'bare, visible and restricted', material: 'copper', insulation: '', t_initial: 30, t_final: 500, k: 228, k_by_formula: 228.1 },
    { table: '54.6', use: 'bare, normal', material: 'copper', insulation: '', t_initial: 30, t_final: 200, k: 159, k_by_formula: 159 },
    { table: '54.6', use: 'bare, fire risk', material: 'copper', insulation: '', t_initial: 30, t_final: 150, k: 138, k_by_formula: 138 },
    { table: '54.6', use: 'bare, visible', material: 'steel', insulation: '', t_initial: 30, t_final: 500, k: 82, k_by_formula: 82.3 },
    { table: '54.6', use: 'bare, normal', material: 'steel', insulation: '', t_initial: 30, t_final: 200, k: 58, k_by_formula: 58 },
    { table: '54.6', use: 'bare, fire risk', material: 'steel', insulation: '', t_initial: 30, t_final: 150, k: 50, k_by_formula: 50.5 },
  ],
} satisfies ReferenceTable

export const table54_7 = {
  id: '54.7',
  title: 'Minimum protective conductor where not calculated',
  source: {
    title: 'BS 7671 Table 54.7, as explained on a training blog and in a trade forum',
    edition: 'BS 7671 table 54.7',
  },
  confidence: 'two sources',
  units: {},
  notes: 'Non-standard result: next larger size. Separate cpc minimum 2.5 mm2 with, 4 mm2 without mechanical protection (543.1.1). k1 = line conductor table 43.1; k2 = protective conductor table 54.2-54.6.',
  rows: [
    { S_mm2: 'S <= 16', same_material: 'S', other_material: '(k1/k2) S' },
    { S_mm2: '16 < S <= 35', same_material: '16', other_material: '(k1/k2) 16' },
    { S_mm2: 'S > 35', same_material: 'S/2', other_material: '(k1/k2) S/2' },
  ],
} satisfies ReferenceTable

export const table54_8 = {
  id: '54.8',
  title: 'Main protective bonding conductor, PME conditions',
  source: {
    title: 'BS 7671 Table 54.8, as reprinted in Guide to the Wiring Regulations: 17th Edition (Wiley 2008, ISBN 978-0-470-51685-0), table E 4.6, and on a training blog',
    edition: 'BS 7671 table 54.8',
  },
  confidence: 'two sources',
  units: { neutral_mm2: 'mm2 copper equivalent', bonding_mm2: 'mm2 copper equivalent' },
  notes: 'Not PME: at least half the earthing conductor, minimum 6 mm2, need not exceed 25 mm2 copper (544.1.1). Distributor may ask for more.',
  rows: [
    { neutral_mm2: '<= 35', bonding_mm2: 10 },
    { neutral_mm2: '> 35 to 50', bonding_mm2: 16 },
    { neutral_mm2: '> 50 to 95', bonding_mm2: 25 },
    { neutral_mm2: '> 95 to 150', bonding_mm2: 35 },
    { neutral_mm2: '> 150', bonding_mm2: 50 },
  ],
} satisfies ReferenceTable

export const tableTails = {
  id: 'tails',
  title: 'Main tails, earthing conductor and bonding for single-phase supplies',
  source: {
    title: 'On-Site Guide sections 2 and 4, as quoted in a trade forum',
    edition: 'On-Site Guide section 2 and 4; distributors',
  },
  confidence: 'one source',
  units: { '*': 'mm2 copper' },
  notes: 'Check by Table 4D1A method C, two cables: 16 mm2 87 A, 25 mm2 114 A; so 16 mm2 carries an 80 A fuse clipped direct, but many distributors ask for 25 mm2 from 80 A. Distributors usually limit tails to about 3 m before a switch-fuse (common practice).',
  rows: [
    { service_fuse_A: 60, tails: 16, earthing_conductor: 10, earthing_common: 16, bonding_PME: 10, verified: 'common practice' },
    { service_fuse_A: 80, tails: 16, tails_common: 25, earthing_conductor: 16, bonding_PME: 10, verified: 'common practice' },
    { service_fuse_A: 100, tails: 25, earthing_conductor: 16, bonding_PME: 10, verified: 'one source' },
  ],
} satisfies ReferenceTable

export const tableEarthing_buried = {
  id: 'earthing-buried',
  title: 'Earthing conductor to an earth electrode',
  source: {
    title: 'BS 7671:2018 542.3.1 and Table 54.1; buried rows as printed in The Electrician\'s Guide to the 16th Edition (handbook, 5th ed.), 5.4.1',
    edition: 'BS 7671 542.3.1 and table 54.1',
  },
  confidence: 'from memory',
  units: { '*': 'mm2 copper / steel' },
  notes: 'The two buried rows agree with the handbook, which gives the 25 and 50 mm2 whether or not the conductor is protected from damage; the rest from memory.',
  rows: [
    { case: 'not buried, mechanically protected, calculated', copper: 'adiabatic, 2.5 min', verified: 'from memory' },
    { case: 'not buried, not mechanically protected', copper: 4, verified: 'from memory' },
    { case: 'connected to an electrode (2018 text)', copper: 6, steel: 50, verified: 'from memory' },
    { case: 'buried, protected against corrosion, not mechanically', copper: 16, steel: 16, verified: 'one source' },
    { case: 'buried, not protected against corrosion', copper: 25, steel: 50, verified: 'one source' },
  ],
} satisfies ReferenceTable

export const tableElectrode = {
  id: 'electrode',
  title: 'Earth electrode resistance formulas',
  source: {
    title: 'BS 7430 formulas, as reprinted in a document on earth rods',
    edition: 'BS 7430',
  },
  confidence: 'one source',
  units: {},
  notes: 'Typical rho (ohm.m) from the source: well-graded gravel 600-1000, poorly graded 1000-2500, clayey gravel 200-400, silty sand 100-800, clayey sand 50-200, clayey sand with plasticity 30-80.',
  rows: [
    { electrode: 'vertical rod', formula: 'R = rho/(2 pi L) x (ln(8 L/d) - 1)', symbols: 'rho ohm.m, L m buried length, d m diameter' },
    { electrode: 'n rods in line, spacing s', formula: 'Rn = R/n x (1 + lambda a), a = rho/(2 pi R s)', note: 'lambda: 2 rods 1.00, 3 rods 1.66, 4 rods 2.15 (from memory)' },
  ],
} satisfies ReferenceTable
