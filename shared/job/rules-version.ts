/** The version of the rule data and tables that verdicts rest on; a seal names it, so that its figures can be worked again. */
export const RULES_VERSION = '2026-12-01'
