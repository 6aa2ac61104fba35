import { describe, expect, it } from 'vitest'
import { looseEnds, mayEnergise, maySign } from '#shared/job/completeness'
import { REQUIRED_FIELDS } from '#shared/job/completeness/required-fields'
import { judgeJob } from '#shared/job/judge/judge-job'
import { PARTS } from '#shared/job/parts'
import { TEST_KEYS } from '#shared/job/tests.data'
import type { JobRecord } from '#shared/types/record'
import { allPutBack, instruments, jobRecord, partRow, reading, threePhaseJob, ttJob, withFields, withoutReading, withReading, WORK_DAY } from '../../support/build/job-record'

const ends = (record: JobRecord) => looseEnds(record, judgeJob(record, WORK_DAY), WORK_DAY)
const signing = (record: JobRecord) => maySign(record, judgeJob(record, WORK_DAY), WORK_DAY)
const energising = (record: JobRecord) => mayEnergise(record, judgeJob(record, WORK_DAY))
const survey = (fields: Parameters<typeof withFields>[3]) => withFields(jobRecord(), 'survey', 'survey', fields)
const limited = (fields: Parameters<typeof withFields>[3] = {}) => allPutBack(withFields(withReading(jobRecord(), 'limiter', 'correct'), 'loadLimit', 'limit', { state: 'fitted', limit_A: 60, set_A: 60, set_where: 'dial', ct_checked: 'yes', fails_safe: 'yes', ...fields }))
const emptyJob = (): JobRecord => {
  const record = jobRecord()
  return { ...record, readings: [], photographs: [], parts: Object.fromEntries(Object.keys(record.parts).map(part => [part, []])) as unknown as JobRecord['parts'] }
}

describe('a complete job', () => {
  it.each([['single-phase TN-C-S', jobRecord()], ['TT', ttJob()], ['three-phase', threePhaseJob()], ['with a tested limiter', limited()]])('%s has no loose end and may be signed', (_, record) => {
    expect(ends(record)).toEqual([])
    expect(signing(record)).toEqual({ allowed: true, reasons: [] })
    expect(energising(record)).toEqual({ allowed: true, reasons: [] })
  })
})

describe('every required field', () => {
  const cases = REQUIRED_FIELDS.filter(each => !each.when).map(each => [`${each.part}.${each.key}.${each.field}`, each] as const)
  it.each(cases)('%s is named while it is empty', (address, { part, key, field, isNice }) => {
    let record = withFields(jobRecord(), part, key, { [field]: null })
    if (part === 'circuit') record = withFields(record, 'circuit', 'designed', { [field]: null })
    expect(ends(record)).toContainEqual(expect.objectContaining({ field: address, stops: !isNice }))
  })

  it('exists in its part', () => {
    const unknown = REQUIRED_FIELDS.filter(({ part, field }) => !(field in PARTS[part].fields))
    expect(unknown).toEqual([])
  })
})

