import './signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { afterEach, expect, it, vi } from 'vitest'
import { nextTick } from 'vue'
import ReadingPad from '~/components/readings/ReadingPad.vue'

const props = {
  title: 'R1+R2', unit: 'Ω', units: ['Ω', 'MΩ'], expected: { value: 0.21, text: 'Design about 0.21 Ω' }, resolution: 0.01, reasons: ['No access'],
  judge: (value: number) => value <= 0.66 ? { verdict: 'within' as const, detail: `${(0.66 - value).toFixed(2)} Ω inside` } : { verdict: 'outside' as const, detail: `by ${(value - 0.66).toFixed(2)} Ω` },
}
let pad: Awaited<ReturnType<typeof mountSuspended>> | undefined
/** The sheet is drawn at the end of the page, outside the component that asks for it. */
const open = async () => {
  pad = await mountSuspended(ReadingPad, { props })
  await nextTick()
}
const sheet = () => document.querySelector<HTMLElement>('.pad')!
const shown = () => sheet().querySelector('output')!.textContent
const said = () => sheet().querySelector('[role="status"]')!.textContent
const button = (words: RegExp) => [...sheet().querySelectorAll('button')].find(each => words.test(each.getAttribute('aria-label') ?? each.textContent ?? ''))!
const tap = async (words: RegExp) => {
  button(words).click()
  await nextTick()
}
const type = async (...keys: string[]) => {
  for (const key of keys) sheet().dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }))
  await nextTick()
}

afterEach(() => {
  pad?.unmount()
  pad = undefined
})

it('keys the same by hand and by keyboard', async () => {
  await open()
  for (const key of [/^0$/, /^Point$/, /^2$/, /^1$/]) await tap(key)
  expect(shown()).toContain('0.21')
  await type('Backspace', '3')
  expect(shown()).toContain('0.23')
})

it('stays neutral while typing and becomes a verdict on Keep', async () => {
  await open()
  await type('0', '.', '2', '1')
  expect(sheet().textContent).toContain('0.45 Ω inside')
  expect(sheet().querySelector('.mark')).toBeNull()
  await tap(/^Keep/)
  expect(pad!.emitted('keep')).toEqual([[{ kind: 'value', shown: '0.21', value: 0.21, unit: 'Ω', reason: null }]])
  expect(sheet().querySelector('.mark')!.textContent).toContain('Within limit')
})

it('asks for a slipped point again before it keeps anything', async () => {
  const vibrate = vi.fn(() => true)
  Object.defineProperty(navigator, 'vibrate', { value: vibrate, configurable: true })
  await open()
  await type('2', '.', '1', 'Enter')
  expect(pad!.emitted('keep')).toBeUndefined()
  expect(said()).toContain('far from the design')
  expect(button(/Key it again to confirm/).textContent).toContain('2.1')
  expect(vibrate).toHaveBeenCalledWith([30, 60, 30])
  await type('2', '.', '1', 'Enter')
  expect(pad!.emitted('keep')).toHaveLength(1)
  expect(sheet().querySelector('.mark')!.textContent).toContain('Outside limit')
})

it('asks why before LIM, and hands the reason on', async () => {
  await open()
  await tap(/^LIM/)
  expect(sheet().textContent).toContain('why can it not be read')
  await tap(/^No access$/)
  expect(pad!.emitted('keep')).toEqual([[{ kind: 'limited', shown: 'LIM', value: null, unit: 'Ω', reason: 'No access' }]])
})

it('judges in the first unit whatever unit is shown', async () => {
  await open()
  await tap(/^Change the unit$/)
  await type('5')
  expect(sheet().textContent).toContain('by 4999999.34 Ω')
})

it('tells what was typed when it is closed without keeping', async () => {
  await open()
  await type('0', '.', '2')
  await tap(/^Close$/)
  expect(pad!.emitted('close')).toEqual([['0.2']])
})
