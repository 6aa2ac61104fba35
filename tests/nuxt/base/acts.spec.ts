import './signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import BaseButton from '~/components/base/BaseButton.vue'
import BaseKept from '~/components/base/BaseKept.vue'
import BaseNotice from '~/components/base/BaseNotice.vue'
import BaseSentenceRow from '~/components/base/BaseSentenceRow.vue'
import BaseTable from '~/components/base/BaseTable.vue'
import BaseUndo from '~/components/base/BaseUndo.vue'
import BaseVerdictMark from '~/components/base/BaseVerdictMark.vue'
import { VERDICTS } from '#shared/utils/verdict'

describe('a button', () => {
  it('passes a press on', async () => {
    const button = await mountSuspended(BaseButton, { slots: { default: () => 'Countersign' } })
    await button.get('button').trigger('click')
    expect(button.emitted('click')).toHaveLength(1)
  })

  it('with a reason stays reachable, does nothing and shows the reason', async () => {
    const button = await mountSuspended(BaseButton, { props: { why: '1 query is open.' }, slots: { default: () => 'Countersign' } })
    const inner = button.get('button')
    await inner.trigger('click')
    expect(button.emitted('click')).toBeUndefined()
    expect(inner.attributes('disabled')).toBeUndefined()
    expect(inner.attributes('aria-disabled')).toBe('true')
    expect(button.get(`#${inner.attributes('aria-describedby')}`).text()).toBe('1 query is open.')
  })

  it('with a reason does not send its form', async () => {
    const button = await mountSuspended(BaseButton, { props: { why: 'Not yet.', type: 'submit' } })
    const event = new MouseEvent('click', { bubbles: true, cancelable: true })
    button.get('button').element.dispatchEvent(event)
    expect(event.defaultPrevented).toBe(true)
  })

  it('says what it is busy with and takes no second press', async () => {
    const button = await mountSuspended(BaseButton, { props: { busy: 'Keeping…' }, slots: { default: () => 'Keep' } })
    await button.get('button').trigger('click')
    expect(button.get('button').text()).toBe('Keeping…')
    expect(button.get('[role="status"]').text()).toBe('Keeping…')
    expect(button.emitted('click')).toBeUndefined()
  })

  it('with a reason is no link', async () => {
    const button = await mountSuspended(BaseButton, { props: { to: '/jobs', why: 'Not yet.' } })
    expect(button.find('a').exists()).toBe(false)
  })
})

describe('a verdict mark', () => {
  it.each(VERDICTS)('%s tells itself in words, not by colour', async (verdict) => {
    const mark = await mountSuspended(BaseVerdictMark, { props: { verdict } })
    expect(mark.get('.word').text().length).toBeGreaterThan(2)
    expect(mark.get('.sr-only').text().length).toBeGreaterThan(5)
  })

  it('joins word and number, and says the unit', async () => {
    const mark = await mountSuspended(BaseVerdictMark, { props: { verdict: 'outside', detail: 'by 0.12 Ω' } })
    expect(mark.get('[aria-hidden="true"]').text()).toBe('Outside limit · by 0.12 Ω')
    expect(mark.get('.sr-only').text()).toBe('outside limit, by 0.12 ohms')
    expect(mark.classes()).toContain('edge-hatch')
  })

  it('takes speech of its own', async () => {
    expect((await mountSuspended(BaseVerdictMark, { props: { verdict: 'within', speech: 'well within' } })).get('.sr-only').text()).toBe('well within')
  })
})

describe('the line about keeping', () => {
  const text = async (props: InstanceType<typeof BaseKept>['$props']) => (await mountSuspended(BaseKept, { props })).text()

  it('names device and moments', async () => {
    expect(await text({ keptAt: '2027-03-02T14:02:00Z', sentAt: '2027-03-02T14:03:00Z', device: 'tablet' })).toBe('Kept on this tablet 14:02 · Sent 14:03')
  })

  it('never claims sent while something waits', async () => {
    expect(await text({ keptAt: '2027-03-02T14:02:00Z', sentAt: '2027-03-02T14:03:00Z', waiting: 2, offline: true })).toBe('Kept on this device 14:02 · 2 not sent yet · no connection')
  })

  it('claims nothing before anything was kept', async () => {
    expect(await text({})).toBe('Nothing to keep yet')
  })
})

describe('rows, tables and strips', () => {
  it('makes a sentence with an address a link over the whole row', async () => {
    const row = await mountSuspended(BaseSentenceRow, { props: { sentence: 'Reply to the question', about: '14 Elm Row', to: '/jobs/1', age: '2 wd', ageSpeech: '2 working days' } })
    expect(row.get('a').attributes('href')).toBe('/jobs/1')
    expect(row.text()).toContain('Reply to the question 14 Elm Row')
    expect(row.get('.sr-only').text()).toBe('2 working days')
  })

  it('heads each row of a table and lets the keyboard reach its region', async () => {
    const table = await mountSuspended(BaseTable, { props: { caption: 'Readings', columns: [{ key: 'test', label: 'Test' }, { key: 'found', label: 'Found', figures: true }], rows: [{ test: 'Zs', found: '0.71' }] } })
    expect(table.get('[role="region"]').attributes()).toMatchObject({ 'tabindex': '0', 'aria-label': 'Readings' })
    expect(table.get('tbody th').attributes('scope')).toBe('row')
    expect(table.get('tbody td').text()).toBe('0.71')
  })

  it('says so where a table has no rows', async () => {
    const table = await mountSuspended(BaseTable, { props: { caption: 'Readings', columns: [{ key: 'test', label: 'Test' }], rows: [] }, slots: { empty: () => 'No readings yet.' } })
    expect(table.get('tbody').text()).toBe('No readings yet.')
  })

  it('lets an act be taken back', async () => {
    const strip = await mountSuspended(BaseUndo, { props: { sentence: 'Moved to Thursday.' } })
    await strip.findAll('button')[0]!.trigger('click')
    expect(strip.emitted('undo')).toHaveLength(1)
    expect(strip.attributes('role')).toBe('status')
  })

  it('speaks a stopping message at once, and a quiet one not at all', async () => {
    expect((await mountSuspended(BaseNotice, { props: { tone: 'stop', live: true } })).attributes('role')).toBe('alert')
    expect((await mountSuspended(BaseNotice)).attributes('role')).toBeUndefined()
  })
})
