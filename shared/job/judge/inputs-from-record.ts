/** Turns the parts of a job's record into the inputs of the calculations. What nobody answered is left out. */
import type { JobRecord, PartContent } from '../../types/record'
import { designCurrent } from '../../electrical/design-current'
import type { TestKey } from '../tests.data'
import type { TestReadings } from './counted'
import { contentOf, installedContent, jobFacts, numberOf, phasesOf, textOf, yesOf, type JobFacts } from './facts'
import type { Judgement } from './types'
import { valueIn } from './units'

/** Typical declared most of the external loop (common practice, from memory): combined neutral and earth, and separate. */
export const DECLARED_ZE_OHM = { 'TN-C-S': 0.35, 'TN-S': 0.8 } as const

export interface JobInputs {
  facts: JobFacts
  survey: PartContent
  wanted: PartContent
  designed: PartContent
  /** As installed, each field falling back on the design. */
  installed: PartContent
  earthing: PartContent
  limit: PartContent
  charger: PartContent
  supplyPhases: 1 | 3 | undefined
  circuitPhases: 1 | 3
  /** The charger's full current, A a phase: as designed, and as fitted. */
  designedEv_A: number | undefined
  ev_A: number | undefined
  fuseKnown: 'read' | 'told' | 'assumed' | undefined
  /** The arrangement, unless it is only assumed. */
  arrangement: 'TN-C-S' | 'TN-S' | 'TT' | undefined
  Ze: Judgement['Ze']
  Ipf_kA: number | undefined
  RA_ohm: number | undefined
  IdeltaN_A: number | undefined
  limitState: 'none' | 'planned' | 'fitted' | 'tested'
  loadLimit_A: number | undefined
  limiterTested: boolean
  legs: Record<string, unknown>[]
  /** The key of each leg's row, in the same order. */
  legKeys: string[]
  /** The length as fitted, where it was measured. */
  fitted_m: number | undefined
  designed_m: number | undefined
}

export function jobInputs(record: JobRecord, counted: Record<TestKey, TestReadings>): JobInputs {
  const facts = jobFacts(record)
  const survey = contentOf(record, 'survey', 'survey')
  const wanted = contentOf(record, 'wanted', 'wanted')
  const designed = contentOf(record, 'circuit', 'designed')
  const installed = installedContent(record)
  const earthing = contentOf(record, 'earthing', 'earthing')
  const limit = contentOf(record, 'loadLimit', 'limit')
  const charger = contentOf(record, 'equipment', 'charger')
  const legs = legInputs(record)
  const figure = (test: TestKey, unit: string) => valueIn(counted[test].counted, unit) ?? undefined
  const designedEv_A = numberOf(designed, 'Ib_A') ?? wantedCurrent(wanted)
  const lengths = legs.map(leg => leg.L_m).filter(each => typeof each === 'number')
  const rcd_mA = numberOf(installed, 'rcd_IdeltaN_mA')
  return {
    facts, survey, wanted, designed, installed, earthing, limit, charger,
    supplyPhases: phasesOf(survey, 'supply_phases'),
    circuitPhases: phasesOf(installed, 'phases') ?? phasesOf(wanted, 'phases') ?? 1,
    designedEv_A,
    ev_A: numberOf(contentOf(record, 'circuit', 'installed'), 'Ib_A') ?? (numberOf(charger, 'rating_A') || undefined) ?? designedEv_A,
    fuseKnown: howOf(survey, 'cutout_A'),
    arrangement: arrangementOf(survey),
    Ze: zeOf(survey, counted),
    Ipf_kA: figure('Ipf', 'kA'),
    RA_ohm: figure('RA', 'Ω'),
    IdeltaN_A: rcd_mA === undefined ? undefined : rcd_mA / 1000,
    ...limiterInputs(limit, counted),
    legs,
    legKeys: legRows(record).map(row => row.key),
    fitted_m: fittedLength(installed),
    designed_m: lengths.length && lengths.length === legs.length ? lengths.reduce((sum, each) => sum + each, 0) : undefined,
  }
}

function howOf(content: PartContent, key: string): 'read' | 'told' | 'assumed' | undefined {
  const how = content[`${key}_how`]
  return how === 'read' || how === 'told' || how === 'assumed' ? how : undefined
}

