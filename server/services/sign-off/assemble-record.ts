/**
 * Puts an installation certificate together from a job's record and its judgement: every field of the form holds a value,
 * N/A with its reason, or (on a draft) "not entered". Pure: the same input gives the same record, and so the same hash.
 */
import { contentOf, textOf } from '../../../shared/job/judge/facts'
import { withoutBlanks } from '../../../shared/job/judge/judged'
import { revisionLetters } from '../../../shared/job/certificate-name'
import { ruleIdOf } from '../../../shared/job/rules/rule'
import { notApplicable, notEntered, textField } from '../../../shared/schemas/sealed-record/field'
import type { InstallationRecord } from '../../../shared/schemas/sealed-record/installation'
import { composed, instant, recorded } from './assemble/fields'
import type { AssembleInput } from './assemble/input'
import { departures, designPart, exceptions, inspectionsPart, instruments, isSelfCountersigned, photographs, signatures } from './assemble/papers'
import { conductorParts, mainSwitchPart, maximumDemandPart, meansOfEarthingPart, supplyPart } from './assemble/supply-part'
import { testsPart } from './assemble/tests-part'

/** The edition of the list of fields; what amendment 4 changed in the forms has not been read. */
const FORM_EDITION = 'Amendment 2 list of fields'

export type { AssembleInput, FirmOnPaper } from './assemble/input'

export function assembleSealedRecord(input: AssembleInput): InstallationRecord {
  const { record, firm, certificate } = input
  const { replaces } = certificate
  return {
    format: 1,
    kind: 'installation',
    firm: { name: firm.name, address: firm.address || 'not entered', scheme: firm.scheme || 'none', registration: firm.registration || 'none' },
    certificate: {
      number: certificate.number, revision: revisionLetters(certificate.revision),
      replaces: replaces ? { ...replaces, revision: revisionLetters(replaces.revision) } : null,
      edition: input.edition, formEdition: FORM_EDITION, ruleDataVersion: input.ruleDataVersion, at: instant(input.sealedAt),
    },
    jobReference: record.job.ref,
    client: { name: record.customer.name || 'not entered', address: fullAddress(record.premises) || 'not entered' },
    departures: departures(input),
    exceptions: exceptions(input),
    signatures: signatures(input),
    selfCountersigned: isSelfCountersigned(input),
    instruments: instruments(input),
    photographs: photographs(input),
    previousHash: input.previousHash,
    installation: installationPart(input),
    nextInspection: nextInspection(input),
    supply: supplyPart(input),
    meansOfEarthing: meansOfEarthingPart(input),
    maximumDemand: maximumDemandPart(input),
    ...conductorParts(input),
    mainSwitch: mainSwitchPart(input),
    existingInstallation: { comments: recorded(input, 'survey', 'survey', 'existing_comments') },
    earthingMethod: earthingMethod(input),
    inspections: inspectionsPart(input),
    tests: testsPart(input),
    design: designPart(input),
  }
}

function installationPart(input: AssembleInput): InstallationRecord['installation'] {
  const { record } = input
  const { premises } = record
  const statement = contentOf(record, 'statement', 'statement')
  const occupier = textOf(statement, 'occupier') ?? (premises.occupier.trim() || undefined)
  const phases = contentOf(record, 'survey', 'survey').supply_phases
  const said = textOf(statement, 'nature')
  return {
    shortAddress: [premises.address.split(/[\n,]/)[0]?.trim(), premises.postcode].filter(Boolean).join(', ') || 'not entered',
    address: composed(fullAddress(premises)),
    occupier: occupier === undefined || occupier === record.customer.name ? notApplicable('the client is the occupier') : textField(occupier),
    description: phases === undefined || phases === null ? notEntered() : textField(`Dwelling with a ${Number(phases) === 3 ? 'three-phase' : 'single-phase'} supply`),
    extent: recorded(input, 'statement', 'statement', 'description'),
    notCovered: recorded(input, 'statement', 'statement', 'not_covered'),
    // On a draft that does not say, a new circuit in a house is an addition.
    nature: said === 'new' || said === 'alteration' ? said : 'addition',
  }
}

function nextInspection(input: AssembleInput): InstallationRecord['nextInspection'] {
  const years = recorded(input, 'statement', 'statement', 'next_inspection_years')
  const inspector = input.signatures.find(each => each.capacity === 'inspector')
  const { shown, value, personId, personName, at } = years
  const interval = years.kind === 'value' ? textField(value === 1 ? '1 year' : `${shown} years`, { value, personId, personName, at }) : years
  return { interval: withoutBlanks(interval) as typeof interval, recommendedBy: composed(inspector?.nameShown) }
}

function earthingMethod(input: AssembleInput): InstallationRecord['earthingMethod'] {
  const { answer } = input.judgement.earthing
  const method = recorded(input, 'earthing', 'earthing', 'method')
  const rule = answer.reasons.map(ruleIdOf).find(id => id !== null)
  return {
    method: method.kind === 'value' ? { ...method, judgement: { verdict: answer.verdict ?? 'waiting' } } : method,
    why: recorded(input, 'earthing', 'earthing', 'reason'),
    ...(rule && { rule }),
  }
}

function fullAddress({ address, town, postcode }: AssembleInput['record']['premises']): string {
  return [address.replace(/\s*\n\s*/g, ', ').trim(), [town, postcode].filter(Boolean).join(' ')].filter(Boolean).join(', ')
}
