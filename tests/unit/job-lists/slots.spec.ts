import { describe, expect, it } from 'vitest'
import { calibrationVerdict } from '../../../shared/job/calibration'
import { changedWords, nextWords, stateWords } from '../../../shared/job/job-line'
import { lastDayWords, noticeSentence } from '../../../shared/job/notices'
import { freeSlots, objections, workingDaysFrom } from '../../../shared/job/slots'
import type { Diary, DiaryVisit } from '../../../shared/schemas/job'
import { safeNext } from '../../../app/utils/safe-next'

const TODAY = '2026-12-01'
const visit = (given: Partial<DiaryVisit>): DiaryVisit => ({ id: 'v1', jobId: 'j1', ref: 'J0001', kind: 'install', day: '2026-12-02', half: 'am', crewId: 'a', hours: 4, state: 'booked', note: '', version: 1, customer: 'Jane Holt', postcode: 'UX4 2PG', address: '14 Elm Row', stage: 'install-booked', ...given })
const diary: Diary = { crews: [{ id: 'a', name: 'Crew A', people: ['T. Wilk'] }, { id: 'b', name: 'Crew B', people: ['G. Adeyemi'] }, { id: 'c', name: 'Crew C', people: [] }], visits: [visit({}), visit({ id: 'v2', day: '2026-12-04', half: 'pm', crewId: 'b', postcode: 'UX11 9WW' })] }

describe('free half-days', () => {
  it('leave out weekends and the bank holidays of the nation', () => {
    expect(workingDaysFrom('2026-12-24', 3, 'England')).toEqual(['2026-12-24', '2026-12-29', '2026-12-30'])
  })

  it('offer no half-day that is taken, and no crew with nobody in it', () => {
    const slots = freeSlots(diary, { postcode: 'UX1 1AA', country: 'England' }, '2026-12-02', 60)
    expect(slots.some(slot => slot.day === '2026-12-02' && slot.half === 'am' && slot.crewId === 'a')).toBe(false)
    expect(slots.some(slot => slot.crewId === 'c')).toBe(false)
    expect(slots).toHaveLength(10 * 2 * 2 - 2)
  })

  it('put the day asked for first, then the crew that is in the district', () => {
    const slots = freeSlots(diary, { postcode: 'UX11 2AA', country: 'England', day: '2026-12-09', half: 'pm' }, '2026-12-02')
    expect(slots).toHaveLength(9)
    expect(slots[0]).toMatchObject({ day: '2026-12-09', half: 'pm', why: 'asked for' })
    expect(slots[2]).toMatchObject({ day: '2026-12-04', half: 'am', crewId: 'b', why: 'Crew B is in UX11 that day' })
  })
})

describe('what speaks against a place in the diary', () => {
  const place = { day: '2026-12-02', half: 'am' as const, crewId: 'a' }
  it('another visit at the same time', () => expect(objections(diary, { id: 'v2', kind: 'survey' }, place, TODAY)).toEqual(['Crew A has a visit already that morning: Install, UX4.']))
  it('not the visit itself', () => expect(objections(diary, { id: 'v1', kind: 'install' }, place, TODAY)).toEqual([]))
  it('a crew with nobody in it', () => expect(objections(diary, { id: null, kind: 'survey' }, { ...place, crewId: 'c' }, TODAY)).toEqual(['Crew C has nobody in it.']))
  it('a day gone by', () => expect(objections(diary, { id: null, kind: 'survey' }, { ...place, day: '2026-11-30' }, TODAY)).toEqual(['Mon 30 Nov 2026 lies behind you.']))
  it('a bank holiday, by its name', () => expect(objections(diary, { id: null, kind: 'survey' }, { ...place, day: '2026-12-25' }, TODAY)).toEqual(['Fri 25 Dec 2026 is Christmas Day.']))
})

describe('a line of the jobs list', () => {
  it.each([['on-site', 'sent-back', 'On site, sent back'], ['quoted', null, 'Quoted'], ['enquiry', 'cancelled', 'Cancelled'], ['surveyed', 'waiting', 'Surveyed, waiting']] as const)('%s and %s', (stage, sideState, words) => expect(stateWords({ stage, sideState })).toBe(words))
  it.each([['2026-12-01', 'today'], ['2026-12-02', 'tomorrow'], ['2026-12-08', 'Tue 8 Dec'], ['2027-01-05', 'Tue 5 Jan 2027'], ['2026-11-30', 'was yesterday'], [null, '']])('next visit on %s', (nextDay, words) => expect(nextWords({ nextDay }, TODAY)).toBe(words))
  it.each([['2026-12-01 09:30:00.123456+00', 'today'], ['2026-11-30 23:59:00+00', 'yesterday'], ['2026-06-30 23:30:00+00', 'Wed 1 Jul']])('changed at %s', (changedAt, words) => expect(changedWords({ changedAt }, TODAY)).toBe(words))
})

describe('a notice', () => {
  const line = { kind: 'network-operator', recipient: 'Network operator', state: 'to-prepare' as const, address: '14 Elm Row', sentOn: null, lastDay: '2026-12-29', country: 'England' as const }
  it('says whom and by when', () => {
    expect(noticeSentence(line, TODAY)).toBe('Tell the network operator about 14 Elm Row')
    expect(lastDayWords(line, TODAY)).toBe('Last day Tue 29 Dec 2026 · 18 working days left')
  })
  it('says when the last day has gone by', () => {
    expect(noticeSentence({ ...line, lastDay: '2026-11-27' }, TODAY)).toContain('the last day has gone by')
    expect(lastDayWords({ ...line, lastDay: '2026-11-27' }, TODAY)).toBe('Last day Fri 27 Nov 2026 · 2 working days late')
  })
})

describe('an instrument', () => {
  const with_ = (...calibrations: [string, string][]) => ({ calibrations: calibrations.map(([doneOn, goodUntil]) => ({ doneOn, goodUntil })) })
  it.each([
    [with_(['2026-06-01', '2027-06-01']), 'within', 'In calibration until Tue 1 Jun 2027'],
    [with_(['2025-12-21', '2026-12-21']), 'unexpected', 'In calibration until Mon 21 Dec 2026: 20 days left'],
    [with_(['2025-12-01', '2026-12-01']), 'unexpected', 'today is its last day'],
    [with_(['2025-11-30', '2026-11-30']), 'outside', 'Out of calibration since Mon 30 Nov 2026'],
    [with_(['2026-12-02', '2027-12-02']), 'waiting', 'Its calibration begins on Wed 2 Dec 2026'],
    [with_(), 'not-entered', 'No calibration is on file'],
  ])('%o: %s', (instrument, verdict, words) => {
    const said = calibrationVerdict(instrument, TODAY)
    expect(said.verdict).toBe(verdict)
    expect(said.sentence).toContain(words)
  })
})

describe('where signing in leads', () => {
  it.each([['/jobs?stage=enquiry', '/jobs?stage=enquiry'], ['/jobs/1#ze', '/jobs/1#ze'], ['/', '/']])('%s stays', (next, to) => expect(safeNext(next)).toBe(to))
  it.each(['//evil.example', '/\\evil.example', 'https://evil.example', '/\t/evil.example', 'javascript:alert(1)', '', undefined, ['/a', '/b'], '/..//evil.example'])('%s never leaves our pages', next => expect(safeNext(next)).toMatch(/^\/(?![/\\])/))
})
