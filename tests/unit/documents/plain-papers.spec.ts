import { describe, expect, it } from 'vitest'
import { invoiceWords } from '#server/documents/invoice/content'
import { noticeWords } from '#server/documents/notice/content'
import { packContent } from '#server/documents/pack/content'
import { liveWithIt } from '#server/documents/plain-words/live-with-it'
import { proveIt } from '#server/documents/plain-words/prove-it'
import { quoteWords } from '#server/documents/quote/content'
import { workingContent } from '#server/documents/working/content'
import { limited, notApplicable, textField } from '#shared/schemas/sealed-record/field'
import { draftSample, installationSample, minorWorksSample } from '../../support/build/sealed-record'
import { invoiceSample, LIVE_WITH, noticeSample, packSample, quoteSample, SEAL } from './samples'

describe('design working', () => {
  const [circuit, supply] = workingContent(installationSample(), SEAL)?.sheets ?? []

  it('gives each step with its numbers, its source and how well it is known, rounded once', () => {
    expect(circuit?.rows[2]).toEqual({ symbol: 'ΔU', expression: '7.3 × 32 × 18 ÷ 1000', value: '4.205\u202fV', source: 'BS 7671 Table 4D4B', confidence: 'one source', isFromMemory: false })
    expect(circuit?.rows.map(row => row.isFromMemory)).toEqual([false, false, false, false, true])
  })

  it('prints the command and the input that give the same figures again', () => {
    expect(circuit?.command).toBe('npm run --silent calc -- circuit')
    expect(JSON.parse(circuit?.input ?? '')).toEqual(installationSample().design.circuit.input)
    expect(supply?.reasons).toEqual(['DNO-11: the tested load limiter counts.'])
  })

  it('shows every size that was compared, and does not round a small figure away', () => {
    const record = installationSample()
    record.design.circuit.result = { sizes: [{ S_mm2: 4, Iz_A: 37, volt_drop_V: 6.34, percent: 2.757, Zs_ohm: 0.40671, verdict: 'outside', firstReason: 'Iz 37 A is under In 40 A' }, { S_mm2: 6, verdict: 'within' }] }
    record.design.circuit.working = [{ symbol: 'x', expression: '', value: 0.000123456, unit: 'Ω', source: '', confidence: 'computed' }]
    const sheet = workingContent(record, SEAL)?.sheets[0]
    expect(sheet?.sizes).toEqual([['4\u202fmm²', '37\u202fA', '6.34\u202fV', '2.757\u202f%', '0.4067\u202fΩ', 'Iz 37 A is under In 40 A'], ['6\u202fmm²', 'no figure', 'no figure', 'no figure', 'no figure', 'Within limit']])
    expect(sheet?.rows[0]).toMatchObject({ value: '0.0001235\u202fΩ', expression: 'as given', source: 'no source named' })
  })

  it('is left out where no calculation stands behind the work, and cautions where one does', () => {
    expect(workingContent(minorWorksSample(), SEAL)).toBeNull()
    expect(workingContent(installationSample(), SEAL)?.caution).toContain('gives no permission to work')
  })
})

describe('prove it', () => {
  it('says for each check what was found, what it must be, and what that means', () => {
    const rows = proveIt(installationSample())
    expect(rows).toHaveLength(17)
    expect(rows.find(row => row.checked === 'Earth fault path (Zs)')).toEqual({ checked: 'Earth fault path (Zs)', found: '0.44\u202fΩ', mustBe: '≤ 0.87 Ω', inShort: 'If live touches metal, enough current flows to switch it off at once.', mark: { verdict: 'within', words: 'Within limit · 0.43 Ω inside' } })
    expect(proveIt(minorWorksSample())).toHaveLength(8)
  })

  it.each([
    ['N/A', notApplicable('no limiter'), 'Does not apply here.'],
    ['LIM', limited('no access'), 'Could not be measured; the reason is given.'],
    ['outside', textField('x', { judgement: { verdict: 'outside' } }), 'Not as it must be.'],
    ['waiting', textField('x', { judgement: { verdict: 'waiting' } }), 'Cannot be told yet.'],
  ])('never says that %s is good', (_, field, inShort) => {
    const record = minorWorksSample()
    record.results.zs = field
    expect(proveIt(record).find(row => row.checked === 'Earth fault path (Zs)')?.inShort).toBe(inShort)
  })

  it('says of a gap that it was not measured', () => {
    expect(proveIt(draftSample()).find(row => row.checked === 'Leakage switch, time')?.inShort).toBe('Not measured yet.')
  })
})

