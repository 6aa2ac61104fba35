/** What The Run shows of a job. It is given ready-made: which facts a part quotes is the page's business. */
export type RunPartKey = 'supply' | 'board' | 'cable' | 'point' | 'dead' | 'live' | 'leave'
export type StepState = 'not-started' | 'started' | 'ready' | 'checked' | 'not-needed'

export interface RunPart {
  key: RunPartKey
  label: string
  href: string
  state: StepState
  /** How many answers are still owed, of how many. */
  left: number
  total: number
  /** Short facts quoted in the strip: "80 A", "Ze 0.21 Ω". */
  facts: string[]
  /** Why it cannot be filled yet: "dead tests come first". */
  lock?: string
}

/** An office matter of the same job, shown as a word above the strip. */
export interface RunOfficeMatter { label: string, href: string, state: string }

export type FillMark = 'dashed' | 'outline' | 'half' | 'full' | 'barred' | 'none'

/** Which square stands for a state; a started part with something in it is half filled. */
export function fillMark(part: Pick<RunPart, 'state' | 'left' | 'total'>): FillMark {
  switch (part.state) {
    case 'not-started': return 'dashed'
    case 'started': return part.left < part.total ? 'half' : 'outline'
    case 'ready': return 'full'
    case 'checked': return 'barred'
    case 'not-needed': return 'none'
  }
}

/** The state in words, for speech and for tooltips: "Started, 2 left". */
export function stateWords(part: Pick<RunPart, 'state' | 'left'>): string {
  switch (part.state) {
    case 'not-started': return 'Not started'
    case 'started': return `Started, ${part.left} left`
    case 'ready': return 'Ready'
    case 'checked': return 'Checked'
    case 'not-needed': return 'Not needed'
  }
}
