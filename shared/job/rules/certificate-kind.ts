/**
 * Which certificate does this work need, and which edition of the wiring regulations may it cite on its date?
 *
 * A new circuit needs an installation certificate; only a change to an existing circuit may take the minor works one.
 * While two editions may be cited, the one offered is taken where it is among them, else the later one.
 *
 * @source rules DOC-01, DOC-02, EAR-28; the days of each edition in editions.data.ts
 * @example a new circuit on 2026-12-01 -> installation, BS 7671:2018+A4:2026
 */
import * as z from 'zod'
import { fields } from '../../electrical/inputs'
import { answer, waiting, type Answer } from '../../utils/answer'
import { defineCalculation } from '../../utils/calculation'
import { compareDays, formatDay } from '../../utils/dates'
import { WIRING_EDITIONS } from './editions.data'
import { editionsOn } from './editions'
import { blankKeys, day, yesOrNo } from './inputs'
import { because, ruleStep } from './rule'

const MOST_EDITION_LETTERS = 80

const input = fields({
  newCircuit: yesOrNo.nullish(),
  date: day.nullish(),
  edition: z.string('Enter the edition in full, as BS 7671:2018+A4:2026').max(MOST_EDITION_LETTERS, 'Enter the edition in full, as BS 7671:2018+A4:2026').nullish(),
  kind: z.enum(['installation', 'minor-works'], 'Enter installation or minor-works').nullish().describe('The certificate offered'),
})
export type CertificateKindInput = z.infer<typeof input>
export type CertificateKind = 'installation' | 'minor-works'

export interface CertificateKindResult {
  kind: CertificateKind
  edition: string
}

export function certificateKind(given: CertificateKindInput): Answer<CertificateKindResult> {
  const { newCircuit, date } = given
  if (typeof newCircuit !== 'boolean' || !date) return waiting(blankKeys({ newCircuit, date, edition: given.edition }))
  const kind: CertificateKind = newCircuit ? 'installation' : 'minor-works'
  const offered = given.edition?.trim() ?? ''
  const usable = editionsOn(date).map(each => each.edition)
  const edition = usable.includes(offered) ? offered : usable.at(-1)
  const kindFault = kindReason(newCircuit, given.kind ?? null)
  const reasons = [...(kindFault ? [kindFault] : []), ...(offered && edition && edition !== offered ? [editionReason(offered, date)] : [])]
  if (!edition) return waiting(['edition'], { result: { kind }, reasons, notes: [`No edition of the wiring regulations is on record for ${formatDay(date)}.`] })
  if (!offered && !reasons.length) return waiting(['edition'], { result: { kind, edition } })
  return answer({
    verdict: reasons.length ? 'outside' : 'within',
    result: { kind, edition },
    missing: offered ? [] : ['edition'],
    working: [
      ruleStep(newCircuit ? 'DOC-01' : 'DOC-02', { symbol: 'certificate', expression: newCircuit ? 'a new circuit' : 'a change to an existing circuit', value: kind, unit: '' }),
      ruleStep('EAR-28', { symbol: 'edition', expression: `may be cited on ${date}: ${usable.join(', ')}`, value: edition, unit: '' }),
    ],
    reasons,
    notes: notesFor(newCircuit, given.kind ?? null, usable),
  })
}

function kindReason(newCircuit: boolean, offered: CertificateKind | null): string | null {
  if (newCircuit && offered === 'minor-works') return because('DOC-01', 'A new circuit needs an installation certificate with schedules; a minor works certificate cannot cover it.')
  return null
}

function editionReason(offered: string, date: string): string {
  const known = WIRING_EDITIONS.find(each => each.edition === offered)
  if (!known) return because('EAR-28', `"${offered}" is no edition on record. Cite it in full.`)
  const isEarly = compareDays(date, known.from) < 0
  const sentence = isEarly ? `was not yet published on ${formatDay(date)}` : `may no longer be cited on ${formatDay(date)}`
  return because('EAR-28', `${offered} ${sentence}.`)
}

function notesFor(newCircuit: boolean, offered: CertificateKind | null, usable: string[]): string[] {
  return [
    // Never wrong, only more than is asked: the installation certificate may always be used.
    ...(!newCircuit && offered === 'installation' ? [because('DOC-02', 'A minor works certificate is enough for a change to an existing circuit; an installation certificate says more.')] : []),
    ...(usable.length > 1 ? [because('EAR-28', `Two editions may be cited on this day: ${usable.join(' and ')}. Keep one through the job.`)] : []),
  ]
}

export const certificateKindCalculation = defineCalculation({
  name: 'certificate-kind',
  purpose: 'Says which certificate work needs and which edition of the wiring regulations it may cite.',
  input,
  run: certificateKind,
})
