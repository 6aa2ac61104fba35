/** What stands around the figures: inspections, departures, instruments, photographs, signatures, calculations. */
import { calibrationOn } from '../../../../shared/job/judge/counted'
import { contentOf, isNone, textOf } from '../../../../shared/job/judge/facts'
import type { Judged } from '../../../../shared/job/judge/types'
import { INSPECTIONS, INSPECTIONS_EDITION, type InspectionSpec } from '../../../../shared/job/inspections.data'
import { findShot } from '../../../../shared/job/shots.data'
import { INSTRUMENT_WORDS, testSpec, TEST_KEYS, type InstrumentFunction } from '../../../../shared/job/tests.data'
import { textField } from '../../../../shared/schemas/sealed-record/field'
import type { InspectionItem } from '../../../../shared/schemas/sealed-record/inspections'
import type { InstallationRecord } from '../../../../shared/schemas/sealed-record/installation'
import { SIGNING_WAYS, type Capacity, type Instrument, type SealedCalculation, type Signature } from '../../../../shared/schemas/sealed-record/parts'
import { formatDay, londonDay } from '../../../../shared/utils/dates'
import { instant, personName, rowOf } from './fields'
import type { AssembleInput } from './input'

export function inspectionsPart(input: AssembleInput): InstallationRecord['inspections'] {
  return { edition: INSPECTIONS_EDITION, items: INSPECTIONS.map(item => inspectionItem(input, item)) }
}

function inspectionItem(input: AssembleInput, item: InspectionSpec): InspectionItem {
  const row = rowOf(input, 'inspection', item.key)
  const said = row && textOf(row.content, 'outcome')
  const reason = row && textOf(row.content, 'reason')
  const known = said === 'satisfactory' || said === 'unsatisfactory' || (said === 'not-applicable' && reason) ? said : 'not-entered'
  const stamp = row?.stamps.outcome
  const rests = restsOn(input, item)
  return {
    number: item.key, words: item.words, outcome: known,
    ...(known !== 'not-entered' && reason && { reason }),
    ...(known !== 'not-entered' && stamp && { personId: stamp.by, personName: personName(input, stamp.by), at: instant(stamp.at) }),
    ...(known === 'satisfactory' && rests && { restsOn: rests }),
  }
}

function restsOn({ record, judgement }: AssembleInput, { restsOn: { shots, tests } }: InspectionSpec): string | undefined {
  const photograph = shots.find(claim => record.photographs.some(each => each.claim === claim))
  const test = tests.find(each => judgement.readings[each].counted)
  const words = [photograph && `Photograph: ${findShot(photograph)!.label.toLowerCase()}`, test && `Reading: ${judgement.readings[test].label}`].filter(Boolean)
  return words.length ? words.join('; ') : undefined
}

export function departures({ record, signatures }: AssembleInput): InstallationRecord['departures'] {
  const designer = signatures.find(each => each.capacity === 'designer')?.nameShown ?? 'not signed yet'
  return record.parts.departure.flatMap(({ content }) => {
    const [regulation, differs, whySafe] = [textOf(content, 'regulation'), textOf(content, 'differs'), textOf(content, 'why')]
    return regulation && differs && whySafe ? [{ regulation, differs, whySafe, designer }] : []
  })
}

/** An omitted residual-current or surge device, with the photographed risk assessment. */
export function exceptions({ record, signatures }: AssembleInput): InstallationRecord['exceptions'] {
  const words = textOf(contentOf(record, 'statement', 'statement'), 'exceptions')
  const paper = record.photographs.find(each => each.claim === 'risk-assessment')
  if (isNone(words) || !words || !paper) return []
  const designer = signatures.find(each => each.capacity === 'designer')?.nameShown ?? 'not signed yet'
  return [{ omitted: words, reason: words, riskAssessment: { title: 'Risk assessment as photographed', sha256: paper.sha256 }, designer }]
}

