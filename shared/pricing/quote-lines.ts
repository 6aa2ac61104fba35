/**
 * The lines that a job's design asks for, priced from the firm's list. A suggestion to be edited: every line says why it
 * stands there, and a price that the list lacks stays empty rather than being made up.
 */
import { contentOf, jobFacts, numberOf, phasesOf, textOf } from '../job/judge/facts'
import type { Judgement } from '../job/judge/types'
import type { PriceItem } from '../schemas/quote'
import type { JobRecord } from '../types/record'
import { formatMetres } from '../utils/figures'
import { CABLE_WORDS, LABOUR_PLAIN_HOURS, LABOUR_METRES_PER_HOUR, LABOUR_PLAIN_METRES } from './quote-lines.data'

export interface SuggestedLine {
  /** The code in the price list. */
  code: string
  description: string
  /** Thousandths of the unit. */
  quantityThousandths: number
  unit: string
  /** Whole pence without VAT; null: the list has no price for it yet. */
  unitNetPence: number | null
  vatBp: number
  /** Why the design asks for it. */
  why: string
}

interface Wanted { code: string, description: string, quantity: number, unit: string, why: string }

const BONDS = [['bond_water', 'water'], ['bond_gas', 'gas'], ['bond_oil', 'oil'], ['bond_steel', 'structural steel'], ['bond_other', 'another service']] as const

/** @param vatBp the rate of a line that the list has no item for */
export function suggestQuoteLines(record: JobRecord, judgement: Judgement, prices: readonly PriceItem[], vatBp = 2000): SuggestedLine[] {
  const priced = new Map(prices.filter(item => item.active).map(item => [item.code.toUpperCase(), item]))
  return wantedLines(record, judgement).map(({ quantity, ...line }) => {
    const item = priced.get(line.code)
    return {
      ...line,
      description: item?.description ?? line.description,
      unit: item?.unit ?? line.unit,
      quantityThousandths: Math.round(quantity * 1000),
      unitNetPence: item?.netPence ?? null,
      vatBp: item?.vatBp ?? vatBp,
    }
  })
}

function wantedLines(record: JobRecord, judgement: Judgement): Wanted[] {
  return [
    ...chargerLine(record),
    ...cableLines(record, judgement),
    ...deviceLine(record),
    ...safetyLines(record),
    ...labourLine(judgement.designed_m),
    one('TEST', 'Inspection, testing and certificate', 'every new circuit is tested and certified'),
    ...paperworkLine(judgement),
  ]
}

const one = (code: string, description: string, why: string): Wanted => ({ code, description, quantity: 1, unit: 'each', why })

function chargerLine(record: JobRecord): Wanted[] {
  const wanted = contentOf(record, 'wanted', 'wanted')
  const rating = numberOf(wanted, 'rating_kW')
  const outlet = textOf(wanted, 'outlet')
  if (rating === undefined) return []
  const kind = outlet === 'tethered' ? 'tethered cable' : outlet === 'socket' ? 'socket' : null
  const phases = phasesOf(wanted, 'phases') === 3 ? ', three-phase' : ''
  return [one(`CHARGER-${Math.floor(rating)}${outlet === 'tethered' ? 'T' : 'S'}`, `Wall charger, ${rating} kW${phases}${kind ? `, ${kind}` : ''}`, kind ? 'the charger wanted' : 'the charger wanted; socket or tethered is still to be asked')]
}

/** Metres from the legs, rounded up to a whole metre; the size is the one the design stands on. */
function cableLines(record: JobRecord, judgement: Judgement): Wanted[] {
  const size = judgement.designedSize
  const cable = CABLE_WORDS[textOf(contentOf(record, 'circuit', 'designed'), 'cable') ?? '']
  const lengths = record.parts.leg.map(leg => ({ m: numberOf(leg.content, 'L_m') ?? 0, isBuried: leg.content.method === 'D' }))
  const buried = lengths.filter(leg => leg.isBuried).reduce((sum, leg) => sum + leg.m, 0)
  const metres = judgement.designed_m
  if (metres === null || !size || !cable) return []
  const runs = `${lengths.length === 1 ? 'the leg' : `${lengths.length} legs`}, ${formatMetres(metres, 1)} in all, rounded up`
  return [
    { code: `CABLE-${size.S_mm2}-${cable.code}`, description: `${cable.words}, ${size.S_mm2} mm², fixed`, quantity: wholeMetres(metres), unit: 'm', why: runs },
    ...(buried > 0 ? [{ code: 'TRENCH', description: 'Trench, made good', quantity: wholeMetres(buried), unit: 'm', why: `${formatMetres(buried, 1)} in the ground, rounded up` }] : []),
  ]
}

