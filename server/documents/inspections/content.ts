import type { InstallationRecord } from '#shared/schemas/sealed-record/installation'
import type { InspectionItem } from '#shared/schemas/sealed-record/inspections'
import type { Verdict } from '#shared/utils/verdict'
import type { OpeningContent } from '../paper/opening'
import { openingOf, type PaperSeal } from '../paper/record-paper'
import { shortMoment, type Mark } from '../paper/said'

export interface InspectionRow { number: string, words: string, outcome: string, mark: Mark, restsOn: string, by: string }
export interface InspectionsContent { opening: OpeningContent, edition: string, rows: InspectionRow[] }

const OUTCOMES: Record<InspectionItem['outcome'], { words: string, verdict: Verdict }> = {
  'satisfactory': { words: 'Satisfactory', verdict: 'within' },
  'unsatisfactory': { words: 'Unsatisfactory', verdict: 'outside' },
  'not-applicable': { words: 'N/A', verdict: 'not-applicable' },
  'not-entered': { words: 'Not entered', verdict: 'not-entered' },
}

/** What was looked at, and what was found. */
export function inspectionsContent(record: InstallationRecord, seal: PaperSeal | null): InspectionsContent {
  return {
    opening: openingOf(record, seal, 'Schedule of inspections', { withCode: false }),
    edition: record.inspections.edition,
    rows: record.inspections.items.map(toRow),
  }
}

function toRow(item: InspectionItem): InspectionRow {
  const { words, verdict } = OUTCOMES[item.outcome]
  const outcome = item.reason ? `${words} · ${item.reason}` : words
  return {
    number: item.number,
    words: item.words,
    outcome,
    mark: { verdict, words: outcome },
    restsOn: item.restsOn ?? (item.outcome === 'satisfactory' ? 'Looked at on site' : 'N/A'),
    by: [item.personName, item.at && shortMoment(item.at)].filter(Boolean).join(' · ') || 'Nobody yet',
  }
}
