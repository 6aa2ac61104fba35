/** Continuity and loop impedance: what the device allows, what the cable should give, and whether the readings fit. */
import { readingFitsCalculation, type ReadingFitsResult } from '../../../electrical/reading-fits'
import { temperatureMultiplierOf } from './temperature'
import { zsLimitCalculation } from '../../../electrical/zs-limit'
import { formatFigure, formatOhms } from '../../../utils/figures'
import { numberOf, textOf } from '../facts'
import { fieldRef, readingRef } from '../field-refs'
import { judged } from '../judged'
import type { ReadingLimit } from '../types'
import { valueIn } from '../units'
import { expected, most } from './limits'
import { againstLimit, EMPTY_FRAME, fromAnswer, outcome, overRange, type Frame, type ReadingBench, type TestJudge } from './outcome'

const OHM_DECIMALS = 2
const installedRef = (field: string, words?: string) => fieldRef('circuit', 'installed', field, words)
const LIMIT_FROM = { device: installedRef('device', 'the protective device'), In_A: installedRef('In_A', 'the device\'s rating'), IdeltaN_A: installedRef('rcd_IdeltaN_mA', 'the rated residual current') }

/** The Zs limit of the circuit's device, with or without a reading. */
export function zsOf({ inputs }: ReadingBench, measured: Record<string, number | undefined> = {}) {
  return judged(zsLimitCalculation, {
    title: 'The largest loop impedance the device allows',
    input: { device: textOf(inputs.installed, 'device'), In_A: numberOf(inputs.installed, 'In_A'), system: inputs.facts.system, IdeltaN_A: inputs.facts.system === 'TT' ? inputs.IdeltaN_A : undefined, ...measured },
    from: LIMIT_FROM,
  })
}

function zsLimitOf(bench: ReadingBench): { limit: ReadingLimit | null, waitsFor: Frame['waitsFor'] } {
  const { answer, waitsFor } = zsOf(bench)
  const value = bench.inputs.facts.system === 'TT' ? answer.result.ZsMax_ohm : answer.result.ZsMeasuredMax_ohm
  return { limit: value === undefined ? null : most(value, 'Ω', OHM_DECIMALS), waitsFor }
}

/** The cable's sizes and length as installed. */
function cableOf({ inputs, installed }: ReadingBench) {
  const size = installed.answer.result.sizes?.[0]
  return { line_mm2: numberOf(inputs.installed, 'S_mm2') ?? size?.S_mm2, cpc_mm2: numberOf(inputs.installed, 'cpc_mm2') ?? size?.cpc_mm2, L_m: inputs.fitted_m ?? inputs.designed_m }
}

function fits(bench: ReadingBench, readings: Record<string, number | undefined>): Partial<ReadingFitsResult> {
  return judged(readingFitsCalculation, { title: 'Whether the readings fit', input: { ...cableOf(bench), ...readings }, from: {} }).answer.result
}

/** The sentences that this reading adds to those which the others bring by themselves. */
function addedOdd(bench: ReadingBench, others: Record<string, number | undefined>, own: Record<string, number>): string[] {
  const before = new Set(fits(bench, others).odd ?? [])
  return (fits(bench, { ...others, ...own }).odd ?? []).filter(sentence => !before.has(sentence))
}

/** Ze or, with an electrode of its own, RA: only as measured or told, never the declared most. */
function outsideOhm({ inputs }: ReadingBench): number | undefined {
  if (inputs.facts.system === 'TT') return inputs.RA_ohm
  return inputs.Ze && inputs.Ze.how !== 'declared' ? inputs.Ze.value : undefined
}

const ohmsOf = (bench: ReadingBench, test: 'R1R2' | 'R1Rn') => valueIn(bench.counted[test].counted, 'Ω') ?? undefined

