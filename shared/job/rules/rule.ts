/** Looking a rule of the trade up, and naming it in an answer. */
import type { WorkingStep } from '../../utils/answer'
import type { Day } from '../../utils/dates'
import type { Rule, RuleId } from './rule-types'
import { RULES } from './rules.data'

const BY_ID: ReadonlyMap<string, Rule> = new Map(RULES.map(each => [each.id, each]))

/** The rule of that id, or null. */
export function findRule(id: string): Rule | null {
  return BY_ID.get(id) ?? null
}

/** The rule of that id, which must exist. */
export function rule(id: RuleId): Rule {
  const found = BY_ID.get(id)
  if (!found) throw new RangeError(`There is no rule ${id}`)
  return found
}

/** A reason or note that rests on a rule: the id first, then what it means here. @example 'DNO-06: The supply is looped.' */
export function because(id: RuleId, sentence: string): string {
  return `${rule(id).id}: ${sentence}`
}

/** The id that a reason or note begins with, for showing the rule and its confidence beside it; null where none does. */
export function ruleIdOf(reason: string): RuleId | null {
  const id = /^[A-Z]{3}-\d{2}(?=: )/.exec(reason)?.[0]
  return id ? findRule(id)?.id ?? null : null
}

/** A step of the working that rests on a rule, with the rule's source and confidence. */
export function ruleStep(id: RuleId, step: Pick<WorkingStep, 'symbol' | 'expression' | 'value' | 'unit'>): WorkingStep {
  const { source, confidence } = rule(id)
  return { ...step, source: source ? `${id}, ${source.title}` : id, confidence }
}

/** Whether the rule is in force on that day. A rule dated by year or month alone counts from its first day to its last. */
export function isInForce(given: Rule, day: Day): boolean {
  const isSince = given.since === null || day >= given.since.padEnd(10, '-01')
  const isUntil = given.until === null || day <= given.until
  return isSince && isUntil
}