/** An assumed arrangement is no arrangement: what rests on it waits. */
function arrangementOf(survey: PartContent): JobInputs['arrangement'] {
  if (survey.earthing_how === 'assumed') return undefined
  const { earthing } = survey
  return earthing === 'TN-C-S' || earthing === 'TN-S' || earthing === 'TT' ? earthing : undefined
}

function wantedCurrent(wanted: PartContent): number | undefined {
  return designCurrent({ P_kW: numberOf(wanted, 'rating_kW'), phases: phasesOf(wanted, 'phases') ?? 1 }).result.Ib_A
}

function zeOf(survey: PartContent, counted: Record<TestKey, TestReadings>): Judgement['Ze'] {
  const reading = counted.Ze.counted
  const value = valueIn(reading, 'Ω')
  if (reading?.kind === 'value' && value !== null) return { value, how: reading.context.byEnquiry ? 'by enquiry' : 'measured' }
  const { earthing } = survey
  return earthing === 'TN-C-S' || earthing === 'TN-S' ? { value: DECLARED_ZE_OHM[earthing], how: 'declared' } : null
}

/** A limiter counts as tested only by a reading of this job: somebody saw it limit, and stands beside it with name and moment. */
function limiterInputs(limit: PartContent, counted: Record<TestKey, TestReadings>): Pick<JobInputs, 'limitState' | 'loadLimit_A' | 'limiterTested'> {
  const said = textOf(limit, 'state')
  const state = said === 'planned' || said === 'fitted' || said === 'tested' ? said : 'none'
  const seen = counted.limiter.counted
  const limiterTested = (state === 'fitted' || state === 'tested') && seen?.kind === 'seen' && seen.shown === 'correct'
  return {
    limitState: state === 'none' ? 'none' : limiterTested ? 'tested' : state === 'tested' ? 'fitted' : state,
    loadLimit_A: state === 'none' ? undefined : numberOf(limit, 'set_A') ?? numberOf(limit, 'limit_A'),
    limiterTested,
  }
}

const legRows = (record: JobRecord) => [...record.parts.leg].sort((a, b) => a.position - b.position)

function legInputs(record: JobRecord): Record<string, unknown>[] {
  const keys = ['method', 'L_m', 'ambient_C', 'ground_C', 'circuits', 'arrangement', 'insulationLength_mm', 'depth_m', 'rho_Km_per_W']
  return legRows(record).map(({ content }) => Object.fromEntries(keys.flatMap(key => content[key] === null || content[key] === undefined ? [] : [[key, content[key]]])))
}

/** The run as fitted: in metres, or from the marks on the cable's sheath. */
function fittedLength(installed: PartContent): number | undefined {
  const start = numberOf(installed, 'start_mark_m')
  const end = numberOf(installed, 'end_mark_m')
  const byMarks = start === undefined || end === undefined ? undefined : Math.abs(end - start)
  return numberOf(installed, 'L_m') ?? (byMarks || undefined)
}

/** The calculation's allowance items: uses that share an allowance are put together, so that it is taken once. */
export function demandItems(record: JobRecord, U_V = 230): { items: Record<string, unknown>[], incomplete: string[] } {
  const lists: Record<'sockets' | 'instantaneous-water', number[]> = { 'sockets': [], 'instantaneous-water': [] }
  const items: Record<string, unknown>[] = []
  const incomplete: string[] = []
  for (const row of record.parts.appliance) {
    const use = textOf(row.content, 'use')
    const power = numberOf(row.content, 'P_W')
    const I_A = numberOf(row.content, 'I_A') ?? (power === undefined ? undefined : power / U_V)
    if (!use || I_A === undefined) incomplete.push(row.key)
    else if (use === 'sockets' || use === 'instantaneous-water') lists[use].push(I_A)
    else items.push({ use, I_A, ...(use === 'cooker' && { socket: yesOf(row.content, 'socket') ?? false }) })
  }
  if (lists.sockets.length) items.push({ use: 'sockets', In_A: lists.sockets })
  if (lists['instantaneous-water'].length) items.push({ use: 'instantaneous-water', I_A: lists['instantaneous-water'] })
  return { items: heatingOnce(items), incomplete }
}

function heatingOnce(items: Record<string, unknown>[]): Record<string, unknown>[] {
  const heating = items.filter(item => item.use === 'heating')
  if (heating.length < 2) return items
  const I_A = heating.reduce((sum, item) => sum + (item.I_A as number), 0)
  return [...items.filter(item => item.use !== 'heating'), { use: 'heating', I_A }]
}
