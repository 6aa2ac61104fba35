import { describe, expect, it } from 'vitest'
import { assembleSealedRecord, type AssembleInput } from '#server/services/sign-off/assemble-record'
import { judgeJob } from '#shared/job/judge/judge-job'
import { certificateRecord, sealedRecord, sealingGaps } from '#shared/schemas/sealed-record'
import type { JobRecord } from '#shared/types/record'
import { jobRecord, signatures, threePhaseJob, ttJob, withFields, withoutReading, withReading, WORK_DAY } from '../../support/build/job-record'

const EDITION = 'BS 7671:2018+A4:2026'

function assemble(record: JobRecord, changes: Partial<AssembleInput> = {}) {
  return assembleSealedRecord({
    record, judgement: judgeJob(record, WORK_DAY), firm: { name: 'Wrenfield Charging (invented)', address: 'Unit 2, Sample Yard', telephone: '01632 960123', scheme: 'Invented Competence Scheme', registration: 'ICS 000123' },
    certificate: { number: 'WRN-2027-00042', revision: 0 }, signatures: signatures(), previousHash: null, sealedAt: '2027-03-03T09:05:00Z', edition: EDITION, ruleDataVersion: '2026-12-01', draft: false, ...changes,
  })
}

describe('assembleSealedRecord', () => {
  it.each([['single-phase TN-C-S', jobRecord()], ['TT', ttJob()], ['three-phase', threePhaseJob()]])('of a complete %s job may be sealed', (_, record) => {
    const made = assemble(record)
    expect(sealingGaps(made)).toEqual([])
    expect(sealedRecord.safeParse(made).error?.issues).toBeUndefined()
  })

  it('prints the engine\'s own figures', () => {
    const record = jobRecord()
    const judgement = judgeJob(record, WORK_DAY)
    const made = assemble(record)
    const circuit = made.tests.circuits[0]!
    expect(circuit.maximumZs).toMatchObject({ shown: '0.87', value: judgement.zsLimit.answer.result.ZsMeasuredMax_ohm })
    expect(circuit.zs).toMatchObject({ shown: '0.33', value: 0.33, unit: 'Ω', instrumentSerial: 'MFT-0042', personName: 'R. Invented', judgement: { verdict: 'within', limit: '≤ 0.87\u2009Ω' } })
    expect(made.maximumDemand.demand).toMatchObject({ shown: '52.0', value: judgement.supply.answer.result.demandAfter_A })
    expect(made.design.circuit.result).toEqual(JSON.parse(JSON.stringify(judgement.chosen.answer.result)))
    expect(made.design.supplyCheck.working).toEqual(judgement.supply.answer.working)
  })

  it('of a job hardly begun is still a valid draft, with "not entered" where nothing is known', () => {
    const record = jobRecord()
    const bare: JobRecord = { ...record, readings: [], photographs: [], parts: Object.fromEntries(Object.keys(record.parts).map(part => [part, []])) as unknown as JobRecord['parts'] }
    const draft = assemble(bare, { draft: true, signatures: [] })
    expect(certificateRecord.safeParse(draft).error?.issues).toBeUndefined()
    expect(draft.supply.earthing).toEqual({ kind: 'not-entered', shown: 'not entered' })
    expect(sealingGaps(draft).length).toBeGreaterThan(50)
  })

  it('cannot be sealed with a reading missing or outside', () => {
    expect(sealingGaps(assemble(withoutReading(jobRecord(), 'Zs'))).map(gap => gap.message)).toEqual(['Not entered'])
    expect(sealingGaps(assemble(withReading(jobRecord(), 'Zs', '0.95'))).map(gap => gap.message)).toEqual(['Outside limit'])
  })

  it('keeps the earlier readings beneath a re-test', () => {
    const made = assemble(withReading(withReading(jobRecord(), 'Zs', '0.95'), 'Zs', '0.33'))
    expect(made.tests.circuits[0]!.zs.earlier).toMatchObject([{ shown: '0.33' }, { shown: '0.95', judgement: { verdict: 'outside' } }])
  })

  it('prints the sentence of an Unexpected with who wrote and who accepted it', () => {
    const record = withReading(withoutReading(jobRecord(), 'R1Rn'), 'R1R2', '0.16')
    const explained = { ...record, parts: { ...record.parts, unexpected: [{ key: 'R1R2', position: 0, version: 1, content: { sentence: 'Round the extension.' }, stamps: { sentence: { v: 1, by: 'p-tester', at: `${WORK_DAY}T15:00:00Z` } } }] } }
    const made = assemble(explained)
    expect(made.tests.circuits[0]!.continuity.judgement).toMatchObject({ verdict: 'unexpected', sentence: 'Round the extension.', sentenceBy: 'R. Invented', acceptedBy: 'S. Fictional' })
    expect(sealingGaps(made)).toEqual([])
  })

  it('joins the capacities that one person signed in one act', () => {
    const made = assemble(jobRecord())
    expect(made.signatures.map(each => each.capacities)).toEqual([['design', 'construction', 'inspection-and-test'], ['checked-for-the-firm']])
    expect(made.selfCountersigned).toBe(false)
    expect(assemble(jobRecord(), { signatures: signatures().map(each => ({ ...each, personId: 'p-tester' })) }).selfCountersigned).toBe(true)
  })

  it('names each instrument used, in calibration on the day', () => {
    expect(assemble(jobRecord()).instruments).toMatchObject([{ serial: 'MFT-0042', calibratedUntil: '2027-09-14' }, { serial: 'VA-0007' }])
  })

  it('prints N/A with its reason where the electrode is not, and its resistance where it is', () => {
    expect(assemble(jobRecord()).meansOfEarthing.electrodeResistance).toMatchObject({ kind: 'not-applicable', reason: expect.any(String) as string })
    expect(assemble(ttJob()).meansOfEarthing).toMatchObject({ electrodeResistance: { shown: '82.0' }, electrodeMethod: { shown: 'Electrode tester' } })
    expect(assemble(ttJob()).tests.circuits[0]).toMatchObject({ maximumZsBasis: { shown: '50 V ÷ rated residual current (TT)' }, disconnectionTime: { value: 0.2 } })
  })

  it('letters its revisions and names what it replaces', () => {
    const { certificate } = assemble(jobRecord(), { certificate: { number: 'WRN-2027-00042', revision: 1, replaces: { number: 'WRN-2027-00042', revision: 0, hash: 'a'.repeat(64), why: 'Serial number mistyped' } } })
    expect(certificate).toMatchObject({ revision: 'B', replaces: { revision: 'A', why: 'Serial number mistyped' } })
  })

  it('holds neither telephone nor e-mail of the customer', () => {
    const record = jobRecord()
    const text = JSON.stringify(assemble({ ...record, customer: { ...record.customer, telephone: '01632 960777' } }))
    expect(text).not.toContain('a.sample@example.org')
    expect(text).not.toContain('960777')
  })

  it('is the same record from the same input', () => {
    const record = withFields(jobRecord(), 'statement', 'statement', { occupier: 'B. Tenant' })
    expect(assemble(record)).toEqual(assemble(record))
    expect(assemble(record).installation.occupier.shown).toBe('B. Tenant')
  })
})
