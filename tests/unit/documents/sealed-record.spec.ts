import { describe, expect, it } from 'vitest'
import { sealedRecord, sealingGaps } from '#shared/schemas/sealed-record'
import { limited, textField } from '#shared/schemas/sealed-record/field'
import { fieldsOf } from '#shared/schemas/sealed-record/fields-of'
import { draftSample, everySample, installationSample, minorWorksSample } from '../../support/build/sealed-record'

describe('a sealed record', () => {
  it.each(everySample())('takes a whole $kind record unchanged', (record) => {
    expect(sealedRecord.parse(record)).toEqual(record)
    expect(fieldsOf(record).length).toBeGreaterThan(30)
  })

  it('refuses a key it does not know, because dropping it would change the hash', () => {
    expect(sealedRecord.safeParse({ ...minorWorksSample(), price_pence: 1 }).success).toBe(false)
    const record = minorWorksSample()
    expect(sealedRecord.safeParse({ ...record, client: { ...record.client, telephone: '01632 960001' } }).success).toBe(false)
  })

  it('names each reading that is not entered, and each missing signature', () => {
    expect(sealingGaps(draftSample()).map(gap => gap.message).sort()).toEqual(['No signature: checked for the firm', 'No signature: construction', 'No signature: design', 'No signature: inspection and test', 'Not entered', 'Not entered'])
    expect(sealedRecord.safeParse(draftSample()).success).toBe(false)
  })

  it('takes LIM against an existing part but not on a new circuit', () => {
    const record = installationSample()
    expect(record.bonding.continuity.kind).toBe('limited')
    expect(sealingGaps(record)).toEqual([])
    record.tests.circuits[0]!.zs = limited('no access')
    expect(sealingGaps(record)).toEqual([{ path: ['tests', 'circuits', 0, 'zs'], message: 'LIM cannot stand on a new circuit' }])
  })

  it.each([
    ['Outside limit', { verdict: 'outside' as const }],
    ['Cannot tell yet', { verdict: 'waiting' as const }],
    ['An Unexpected figure needs its sentence', { verdict: 'unexpected' as const }],
  ])('stops at %s', (message, judgement) => {
    const record = minorWorksSample()
    record.results.zs = textField('0.91', { unit: 'Ω', judgement })
    expect(sealingGaps(record)).toEqual([{ path: ['results', 'zs'], message }])
  })

  it('stops at an inspection that is unsatisfactory', () => {
    const record = installationSample()
    record.inspections.items[0] = { number: '1', words: 'Intake', outcome: 'unsatisfactory' }
    expect(sealingGaps(record).map(gap => gap.message)).toEqual(['1 Intake: unsatisfactory'])
  })

  it('wants a reason beside N/A and LIM, and never an empty cell', () => {
    const record = minorWorksSample()
    expect(sealedRecord.safeParse({ ...record, results: { ...record.results, zs: { kind: 'not-applicable', shown: 'N/A' } } }).success).toBe(false)
    expect(sealedRecord.safeParse({ ...record, results: { ...record.results, remarks: { kind: 'value', shown: ' ' } } }).success).toBe(false)
  })
})