export const R1R2: TestJudge = {
  frame(bench) {
    const { limit: zs, waitsFor } = zsLimitOf(bench)
    const Ze = bench.inputs.facts.system === 'TT' ? bench.inputs.RA_ohm ?? numberOf(bench.inputs.earthing, 'RA_max_ohm') : bench.inputs.Ze?.value
    const { R1R2: band } = fits(bench, { ambient_C: bench.counted.R1R2.counted?.context.ambient_C })
    const outsideRef = readingRef(bench.inputs.facts.system === 'TT' ? 'RA' : 'Ze')
    return {
      limit: zs && Ze !== undefined ? most(Math.max(0, zs.value - Ze), 'Ω', OHM_DECIMALS) : null,
      expected: band ? expected(band.expected_ohm, 'Ω', OHM_DECIMALS, 'the cable\'s sizes and length') : null,
      waitsFor: [...waitsFor, ...(Ze === undefined ? [outsideRef] : [])],
    }
  },
  judge(bench, reading, value, frame) {
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    const odd = addedOdd(bench, { ambient_C: reading.context.ambient_C }, { R1R2_ohm: value })
    return { ...againstLimit(value, frame), working: zsOf(bench).answer.working, reasons: frame.limit ? [`What the limit of Zs leaves for R1+R2 is ${formatFigure(frame.limit.value, 'Ω', 3)}.`] : [], odd }
  },
}

export const R1Rn: TestJudge = {
  frame(bench) {
    const { R1Rn: band } = fits(bench, { ambient_C: bench.counted.R1Rn.counted?.context.ambient_C })
    return { ...EMPTY_FRAME, expected: band ? expected(band.expected_ohm, 'Ω', OHM_DECIMALS, 'the cable\'s size and length') : null }
  },
  judge(bench, reading, value) {
    if (reading.kind === 'over-range' || value === null) return outcome('outside', { reasons: ['No continuity within the range of the tester.'] })
    return outcome('within', { odd: addedOdd(bench, { ambient_C: reading.context.ambient_C, R1R2_ohm: ohmsOf(bench, 'R1R2') }, { R1Rn_ohm: value }) })
  },
}

export const Zs: TestJudge = {
  frame(bench) {
    const Ze = outsideOhm(bench) ?? bench.inputs.Ze?.value
    const band = Ze === undefined ? undefined : fits(bench, { Ze_ohm: Ze }).Zs
    const how = outsideOhm(bench) === undefined ? 'the declared most of Ze' : bench.inputs.facts.system === 'TT' ? 'RA' : 'Ze'
    return { ...zsLimitOf(bench), expected: band ? expected(band.expected_ohm, 'Ω', OHM_DECIMALS, `${how} and R1+R2 of the cable`) : null }
  },
  judge(bench, reading, value, frame) {
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    const plain = zsOf(bench, { measured_ohm: value })
    const odd = addedOdd(bench, { R1R2_ohm: ohmsOf(bench, 'R1R2'), Ze_ohm: outsideOhm(bench) }, { Zs_ohm: value })
    const assessed = plain.answer.verdict === 'outside' ? byTemperature(bench, value, reading.context.ambient_C) : null
    if (assessed?.answer.verdict === 'within') {
      const hot = assessed.answer.result.ZsCorrected_ohm!
      return { ...fromAnswer(assessed.answer), odd, corrected: { value: hot, text: formatOhms(hot), limitText: most(assessed.answer.result.ZsMax_ohm!, 'Ω', OHM_DECIMALS).text } }
    }
    return { ...fromAnswer(plain.answer, plain.waitsFor), odd }
  },
}

/** Only where 80 % is passed, and only with R1+R2 and the temperature at which both were measured. */
function byTemperature(bench: ReadingBench, measured_ohm: number, ambient_C: number | undefined) {
  const R1R2_ohm = ohmsOf(bench, 'R1R2')
  if (bench.inputs.facts.system === 'TT' || R1R2_ohm === undefined || ambient_C === undefined) return null
  return zsOf(bench, { measured_ohm, R1R2_ohm, ambient_C, multiplier: temperatureMultiplierOf(bench) })
}

/** At the board there is the new circuit's own limit to keep, and what lies outside to expect. */
export const ZsBoard: TestJudge = {
  frame(bench) {
    const Ze = outsideOhm(bench)
    // An electrode for the charger alone is not what the board's loop runs through.
    if (bench.inputs.facts.system === 'TT' && bench.inputs.arrangement !== 'TT') return EMPTY_FRAME
    return { ...zsLimitOf(bench), expected: Ze === undefined ? null : expected(Ze, 'Ω', OHM_DECIMALS, 'the loop outside') }
  },
  judge(_bench, reading, value, frame) {
    if (!frame.limit && !frame.waitsFor.length) return outcome('within')
    if (reading.kind === 'over-range' || value === null) return overRange(value, frame) ?? outcome('waiting')
    return againstLimit(value, frame)
  },
}
