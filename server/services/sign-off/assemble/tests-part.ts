/** The schedule of test results: the board and the one new circuit. */
import { contentOf, numberOf, textOf } from '../../../../shared/job/judge/facts'
import { INSULATION_TEST_V } from '../../../../shared/job/judge/readings/insulation'
import { notApplicable, notEntered, textField, type PrintedField } from '../../../../shared/schemas/sealed-record/field'
import type { InstallationRecord } from '../../../../shared/schemas/sealed-record/installation'
import type { TestedCircuit } from '../../../../shared/schemas/sealed-record/test-schedule'
import { TEST_KEYS } from '../../../../shared/job/tests.data'
import { formatFigure, formatNumber } from '../../../../shared/utils/figures'
import { composed, instant, personName, reading, recorded } from './fields'
import type { AssembleInput } from './input'

const circuit = (input: AssembleInput, field: string, rest?: Partial<PrintedField>) => recorded(input, 'circuit', 'installed', field, rest)
const survey = (input: AssembleInput, field: string) => recorded(input, 'survey', 'survey', field)
/** A charging point is held to the shorter time whatever its rating (common practice). */
const DISCONNECTION_S = { TN: 0.4, TT: 0.2 } as const

export function testsPart(input: AssembleInput): InstallationRecord['tests'] {
  return { board: boardPart(input), circuits: [circuitPart(input)], testedBy: testedBy(input) }
}

/** Who signs as inspector and tester; on a draft the person of the latest reading. */
function testedBy(input: AssembleInput): InstallationRecord['tests']['testedBy'] {
  const inspector = input.signatures.find(each => each.capacity === 'inspector')
  if (inspector) return { personId: inspector.personId, name: inspector.nameShown, at: instant(inspector.at) }
  const last = [...input.record.readings].sort((a, b) => Date.parse(a.serverAt) - Date.parse(b.serverAt)).at(-1)
  return last ? { personId: last.personId, name: personName(input, last.personId), at: instant(last.serverAt) } : { personId: 'nobody-yet', name: 'nobody yet', at: instant(input.sealedAt) }
}

function boardPart(input: AssembleInput): InstallationRecord['tests']['board'] {
  const content = contentOf(input.record, 'survey', 'survey')
  const fuse_A = numberOf(content, 'cutout_A')
  const upstream = textOf(content, 'upstream_rcd')
  const decision = survey(input, content.spd === 'declined' || content.spd === 'not_needed' ? 'spd_reason' : 'spd_type')
  const surge = survey(input, 'spd')
  return {
    designation: survey(input, 'board_name'),
    location: survey(input, 'board_location'),
    suppliedFrom: textField('The origin'),
    device: fuse_A === undefined ? notEntered() : textField(`${formatFigure(fuse_A, 'A')} fuse at the cut-out`),
    rcd: upstream === 'none' ? notApplicable('none for the whole board') : survey(input, 'upstream_rcd'),
    zs: reading(input, 'Zs-board'),
    faultCurrent: reading(input, 'Ipf-board'),
    polarity: reading(input, 'supply-polarity'),
    phaseSequence: reading(input, 'phase-sequence'),
    surgeDevice: surge.kind === 'value' && decision.kind === 'value' ? { ...surge, shown: `${surge.shown}: ${decision.shown}` } : notEntered(),
  }
}

