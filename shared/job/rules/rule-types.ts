/** The shape of one rule of the trade, as `rules.data.ts` carries it. */

/** How well a rule is known; shown wherever it blocks someone. */
export type RuleConfidence = 'two sources' | 'one source' | 'from memory' | 'common practice'

export type RuleStage
  = 'survey' | 'permissions' | 'supply' | 'design' | 'test' | 'smart' | 'certify' | 'notify'
    | 'grant' | 'contract' | 'invoice' | 'records' | 'handover' | 'people' | 'audit'

export type RuleJurisdiction
  = 'UK' | 'GB' | 'England' | 'England and Wales' | 'Wales' | 'Scotland' | 'Northern Ireland' | 'NGED areas'

export type RuleId = `${'SUR' | 'DNO' | 'EAR' | 'TST' | 'SMT' | 'DOC' | 'GRT' | 'COM' | 'HND' | 'PPL' | 'AUD'}-${string}`

/** A figure inside a rule, for showing beside it; no calculation reads its number from here. */
export interface RuleFigure {
  name: string
  op: '=' | '<' | '<=' | '>' | '>=' | '~' | 'in'
  value: number | string
  unit: string
}

export interface RuleSource {
  title: string
  publisher: string
  edition: string
  url: string | null
}

export interface Rule {
  id: RuleId
  topic: string
  stage: RuleStage
  jurisdiction: RuleJurisdiction
  /** The rule in our own words. */
  statement: string
  figures: readonly RuleFigure[]
  source: RuleSource | null
  confidence: RuleConfidence
  /** First day in force; may be a year or a month alone where no more is known. Null: not dated. */
  since: string | null
  /** Last day in force; null: still in force. */
  until: string | null
  alsoSeenIn?: readonly RuleSource[]
  note?: string
}
