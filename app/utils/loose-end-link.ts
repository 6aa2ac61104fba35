import type { LooseEnd } from '#shared/job/completeness'

/** Inspections are answered where one signs, whatever part of the house they look at. */
const ON_LEAVE = /^inspection\./

/** The page and field that a loose end leads to: `/jobs/<id>/supply#survey.survey.cutout_A`. */
export function looseEndLink(jobId: string, end: Pick<LooseEnd, 'page' | 'field'>): string {
  const page = end.field && ON_LEAVE.test(end.field) ? 'leave' : end.page
  return `/jobs/${jobId}/${page}${end.field ? `#${end.field}` : ''}`
}