describe('what stops you finishing', () => {
  it.each<[string, JobRecord, string]>([
    ['an assumed main fuse', survey({ cutout_A_how: 'assumed' }), 'assumed-fuse'],
    ['a main fuse of which nobody said how it is known', survey({ cutout_A_how: null }), 'assumed-fuse'],
    ['an assumed earthing arrangement', survey({ earthing_how: 'assumed' }), 'assumed-earthing'],
    ['an arrangement that was not seen', survey({ earthing: 'cannot-see' }), 'unseen-earthing'],
    ['a missing bond', survey({ bond_gas: 'missing' }), 'missing-bond:gas'],
    ['an earthing conductor not verified', survey({ earthing_conductor_verified: 'no' }), 'earthing-conductor'],
    ['bonding not verified', survey({ bonding_verified: 'no' }), 'bonding'],
    ['a loop that nobody could see', survey({ looped: 'cannot-see' }), 'unseen-loop'],
    ['a type AC device upstream', survey({ upstream_rcd: 'type-AC' }), 'safety:upstream-rcd'],
    ['a supply that does not fit', survey({ cutout_A: 50 }), 'safety:supply'],
    ['a cable too long', withFields(jobRecord(), 'circuit', 'installed', { L_m: 60 }), 'safety:cable'],
    ['an earthing method that does not suit', withFields(jobRecord(), 'earthing', 'earthing', { method: 'none' }), 'safety:earthing-method'],
    ['a device that cannot break the fault current', withFields(survey({ board_conditional_kA: null }), 'circuit', 'designed', { device_kA: 1 }), 'safety:breaking-capacity'],
    ['two serial numbers', withFields(jobRecord(), 'equipment', 'charger', { serial_again: 'INV-3991' }), 'serial-differs'],
    ['a socket too low', withFields(jobRecord(), 'equipment', 'charger', { height_m: 0.45 }), 'mounting'],
    ['a limit set above what was agreed', limited({ set_A: 63 }), 'limit-above-agreed'],
    ['a limit above the main fuse', limited({ limit_A: 120, set_A: 120 }), 'limit-above-fuse'],
    ['a limiter that is only planned', limited({ state: 'planned' }), 'limiter-planned'],
    ['a current transformer the wrong way round', limited({ ct_checked: 'no' }), 'ct-direction'],
    ['a limiter that does not fail safe', limited({ fails_safe: 'no' }), 'fails-unsafe'],
    ['a day of completion still to come', withFields(jobRecord(), 'statement', 'statement', { completed_on: '2027-03-03' }), 'completed-later'],
    ['nothing recorded as installed', withFields(jobRecord(), 'circuit', 'installed', { device: null, In_A: null, cable: null, S_mm2: null }), 'installed-not-recorded'],
    ['a refused permission', withFields(jobRecord(), 'consent', 'k', { kind: 'landlord', state: 'refused', by: 'The landlord' }), 'consent-refused:k'],
    ['an inspection with a fault', withFields(jobRecord(), 'inspection', '11', { outcome: 'unsatisfactory' }), 'inspection:11'],
    ['an inspection N/A without a reason', withFields(jobRecord(), 'inspection', '12', { reason: null }), 'inspection:12'],
    ['an inspection not answered', withFields(jobRecord(), 'inspection', '13.4', { outcome: null }), 'inspections'],
    ['an open question', { ...jobRecord(), queries: [{ id: 'q-1', part: 'live', field: 'reading.Zs', question: 'Was the bonding on?', askedBy: 's', askedAt: `${WORK_DAY}T16:00:00Z`, answer: null, answeredBy: null, answeredAt: null }] }, 'query:q-1'],
    ['half a departure', withFields(jobRecord(), 'departure', 'd', { regulation: '722.55.101.5' }), 'departure:d'],
    ['a must photograph missing', { ...jobRecord(), photographs: jobRecord().photographs.filter(each => each.claim !== 'earth-connection') }, 'shot:earth-connection'],
    ['a reading missing', withoutReading(jobRecord(), 'RCD-button'), 'reading:RCD-button'],
    ['a reading outside', withReading(jobRecord(), 'Zs', '0.95'), 'reading:Zs'],
    ['an Unexpected without its sentence', withReading(jobRecord(), 'R1R2', '0.23'), 'reading:R1R2'],
    ['LIM on a required test', withReading(jobRecord(), 'Zs', 'LIM', { kind: 'limited', value: null, resolution: null, reason: 'no access' }), 'reading:Zs'],
    ['a typed reading not confirmed', withReading(jobRecord(), 'Zs', '0.33', { typedBy: 'p-office' }), 'reading:Zs'],
    ['an instrument out of calibration on the day', { ...jobRecord(), instruments: instruments().map(each => ({ ...each, calibrations: [{ doneOn: '2026-01-01', goodUntil: '2027-03-01', reference: '' }] })) }, 'reading:Zs'],
    ['no electrode reading on TT', withoutReading(ttJob(), 'RA'), 'reading:RA'],
    ['no phase sequence on three phases', withoutReading(threePhaseJob(), 'phase-sequence'), 'reading:phase-sequence'],
    ['a limiter nobody saw limit', withoutReading(limited(), 'limiter'), 'reading:limiter'],
  ])('%s', (_, record, id) => {
    const found = ends(record).find(end => end.id === id)
    expect(found).toMatchObject({ stops: true, sentence: expect.stringMatching(/\S.*[.?)]$/s) as string })
    expect(signing(record).allowed).toBe(false)
    expect(signing(record).reasons).toContain(found!.sentence)
  })

  it('sends people away from an unsafe intake with the number to ring', () => {
    const record = survey({ service_ok: 'unsafe' })
    expect(ends(record)[0]).toMatchObject({ id: 'unsafe-service', stops: true, sentence: expect.stringContaining('105') as string })
    expect(energising(record).allowed).toBe(false)
    const inNorthernIreland = { ...record, premises: { ...record.premises, country: 'Northern Ireland' as const } }
    expect(ends(inNorthernIreland).find(end => end.id === 'unsafe-service')?.sentence).not.toContain('105')
  })

  it('is not lifted by a sentence where a figure is outside', () => {
    const record = withFields(withReading(jobRecord(), 'Zs', '0.95'), 'unexpected', 'Zs', { sentence: 'It is always like that.' })
    expect(signing(record).allowed).toBe(false)
    expect(signing(withReading(record, 'Zs', '0.33')).allowed).toBe(true)
  })

  it('is lifted by the sentence of an Unexpected', () => {
    const record = withFields(withReading(withoutReading(jobRecord(), 'R1Rn'), 'R1R2', '0.16'), 'unexpected', 'R1R2', { sentence: 'The route goes round the extension.' })
    expect(signing(record)).toEqual({ allowed: true, reasons: [] })
  })

  it('waits for the network operator where they must be asked first', () => {
    const record = { ...jobRecord(), parts: { ...jobRecord().parts, appliance: [partRow('house', { use: 'fixed', I_A: 35 })] } }
    expect(ends(record).find(end => end.id === 'network-reply')).toMatchObject({ stops: true, with: 'office' })
    const reply = (outcome: string): JobRecord => ({ ...record, notices: [{ id: 'n', kind: 'network-operator', recipient: '', route: 'ask-first', reasons: [], lastDay: null, state: 'answered', sentOn: WORK_DAY, sentHow: '', reference: '', replies: [{ outcome, note: '', repliedOn: WORK_DAY }] }] })
    expect(energising(reply('refused')).allowed).toBe(false)
    expect(energising(reply('agreed'))).toEqual({ allowed: true, reasons: [] })
  })

  it('lets a recorded departure stand for the height of a socket', () => {
    const record = withFields(withFields(jobRecord(), 'equipment', 'charger', { height_m: 0.45 }), 'departure', 'd', { regulation: '722.55.101.5', differs: 'Socket at 0.45 m', why: 'Wheelchair user, agreed in writing' })
    expect(ends(record).find(end => end.id === 'mounting')?.stops).toBe(false)
    expect(signing(record).allowed).toBe(true)
  })

  it('wants the risk assessment of an exception, and the sheet of typed readings, as photographs', () => {
    const bare = { ...jobRecord(), photographs: jobRecord().photographs.filter(each => !['risk-assessment', 'reading-sheet'].includes(each.claim)) }
    expect(signing(bare).allowed).toBe(true)
    expect(ends(withFields(bare, 'statement', 'statement', { exceptions: 'No surge device' })).some(end => end.id === 'shot:risk-assessment')).toBe(true)
    const typed = withReading(bare, 'Zs', '0.33', { typedBy: 'p-office', confirmedAt: `${WORK_DAY}T18:00:00Z` })
    expect(ends(typed).map(end => end.id)).toEqual(['shot:reading-sheet'])
  })
})

