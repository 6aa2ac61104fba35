import { describe, expect, it } from 'vitest'
import { certificateContent } from '#server/documents/certificate/content'
import { inspectionsContent } from '#server/documents/inspections/content'
import { footOf } from '#server/documents/paper/record-paper'
import { footText } from '#server/documents/paper/foot'
import { fieldText, type FactGroup } from '#server/documents/paper/said'
import { testResultsContent } from '#server/documents/test-results/content'
import { fieldsOf } from '#shared/schemas/sealed-record/fields-of'
import { draftSample, installationSample, minorWorksSample } from '../../support/build/sealed-record'
import { SEAL } from './samples'

/** What the standard's forms ask for, in our words: group by group. */
const INSTALLATION: Record<string, string[]> = {
  'This certificate': ['Number', 'Edition of the rules', 'Replaces', 'Pages and schedules', 'Firm', 'Scheme and registration', 'State', 'Job'],
  'Client and installation': ['Client', 'Address of the installation', 'Occupier', 'The installation', 'This work is', 'Extent of the work covered', 'Expressly not covered'],
  'Supply': ['Earthing arrangement', 'Evidence', 'Live conductors', 'Nominal voltage U / U0', 'Frequency', 'Supply polarity', 'Prospective fault current Ipf', 'External loop impedance Ze', 'Supply device: standard', 'Supply device: type', 'Supply device: rating', 'Other sources of supply'],
  'Means of earthing': ['Means of earthing', 'Electrode type', 'Electrode location', 'Electrode resistance', 'Method of measurement', 'Earthing method for charging', 'Why this method'],
  'Maximum demand': ['Maximum demand', 'Found by', 'Load limiter', 'Load limit set to'],
  'Earthing conductor': ['Material', 'Size', 'Continuity', 'Connection'],
  'Main bonding': ['Material', 'Size', 'Continuity', 'To water', 'To gas', 'To oil', 'To structural steel', 'To lightning protection', 'To anything else'],
  'Main switch': ['Location', 'Standard', 'Type', 'Poles', 'Current rating', 'Voltage rating', 'Fuse or setting', 'Residual current IΔn', 'Residual-current delay', 'Residual-current trip time'],
  'Existing installation, next inspection': ['Seen and not worked on', 'Next inspection after', 'Recommended by'],
  'Seal': ['Four words', 'Sealed', 'SHA-256 of the record', 'Hash before it', 'Rule data', 'Where to check'],
}

const labelsOf = (groups: FactGroup[]) => Object.fromEntries(groups.map(group => [group.title, group.facts.map(one => one.label)]))

/** Every text anywhere in a content. */
function textsOf(part: unknown): string[] {
  if (typeof part === 'string') return [part]
  if (Array.isArray(part)) return part.flatMap(textsOf)
  return part !== null && typeof part === 'object' ? Object.values(part).flatMap(textsOf) : []
}

describe('an installation certificate', () => {
  const record = installationSample()
  const content = certificateContent(record, SEAL)
  const schedules = [inspectionsContent(record, SEAL), testResultsContent(record, SEAL)]

  it('holds each field of the form, in order', () => {
    expect(labelsOf([content.heading, ...content.groups, content.seal])).toEqual(INSTALLATION)
  })

  it('prints each field of the record somewhere, and never an empty text', () => {
    const printed = textsOf([content, ...schedules])
    const texts = new Set(printed)
    expect(fieldsOf(record).filter(({ field }) => !texts.has(fieldText(field))).map(({ path }) => path.join('.'))).toEqual([])
    expect(printed.filter(text => text.trim() === '')).toEqual([])
  })

  it('says how a figure is known: how, who, with what, when', () => {
    const ze = content.groups.flatMap(group => group.facts).find(one => one.label === 'External loop impedance Ze')
    expect(ze?.said).toEqual({ text: '0.21\u202fΩ', notes: ['must be ≤ 0.35 Ω', 'measured · R. Invented · instrument MFT-0042 · 2 Mar 2027 10:12'], mark: { verdict: 'within', words: 'Within limit · 0.14 Ω inside' } })
  })

  it('says that one person signed for the three, how, when and to which edition', () => {
    expect(content.signatures[0]).toMatchObject({ capacities: 'Design · Construction · Inspection and test', name: 'R. Invented', signed: 'Signed by a drawn signature on Tue 2 Mar 2027, 15:40, to BS 7671:2018+A4:2026', firm: expect.stringContaining('telephone 01632 960123') })
    expect(content.signatures[1]?.capacities).toBe('Checked for the firm')
    expect(content.signatureNotes).toContain('One person designed, built, inspected and tested this work: one signature stands for the three declarations.')
  })

  it('says so where the firm let a person check their own work', () => {
    expect(certificateContent({ ...record, selfCountersigned: true }, SEAL).signatureNotes.join(' ')).toContain('Self-countersigned')
  })

  it('prints departures and permitted exceptions with their risk assessment', () => {
    const departed = certificateContent({ ...record, departures: [{ regulation: '120.3', differs: 'A', whySafe: 'B', designer: 'C' }], exceptions: [{ omitted: 'Surge device', reason: 'R', designer: 'C', riskAssessment: { title: 'Assessment 1', sha256: 'd'.repeat(64) } }] }, SEAL)
    expect(departed.departures).toEqual([['120.3', 'A', 'B', 'C']])
    expect(departed.exceptions[0]?.join(' ')).toContain(`Assessment 1, SHA-256 ${'d'.repeat(64)}`)
  })

  it('says what it replaces and why, on the first page and at each foot', () => {
    const revised = { ...record, certificate: { ...record.certificate, revision: 'B', replaces: { number: 'WRN-2027-00042', revision: 'A', hash: 'e'.repeat(64), why: 'Serial number corrected' } } }
    const replaces = certificateContent(revised, SEAL).heading.facts.find(one => one.label === 'Replaces')
    expect(replaces?.said).toMatchObject({ text: 'WRN-2027-00042 A', notes: ['Serial number corrected'] })
    expect(footText(footOf(revised, SEAL), 2, 5)).toBe('WRN-2027-00042 B  ·  page 2 of 5  ·  19 Hill Street, ZZ1 1ZZ  ·  disorder · stay · behave · shaft  ·  Replaces WRN-2027-00042 A')
  })

  it('has no condition codes and no lone ticks', () => {
    expect(textsOf([content, ...schedules]).join(' ')).not.toMatch(/\b(C1|C2|C3|FI)\b|[✓✔✗✘☑]/)
  })
})

