import type { CertificateRecord } from '#shared/schemas/sealed-record'
import type { InstallationRecord } from '#shared/schemas/sealed-record/installation'
import type { MinorWorksRecord } from '#shared/schemas/sealed-record/minor-works'
import { inspectionItems } from '#shared/schemas/sealed-record/inspection-items.data'
import { limited, notApplicable, notEntered, textField, type Judgement, type PrintedField } from '#shared/schemas/sealed-record/field'
import type { Capacity, Signature } from '#shared/schemas/sealed-record/parts'

/** An invented firm, house and circuit; every figure is made up but fits the others. */
const EDITION = 'BS 7671:2018+A4:2026'
const AT = '2027-03-02T10:12:00Z'
const TESTER = { personId: 'p-2', personName: 'R. Invented' }

const told = (shown: string, howKnown = 'read on site'): PrintedField => textField(shown, { howKnown, ...TESTER, at: AT })
const figure = (value: number, shown: string, unit: string, howKnown = 'given'): PrintedField => textField(shown, { value, unit, howKnown })
const measured = (value: number, shown: string, unit: string, resolution: number, judgement?: Judgement): PrintedField =>
  ({ kind: 'value', shown, value, unit, resolution, howKnown: 'measured', ...TESTER, instrumentSerial: 'MFT-0042', at: AT, ...(judgement && { judgement }) })
const tried = (shown: string): PrintedField => textField(shown, { howKnown: 'tried', ...TESTER, instrumentSerial: 'VA-0007', at: AT, judgement: { verdict: 'within' } })

function signature(capacities: Capacity[], who: Pick<Signature, 'personId' | 'name' | 'way' | 'statement'> & Partial<Signature>): Signature {
  return { capacities, firm: 'Wrenfield Charging (invented)', address: 'Unit 2, Sample Yard, Exampleton ZZ9 9ZZ', telephone: '01632 960123', edition: EDITION, at: '2027-03-02T15:40:00Z', ...who }
}

const common = () => ({
  format: 1 as const,
  firm: { name: 'Wrenfield Charging (invented)', address: 'Unit 2, Sample Yard, Exampleton ZZ9 9ZZ', scheme: 'Invented Competence Scheme', registration: 'ICS 000123' },
  certificate: { number: 'WRN-2027-00042', revision: 'A', replaces: null, edition: EDITION, formEdition: 'Amendment 2 list of fields', ruleDataVersion: '2026-12-01', at: '2027-03-03T09:05:00Z' },
  jobReference: 'J-1042',
  client: { name: 'A. Sample', address: '19 Hill Street, Exampleton ZZ1 1ZZ' },
  departures: [],
  exceptions: [],
  selfCountersigned: false,
  previousHash: 'c'.repeat(64),
  instruments: [
    { function: 'Continuity, insulation, loop, RCD', description: 'Multifunction installation tester', serial: 'MFT-0042', calibratedOn: '2026-09-14', calibratedUntil: '2027-09-14', validOnUse: textField('In calibration on 2 Mar 2027') },
    { function: 'Vehicle adapter', description: 'Vehicle simulator, socket type 2', serial: 'VA-0007', calibratedUntil: '2027-06-30', validOnUse: textField('In calibration on 2 Mar 2027') },
  ],
  photographs: [
    { claim: 'Cut-out with its rating readable', sha256: '1'.repeat(64), at: '2027-03-02T08:40:00Z', personName: 'R. Invented' },
    { claim: 'Earth connection at the charging point', sha256: '2'.repeat(64), at: '2027-03-02T13:02:00Z', personName: 'R. Invented' },
  ],
})

const checked = () => signature(['checked-for-the-firm'], { personId: 'p-3', name: 'S. Fictional', way: 'passkey', statement: 'I have compared this record with the design and found it complete.', at: '2027-03-03T09:05:00Z' })
const device = () => ({ standard: textField('BS EN 61009-1'), type: textField('RCBO, curve B'), rating: figure(40, '40', 'A', 'read'), breakingCapacity: figure(6, '6', 'kA', 'read') })
const rcd = () => ({ standard: textField('BS EN 61009-1'), type: textField('Type A'), tripCurrent: figure(30, '30', 'mA', 'read'), rating: figure(40, '40', 'A', 'read'), place: textField('At the board, way 9') })

