/** The way of a job: the only place that knows which stage follows which, and who moves it. */
export const STAGES = ['enquiry', 'survey-booked', 'surveyed', 'quoted', 'accepted', 'install-booked', 'on-site', 'ready-to-check', 'countersigned', 'handed-over', 'closed'] as const
export type Stage = (typeof STAGES)[number]

export const SIDE_STATES = ['sent-back', 'waiting', 'cancelled'] as const
export type SideState = (typeof SIDE_STATES)[number]

interface StageWords { words: string, withWhom: string }

/** What people read for each stage, and who must move next while nothing else is known. */
export const STAGE_WORDS: Record<Stage, StageWords> = {
  'enquiry': { words: 'Enquiry', withWhom: 'office' },
  'survey-booked': { words: 'Survey booked', withWhom: 'installer' },
  'surveyed': { words: 'Surveyed', withWhom: 'office' },
  'quoted': { words: 'Quoted', withWhom: 'customer' },
  'accepted': { words: 'Accepted', withWhom: 'office' },
  'install-booked': { words: 'Install booked', withWhom: 'installer' },
  'on-site': { words: 'On site', withWhom: 'installer' },
  'ready-to-check': { words: 'Ready to check', withWhom: 'supervisor' },
  'countersigned': { words: 'Countersigned', withWhom: 'office' },
  'handed-over': { words: 'Handed over', withWhom: 'office' },
  'closed': { words: 'Closed', withWhom: 'nobody' },
}

/** What happened, as far as a job's stage is concerned. */
export type StageEvent
  = 'survey-booked' | 'survey-answered' | 'quote-sent' | 'quote-accepted' | 'quote-not-needed' | 'install-booked'
    | 'work-recorded' | 'capacities-signed' | 'sent-back' | 'countersigned' | 'pack-sent' | 'everything-done' | 'revision-opened'

const before = (stage: Stage, limit: Stage) => STAGES.indexOf(stage) < STAGES.indexOf(limit)

/**
 * The stage after an event, or null where the event does not move a job in this stage. Never moves a job back except
 * "sent-back" and "revision-opened", which return it to the site.
 */
export function stageAfter(stage: Stage, event: StageEvent): Stage | null {
  switch (event) {
    case 'survey-booked': return before(stage, 'survey-booked') ? 'survey-booked' : null
    case 'survey-answered': return before(stage, 'surveyed') ? 'surveyed' : null
    case 'quote-sent': return before(stage, 'quoted') ? 'quoted' : null
    case 'quote-accepted':
    case 'quote-not-needed': return before(stage, 'accepted') ? 'accepted' : null
    case 'install-booked': return before(stage, 'install-booked') ? 'install-booked' : null
    case 'work-recorded': return before(stage, 'on-site') ? 'on-site' : null
    case 'capacities-signed': return stage === 'on-site' ? 'ready-to-check' : null
    case 'sent-back': return stage === 'ready-to-check' ? 'on-site' : null
    case 'countersigned': return stage === 'ready-to-check' ? 'countersigned' : null
    case 'pack-sent': return stage === 'countersigned' ? 'handed-over' : null
    case 'everything-done': return stage === 'handed-over' ? 'closed' : null
    case 'revision-opened': return stage === 'countersigned' || stage === 'handed-over' || stage === 'closed' ? 'on-site' : null
    default: return event satisfies never
  }
}

/** Readings and answers of the work itself may change only until the capacities have signed. */
export function mayChangeWork(stage: Stage): boolean {
  return before(stage, 'ready-to-check')
}