describe('the schedule of test results', () => {
  const content = testResultsContent(installationSample(), SEAL)
  const rows = content.circuits[0]?.rows ?? []

  it('lists every reading in the order of testing', () => {
    expect(rows.map(row => row.label)).toEqual(['Ring, line r1', 'Ring, neutral rn', 'Ring, protective r2', 'Continuity R1+R2', 'Continuity R1+Rn', 'Insulation: test voltage', 'Insulation: charger connected', 'Insulation: line to line', 'Insulation: line to earth', 'Insulation: neutral to earth', 'Polarity', 'Zs measured, reading 1', 'Zs measured, reading 2', 'Zs corrected for temperature', 'RCD trip time at IΔn', '6 mA d.c. trip', 'RCD button', 'Arc-fault device button', 'Vehicle states', 'Protective-conductor fault', 'Open-PEN function', 'Load limiter seen to limit', 'Randomised delay restored', 'Isolation', 'Remarks'])
  })

  it('keeps the first reading beside the re-test, with its own verdict', () => {
    const [first, second] = rows.filter(row => row.label.startsWith('Zs measured'))
    expect(first).toMatchObject({ found: '0.91\u202fΩ', mark: { verdict: 'outside', words: 'Outside limit · by 0.04 Ω' }, isEarlier: true })
    expect(second).toMatchObject({ found: '0.44\u202fΩ', mustBe: '≤ 0.87 Ω', expected: '0.44 Ω', mark: { verdict: 'within' } })
  })

  it('prints the sentence that an Unexpected stands on, and who accepted it', () => {
    expect(rows.find(row => row.label === 'Continuity R1+R2')?.sentence).toBe('Why it stands: “The measured length was 34 m, not 18 m: the route goes round the extension; volt drop worked again, 3.5 %.” (R. Invented; accepted by S. Fictional)')
  })

  it('names the circuit’s own facts and the board’s', () => {
    expect(labelsOf([content.board])).toEqual({ Board: ['Designation', 'Location', 'Supplied from', 'Its protective device', 'Its RCD', 'Zs at the board', 'Ipf at the board', 'Polarity', 'Phase sequence', 'Surge device'] })
    expect(content.circuits[0]?.facts.facts).toHaveLength(20)
  })
})

describe('the schedule of inspections', () => {
  const content = inspectionsContent(installationSample(), SEAL)

  it('lists the items with the sub-list for vehicle charging, each with its outcome', () => {
    expect(content.rows.map(row => row.number)).toEqual(['1', '2', '3', '4', '5', '6', '7', '8', '9', '10', '11', '12', '13', '13.1', '13.2', '13.3', '13.4', '13.5', '13.6', '13.7', '13.8', '14'])
    expect(new Set(content.rows.map(row => row.outcome))).toEqual(new Set(['Satisfactory', 'N/A · nothing of the kind in this work']))
    expect(content.rows[0]?.restsOn).toContain('Photograph')
  })
})

describe('a draft', () => {
  const content = certificateContent(draftSample(), null)

  it('has no number and no code to check, and says what is missing', () => {
    expect(content.opening.qr).toBeNull()
    expect(content.heading.facts.find(one => one.label === 'Number')?.said.text).toBe('Draft for job J-1042')
    expect(content.signatureNotes).toEqual(expect.arrayContaining(['Design: not signed.', 'Checked for the firm: not signed.']))
    expect(testResultsContent(draftSample(), null).circuits[0]?.rows.filter(row => row.found === 'not entered').map(row => row.label)).toEqual(['Zs measured', 'RCD trip time at IΔn'])
  })
})

describe('a minor works certificate', () => {
  const record = minorWorksSample()
  const content = certificateContent(record, SEAL)

  it('prints each field of its record, and never an empty text', () => {
    const printed = textsOf(content)
    const texts = new Set(printed)
    expect(fieldsOf(record).filter(({ field }) => !texts.has(fieldText(field))).map(({ path }) => path.join('.'))).toEqual([])
    expect(printed.filter(text => text.trim() === '')).toEqual([])
  })

  it('holds each field of the form', () => {
    const labels = content.groups.flatMap(group => group.facts.map(one => one.label))
    for (const label of ['Client', 'Address of the work', 'Completed', 'Description of the work', 'Location', 'Existing installation', 'System', 'Earthing', 'Zs at the board', 'Earthing conductor', 'Main bonding', 'Circuit', 'Protective device: rating', 'RCD: IΔn', 'Surge device', 'Arc-fault device', 'Line conductor', 'Protective conductor', 'Continuity R1+R2', 'Insulation: line to earth', 'Polarity', 'Zs measured', 'RCD trip time at IΔn', 'RCD button']) expect(labels).toContain(label)
    expect(content.signatures.map(one => one.capacities)).toEqual(['The work, its inspection and test', 'Checked for the firm'])
    expect(content.signatureNotes).toEqual([])
  })
})
