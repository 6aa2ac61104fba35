/** Loose ends of fields: what the certificate needs and nobody has answered, and answers that cannot stand. */
import type { JobRecord, PartContent } from '../../types/record'
import { contentOf, installedContent, isAnswered, jobFacts, numberOf, textOf } from '../judge/facts'
import { fieldRef, pageOf } from '../judge/field-refs'
import type { Part } from '../parts'
import { REQUIRED_FIELDS, type RequiredField } from './required-fields'
import type { Holder, LooseEnd } from './types'

export function fieldEnds(record: JobRecord): LooseEnd[] {
  const facts = jobFacts(record)
  return REQUIRED_FIELDS.flatMap((required) => {
    const content = contentFor(record, required)
    if (required.when && !required.when(facts, content)) return []
    return isAnswered(content[required.field]) ? [] : [missingField(required)]
  })
}

function contentFor(record: JobRecord, { part, key, field }: RequiredField): PartContent {
  if (part === 'circuit') return installedContent(record)
  const content = contentOf(record, part, key)
  // The electrode may have been described at the survey already.
  if (part === 'equipment' && key === 'electrode' && !isAnswered(content[field])) {
    const survey = contentOf(record, 'survey', 'survey')
    return { description: survey.electrode_type ?? null, location: survey.electrode_location ?? null }
  }
  return content
}

function missingField({ part, key, field, sentence, isNice, with: holder }: RequiredField): LooseEnd {
  const address = `${part}.${key}.${field}`
  return { id: `field:${address}`, stops: !isNice, sentence, page: pageOf(part, field), field: address, with: holder ?? 'installer' }
}

/** An end on one field. */
function onField(part: Part, key: string, field: string, id: string, stops: boolean, sentence: string, holder: Holder = 'installer'): LooseEnd {
  const ref = fieldRef(part, key, field)
  return { id, stops, sentence, page: ref.page, field: ref.field, with: holder }
}

const BONDS = { water: 'water', gas: 'gas', oil: 'oil', steel: 'structural steel', lightning: 'lightning protection', other: 'another service' } as const

/** Answers that are there but cannot stand. */
export function answerEnds(record: JobRecord, today: string): LooseEnd[] {
  const survey = contentOf(record, 'survey', 'survey')
  const charger = contentOf(record, 'equipment', 'charger')
  const statement = contentOf(record, 'statement', 'statement')
  const of = (field: string, id: string, stops: boolean, sentence: string, holder?: Holder) => onField('survey', 'survey', field, id, stops, sentence, holder)
  const emergency = record.premises.country === 'Northern Ireland' ? 'ring the emergency line of NIE Networks' : 'ring the network operator on 105'
  const serial = textOf(charger, 'serial')
  const again = textOf(charger, 'serial_again')
  const completed = textOf(statement, 'completed_on')
  const ends: (LooseEnd | false)[] = [
    survey.service_ok === 'unsafe' && of('service_ok', 'unsafe-service', true, `Stop work: cut-out, meter or tails are hot, damaged or exposed. Keep clear, tell the customer and ${emergency}; go on when it is put right.`),
    survey.service_ok === 'cannot-see' && of('service_ok', 'unseen-service', true, 'Look at cut-out, meter and tails: nobody has seen whether they are sound.'),
    survey.asbestos === 'yes' && of('asbestos', 'asbestos', false, 'An old board or flash guards may hold asbestos: do not drill or break them, and tell the customer.'),
    survey.earthing === 'cannot-see' && of('earthing', 'unseen-earthing', true, 'Find out the earthing arrangement: it was not seen.'),
    isAnswered(survey.earthing) && survey.earthing_how === 'assumed' && of('earthing', 'assumed-earthing', true, 'Find out the earthing arrangement: it is only assumed, and an assumption cannot be signed.'),
    isAnswered(survey.cutout_A) && survey.cutout_A_how !== 'read' && survey.cutout_A_how !== 'told' && of('cutout_A', 'assumed-fuse', true, 'Read the main fuse\'s rating on the carrier, or ask the network operator: an assumed rating cannot be signed.'),
    survey.looped === 'cannot-see' && of('looped', 'unseen-loop', true, 'Find out whether the supply is looped, on site or from the network operator.', 'office'),
    survey.earthing_conductor_verified === 'no' && of('earthing_conductor_verified', 'earthing-conductor', true, 'Put the earthing conductor right: its continuity or connection is not verified.'),
    survey.bonding_verified === 'no' && of('bonding_verified', 'bonding', true, 'Put the main bonding right: its continuity is not verified.'),
    ...Object.entries(BONDS).map(([key, words]) => survey[`bond_${key}`] === 'missing' && of(`bond_${key}`, `missing-bond:${key}`, true, `Bond ${words}: the main bonding is missing.`)),
    serial !== undefined && again !== undefined && serial !== again && onField('equipment', 'charger', 'serial_again', 'serial-differs', true, `Check the charger's serial number: it was typed as ${serial} and as ${again}.`),
    charger.labels === 'no' && onField('equipment', 'charger', 'labels', 'labels', true, 'Fix the labels.'),
    completed !== undefined && completed > today && onField('statement', 'statement', 'completed_on', 'completed-later', true, 'Enter the day of completion: the one entered is still to come.'),
    nextInspectionEnd(record, statement),
    ...limitEnds(record, survey),
    ...installedEnds(record),
    ...officeEnds(record),
  ]
  return ends.filter(end => end !== false)
}