describe('worth a look', () => {
  it.each<[string, JobRecord, string]>([
    ['photographs that are nice to have', { ...jobRecord(), photographs: jobRecord().photographs.filter(each => each.claim !== 'meter') }, 'shots'],
    ['a length that nobody measured', withFields(jobRecord(), 'circuit', 'installed', { L_m: null }), 'length-not-measured'],
    ['one mark of two', withFields(jobRecord(), 'circuit', 'installed', { L_m: null, start_mark_m: 120 }), 'half-marked'],
    ['ten years for a tenant', { ...jobRecord(), premises: { ...jobRecord().premises, tenure: 'tenant' } }, 'next-inspection'],
    ['a d.c. device that only tests itself', withReading(jobRecord(), 'RCD-dc', 'N/A', { kind: 'not-applicable', value: null, resolution: null, reason: 'self-test only' }), 'reading:RCD-dc'],
    ['LIM at the existing board', withReading(jobRecord(), 'Zs-board', 'LIM', { kind: 'limited', value: null, resolution: null, reason: 'no access' }), 'reading:Zs-board'],
  ])('%s does not stop signing', (_, record, id) => {
    expect(ends(record)).toMatchObject([{ id, stops: false }])
    expect(signing(record).allowed).toBe(true)
  })
})

describe('a job that has only begun', () => {
  it('names each thing once and has a place to go for each', () => {
    const found = ends(emptyJob())
    const ids = found.map(end => end.id)
    expect(new Set(ids).size).toBe(ids.length)
    expect(found.every(end => end.sentence.trim() !== '' && (end.field !== undefined || end.id === 'network-reply'))).toBe(true)
    expect(found.findIndex(end => !end.stops)).toBeGreaterThan(found.findLastIndex(end => end.stops))
  })

  it('never throws, whatever single thing is missing', () => {
    for (const part of Object.keys(jobRecord().parts) as (keyof JobRecord['parts'])[]) {
      const record = jobRecord()
      expect(() => ends({ ...record, parts: { ...record.parts, [part]: [] } })).not.toThrow()
    }
    for (const test of TEST_KEYS) expect(() => ends(withoutReading(jobRecord(), test))).not.toThrow()
  })
})

