/** Allowances for what a dwelling draws at once. Printed standards outrank these figures. */
import type { ReferenceTable } from './reference-table'

export const tableA2 = {
  id: 'A2',
  title: 'Allowances for diversity, individual dwellings',
  source: {
    title: 'On-Site Guide Table A2; same rows in The Electrician\'s Guide to the 16th Edition (handbook, 5th ed.) table 6.2 and on a do-it-yourself wiki',
    edition: 'On-Site Guide Appendix A table A2; same rows in two older prints',
  },
  confidence: 'two sources',
  units: {},
  notes: 'For standard circuits the device rating is only an upper bound: a trade body\'s answer says diversity applies to the circuits\' current demand, not to device ratings. EV row: number and wording from memory; an exam article confirms that there is no diversity.',
  rows: [
    { purpose: 'lighting', rule: '66 % of total current demand' },
    { purpose: 'heating and power (no other row)', rule: '100 % up to 10 A + 50 % of the rest' },
    { purpose: 'cooking appliances', rule: '10 A + 30 % of connected full-load current above 10 A + 5 A if the control unit has a socket-outlet' },
    { purpose: 'motors (other than lift)', rule: 'not tabulated for dwellings' },
    { purpose: 'instantaneous water heaters (showers)', rule: '100 % of largest + 100 % of second largest + 25 % of the rest' },
    { purpose: 'thermostatic water heaters', rule: 'no diversity' },
    { purpose: 'floor warming', rule: 'no diversity' },
    { purpose: 'thermal storage heating', rule: 'no diversity' },
    { purpose: 'standard circuits (ring and radial socket circuits)', rule: '100 % of the largest circuit\'s demand + 40 % of every other\'s' },
    { purpose: 'sockets and stationary equipment other than above', rule: '100 % of largest point + 40 % of every other' },
    { purpose: 'electric vehicle charging', rule: 'no diversity; a load-curtailment arrangement, automatic or by hand, may be counted (722.311.201)' },
  ],
} satisfies ReferenceTable

export const tableA1 = {
  id: 'A1',
  title: 'Current demand assumed per point',
  source: {
    title: 'On-Site Guide Table A1; lighting row as printed in The Electrician\'s Guide to the 16th Edition (handbook, 5th ed.), 6.2.1',
    edition: 'On-Site Guide Appendix A table A1',
  },
  confidence: 'from memory',
  units: {},
  notes: 'The handbook prints the connected load with at least 100 W a lampholder; the cooker rule is also in its table 6.2 (see A2). The rest from memory.',
  rows: [
    { point: 'socket-outlet other than 2 A', demand: 'rated current' },
    { point: '2 A socket-outlet', demand: 'at least 0.5 A' },
    { point: 'lighting outlet', demand: 'connected load, minimum 100 W per lampholder (guide allows the actual LED load)', verified: 'one source, LED remark from memory' },
    { point: 'electric clock, shaver supply unit, bell transformer, <= 5 VA', demand: 'may be neglected' },
    { point: 'household cooking appliance', demand: '10 A + 30 % of the rest of rated current + 5 A if socket' },
    { point: 'all other stationary equipment', demand: 'British Standard rated current or normal current' },
  ],
} satisfies ReferenceTable

export const tableDemand_guidance = {
  id: 'demand-guidance',
  title: 'Guidance on finding maximum demand of an existing dwelling',
  source: {
    title: 'trade forum and institution webinar answers, see rows',
    edition: 'Mixed, see rows',
  },
  confidence: 'one source',
  units: {},
  notes: '',
  rows: [
    { text: 'Maximum demand may be calculated or, for an existing installation, recorded over a representative period; an instantaneous clamp reading is not a maximum demand' },
    { text: 'A distributor\'s permission is needed before adding a charge point where the resulting demand exceeds the supply (installers quote 60 A as the threshold in the network operators\' joint form)' },
    { text: 'Load curtailment is expected to be used to match loads to the supply', url: 'https://electrical.theiet.org/bs-7671/faqs/webinar-questions-and-answers/electrical-diversity-and-load-curtailment-evc-webinar/' },
    { text: 'Regulation numbers: 311.1 (maximum demand, diversity may be taken), 722.311.201 (EV)', verified: 'from memory' },
  ],
} satisfies ReferenceTable

export const tableADMD = {
  id: 'ADMD',
  title: 'After diversity maximum demand, UK dwellings',
  source: {
    title: 'distributors\' design manuals, none read',
    edition: 'Distributors\' design manuals',
    more_urls: ['http://www.networkrevolution.co.uk/project-library/diversity-maximum-demand-admd-report/'],
  },
  confidence: 'from memory',
  units: { ADMD_kW: 'kW per dwelling' },
  notes: 'Order of magnitude only, from memory: network planning figures for many homes together, NOT the maximum demand of one dwelling. No published table by house type was obtained. A network trial report (CLNR-L217, 2015) calls 2 kW normal where there is no electric heating and found 1.5 kW a home in its sample: the gas rows lie about there.',
  rows: [
    { type: 'gas heated, 1-2 bedrooms', ADMD_kW: 1.2 },
    { type: 'gas heated, 3 bedrooms', ADMD_kW: 1.5 },
    { type: 'gas heated, 4+ bedrooms', ADMD_kW: 2 },
    { type: '7 kW EV charging, diversified, added', ADMD_kW: '1.5 to 2.5' },
    { type: 'heat pump, added', ADMD_kW: '2 to 3' },
  ],
} satisfies ReferenceTable