/** Owned ten years at most, rented five (rule DOC-07). */
function nextInspectionEnd(record: JobRecord, statement: PartContent): LooseEnd | false {
  const years = numberOf(statement, 'next_inspection_years')
  const isRented = record.premises.tenure === 'tenant' || record.premises.tenure === 'landlord'
  return isRented && years !== undefined && years > 5 && onField('statement', 'statement', 'next_inspection_years', 'next-inspection', false, 'Look at the next inspection: rented homes are usually due within 5 years (DOC-07).')
}

function limitEnds(record: JobRecord, survey: PartContent): (LooseEnd | false)[] {
  const limit = contentOf(record, 'loadLimit', 'limit')
  const set_A = numberOf(limit, 'set_A')
  const agreed_A = numberOf(limit, 'limit_A')
  const fuse_A = numberOf(survey, 'cutout_A')
  const on = (field: string, id: string, sentence: string) => onField('loadLimit', 'limit', field, id, true, sentence)
  return [
    limit.state === 'planned' && on('state', 'limiter-planned', 'Fit the load limiter, or change the design: it is only planned.'),
    limit.state !== 'none' && limit.ct_checked === 'no' && on('ct_checked', 'ct-direction', 'Turn the current transformer the right way round on the right conductor.'),
    limit.state !== 'none' && limit.fails_safe === 'no' && on('fails_safe', 'fails-unsafe', 'Make the load limiter fail safe: without its measurement it must stop the charge (DNO-11).'),
    set_A !== undefined && agreed_A !== undefined && set_A > agreed_A && on('set_A', 'limit-above-agreed', `Lower the load limit: it is set to ${set_A} A, and ${agreed_A} A was agreed.`),
    set_A !== undefined && fuse_A !== undefined && set_A > fuse_A && on('set_A', 'limit-above-fuse', `Lower the load limit: it is set to ${set_A} A, above the main fuse of ${fuse_A} A.`),
  ]
}

/** The schedules hold what was installed; a circuit that nobody recorded as installed would print the design as if it were. */
function installedEnds(record: JobRecord): (LooseEnd | false)[] {
  const installed = contentOf(record, 'circuit', 'installed')
  const designed = contentOf(record, 'circuit', 'designed')
  const isRecorded = ['device', 'In_A', 'cable', 'S_mm2'].some(field => isAnswered(installed[field]))
  const isDesigned = ['device', 'In_A', 'cable', 'S_mm2'].every(field => isAnswered(designed[field]))
  const hasLength = isAnswered(installed.L_m) || (isAnswered(installed.start_mark_m) && isAnswered(installed.end_mark_m))
  const halfMarked = isAnswered(installed.start_mark_m) !== isAnswered(installed.end_mark_m) && !isAnswered(installed.L_m)
  return [
    !isRecorded && isDesigned && onField('circuit', 'installed', 'S_mm2', 'installed-not-recorded', true, 'Record the device and the cable that were installed; so far only the design is known.'),
    halfMarked && onField('circuit', 'installed', isAnswered(installed.start_mark_m) ? 'end_mark_m' : 'start_mark_m', 'half-marked', false, `Read the mark at the ${isAnswered(installed.start_mark_m) ? 'end' : 'start'} of the cable too, or enter its length.`),
    !hasLength && !halfMarked && onField('circuit', 'installed', 'L_m', 'length-not-measured', false, 'Enter the length of cable as fitted, or the marks at its two ends; so far the length is the design\'s.'),
  ]
}

function officeEnds(record: JobRecord): (LooseEnd | false)[] {
  const at = (id: string, field: string, stops: boolean, sentence: string, holder: Holder = 'office'): LooseEnd => ({ id, stops, sentence, page: 'enquiry', field, with: holder })
  const { customer, premises } = record
  return [
    !customer.name.trim() && at('customer-name', 'customer.name', true, 'Enter the customer\'s name.'),
    !customer.email.trim() && at('customer-email', 'customer.email', false, 'Ask the customer for an e-mail address: the pack goes there.', 'customer'),
    !premises.address.trim() && at('address', 'premises.address', true, 'Enter the address of the installation.'),
    !premises.postcode.trim() && at('postcode', 'premises.postcode', true, 'Enter the postcode of the installation.'),
    !premises.mpan.trim() && at('mpan', 'premises.mpan', false, 'Enter the supply number: the notice to the network operator needs it.'),
    ...record.parts.consent.map(({ key, content }) => content.state === 'refused' && at(`consent-refused:${key}`, `consent.${key}.state`, true, `Settle the permission that was refused${textOf(content, 'by') ? ` by ${textOf(content, 'by')}` : ''}.`)),
    ...record.parts.consent.map(({ key, content }) => content.state === 'asked' && at(`consent-asked:${key}`, `consent.${key}.state`, false, 'Chase the permission that was asked for.')),
  ]
}