export function installationSample(changes: Partial<InstallationRecord> = {}): InstallationRecord {
  return {
    ...common(),
    kind: 'installation',
    signatures: [
      signature(['design', 'construction', 'inspection-and-test'], { personId: 'p-2', name: 'R. Invented', way: 'drawn', statement: 'I designed, built, inspected and tested the work described here and it meets the edition named, save for the departures listed.', drawing: { width: 200, height: 60, path: 'M10 40 C 30 5, 50 55, 70 30 S 110 10, 130 35 L 180 28' } }),
      checked(),
    ],
    installation: {
      shortAddress: '19 Hill Street, ZZ1 1ZZ',
      address: textField('19 Hill Street, Exampleton ZZ1 1ZZ'),
      occupier: notApplicable('the client lives there'),
      description: textField('House with a single-phase supply'),
      extent: textField('One new circuit from the consumer unit in the hall to a 7.4 kW vehicle charging point on the garage wall'),
      notCovered: textField('All other circuits of the house'),
      nature: 'addition',
    },
    nextInspection: { interval: textField('10 years, or at a change of owner'), recommendedBy: textField('R. Invented') },
    supply: {
      earthing: told('TN-C-S'),
      earthingEvidence: told('Link between neutral and earth seen at the cut-out, photograph 1'),
      liveConductors: told('1 line, 1 neutral, a.c.'),
      nominalVoltage: textField('230 / 230', { unit: 'V', howKnown: 'by enquiry' }),
      frequency: textField('50', { value: 50, unit: 'Hz', howKnown: 'by enquiry' }),
      faultCurrent: measured(1.1, '1.10', 'kA', 0.01, { verdict: 'within', limit: '≤ 6 kA', margin: '4.90 kA inside' }),
      loopImpedance: measured(0.21, '0.21', 'Ω', 0.01, { verdict: 'within', limit: '≤ 0.35 Ω', margin: '0.14 Ω inside' }),
      polarity: { ...told('Confirmed', 'tested'), judgement: { verdict: 'within' } },
      device: { standard: told('BS 1361'), type: told('Type II'), rating: { ...figure(80, '80', 'A', 'read on the fuse carrier'), ...TESTER, at: AT } },
      otherSources: told('None seen'),
    },
    meansOfEarthing: { means: textField('Distributor’s facility'), electrodeType: notApplicable('distributor’s earth'), electrodeLocation: notApplicable('distributor’s earth'), electrodeResistance: notApplicable('distributor’s earth'), electrodeMethod: notApplicable('distributor’s earth') },
    maximumDemand: { demand: figure(60, '60', 'A', 'calculated'), way: textField('Allowances for the house, charging point in full, held by the load limiter'), loadLimiter: textField('With load limiter, tested'), loadLimit: figure(60, '60', 'A', 'set in the installer’s menu') },
    earthingConductor: { material: told('Copper'), size: figure(16, '16', 'mm²', 'read'), continuity: { ...told('Verified', 'tested'), judgement: { verdict: 'within' } }, connection: told('Verified', 'looked at') },
    bonding: { material: told('Copper'), size: figure(10, '10', 'mm²', 'read'), continuity: limited('pipe boxed in; existing part', { howKnown: 'existing' }), water: told('Yes'), gas: told('Yes'), oil: told('Not present'), steel: told('Not present'), lightning: told('Not present'), other: told('Not present') },
    mainSwitch: { location: told('Hall cupboard'), standard: told('BS EN 60947-3'), type: told('Switch-disconnector'), poles: told('2'), currentRating: figure(100, '100', 'A', 'read'), voltageRating: figure(230, '230', 'V', 'read'), setting: notApplicable('no fuse in the switch'), rcdCurrent: notApplicable('not a residual-current device'), rcdDelay: notApplicable('not a residual-current device'), rcdTime: notApplicable('not a residual-current device') },
    existingInstallation: { comments: textField('One blank missing at the consumer unit was fitted. Nothing else seen that bears on this work.') },
    earthingMethod: { method: textField('Open-PEN device built into the charging point'), why: textField('Single-phase house on TN-C-S, vehicle parked outdoors'), rule: 'EAR-05' },
    inspections: {
      edition: inspectionItems.edition,
      items: inspectionItems.items.map(item => ['5', '12', '14'].includes(item.number)
        ? { ...item, outcome: 'not-applicable' as const, reason: 'nothing of the kind in this work', ...TESTER, at: AT }
        : { ...item, outcome: 'satisfactory' as const, ...TESTER, at: AT, ...(item.number === '1' && { restsOn: 'Photograph: cut-out with its rating readable' }) }),
    },
    tests: {
      board: { designation: textField('CU1'), location: told('Hall cupboard'), suppliedFrom: textField('The origin'), device: textField('80 A fuse at the cut-out'), rcd: notApplicable('none for the whole board'), zs: measured(0.21, '0.21', 'Ω', 0.01), faultCurrent: measured(1.1, '1.10', 'kA', 0.01), polarity: { ...told('Confirmed', 'tested'), judgement: { verdict: 'within' } }, phaseSequence: notApplicable('single-phase'), surgeDevice: told('Type 2, indicator shows ready') },
      circuits: [{
        number: textField('9'),
        description: textField('Vehicle charging point, garage wall'),
        wiringType: textField('Armoured, thermosetting, 3-core'),
        referenceMethod: textField('C'),
        points: textField('1'),
        lineSize: figure(6, '6', 'mm²', 'read'),
        protectiveSize: figure(6, '6', 'mm²', 'read'),
        device: device(),
        disconnectionTime: figure(0.4, '0.4', 's', 'table'),
        maximumZs: figure(0.87, '0.87', 'Ω', 'calculated'),
        maximumZsBasis: textField('80 % of 1.09 Ω from the table'),
        rcd: rcd(),
        dcDetection: textField('6 mA d.c., in the charging point'),
        ring: { r1: notApplicable('not a ring'), rn: notApplicable('not a ring'), r2: notApplicable('not a ring') },
        continuityOf: 'R1+R2',
        continuity: measured(0.23, '0.23', 'Ω', 0.01, { verdict: 'unexpected', limit: '≤ 0.66 Ω', expected: '0.11 Ω', margin: '2.1 × design', sentence: 'The measured length was 34 m, not 18 m: the route goes round the extension; volt drop worked again, 3.5 %.', sentenceBy: 'R. Invented', acceptedBy: 'S. Fictional' }),
        r1rn: measured(0.23, '0.23', 'Ω', 0.01),
        insulation: {
          voltage: figure(500, '500', 'V', 'set'),
          lineToLine: notApplicable('single-phase'),
          lineToEarth: { kind: 'over-range', shown: '> 999', value: 999, unit: 'MΩ', resolution: 1, howKnown: 'measured', ...TESTER, instrumentSerial: 'MFT-0042', at: AT, judgement: { verdict: 'within', limit: '≥ 1.0 MΩ' } },
          neutralToEarth: measured(412, '412', 'MΩ', 1, { verdict: 'within', limit: '≥ 1.0 MΩ' }),
          chargerConnected: textField('No: cable alone'),
        },
        polarity: { ...tried('Correct'), judgement: { verdict: 'within' } },
        zs: { ...measured(0.44, '0.44', 'Ω', 0.01, { verdict: 'within', limit: '≤ 0.87 Ω', expected: '0.44 Ω', margin: '0.43 Ω inside' }), earlier: [{ kind: 'value', shown: '0.91', value: 0.91, unit: 'Ω', resolution: 0.01, howKnown: 'measured', ...TESTER, instrumentSerial: 'MFT-0042', at: '2027-03-02T09:58:00Z', judgement: { verdict: 'outside', limit: '≤ 0.87 Ω', margin: 'by 0.04 Ω' } }] },
        zsCorrected: notApplicable('measured value is within 80 %'),
        rcdTime: measured(24.5, '24.5', 'ms', 0.1, { verdict: 'within', limit: '≤ 300 ms', margin: '275.5 ms inside' }),
        dcTrip: measured(1.8, '1.8', 's', 0.1, { verdict: 'within', limit: '≤ 10 s', margin: '8.2 s inside' }),
        rcdButton: tried('Trips'),
        arcFaultButton: notApplicable('none fitted'),
        functional: { vehicleStates: tried('A, B and C as they should be'), protectiveConductorFault: tried('Stops'), openPen: tried('Maker’s own test passed'), loadLimiter: tried('Seen to hold the house at 60 A'), randomDelay: tried('Back on after the tests'), isolation: tried('Isolates both poles') },
        remarks: textField('None'),
      }],
      testedBy: { personId: 'p-2', name: 'R. Invented', at: '2027-03-02T15:40:00Z' },
    },
    design: {
      circuit: {
        name: 'circuit',
        title: 'Is the circuit right?',
        input: { Ib_A: 32, device: 'B', In_A: 40, phases: 1, cable: 'swa-90', terminals_C: 70, legs: [{ method: 'C', L_m: 18, ambient_C: 30 }], Ze_ohm: 0.21, Ipf_kA: 1.1, device_kA: 6 },
        result: { S_mm2: 6 },
        verdict: 'within',
        working: [
          { symbol: 'Ib', expression: '7,360 ÷ (230 × 1)', value: 32, unit: 'A', source: 'Given: 7.36 kW, single-phase', confidence: 'given' },
          { symbol: 'It ≥ In ÷ (Ca × Cg × Ci)', expression: '40 ÷ (1 × 1 × 1)', value: 40, unit: 'A', source: 'BS 7671 Appendix 4', confidence: 'two sources' },
          { symbol: 'ΔU', expression: '7.3 × 32 × 18 ÷ 1000', value: 4.2048, unit: 'V', source: 'BS 7671 Table 4D4B', confidence: 'one source' },
          { symbol: 'Zs', expression: '0.21 + 0.133', value: 0.343, unit: 'Ω', source: 'Ze and R1+R2 at 70 °C', confidence: 'computed' },
          { symbol: 'S', expression: '√(670² × 0.1) ÷ 143', value: 1.48, unit: 'mm²', source: 'BS 7671 regulation 543.1.3; k from Table 54.4', confidence: 'from memory' },
        ],
        reasons: [],
        notes: ['R1+R2 is taken hot: × 1.20 at 70 °C terminals.'],
      },
      supplyCheck: {
        name: 'supply',
        title: 'Can the supply carry it?',
        input: { fuse_A: 80, fuseKnown: 'read', house_A: 46, ev_A: 32, loadLimit_A: 60, limiterTested: true },
        result: { demandAfter_A: 60 },
        verdict: 'within',
        working: [{ symbol: 'Demand after', expression: 'max(46, min(46 + 32, 60))', value: 60, unit: 'A', source: 'BS 7671 722.311', confidence: 'two sources' }],
        reasons: ['DNO-11: the tested load limiter counts.'],
        notes: [],
      },
      others: [],
    },
    ...changes,
  }
}

