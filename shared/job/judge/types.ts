/** What a job's judgement holds: every figure computed once, for tablet, server and paper alike. */
import type { BreakingCapacityResult } from '../../electrical/breaking-capacity'
import type { CircuitResult } from '../../electrical/circuit'
import type { SizeResult } from '../../electrical/circuit-sizes'
import type { DemandResult } from '../../electrical/demand'
import type { SupplyResult } from '../../electrical/supply'
import type { ZsLimitResult } from '../../electrical/zs-limit'
import type { ReadingRow } from '../../types/record'
import type { Answer, Confidence } from '../../utils/answer'
import type { Verdict } from '../../utils/verdict'
import type { EarthingMethodResult } from '../rules/earthing-method'
import type { MountingResult } from '../rules/mounting'
import type { NetworkRouteResult } from '../rules/network-route'
import type { TestKey } from '../tests.data'

/** The page of a job that a field lives on. */
export type JobPage = 'enquiry' | 'supply' | 'board' | 'cable' | 'point' | 'dead' | 'live' | 'leave'

/**
 * Where to go to put something right. `field` is an address inside the record:
 * `<part>.<row key>.<field>` such as `survey.survey.cutout_A` or `circuit.designed.In_A`; `reading.<test>` for a reading;
 * `shot.<claim>` for a photograph; `<part>` alone where a row is still to be made (`leg`, `appliance`).
 */
export interface FieldRef {
  page: JobPage
  field: string
  /** The field in words: "the cable's length". */
  words: string
}

/** One calculation on the job's own figures: what went in, what came out, and what it still waits for, in words. */
export interface Judged<Result> {
  /** Its name at the command line and at the API. */
  name: string
  /** The question it answers, as a heading. */
  title: string
  input: Record<string, unknown>
  answer: Answer<Result>
  /** What a `waiting` verdict waits for. */
  waitsFor: FieldRef[]
}

/** What the house draws at most, each way it is known, and the one that is used: the greater. */
export interface HouseDemand {
  allowances_A: number | null
  recorded_A: number | null
  used_A: number | null
  way: 'allowances' | 'recorded' | null
  words: string
}

export interface Capacity {
  code: 'fits' | 'fits-if-managed' | 'does-not-fit' | 'cannot-tell'
  /** "Fits", "Fits if load-managed" … */
  words: string
  sentence: string
}

/** A limit as a number and as it is printed: `≤ 0.87 Ω`. */
export interface ReadingLimit { value: number, text: string, is: 'most' | 'least' }
/** What the design leads one to expect. */
export interface ReadingExpected { value: number, text: string, from: string }

/** A reading that a later one has followed, or that does not count. */
export interface EarlierReading { reading: ReadingRow, verdict: Verdict, detail: string, isCounted: boolean }

/** One test of the job, judged. */
export interface JudgedReading {
  test: TestKey
  page: 'supply' | 'dead' | 'live'
  label: string
  title: string
  unit: string
  /** Whether the test belongs to this job; where not, the verdict is `not-applicable` and `reason` says why. */
  applies: boolean
  isRequired: boolean
  isSafety: boolean
  verdict: Verdict
  /** Verdict and figure in one line: "Within limit · 0.79 Ω inside". */
  words: string
  /** The figure's own part of it: "0.79 Ω inside", "by 0.12 Ω", "1.8 × design", the reason of LIM or N/A, what it waits for. */
  detail: string
  /** The same for the ear. */
  speech: string
  /** The reading as printed: "0.21 Ω"; "Not entered". */
  shown: string
  /** The latest reading that counts. */
  counted: ReadingRow | null
  /** Why the latest reading does not count: typed and not confirmed, instrument out of calibration … */
  notCounted: string | null
  /** Every other reading, oldest first. */
  earlier: EarlierReading[]
  limit: ReadingLimit | null
  expected: ReadingExpected | null
  /** Why it is N/A or LIM. */
  reason: string | null
  /** Why a reading that is within its limit does not fit the other figures. */
  odd: string[]
  /** The sentence that an Unexpected stands on. */
  sentence: string | null
  /** Zs assessed by temperature, where that lifted it. */
  corrected: { value: number, text: string, limitText: string } | null
  /** What it waits for, where it cannot be judged yet. */
  waitsFor: FieldRef[]
  reasons: string[]
  notes: string[]
  confidence: Confidence[]
  /** Whether this line, as it stands, stops signing. */
  stops: boolean
}

/** One safety figure: Outside limit or Cannot tell yet stops signing. */
export interface SafetyFigure {
  id: string
  label: string
  verdict: Verdict
  sentence: string
  page: JobPage
  field: string
  /** What a `waiting` figure waits for, where that is not its sheet's own list. */
  waitsFor?: FieldRef[]
}

export interface JudgedConfidence {
  /** Whether any figure used is known from memory alone. */
  isFromMemory: boolean
  /** Those figures: "Zs limit · Table 41.3". */
  fromMemory: string[]
}

export interface Judgement {
  system: 'TN' | 'TT'
  /** Edition of the wiring rules in force on the day. */
  edition: string
  houseDemand: HouseDemand
  /** The charger's full current, A a phase. */
  ev_A: number | null
  demand: Judged<DemandResult>
  supply: Judged<SupplyResult>
  capacity: Capacity
  route: Judged<NetworkRouteResult>
  earthing: Judged<EarthingMethodResult>
  breakingCapacity: Judged<BreakingCapacityResult>
  /** Every size compared, on the designed figures. */
  designed: Judged<CircuitResult>
  /** The same at the chosen size alone, with its legs and longest route; the same answer where no size is chosen. */
  chosen: Judged<CircuitResult>
  /** The size that the design stands on: the chosen one, or else the smallest that is within. */
  designedSize: SizeResult | null
  /** The circuit as installed; what was not recorded as installed is taken from the design. */
  installed: Judged<CircuitResult>
  installedSize: SizeResult | null
  /** The outlet's height; null with a tethered cable. */
  mounting: Judged<MountingResult> | null
  /** External loop impedance in use: measured or by enquiry, else the declared most of the arrangement. */
  Ze: { value: number, how: 'measured' | 'by enquiry' | 'declared' } | null
  /** The largest loop impedance the installed device allows. */
  zsLimit: Judged<ZsLimitResult>
  /** The run as fitted and as drawn, m. */
  fitted_m: number | null
  designed_m: number | null
  readings: Record<TestKey, JudgedReading>
  safety: SafetyFigure[]
  confidence: JudgedConfidence
}
