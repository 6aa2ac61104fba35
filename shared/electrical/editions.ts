/** Editions of the wiring regulations, as far as a test depends on them. */
import { CalculationInputError } from '../utils/calculation'

const SINCE_A2 = /\+A([2-9]|\d\d):\d{4}/

/** Whether an edition holds amendment 2 (2022), which asks for one a.c. test at the rated residual current. */
export function hasAmendment2(edition: string): boolean {
  if (!/^BS 7671:\d{4}(\+A\d+:\d{4})*$/.test(edition)) throw new CalculationInputError('edition', 'Give the edition in full, such as BS 7671:2018+A4:2026.')
  return edition.startsWith('BS 7671:2018') && SINCE_A2.test(edition)
}
