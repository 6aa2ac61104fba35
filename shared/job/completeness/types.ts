import type { JobPage } from '../judge/types'

export type Holder = 'installer' | 'office' | 'customer' | 'supervisor'

/** One thing missing or open on a job, as a sentence that says what to do, with the place to do it. */
export interface LooseEnd {
  /** Stable while the matter is open: `field:survey.survey.cutout_A`, `safety:Zs`, `put-back:bonding` … */
  id: string
  /** Stops you finishing; otherwise worth a look. */
  stops: boolean
  sentence: string
  page: JobPage
  /** An address as in `FieldRef`. */
  field?: string
  with: Holder
}

/** Whether an act may be done, and if not, why, in sentences. */
export interface Leave {
  allowed: boolean
  reasons: string[]
}
