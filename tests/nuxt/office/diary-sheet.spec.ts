import '../base/signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import DiarySheet from '~/components/diary/DiarySheet.vue'
import type { Place } from '#shared/job/slots'
import type { DiaryVisit } from '#shared/schemas/job'

const visit: DiaryVisit = { id: 'v1', jobId: 'j1', ref: 'J0001', kind: 'survey', day: '2026-12-01', half: 'am', crewId: 'a', hours: 2, state: 'booked', note: '', version: 1, customer: 'Jane Holt', postcode: 'UX4 2PG', address: '14 Elm Row', stage: 'survey-booked' }
const props = (hasHand = false) => ({
  diary: { crews: [{ id: 'a', name: 'Crew A', people: ['T. Wilk'] }, { id: 'b', name: 'Crew B', people: [] }], visits: [visit] },
  days: ['2026-12-01', '2026-12-02'], today: '2026-12-01', hasHand, mayBook: true, askedAt: null,
  visitsAt: (place: Place) => place.day === visit.day && place.half === visit.half && place.crewId === visit.crewId ? [visit] : [],
  isInHand: () => false,
})

describe('the sheet of the diary', () => {
  it('lets one place at a time take the keyboard, and arrows move it', async () => {
    const sheet = await mountSuspended(DiarySheet, { props: props(), attachTo: document.body })
    expect(sheet.findAll('td[tabindex="0"]')).toHaveLength(1)
    await sheet.get('[data-place="0-0"]').trigger('keydown', { key: 'ArrowRight' })
    await sheet.get('[data-place="0-1"]').trigger('keydown', { key: 'ArrowDown' })
    expect(document.activeElement?.getAttribute('data-place')).toBe('1-1')
    expect(sheet.findAll('td[tabindex="0"]')).toHaveLength(1)
  })

  it('Enter picks up the visit there', async () => {
    const sheet = await mountSuspended(DiarySheet, { props: props() })
    await sheet.get('[data-place="0-0"]').trigger('keydown', { key: 'Enter' })
    expect(sheet.emitted('pick')?.[0]).toEqual([visit])
  })

  it('Enter puts down what is in hand, by keyboard as by a press', async () => {
    const sheet = await mountSuspended(DiarySheet, { props: props(true) })
    await sheet.get('[data-place="1-3"]').trigger('keydown', { key: 'Enter' })
    await sheet.get('[data-place="1-2"]').trigger('click')
    expect(sheet.emitted('put')).toEqual([[{ day: '2026-12-02', half: 'pm', crewId: 'b' }], [{ day: '2026-12-02', half: 'am', crewId: 'b' }]])
  })

  it('says each place in full', async () => {
    const sheet = await mountSuspended(DiarySheet, { props: props() })
    expect(sheet.get('[data-place="0-0"]').attributes('aria-label')).toBe('Tue 1 Dec, morning, Crew A: Survey for Jane Holt, UX4 2PG, 2 hours')
    expect(sheet.get('[data-place="1-0"]').attributes('aria-label')).toBe('Tue 1 Dec, morning, Crew B: free')
  })

  it('moves nothing for somebody who may not book', async () => {
    const sheet = await mountSuspended(DiarySheet, { props: { ...props(), mayBook: false } })
    await sheet.get('[data-place="0-0"]').trigger('keydown', { key: 'Enter' })
    expect(sheet.emitted('pick')).toBeUndefined()
  })
})
