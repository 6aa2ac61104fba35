/**
 * Judges a whole job from its record: demand, supply, route, earthing, circuit and every reading.
 * A plain function of record and day, so that tablet, server and paper show the same; quick enough for each keystroke.
 */
import type { JobRecord } from '../../types/record'
import type { Day } from '../../utils/dates'
import { capacityOf } from '../capacity-words'
import { editionInForce } from '../rules/editions'
import { houseDemand, judgeDemand, judgeDesigned, judgeEarthing, judgeInstalled, judgeMounting, judgeRoute, judgeSupply } from './calculations'
import { countReadings } from './counted'
import { numberOf, textOf } from './facts'
import { jobInputs } from './inputs-from-record'
import { judgeReadings } from './judge-readings'
import { breakingCapacityOf } from './readings/origin'
import { zsOf } from './readings/loop'
import { safetyFigures } from './safety'
import type { Judged, JudgedConfidence, JudgedReading, Judgement } from './types'

/** Used where a day lies before the first edition on record. */
const OLDEST_EDITION = 'BS 7671:2018'

export function judgeJob(record: JobRecord, today: Day): Judgement {
  const counted = countReadings(record)
  const inputs = jobInputs(record, counted)

  const demand = judgeDemand(record)
  const house = houseDemand(record, demand.answer.result.total_A)
  const supply = judgeSupply(inputs, house, demand.waitsFor)
  const route = judgeRoute(record, inputs, supply.answer.result, supply.waitsFor)
  const earthing = judgeEarthing(inputs)
  const breakingCapacity = breakingCapacityOf(inputs, inputs.Ipf_kA)

  const { designed, chosen } = judgeDesigned(inputs)
  const designed_mm2 = numberOf(inputs.designed, 'S_mm2') ?? designed.answer.result.S_mm2 ?? undefined
  const designedSize = [...chosen.answer.result.sizes ?? [], ...designed.answer.result.sizes ?? []].find(size => size.S_mm2 === designed_mm2) ?? null
  const installed = judgeInstalled(inputs, designed_mm2)
  const installedSize = installed.answer.result.sizes?.find(size => size.S_mm2 === installed.answer.result.shown_mm2) ?? null

  const edition = editionInForce(today)?.edition ?? OLDEST_EDITION
  const bench = { inputs, counted, installed, edition }
  const readings = judgeReadings(record, bench)
  const sheets = { supply, earthing, breakingCapacity, installed, system: inputs.facts.system }

  return {
    ...sheets,
    edition,
    houseDemand: house,
    ev_A: inputs.ev_A ?? null,
    demand, capacity: capacityOf(supply), route,
    designed, chosen, designedSize, installedSize,
    mounting: inputs.wanted.outlet === 'tethered' ? null : judgeMounting(inputs),
    Ze: inputs.Ze,
    zsLimit: zsOf(bench),
    fitted_m: inputs.fitted_m ?? null,
    designed_m: inputs.designed_m ?? null,
    readings,
    safety: safetyFigures({ ...sheets, upstreamRcd: textOf(inputs.survey, 'upstream_rcd') }, readings),
    confidence: confidenceOf([demand, supply, route, earthing, breakingCapacity, chosen, installed], Object.values(readings)),
  }
}

/** Every figure that is known from memory alone, named once. */
function confidenceOf(sheets: Judged<unknown>[], readings: JudgedReading[]): JudgedConfidence {
  const steps = sheets.flatMap(sheet => sheet.answer.working).filter(step => step.confidence === 'from memory').map(step => `${step.symbol} · ${step.source}`)
  const tests = readings.filter(each => each.applies && each.confidence.includes('from memory')).map(each => each.label)
  const fromMemory = [...new Set([...steps, ...tests])]
  return { isFromMemory: fromMemory.length > 0, fromMemory }
}
