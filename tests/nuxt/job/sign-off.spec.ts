import { buttonOf, CHECKER, INSTALLER, standOn } from './job-on-page'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import CountersignPairs from '~/components/countersign/CountersignPairs.vue'
import LeaveEnds from '~/components/leave/LeaveEnds.vue'
import LeaveSign from '~/components/leave/LeaveSign.vue'
import { looseEnds } from '#shared/job/completeness'
import { judgeJob } from '#shared/job/judge/judge-job'
import type { JobRecord } from '#shared/types/record'
import { jobRecord, signatures, TESTER, withFields, WORK_DAY } from '../../support/build/job-record'

let page: Awaited<ReturnType<typeof mountSuspended>> | undefined
afterEach(() => {
  page?.unmount()
  page = undefined
})
const signed = (by = TESTER): JobRecord => {
  const record = jobRecord()
  return { ...record, job: { ...record.job, stage: 'ready-to-check' }, signatures: signatures(false).map(each => ({ ...each, personId: by })) }
}
const whyOf = (button: HTMLElement) => page!.element.querySelector(`#${CSS.escape(button.getAttribute('aria-describedby') ?? 'none')}`)?.textContent

describe('loose ends', () => {
  it('lead to their fields, those that stop before those worth a look', async () => {
    const record = withFields(jobRecord(), 'survey', 'survey', { cutout_A: null })
    page = await mountSuspended(LeaveEnds, { props: { jobId: 'j-1', ends: looseEnds(record, judgeJob(record, WORK_DAY), WORK_DAY) } })
    const links = [...page.element.querySelectorAll('a')].map(link => link.getAttribute('href'))
    expect(links).toContain('/jobs/j-1/supply#survey.survey.cutout_A')
    expect(page.text().indexOf('Stops you finishing')).toBeLessThan(page.text().indexOf('Worth a look'))
  })
})

describe('signing', () => {
  it('refuses with the reason until a capacity, the statement and a name are given', async () => {
    const record = jobRecord()
    standOn({ ...record, people: record.people.map(each => each.id === TESTER ? { ...each, qualifications: [{ title: 'Level 3', number: 'N', capacities: ['designer', 'constructor'], validTo: null }] } : each) }, INSTALLER)
    page = await mountSuspended(LeaveSign)
    const sign = () => buttonOf(page!.element, /^Sign as/)
    expect(whyOf(sign())).toBe('Choose what you sign as.')
    const boxes = () => page!.findAll('input[type="checkbox"]')
    expect(boxes()[2]!.attributes('disabled')).toBeDefined()
    expect(page.text()).toContain('No qualification for this is on file')
    await boxes()[0]!.setValue(true)
    expect(whyOf(sign())).toBe('Read the statements and tick that they are yours.')
    await boxes()[3]!.setValue(true)
    expect(whyOf(sign())).toBe('Type your name as it shall be printed.')
    expect(sign().textContent).toContain('Sign as designer')
  })
})

describe('countersigning', () => {
  const button = () => buttonOf(page!.element, /^Countersign$/)

  it('stays locked until the picked rows are opened and accepted', async () => {
    standOn(signed(), CHECKER)
    page = await mountSuspended(CountersignPairs, { props: { jobId: 'j-1' } })
    expect(whyOf(button())).toMatch(/^Still to do: .*2 picks not opened/)
    for (let presses = 0; presses < 40 && /Still to do/.test(whyOf(button()) ?? ''); presses++) {
      window.dispatchEvent(new KeyboardEvent('keydown', { key: 'a' }))
      await nextTick()
    }
    expect(whyOf(button())).toBe('Read the statement and tick that it is yours.')
  })

  it('needs two presses a pick: one opens, one accepts', async () => {
    standOn(signed(), CHECKER)
    page = await mountSuspended(CountersignPairs, { props: { jobId: 'j-1' } })
    const open = buttonOf(page.element, /^Open it: /)
    const label = open.textContent!.replace(/^Open it: /, '').trim()
    open.click()
    await nextTick()
    expect(whyOf(button())).toMatch(/2 picks not opened/)
    buttonOf(page.element, new RegExp(`^Accept: ${label.replace(/[+]/g, '\\+')}$`)).click()
    await nextTick()
    expect(whyOf(button())).toMatch(/1 pick not opened/)
  })

  it('is refused on one\'s own work', async () => {
    standOn(signed(CHECKER.id), CHECKER)
    page = await mountSuspended(CountersignPairs, { props: { jobId: 'j-1' } })
    expect(whyOf(button())).toBe('You signed this work yourself. Another supervisor countersigns it.')
  })

  it('gives way to sending back once a remark stands', async () => {
    standOn(signed(), CHECKER)
    page = await mountSuspended(CountersignPairs, { props: { jobId: 'j-1' } })
    expect(whyOf(buttonOf(page.element, /^Send back/))).toBe('Write at least one remark on a row first.')
    window.dispatchEvent(new KeyboardEvent('keydown', { key: 'q' }))
    await nextTick()
    await nextTick()
    const box = document.querySelector<HTMLTextAreaElement>('.base-dialog textarea')!
    box.value = 'Photograph it again.'
    box.dispatchEvent(new Event('input', { bubbles: true }))
    await nextTick()
    document.querySelector<HTMLFormElement>('.base-dialog form')!.dispatchEvent(new Event('submit', { bubbles: true, cancelable: true }))
    await nextTick()
    expect(whyOf(buttonOf(page.element, /^Send back/))).toBeUndefined()
    expect(buttonOf(page.element, /^Send back/).textContent).toContain('with one remark')
  })
})