describe('live with it', () => {
  it('has four parts, five plain checks, and the numbers to ring', () => {
    const parts = liveWithIt(LIVE_WITH)
    expect(parts.map(part => part.title)).toEqual(['Switch off in a hurry', 'First charge', 'It is not charging', 'Look after it'])
    expect(parts[2]?.steps).toHaveLength(5)
    expect(parts.flatMap(part => part.steps).join(' ')).toContain('01632 960123')
  })

  it('says nothing of a limiter or a delay that is not there', () => {
    const words = liveWithIt({ ...LIVE_WITH, loadLimit_A: null, randomDelay_min: 0, guaranteeUntil: null }).flatMap(part => part.steps).join(' ')
    expect(words).not.toMatch(/pauses|null|0 minutes/)
  })
})

describe('the pack', () => {
  it('holds all papers of a new circuit, and of minor works only those there are', () => {
    expect(packContent(packSample())).toMatchObject({ inspections: expect.anything(), tests: expect.anything(), working: expect.anything(), photographs: null })
    expect(packContent(packSample({ record: minorWorksSample() }))).toMatchObject({ inspections: null, tests: null, working: null })
  })

  it('prints the head of the firm’s record of events', () => {
    expect(packContent(packSample()).last.at(-1)).toContain('a'.repeat(64))
    expect(packContent(packSample({ auditHead: null, told: [] })).last).toEqual(['Nobody outside has been told yet.', 'Head of the firm’s record of events: none yet.'])
  })
})

describe('the network operator’s sheet', () => {
  it('says route, reasons with their rules, last day, demand before and after', () => {
    const words = noticeWords(noticeSample())
    expect(words.heading.facts.map(one => [one.label, one.said.text])).toEqual([['To', 'Network operator of region 14'], ['Route', 'Told after the installation'], ['Last day', 'Tue 30 Mar 2027'], ['Installed on', 'Tue 2 Mar 2027']])
    expect(words.reasons.filter(reason => /DNO-\d\d:/.test(reason))).toHaveLength(3)
    const labels = words.groups.flatMap(group => group.facts.map(one => one.label))
    for (const label of ['Customer', 'Installer', 'Premises', 'Supply number (MPAN)', 'Before this work', 'After this work', 'Load limiter', 'Cut-out rating', 'Looped service', 'Earthing finally used', 'Rating', 'Can it export']) expect(labels).toContain(label)
  })

  it.each([['ask-first', 'nothing is energised'], ['contact', 'before any work'], ['generation-application', 'acceptance']] as const)('says of %s that work waits', (route, words) => {
    const sheet = noticeWords(noticeSample({ route, lastDay: null, installedOn: null, enclosed: [] }))
    expect(sheet.heading.facts.map(one => one.said.text).join(' ')).toContain(words)
    expect(sheet.heading.facts.map(one => one.said.text)).toContain('None: work waits for your answer')
  })
})

describe('quote and invoice', () => {
  it('prints each line and each sum in pounds and pence', () => {
    const words = quoteWords(quoteSample({ grant_pence: 50000 }))
    expect(words.lines[1]).toEqual(['Armoured cable, clipped', '18 m', '£9.50', '20\u202f%', '£171.00'])
    expect(words.totals).toEqual([['Before VAT', '£820.00'], ['VAT at 20\u202f% on £820.00', '£164.00'], ['Price with VAT', '£984.00'], ['Grant, paid to us for you', '−£500.00'], ['Deposit on acceptance', '£200.00']])
  })

  it('holds what the law asks of an invoice', () => {
    const words = invoiceWords(invoiceSample())
    const said = JSON.stringify(words)
    for (const needed of ['VAT invoice', 'WRN-I-2027-0018', 'issued Thu 4 Mar 2027', 'Tax point', 'Tue 2 Mar 2027', 'VAT number GB 000 0000 00', 'A. Sample', 'Total VAT, in sterling', '£784.00']) expect(said).toContain(needed)
    expect(words.totals.at(-1)).toEqual(['To pay', '£784.00'])
  })

  it('does not call itself a VAT invoice where the firm is not registered', () => {
    const words = invoiceWords(invoiceSample({ firm: { ...invoiceSample().firm, vatNumber: null }, payUrl: null }))
    expect(words.opening.title).toBe('Invoice')
    expect(JSON.stringify(words)).toContain('Not registered for VAT')
  })
})