/** Each instrument that a standing reading was taken with, and that it was in calibration on each of those days. */
export function instruments({ record, judgement }: AssembleInput): Instrument[] {
  return record.instruments.flatMap((instrument) => {
    const used = TEST_KEYS.map(test => judgement.readings[test]).filter(each => each.applies && each.counted?.instrumentId === instrument.id).map(each => each.counted!)
    if (!used.length) return []
    const days = [...new Set(used.map(each => londonDay(each.deviceAt)))].sort()
    const calibration = calibrationOn(instrument, days.at(-1)!)
    if (!calibration) return []
    const functions = [...new Set(used.map(each => testSpec(each.test).instrument).filter((each): each is InstrumentFunction => each !== null))]
    return [{
      function: functions.map(each => INSTRUMENT_WORDS[each]).join(', ') || 'General',
      description: instrument.description || instrument.name, serial: instrument.serial,
      calibratedOn: calibration.doneOn, calibratedUntil: calibration.goodUntil,
      validOnUse: textField(`In calibration on ${days.map(formatDay).join(' and ')}`),
    }]
  })
}

export function photographs(input: AssembleInput): InstallationRecord['photographs'] {
  return input.record.photographs.map(each => ({
    claim: findShot(each.claim)?.label ?? (each.claim || 'Photograph'), sha256: each.sha256, at: instant(each.takenAt),
    ...(each.personId && { personName: personName(input, each.personId) }),
  }))
}

const CAPACITY_OF: Record<AssembleInput['signatures'][number]['capacity'], Capacity> = { designer: 'design', constructor: 'construction', inspector: 'inspection-and-test', supervisor: 'checked-for-the-firm' }

/** One person who took several capacities in one act signs once, and the signature says for what. */
export function signatures(input: AssembleInput): Signature[] {
  const { signatures: rows, firm } = input
  const made: Signature[] = []
  for (const row of rows) {
    const capacity = CAPACITY_OF[row.capacity]
    const same = made.find(each => each.personId === row.personId && each.at === instant(row.at) && capacity !== 'checked-for-the-firm' && !each.capacities.includes('checked-for-the-firm'))
    if (same) {
      same.capacities.push(capacity)
      if (!same.statement.includes(row.statement)) same.statement = `${same.statement} ${row.statement}`
      continue
    }
    made.push({
      capacities: [capacity], personId: row.personId, name: row.nameShown, firm: firm.name, address: firm.address || 'not entered', telephone: firm.telephone || 'not entered',
      edition: row.edition, at: instant(row.at), way: SIGNING_WAYS.find(way => way === row.way) ?? 'typed', statement: row.statement, ...(row.drawing && { drawing: row.drawing }),
    })
  }
  return made
}

export function isSelfCountersigned({ signatures: rows }: AssembleInput): boolean {
  const supervisor = rows.find(each => each.capacity === 'supervisor')
  return supervisor !== undefined && rows.some(each => each.capacity !== 'supervisor' && each.personId === supervisor.personId)
}

/** A calculation as it stood, so that anyone can reproduce it. */
export function sheet({ name, title, input, answer }: Judged<unknown>): SealedCalculation {
  const plain = JSON.parse(JSON.stringify({ input, result: answer.result })) as Pick<SealedCalculation, 'input' | 'result'>
  return { name, title, ...plain, verdict: answer.verdict, working: answer.working.map(step => ({ ...step })), reasons: answer.reasons, notes: answer.notes }
}

export function designPart({ judgement }: AssembleInput): InstallationRecord['design'] {
  const { chosen, installed, supply, demand, earthing, breakingCapacity, zsLimit, route, mounting } = judgement
  const isDesigned = chosen.answer.verdict !== 'waiting'
  return {
    circuit: sheet(isDesigned ? chosen : installed),
    supplyCheck: sheet(supply),
    others: [...(isDesigned ? [installed] : []), demand, earthing, breakingCapacity, zsLimit, route, ...(mounting ? [mounting] : [])].map(sheet),
  }
}