/** Never less than the length; a sum like 3.3 + 2.7 that a computer holds a hair above 6 stays 6. */
const wholeMetres = (metres: number) => Math.ceil(Number(metres.toFixed(6)))

function deviceLine(record: JobRecord): Wanted[] {
  const design = contentOf(record, 'circuit', 'designed')
  const rating = numberOf(design, 'In_A')
  const curve = textOf(design, 'device')
  if (rating === undefined || !curve) return []
  const isBreaker = curve === 'B' || curve === 'C' || curve === 'D'
  const inBoard = design.rcd_where === 'board'
  if (!isBreaker) return [one(`FUSE-${rating}`, `Fuse, ${curve}, ${rating} A, with its carrier`, 'the protective device of the design')]
  const rcd = inBoard ? ` with ${numberOf(design, 'rcd_IdeltaN_mA') ?? 30} mA residual-current protection` : ''
  return [one(`${inBoard ? 'RCBO' : 'MCB'}-${rating}`, `Circuit-breaker, type ${curve}, ${rating} A${rcd}, fitted`, 'the protective device of the design')]
}

function safetyLines(record: JobRecord): Wanted[] {
  const facts = jobFacts(record)
  const survey = contentOf(record, 'survey', 'survey')
  const limiter = contentOf(record, 'loadLimit', 'limit')
  const openPen = textOf(contentOf(record, 'earthing', 'earthing'), 'device') ?? ''
  const bonds = BONDS.filter(([field]) => survey[field] === 'missing')
  return [
    ...(facts.hasLimiter ? [one('LIMITER', 'Load limiter, fitted and tested', numberOf(limiter, 'limit_A') === undefined ? 'the design counts on a load limiter' : `the supply is kept within ${numberOf(limiter, 'limit_A')} A`)] : []),
    ...(facts.needsElectrode ? [one('ELECTRODE', 'Earth electrode, driven and tested', 'the earthing method needs an electrode')] : []),
    ...(facts.hasOpenPen && !/charger/i.test(openPen) ? [one('OPEN-PEN', 'Open-PEN protective device', 'the earthing method needs it, and the design does not say that the charger holds it')] : []),
    ...(survey.spd === 'fitted' ? [one('SPD', 'Surge device, fitted', 'the survey asks for one to be fitted')] : []),
    ...(facts.hasIsolator ? [one('ISOLATOR', 'Isolator at the charger, fitted', 'the design has an isolator')] : []),
    ...(numberOf(survey, 'spare_ways') === 0 ? [one('BOARD', 'Small board for the new circuit', 'the board has no spare way')] : []),
    ...(bonds.length ? [{ code: 'BOND', description: `Main bonding to ${bonds.map(([, words]) => words).join(', ')}`, quantity: bonds.length, unit: 'each', why: 'found missing at the survey' }] : []),
  ]
}

function labourLine(designed_m: number | null): Wanted[] {
  if (designed_m === null) return []
  const further = Math.max(0, Math.ceil((designed_m - LABOUR_PLAIN_METRES) / LABOUR_METRES_PER_HOUR))
  return [{ code: 'LABOUR', description: 'Labour', quantity: LABOUR_PLAIN_HOURS + further, unit: 'hour', why: `${LABOUR_PLAIN_HOURS} hours up to ${LABOUR_PLAIN_METRES} m and one for each further ${LABOUR_METRES_PER_HOUR} m begun: a starting figure, change it` }]
}

function paperworkLine({ route }: Judgement): Wanted[] {
  const way = route.answer.result.route
  if (!way) return []
  return [one('NOTICE', way === 'tell-after' ? 'Notice to the network operator' : 'Application to the network operator', way === 'tell-after' ? 'the operator is told afterwards' : 'the operator is asked before anything is connected')]
}
