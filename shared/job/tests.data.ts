/** The tests and functional checks of a charging circuit, in meter order. Sequence and instruments: BS 7671 Part 6 as told in JOB stage 8 (common practice). */
export interface TestSpec {
  page: 'supply' | 'dead' | 'live'
  label: string
  title: string
  unit: string
  units?: readonly string[]
  answer: 'figure' | 'seen'
  decimals: number
  instrument: InstrumentFunction | null
  /** A figure on which Outside limit or Cannot tell yet stops signing. */
  isSafety: boolean
  isOptional?: boolean
  /** Applies only where this holds; see `appliesTo` in judge-readings. */
  when?: 'TT' | 'three-phase' | 'open-PEN' | 'limiter' | 'rcd-main-switch' | 'dc-detection'
  hint: string
}

export type InstrumentFunction = 'continuity' | 'insulation' | 'loop' | 'rcd' | 'electrode' | 'vehicle-adapter'

export const INSTRUMENT_WORDS: Record<InstrumentFunction, string> = { 'continuity': 'Continuity', 'insulation': 'Insulation', 'loop': 'Loop and fault current', 'rcd': 'Residual-current device', 'electrode': 'Earth electrode', 'vehicle-adapter': 'Vehicle adapter' }

export const TESTS = {
  'supply-polarity': { page: 'supply', label: 'Supply polarity', title: 'Polarity of the supply at the origin', unit: '', answer: 'seen', decimals: 0, instrument: 'loop', isSafety: true, hint: 'Before anything new is connected.' },
  'Ze': { page: 'supply', label: 'Ze', title: 'External loop impedance, Ze', unit: 'Ω', answer: 'figure', decimals: 2, instrument: 'loop', isSafety: true, hint: 'Main switch off, earthing conductor off for the test only; back on before energising.' },
  'Ipf': { page: 'supply', label: 'Ipf', title: 'Prospective fault current at the origin, Ipf', unit: 'kA', answer: 'figure', decimals: 2, instrument: 'loop', isSafety: true, hint: 'The larger of line to neutral and line to earth.' },
  'R1R2': { page: 'dead', label: 'R1+R2', title: 'Continuity, R1+R2', unit: 'Ω', answer: 'figure', decimals: 2, instrument: 'continuity', isSafety: true, hint: 'Leads nulled. Line and protective conductor joined at the board.' },
  'R1Rn': { page: 'dead', label: 'R1+Rn', title: 'Continuity, R1+Rn', unit: 'Ω', answer: 'figure', decimals: 2, instrument: 'continuity', isSafety: false, isOptional: true, hint: 'Shows a loose joint that R1+R2 alone may hide.' },
  'IR-live-earth': { page: 'dead', label: 'Insulation, line to earth', title: 'Insulation, line to earth', unit: 'MΩ', answer: 'figure', decimals: 2, instrument: 'insulation', isSafety: true, hint: '500 V d.c., cable alone: charger and surge device disconnected.' },
  'IR-neutral-earth': { page: 'dead', label: 'Insulation, neutral to earth', title: 'Insulation, neutral to earth', unit: 'MΩ', answer: 'figure', decimals: 2, instrument: 'insulation', isSafety: true, hint: '500 V d.c., cable alone.' },
  'IR-line-neutral': { page: 'dead', label: 'Insulation, line to neutral', title: 'Insulation, line to neutral', unit: 'MΩ', answer: 'figure', decimals: 2, instrument: 'insulation', isSafety: true, hint: '500 V d.c., cable alone.' },
  'IR-line-line': { page: 'dead', label: 'Insulation, line to line', title: 'Insulation, line to line', unit: 'MΩ', answer: 'figure', decimals: 2, instrument: 'insulation', isSafety: true, when: 'three-phase', hint: 'Lowest of the three.' },
  'IR-charger': { page: 'dead', label: 'Insulation, charger connected', title: 'Insulation, charger connected', unit: 'MΩ', answer: 'figure', decimals: 2, instrument: 'insulation', isSafety: true, isOptional: true, hint: '250 V d.c., live conductors together to earth, only if the maker allows it.' },
  'polarity': { page: 'dead', label: 'Polarity', title: 'Polarity of the new circuit', unit: '', answer: 'seen', decimals: 0, instrument: 'continuity', isSafety: true, hint: 'Dead, at the charging point.' },
  'RA': { page: 'dead', label: 'RA', title: 'Earth electrode resistance, RA', unit: 'Ω', answer: 'figure', decimals: 1, instrument: 'electrode', isSafety: true, when: 'TT', hint: 'Away from every other earth.' },
  'Zs-board': { page: 'live', label: 'Zs at the board', title: 'Loop impedance at the board', unit: 'Ω', answer: 'figure', decimals: 2, instrument: 'loop', isSafety: false, hint: 'All earths back on.' },
  'Ipf-board': { page: 'live', label: 'Ipf at the board', title: 'Prospective fault current at the board', unit: 'kA', answer: 'figure', decimals: 2, instrument: 'loop', isSafety: true, hint: 'The larger of line to neutral and line to earth.' },
  'phase-sequence': { page: 'live', label: 'Phase sequence', title: 'Phase sequence', unit: '', answer: 'seen', decimals: 0, instrument: 'loop', isSafety: true, when: 'three-phase', hint: 'At the charging point.' },
  'Zs': { page: 'live', label: 'Zs', title: 'Loop impedance at the charging point, Zs', unit: 'Ω', answer: 'figure', decimals: 2, instrument: 'loop', isSafety: true, hint: 'Through the vehicle adapter; a no-trip range where the device would trip.' },
  'RCD-time': { page: 'live', label: 'RCD time', title: 'Residual-current device, time at rated current', unit: 'ms', answer: 'figure', decimals: 0, instrument: 'rcd', isSafety: true, hint: 'Once at rated residual current, alternating; set the tester to the device\'s type.' },
  'RCD-dc': { page: 'live', label: 'D.c. trip', title: 'D.c. detection, time at 6 mA', unit: 's', answer: 'figure', decimals: 1, instrument: 'vehicle-adapter', isSafety: true, when: 'dc-detection', hint: 'With a smooth direct current of 6 mA, where the adapter can give it.' },
  'RCD-button': { page: 'live', label: 'RCD button', title: 'Residual-current device, test button', unit: '', answer: 'seen', decimals: 0, instrument: null, isSafety: true, hint: 'Press after the measured test.' },
  'vehicle-states': { page: 'live', label: 'Vehicle states', title: 'Vehicle states A, B and C', unit: '', answer: 'seen', decimals: 0, instrument: 'vehicle-adapter', isSafety: true, hint: 'A charger may wait out its random delay before current flows: wait, or override the delay, before you call it a fault.' },
  'PE-fault': { page: 'live', label: 'Protective-conductor fault', title: 'Protective-conductor fault stops charging', unit: '', answer: 'seen', decimals: 0, instrument: 'vehicle-adapter', isSafety: true, hint: 'And the control-pilot fault.' },
  'open-PEN': { page: 'live', label: 'Open-PEN function', title: 'Open-PEN device, maker\'s own test', unit: '', answer: 'seen', decimals: 0, instrument: null, isSafety: true, when: 'open-PEN', hint: 'Only as the maker describes.' },
  'limiter': { page: 'live', label: 'Load limiter', title: 'Load limiter seen to limit', unit: '', answer: 'seen', decimals: 0, instrument: null, isSafety: true, when: 'limiter', hint: 'With the house loaded, the charge falls and comes back.' },
  'delay-restored': { page: 'live', label: 'Random delay', title: 'Randomised delay switched back on', unit: '', answer: 'seen', decimals: 0, instrument: null, isSafety: false, hint: 'Where it was switched off for testing.' },
  'isolation': { page: 'live', label: 'Isolation', title: 'Isolation and switching work', unit: '', answer: 'seen', decimals: 0, instrument: null, isSafety: true, hint: 'The means of isolation opens every live pole.' },
} as const satisfies Record<string, TestSpec>

export type TestKey = keyof typeof TESTS
export const TEST_KEYS = Object.keys(TESTS) as TestKey[]

export function testSpec(key: TestKey): TestSpec {
  return TESTS[key]
}