function circuitPart(input: AssembleInput): TestedCircuit {
  const { record, judgement } = input
  const notRing = notApplicable('not a ring')
  const methods = [...new Set(record.parts.leg.map(row => textOf(row.content, 'method')).filter(each => each !== undefined))].join(', ')
  const wiring = circuit(input, 'wiring')
  const time_s = DISCONNECTION_S[judgement.system]
  return {
    number: circuit(input, 'number'), description: circuit(input, 'description'),
    wiringType: circuit(input, 'cable'),
    referenceMethod: wiring.kind === 'value' ? wiring : composed(methods),
    points: circuit(input, 'points'),
    lineSize: circuit(input, 'S_mm2'), protectiveSize: circuit(input, 'cpc_mm2'),
    device: { standard: circuit(input, 'device_standard'), type: circuit(input, 'device'), rating: circuit(input, 'In_A'), breakingCapacity: circuit(input, 'device_kA') },
    disconnectionTime: textField(formatNumber(time_s), { value: time_s, unit: 's' }),
    ...maximumZs(input),
    rcd: { standard: circuit(input, 'rcd_standard'), type: circuit(input, 'rcd_type'), tripCurrent: circuit(input, 'rcd_IdeltaN_mA'), rating: circuit(input, 'rcd_A'), place: circuit(input, 'rcd_where') },
    dcDetection: circuit(input, 'dc_where'),
    ring: { r1: notRing, rn: notRing, r2: notRing },
    continuityOf: 'R1+R2',
    continuity: reading(input, 'R1R2'),
    r1rn: reading(input, 'R1Rn', 'not taken; not required'),
    insulation: insulationPart(input),
    polarity: reading(input, 'polarity'),
    zs: reading(input, 'Zs'),
    zsCorrected: zsCorrected(input),
    rcdTime: reading(input, 'RCD-time'), dcTrip: reading(input, 'RCD-dc'), rcdButton: reading(input, 'RCD-button'),
    arcFaultButton: notApplicable('none fitted'),
    functional: {
      vehicleStates: reading(input, 'vehicle-states'), protectiveConductorFault: reading(input, 'PE-fault'), openPen: reading(input, 'open-PEN'),
      loadLimiter: reading(input, 'limiter'), randomDelay: reading(input, 'delay-restored'), isolation: reading(input, 'isolation'),
    },
    remarks: remarks(input),
  }
}

/** Rounded down, so that the printed limit never allows more than the true one. */
function maximumZs({ judgement }: AssembleInput): Pick<TestedCircuit, 'maximumZs' | 'maximumZsBasis'> {
  const { ZsMax_ohm: whole, ZsMeasuredMax_ohm: measured } = judgement.zsLimit.answer.result
  if (whole === undefined) return { maximumZs: notEntered(), maximumZsBasis: notEntered() }
  const limit = (value: number, decimals: number) => textField(formatNumber(Math.floor(value * 10 ** decimals + 1e-9) / 10 ** decimals, decimals), { value, unit: 'Ω', howKnown: 'calculated' })
  if (judgement.system === 'TT') return { maximumZs: limit(whole, 0), maximumZsBasis: textField('50 V ÷ rated residual current (TT)') }
  if (judgement.readings.Zs.corrected) return { maximumZs: limit(whole, 2), maximumZsBasis: textField('The table\'s limit; the reading is assessed by temperature') }
  return { maximumZs: limit(measured!, 2), maximumZsBasis: textField(`80 % of ${formatFigure(whole, 'Ω', 2)} from the table`) }
}

function zsCorrected({ judgement }: AssembleInput): PrintedField {
  const { corrected, verdict, applies } = judgement.readings.Zs
  if (corrected) return textField(formatNumber(corrected.value, 2), { value: corrected.value, unit: 'Ω', howKnown: 'calculated', judgement: { verdict: 'within', limit: corrected.limitText } })
  return notApplicable(applies && verdict !== 'not-entered' ? 'the reading is held against its limit as measured' : 'no reading to assess')
}

function insulationPart(input: AssembleInput): TestedCircuit['insulation'] {
  const { counted } = input.judgement.readings['IR-live-earth']
  const test_V = counted?.context.testVoltage_V ?? INSULATION_TEST_V.cable
  const connected = input.judgement.readings['IR-charger']
  return {
    voltage: counted ? textField(formatNumber(test_V), { value: test_V, unit: 'V', howKnown: counted.context.testVoltage_V === undefined ? 'as the test asks' : 'set' }) : notEntered(),
    lineToLine: reading(input, 'IR-line-line'),
    lineToEarth: reading(input, 'IR-live-earth'),
    neutralToEarth: reading(input, 'IR-neutral-earth'),
    chargerConnected: connected.counted ? reading(input, 'IR-charger') : textField('No: cable alone'),
  }
}

/** What has no column of its own, and every sentence that an Unexpected stands on. */
function remarks({ judgement }: AssembleInput): PrintedField {
  const lineNeutral = judgement.readings['IR-line-neutral']
  const sentences = TEST_KEYS.map(test => judgement.readings[test]).flatMap(each => [
    ...(each.verdict === 'unexpected' && each.sentence ? [`${each.label}: ${each.sentence}`] : []),
    ...(each.earlier.some(one => one.isCounted) ? [`${each.label}: tested ${each.earlier.filter(one => one.isCounted).length + 1} times, the last stands.`] : []),
  ])
  const all = [...(lineNeutral.counted ? [`Insulation, line to neutral: ${lineNeutral.shown}, ${lineNeutral.words}.`] : []), ...sentences]
  return textField(all.join(' ') || 'None')
}
