import { describe, expect, it } from 'vitest'
import { certificateKind } from '#shared/job/rules/certificate-kind'
import { editionInForce, editionsOn } from '#shared/job/rules/editions'

const A2 = 'BS 7671:2018+A2:2022'
const A3 = 'BS 7671:2018+A2:2022+A3:2024'
const A4 = 'BS 7671:2018+A4:2026'

describe('the edition on a day', () => {
  it.each([
    ['2022-09-27', ['BS 7671:2018+A1:2020', A2]],
    ['2022-09-28', [A2]],
    ['2024-07-30', [A2]],
    ['2024-07-31', [A3]],
    ['2026-04-14', [A3]],
    ['2026-04-15', [A3, A4]],
    ['2026-10-14', [A3, A4]],
    ['2026-10-15', [A4]],
    ['2018-07-01', []],
  ])('%s: %j', (day, expected) => {
    expect(editionsOn(day).map(each => each.edition)).toEqual(expected)
    expect(editionInForce(day)?.edition ?? null).toBe(expected.at(-1) ?? null)
  })
})

describe('certificate-kind', () => {
  it.each([
    ['2026-10-14', A3, 'within', A3],
    ['2026-10-15', A3, 'outside', A4],
    ['2026-04-14', A4, 'outside', A3],
    ['2026-04-15', A4, 'within', A4],
    ['2026-12-01', 'BS 7671', 'outside', A4],
  ])('on %s citing %s: %s', (date, edition, verdict, expected) => {
    expect(certificateKind({ newCircuit: true, date, edition, kind: 'installation' })).toMatchObject({ verdict, result: { kind: 'installation', edition: expected } })
  })

  it('lets an altered circuit take either paper', () => {
    expect(certificateKind({ newCircuit: false, date: '2026-12-01', edition: A4, kind: 'minor-works' })).toMatchObject({ verdict: 'within', result: { kind: 'minor-works' } })
    expect(certificateKind({ newCircuit: false, date: '2026-12-01', edition: A4, kind: 'installation' }).verdict).toBe('within')
  })

  it('waits for what it lacks', () => {
    expect(certificateKind({}).missing).toEqual(['newCircuit', 'date', 'edition'])
    expect(certificateKind({ newCircuit: true, date: '2026-12-01' })).toMatchObject({ verdict: 'waiting', missing: ['edition'], result: { kind: 'installation', edition: A4 } })
    expect(certificateKind({ newCircuit: true, date: '2010-01-01', edition: A4 }).verdict).toBe('waiting')
  })
})