/** The same sheet with two readings still to come. */
export function draftSample(): InstallationRecord {
  const sample = installationSample({ signatures: [] })
  const circuit = sample.tests.circuits[0]
  if (!circuit) throw new Error('The sample has a circuit')
  return { ...sample, tests: { ...sample.tests, circuits: [{ ...circuit, zs: notEntered(), rcdTime: notEntered() }] } }
}

export function minorWorksSample(changes: Partial<MinorWorksRecord> = {}): MinorWorksRecord {
  return {
    ...common(),
    kind: 'minor-works',
    signatures: [signature(['minor-works'], { personId: 'p-2', name: 'R. Invented', way: 'typed', statement: 'The work described here meets the edition named, save for the departures listed.' }), checked()],
    installation: { shortAddress: '19 Hill Street, ZZ1 1ZZ', address: textField('19 Hill Street, Exampleton ZZ1 1ZZ') },
    work: { completed: textField('2 March 2027', { value: '2027-03-02' }), description: textField('Vehicle charging point changed for another of the same rating'), location: textField('Garage wall, circuit 9') },
    existingInstallation: { comments: textField('No comments') },
    supply: { system: told('TN-C-S, 1 line, 1 neutral'), earthing: told('Distributor’s facility'), impedanceAt: 'Zs at the board', impedance: measured(0.21, '0.21', 'Ω', 0.01, { verdict: 'within', limit: '≤ 0.35 Ω' }), earthingConductor: told('Adequate, 16 mm² copper'), bonding: told('Adequate, 10 mm² copper to water and gas') },
    circuit: { identification: textField('CU1, circuit 9'), device: device(), rcd: rcd(), surgeDevice: told('Type 2, indicator shows ready'), arcFaultDevice: notApplicable('none fitted'), lineSize: figure(6, '6', 'mm²', 'read'), protectiveSize: figure(6, '6', 'mm²', 'read') },
    results: { continuityOf: 'R1+R2', continuity: measured(0.23, '0.23', 'Ω', 0.01, { verdict: 'within', limit: '≤ 0.66 Ω', margin: '0.43 Ω inside' }), insulation: { voltage: figure(500, '500', 'V', 'set'), lineToLine: notApplicable('single-phase'), lineToEarth: measured(412, '412', 'MΩ', 1, { verdict: 'within', limit: '≥ 1.0 MΩ' }), neutralToEarth: measured(388, '388', 'MΩ', 1, { verdict: 'within', limit: '≥ 1.0 MΩ' }) }, polarity: tried('Correct'), maximumZs: figure(0.87, '0.87', 'Ω', 'calculated'), zs: measured(0.44, '0.44', 'Ω', 0.01, { verdict: 'within', limit: '≤ 0.87 Ω', margin: '0.43 Ω inside' }), rcdTime: measured(24.5, '24.5', 'ms', 0.1, { verdict: 'within', limit: '≤ 300 ms' }), rcdButton: tried('Trips'), arcFaultButton: notApplicable('none fitted'), remarks: textField('None') },
    design: null,
    ...changes,
  }
}

/** Every kind of paper, for tests that must hold for all. */
export const everySample = (): CertificateRecord[] => [installationSample(), minorWorksSample()]
