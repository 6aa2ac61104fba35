import { describe, expect, it } from 'vitest'
import { oldestRow, sayWaiting, toWaitingRow, waitingRows, WAITING_KINDS, type WaitingThing } from '../../../shared/job/today'

const TODAY = '2026-12-01' // a Tuesday
const thing = (given: Partial<WaitingThing>): WaitingThing => ({ kind: 'call', id: 'a', jobId: 'j1', ref: 'J0001', customer: 'Jane Holt', address: '14 Elm Row', postcode: 'UX4 2PG', country: 'England', since: '2026-11-26T10:00:00Z', due: null, detail: '', ...given })

describe('a sentence of Today', () => {
  it.each(WAITING_KINDS)('%s begins with a verb and ends without a full stop', (kind) => {
    const sentence = sayWaiting(thing({ kind, detail: kind === 'visit' ? 'install am' : 'something', due: kind === 'visit' ? TODAY : null }), TODAY)
    expect(sentence).toMatch(/^(?:Send|Have|Answer|Confirm|Survey|Install|Go back|Finish|Check|Look|Find|Call|Make|Ask|Book) /)
    expect(sentence).not.toMatch(/[.!]$|undefined|null/)
  })

  it.each([
    [{ kind: 'call' }, 'Call Jane Holt and book the survey'],
    [{ kind: 'notice', due: '2026-12-29', detail: 'Network operator' }, 'Send the notice to the network operator by Tue 29 Dec 2026'],
    [{ kind: 'notice', due: '2026-11-30', detail: 'Building control, through the scheme' }, 'Send the overdue notice to building control, through the scheme'],
    [{ kind: 'calibrate', due: '2026-11-08', detail: 'Tester 2' }, 'Have Tester 2 calibrated: it ran out on Sun 8 Nov 2026'],
    [{ kind: 'sent-back', detail: '2' }, 'Answer the 2 queries of the check and sign again'],
    [{ kind: 'sent-back', detail: '1' }, 'Answer the query of the check and sign again'],
    [{ kind: 'confirm-readings', detail: '3' }, 'Confirm 3 readings typed from your sheet'],
    [{ kind: 'visit', due: TODAY, detail: 'install am' }, 'Install for Jane Holt this morning'],
    [{ kind: 'visit', due: '2026-12-02', detail: 'return pm' }, 'Go back to Jane Holt tomorrow afternoon'],
  ] as [Partial<WaitingThing>, string][])('%o', (given, sentence) => expect(sayWaiting(thing(given), TODAY)).toBe(sentence))
})

describe('the age of a row', () => {
  it('counts working days, not the weekend between', () => {
    expect(toWaitingRow(thing({ since: '2026-11-27T16:00:00Z' }), TODAY)).toMatchObject({ age: '2 wd', ageSpeech: 'waiting 2 working days', edge: 'none' })
  })

  it('leaves out the bank holidays of the nation the job lies in', () => {
    const since = '2026-11-27T16:00:00Z' // St Andrew's day, Monday 30 November, is a bank holiday in Scotland alone
    expect([toWaitingRow(thing({ since, country: 'Scotland' }), TODAY).age, toWaitingRow(thing({ since }), TODAY).age]).toEqual(['1 wd', '2 wd'])
  })

  it('counts down to a last day, and says when it has gone by', () => {
    expect(toWaitingRow(thing({ kind: 'notice', due: '2026-12-29' }), TODAY)).toMatchObject({ age: '18 wd left', edge: 'none' })
    expect(toWaitingRow(thing({ kind: 'notice', due: '2026-12-03' }), TODAY)).toMatchObject({ age: '2 wd left', edge: 'dash' })
    expect(toWaitingRow(thing({ kind: 'notice', due: TODAY }), TODAY)).toMatchObject({ age: 'today', edge: 'dash' })
    expect(toWaitingRow(thing({ kind: 'notice', due: '2026-11-30' }), TODAY)).toMatchObject({ age: '1 wd late', ageSpeech: '1 working day late', edge: 'solid' })
  })
})

describe('the order of Today', () => {
  const late = thing({ id: 'late', kind: 'notice', due: '2026-11-20' })
  const near = thing({ id: 'near', kind: 'notice', due: '2026-12-03' })
  const old = thing({ id: 'old', since: '2026-11-16T10:00:00Z' })
  const fresh = thing({ id: 'fresh', since: '2026-12-01T08:00:00Z' })
  const far = thing({ id: 'far', kind: 'notice', due: '2026-12-29' })
  const back = thing({ id: 'back', kind: 'sent-back', detail: '1', since: '2026-12-01T08:00:00Z' })

  it('late, near, sent back, then the oldest, then what has time', () => {
    expect(waitingRows([far, fresh, old, back, near, late], TODAY).map(row => row.key.split('-').at(-1))).toEqual(['late', 'near', 'back', 'old', 'fresh', 'far'])
  })

  it('names what has waited longest, and nothing where all came today', () => {
    expect(oldestRow(waitingRows([fresh, old, late], TODAY))?.key).toBe('call-old')
    expect(oldestRow(waitingRows([fresh, far], TODAY))).toBeNull()
  })
})
