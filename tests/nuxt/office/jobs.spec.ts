import '../base/signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import JobsFilter from '~/components/jobs/JobsFilter.vue'
import JobsSlots from '~/components/jobs/JobsSlots.vue'
import JobsTable from '~/components/jobs/JobsTable.vue'
import type { JobLine } from '#shared/schemas/job'

const line: JobLine = { id: 'j1', ref: 'J0001', stage: 'on-site', sideState: 'sent-back', withWhom: 'installer', nextDay: '2026-12-02', changedAt: '2026-12-01 09:30:00+00', customer: 'Jane Holt', address: '14 Elm Row', town: 'Quillham', postcode: 'UX4 2PG' }

describe('the table of jobs', () => {
  it('heads each row by its address, which is its link', async () => {
    const table = await mountSuspended(JobsTable, { props: { lines: [line], today: '2026-12-01', caption: 'All jobs' } })
    const header = table.get('tbody th[scope="row"]')
    expect(header.text()).toBe('14 Elm Row, Quillham, UX4 2PG')
    expect(header.get('a').attributes('href')).toBe('/jobs/j1')
    expect(table.get('tbody').text()).toContain('On site, sent back')
    expect(table.get('tbody').text()).toContain('With: the installer')
    expect(table.get('tbody').text()).toContain('tomorrow')
  })

  it('draws newer lines when they come', async () => {
    const table = await mountSuspended(JobsTable, { props: { lines: [line], today: '2026-12-01', caption: 'All jobs' } })
    await table.setProps({ lines: [{ ...line, id: 'j2', address: '9 Mill Lane' }, line] })
    expect(table.findAll('tbody tr')).toHaveLength(2)
    expect(table.get('tbody tr th').text()).toContain('9 Mill Lane')
  })

  it('keeps the place of lines that are still being asked for', async () => {
    const table = await mountSuspended(JobsTable, { props: { lines: null, today: '2026-12-01', caption: 'All jobs' } })
    expect(table.findAll('tbody[aria-hidden="true"] tr').length).toBeGreaterThan(5)
    expect(table.find('a').exists()).toBe(false)
  })
})

describe('finding a job', () => {
  it('"/" puts the cursor into the box, but is typed where one types', async () => {
    const filter = await mountSuspended(JobsFilter, { props: { stage: null, find: '' }, attachTo: document.body })
    const slash = new KeyboardEvent('keydown', { key: '/', bubbles: true, cancelable: true })
    document.body.dispatchEvent(slash)
    expect(document.activeElement?.id).toBe('jobs-find')
    const typed = new KeyboardEvent('keydown', { key: '/', bubbles: true, cancelable: true })
    filter.get('#jobs-find').element.dispatchEvent(typed)
    expect([slash.defaultPrevented, typed.defaultPrevented]).toEqual([true, false])
  })
})

describe('free half-days', () => {
  const slots = [{ day: '2026-12-02', half: 'am' as const, crewId: 'a', crew: 'Crew A', why: '' }, { day: '2026-12-02', half: 'pm' as const, crewId: 'a', crew: 'Crew A', why: '' }]
  const press = (key: string) => window.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }))

  it('are picked by their number', async () => {
    const list = await mountSuspended(JobsSlots, { props: { slots, busy: false } })
    press('2')
    press('7')
    expect(list.emitted('pick')).toEqual([[slots[1]]])
    list.unmount()
  })

  it('are not picked twice while one is being booked', async () => {
    const list = await mountSuspended(JobsSlots, { props: { slots, busy: true } })
    press('1')
    expect(list.emitted('pick')).toBeUndefined()
    list.unmount()
  })
})