describe('energising', () => {
  const open = (key: string) => withFields(jobRecord(), 'putBack', key, { done: 'no' })

  it.each(['earthing-conductor', 'bonding', 'neutrals-links', 'temporary-leads', 'covers-blanks'])('is refused while %s is not put back', (key) => {
    expect(energising(open(key)).allowed).toBe(false)
    expect(ends(open(key))).toMatchObject([{ id: `put-back:${key}`, stops: true }])
  })

  it.each(['surge-device', 'charger', 'random-delay', 'lock-label', 'other-circuits'])('does not wait for %s, but signing does', (key) => {
    expect(energising(open(key)).allowed).toBe(true)
    expect(signing(open(key)).allowed).toBe(false)
  })

  it('wants the dead tests taken and within, not the live ones', () => {
    expect(energising(withoutReading(jobRecord(), 'R1R2', 'polarity')).reasons).toEqual(['Not yet taken: R1+R2, Polarity.'])
    expect(energising(withoutReading(jobRecord(), 'Zs', 'RCD-time')).allowed).toBe(true)
    expect(energising(withReading(jobRecord(), 'IR-live-earth', '0.50')).reasons[0]).toContain('Outside limit')
  })

  it('does not wait for the sentence of an Unexpected', () => {
    expect(energising(withReading(jobRecord(), 'R1R2', '0.16')).allowed).toBe(true)
  })

  it('does not wait for the limiter\'s own live test', () => {
    const record = withoutReading(limited(), 'limiter')
    expect(energising({ ...record, parts: { ...record.parts, appliance: [partRow('house', { use: 'fixed', I_A: 20 })] } }).allowed).toBe(true)
  })

  it('does not ask for earthing and bonding back where Ze is by enquiry', () => {
    const record = { ...withoutReading(jobRecord(), 'Ze') }
    const enquired = { ...record, readings: [...record.readings, reading('Ze', '0.35', { context: { byEnquiry: true }, instrumentId: null })] }
    expect(energising({ ...enquired, parts: { ...enquired.parts, putBack: allPutBack(enquired).parts.putBack } }).allowed).toBe(true)
    expect(allPutBack(enquired).parts.putBack.map(row => row.key)).not.toContain('bonding')
  })
})
