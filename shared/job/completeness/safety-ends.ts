/** Loose ends of the calculated safety figures. A sheet that only waits for fields already named is not named again. */
import type { JobRecord } from '../../types/record'
import { fieldRef } from '../judge/field-refs'
import type { FieldRef, Judged, Judgement } from '../judge/types'
import type { LooseEnd } from './types'

export function safetyEnds(record: JobRecord, judgement: Judgement, named: readonly LooseEnd[]): LooseEnd[] {
  const sheets: Record<string, Judged<unknown>> = { 'supply': judgement.supply, 'cable': judgement.installed, 'earthing-method': judgement.earthing, 'breaking-capacity': judgement.breakingCapacity }
  const isNamed = (ref: FieldRef) => named.some(end => end.stops && end.field !== undefined && sameField(end.field, ref.field))
  const figures = judgement.safety.flatMap((figure): LooseEnd[] => {
    const sheet = sheets[figure.id]
    if (!sheet && figure.id !== 'upstream-rcd') return []
    const end: LooseEnd = { id: `safety:${figure.id}`, stops: true, sentence: figure.sentence, page: figure.page, field: figure.field, with: 'installer' }
    if (figure.verdict === 'outside') return [end]
    if (figure.verdict !== 'waiting') return []
    const waitsFor = figure.waitsFor ?? sheet?.waitsFor ?? []
    return waitsFor.length && waitsFor.every(isNamed) ? [] : [end]
  })
  return [...figures, ...mountingEnd(record, judgement), ...routeEnd(judgement, isNamed)]
}

/** A field of the circuit that is missing as installed is also what the design waits for. */
const sameField = (a: string, b: string) => a.replace('.designed.', '.installed.') === b.replace('.designed.', '.installed.')

function mountingEnd(record: JobRecord, { mounting }: Judgement): LooseEnd[] {
  if (!mounting) return []
  const { field } = fieldRef('equipment', 'charger', 'height_m')
  const at = { page: 'point' as const, field, with: 'installer' as const }
  if (mounting.answer.verdict === 'waiting') return [{ ...at, id: 'mounting', stops: true, sentence: 'Enter the charger\'s lowest height above the ground.' }]
  if (mounting.answer.verdict !== 'outside') return []
  // Not among the safety figures: a recorded departure may stand for it.
  const stops = record.parts.departure.length === 0
  return [{ ...at, id: 'mounting', stops, sentence: `${mounting.answer.reasons.join(' ')} Move it, or record a departure.` }]
}

function routeEnd({ route }: Judgement, isNamed: (ref: FieldRef) => boolean): LooseEnd[] {
  if (route.answer.verdict !== 'waiting' || route.waitsFor.every(isNamed)) return []
  const first = route.waitsFor.find(ref => !isNamed(ref))!
  return [{ id: 'route', stops: true, page: first.page, field: first.field, with: first.page === 'enquiry' ? 'office' : 'installer', sentence: `Enter ${first.words}: it decides whether the network operator is asked first.` }]
}
