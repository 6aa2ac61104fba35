import { buttonOf, sent, standOn } from './job-on-page'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { nextTick } from 'vue'
import TestsSheet from '~/components/tests/TestsSheet.vue'
import Live from '~/pages/jobs/[jobId]/live.vue'
import { allPutBack, jobRecord, withFields, withoutReading, withReading } from '../../support/build/job-record'

let page: Awaited<ReturnType<typeof mountSuspended>> | undefined
const pad = () => document.querySelector<HTMLElement>('.pad')
const keyIn = async (...keys: string[]) => {
  for (const key of keys) pad()!.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }))
  await nextTick()
}
afterEach(() => {
  page?.unmount()
  page = undefined
})

describe('a test keyed on its page', () => {
  it('goes on its way with figure, unit, resolution and instrument', async () => {
    standOn(withoutReading(jobRecord(), 'R1R2', 'IR-live-earth'))
    page = await mountSuspended(TestsSheet, { props: { page: 'dead' } })
    buttonOf(page.element, /^Key R1\+R2$/).click()
    await nextTick()
    expect(pad()!.textContent).toContain('Tester 2')
    await keyIn('0', '.', '1', '1')
    expect(pad()!.textContent).toContain('inside')
    expect(buttonOf(pad()!, /^Keep/).textContent).toContain('Keep and go to: Insulation, line to earth')
    await keyIn('Enter')
    await vi.waitFor(() => expect(sent).toHaveLength(1))
    expect(sent[0]).toMatchObject({ kind: 'add-reading', jobId: 'j-1', payload: { test: 'R1R2', kind: 'value', shown: '0.11', value: 0.11, unit: 'Ω', resolution: 0.01, reason: '', context: {}, instrumentId: 'i-tester' } })
    expect(sent[0]!.payload.id).toMatch(/^[0-9a-f-]{36}$/)
    expect(pad()!.textContent).toContain('Insulation, line to earth')
  })

  it('keeps an over-range reading over its range', async () => {
    standOn(withoutReading(jobRecord(), 'IR-line-neutral'))
    page = await mountSuspended(TestsSheet, { props: { page: 'dead' } })
    buttonOf(page.element, /^Key Insulation, line to neutral$/).click()
    await nextTick()
    await keyIn('>', '9', '9', '9', 'Enter')
    await vi.waitFor(() => expect(sent).toHaveLength(1))
    expect(sent[0]!.payload).toMatchObject({ test: 'IR-line-neutral', kind: 'over-range', shown: '>999', value: 999, unit: 'MΩ' })
    expect(pad()).toBeNull()
  })

  it('takes a check in one press', async () => {
    standOn(withoutReading(jobRecord(), 'polarity'))
    page = await mountSuspended(TestsSheet, { props: { page: 'dead' } })
    buttonOf(page.element, /^Correct: Polarity$/).click()
    await vi.waitFor(() => expect(sent).toHaveLength(1))
    expect(sent[0]!.payload).toMatchObject({ test: 'polarity', kind: 'seen', shown: 'correct', value: null, resolution: null })
  })

  it('shows the first reading beside its re-test and asks for the cause', async () => {
    standOn(withReading(jobRecord(), 'R1R2', '9.00'))
    page = await mountSuspended(TestsSheet, { props: { page: 'dead' } })
    const row = page.element.querySelector('[id="reading.R1R2"]')!
    expect(row.textContent).toContain('Outside limit')
    expect(row.textContent).toContain('Earlier: 0.11')
    buttonOf(row, /^Connection$/).click()
    await nextTick()
    buttonOf(row, /^Test again: R1\+R2$/).click()
    await nextTick()
    await keyIn('0', '.', '1', '1', 'Enter')
    await vi.waitFor(() => expect(sent).toHaveLength(1))
    expect(sent[0]!.payload.context).toEqual({ cause: 'connection' })
  })

  it('shows an instrument out of calibration and does not let it be used', async () => {
    const record = withoutReading(jobRecord(), 'R1R2', 'R1Rn', 'polarity')
    standOn({ ...record, instruments: record.instruments.map(each => ({ ...each, calibrations: [{ doneOn: '2025-01-01', goodUntil: '2026-01-01', reference: 'C' }] })) })
    page = await mountSuspended(TestsSheet, { props: { page: 'dead' } })
    expect(page.text()).toContain('out of calibration')
    const key = buttonOf(page.element, /^Key R1\+R2$/)
    expect(key.getAttribute('aria-disabled')).toBe('true')
    key.click()
    await nextTick()
    expect(pad()).toBeNull()
  })
})

describe('live', () => {
  it('is locked with its reason until the dead tests stand', async () => {
    standOn(withoutReading(jobRecord(), 'R1R2', 'Zs'))
    page = await mountSuspended(Live)
    expect(page.text()).toContain('Not yet taken: R1+R2.')
    const key = buttonOf(page.element, /^Key Zs$/)
    expect(key.getAttribute('aria-disabled')).toBe('true')
    expect(page.element.querySelector(`#${CSS.escape(key.getAttribute('aria-describedby')!)}`)!.textContent).toContain('Locked')
  })

  it('is locked while a bond is off, and opens when it is back on', async () => {
    standOn(withFields(allPutBack(withoutReading(jobRecord(), 'Zs')), 'putBack', 'bonding', { done: null }))
    page = await mountSuspended(Live)
    expect(page.text()).toContain('Not yet put back: Main bonding back on after Ze, and tight.')
    await page.get('[id="putBack.bonding.done"]').setValue(true)
    await vi.waitFor(() => expect(sent[0]).toMatchObject({ kind: 'change-put-back', payload: { key: 'bonding', fields: { done: 'yes' } } }))
    await nextTick()
    expect(page.text()).not.toContain('Live is locked')
    expect(buttonOf(page.element, /^Key Zs$/).getAttribute('aria-disabled')).toBeNull()
  })
})
