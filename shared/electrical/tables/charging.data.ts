/** Control pilot, proximity resistor, and the rules for charging points. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const table61851_duty = {
  id: '61851-duty',
  title: 'Control pilot duty cycle to available current',
  source: {
    title: 'IEC 61851-1 Annex A, as told in public source comments citing SAE J1772 (Oct 2017, p. 17)',
    edition: 'IEC 61851-1 Annex A (same law in SAE J1772)',
  },
  confidence: 'two sources',
  units: { duty: '%', I: 'A' },
  notes: 'Inverse: I 6 to 51 A: duty = I / 0.6; I over 51 to 80 A: duty = I / 2.5 + 64. Least current offered 6 A; 32 A = 53.3 %. 1 kHz square wave, +-12 V. The bands below 10 % and above 96 % differ slightly between the two standards (J1772: up to 8 % none, 9.5 to 10 % 6 A, above 96.5 % none).',
  rows: [
    { duty: '< 3', meaning: 'charging not allowed' },
    { duty: '3 to 7 (nominal 5)', meaning: 'digital communication required' },
    { duty: '7 to 8', meaning: 'charging not allowed' },
    { duty: '8 to < 10', I: '6' },
    { duty: '10 to 85', I: 'duty x 0.6' },
    { duty: '> 85 to 96', I: '(duty - 64) x 2.5' },
    { duty: '> 96 to 97', I: '80' },
    { duty: '> 97 / 100', meaning: 'charging not allowed / steady 12 V' },
  ],
} satisfies ReferenceTable

export const table61851_states = {
  id: '61851-states',
  title: 'Control pilot states',
  source: {
    title: 'IEC 61851-1 Annex A, as printed in two test-adapter manuals and two charge-controller manuals (makers withheld)',
    edition: 'IEC 61851-1',
  },
  confidence: 'two sources',
  units: { V: 'positive peak at the charge point', R: 'ohm vehicle side' },
  notes: 'Some texts quote 1.3 kohm for state C: the switched resistor alone (1.3 k parallel 2.74 k = 882 ohm); likewise 270 ohm for state D (270 parallel 2740 = 246 ohm). Tolerance 1 V. F -12 V printed in one manual only.',
  rows: [
    { state: 'A', V: 12, R: 'open', meaning: 'no vehicle' },
    { state: 'B', V: 9, R: 2740, meaning: 'vehicle connected, not ready (B1 no pilot oscillation, B2 oscillating)' },
    { state: 'C', V: 6, R: 882, meaning: 'ready, no ventilation' },
    { state: 'D', V: 3, R: 246, meaning: 'ready, ventilation required' },
    { state: 'E', V: 0, meaning: 'supply or pilot fault, not available' },
    { state: 'F', V: -12, meaning: 'charge point not available' },
  ],
} satisfies ReferenceTable

export const table61851_PP = {
  id: '61851-PP',
  title: 'Proximity resistor of a detachable type 2 cable',
  source: {
    title: 'IEC 61851-1 Annex B, as printed in two test-adapter manuals and a charge-controller manual (makers withheld)',
    edition: 'IEC 61851-1 Annex B',
  },
  confidence: 'two sources',
  units: { R: 'ohm', I: 'A cable rating' },
  notes: 'One adapter manual prints 64 A for 100 ohm; the controller manual prints 63 (70) A and reads 75 to 150, 150 to 330, 330 to 1000 and 1000 to 2200 ohm as 63, 32, 20 and 13 A, anything lower or higher as a fault or no cable. Resistor tolerance 3 % from memory.',
  rows: [
    { R: 1500, I: 13 },
    { R: 680, I: 20 },
    { R: 220, I: 32 },
    { R: 100, I: '63 (70 single-phase)' },
  ],
} satisfies ReferenceTable

export const table722 = {
  id: '722',
  title: 'Section 722 rules that bear on the calculation',
  source: {
    title: 'BS 7671:2018+A1:2020 Section 722, as told on a device maker\'s page (name withheld), a training blog and a trade forum; (iv) as printed in a charger manual and on a reseller\'s and a maker\'s support pages (names withheld)',
    edition: 'BS 7671:2018+A1:2020, A2:2022',
  },
  confidence: 'one source',
  units: {},
  notes: '',
  rows: [
    { rule: 'separate final circuit for each connecting point (722.314)', verified: 'one source (exam article)' },
    { rule: '30 mA RCD per connecting point, type A plus RDC-DD 6 mA d.c. or type F plus, or type B (722.531.3.101)', verified: 'one source (exam article)' },
    { rule: 'PME not to be used outdoors unless (i) a three-phase installation with other loads keeps the earthing terminal at or below 70 V, (ii) an added electrode does, (iii) a device disconnects live and protective conductors within 5 s above 70 V (need not act under 4 s), (iv) single-phase: a device acting outside 207 V to 253 V, (v) another device no less safe (numbering as in EAR-02 to EAR-06)', verified: 'two sources for iii (70 V, 5 s, 4 s), iv (207 V, 253 V, 5 s) and v; one source for i and ii' },
    { rule: 'maximum neutral current, three-phase (Annex A722)', formula: 'I = sqrt((IL1 - 0.5 (IL2+IL3))^2 + (0.866 (IL2-IL3))^2)', url: null, verified: 'one source' },
    { rule: 'electrode resistance for option (ii) (Annex A722)', formula: 'RAev <= 70 U0 / (Iinst (Cmax U0 - 70)), Cmax = 1.1, Iinst = maximum demand current (single-phase) or neutral current', verified: 'from memory' },
    { rule: 'exemption for dwellings where not reasonably practicable (2015-2018 text) was removed by A1:2020', verified: 'from memory' },
  ],
} satisfies ReferenceTable
