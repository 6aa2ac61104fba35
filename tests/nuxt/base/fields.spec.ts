import './signed-in'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import BaseCheck from '~/components/base/BaseCheck.vue'
import BaseChoice from '~/components/base/BaseChoice.vue'
import BaseDateInput from '~/components/base/BaseDateInput.vue'
import BaseFigureInput from '~/components/base/BaseFigureInput.vue'
import BaseSelect from '~/components/base/BaseSelect.vue'
import BaseTextInput from '~/components/base/BaseTextInput.vue'

describe('a text field', () => {
  it('ties its label, its hint and what to look at again to the box', async () => {
    const field = await mountSuspended(BaseTextInput, { props: { label: 'Postcode', hint: 'With its space', error: 'Type the postcode.', modelValue: 'x' } })
    const box = field.get('input')
    expect(field.get('label').attributes('for')).toBe(box.attributes('id'))
    const described = box.attributes('aria-describedby')!.split(' ').map(id => field.get(`#${id}`).text())
    expect(described).toEqual(['With its space', 'Look again: Type the postcode.'])
    expect(box.attributes('aria-invalid')).toBe('true')
  })

  it('is valid and undescribed without either', async () => {
    const box = (await mountSuspended(BaseTextInput, { props: { label: 'Name' } })).get('input')
    expect(box.attributes('aria-invalid')).toBeUndefined()
    expect(box.attributes('aria-describedby')).toBeUndefined()
  })

  it('says the unit in words with the label and hides the sign from speech', async () => {
    const field = await mountSuspended(BaseTextInput, { props: { label: 'Zs', unit: 'Ω', unitWord: 'ohms' } })
    expect(field.get('label').text()).toContain('(ohms)')
    expect(field.get('span[aria-hidden="true"]').text()).toBe('Ω')
  })

  it('takes the id a loose end links to', async () => {
    expect((await mountSuspended(BaseTextInput, { props: { label: 'Name', id: 'customer-name' } })).find('#customer-name').exists()).toBe(true)
  })
})

describe('a figure', () => {
  const mount = (modelValue: number | null = null) => mountSuspended(BaseFigureInput, { props: { label: 'Length', modelValue } })

  it('reads a comma, gives a number and shows it back with a point', async () => {
    const field = await mount()
    await field.get('input').setValue('0,35')
    await field.get('input').trigger('change')
    expect(field.emitted('update:modelValue')?.at(-1)).toEqual([0.35])
    expect(field.get('input').element.value).toBe('0.35')
  })

  it('keeps what does not read as a figure in the box and says what to do', async () => {
    const field = await mount()
    await field.get('input').setValue('about 3')
    await field.get('input').trigger('change')
    expect(field.get('input').element.value).toBe('about 3')
    expect(field.text()).toContain('Type a figure, for example 0.35.')
    expect(field.emitted('problem')?.at(-1)).toEqual(['Type a figure, for example 0.35.'])
  })

  it('does not nag while a figure is being typed', async () => {
    const field = await mount()
    field.get('input').element.value = '.'
    await field.get('input').trigger('input')
    expect(field.get('input').attributes('aria-invalid')).toBeUndefined()
    await field.get('input').trigger('change')
    expect(field.get('input').attributes('aria-invalid')).toBe('true')
  })

  it('follows a value that comes from elsewhere', async () => {
    const field = await mount(3)
    await field.setProps({ modelValue: 4.5 })
    expect(field.get('input').element.value).toBe('4.5')
    await field.setProps({ modelValue: null })
    expect(field.get('input').element.value).toBe('')
  })

  it('is a text box with the decimal keyboard', async () => {
    expect((await mount()).get('input').attributes()).toMatchObject({ type: 'text', inputmode: 'decimal' })
  })
})

describe('a choice', () => {
  const options = [{ value: 'tn-s', label: 'TN-S' }, { value: 'tt', label: 'TT', why: 'Ask the network operator first.' }]

  it('gives the value of the answer chosen', async () => {
    const field = await mountSuspended(BaseChoice, { props: { label: 'How is it earthed?', options } })
    await field.get('input').setValue(true)
    expect(field.emitted('update:modelValue')).toEqual([['tn-s']])
    expect(field.get('legend').text()).toBe('How is it earthed?')
  })

  it('says why an answer is locked, tied to its button', async () => {
    const field = await mountSuspended(BaseChoice, { props: { label: 'How is it earthed?', options } })
    const locked = field.findAll('input')[1]!
    expect(locked.attributes('disabled')).toBeDefined()
    expect(field.get(`#${locked.attributes('aria-describedby')}`).text()).toBe('Ask the network operator first.')
  })
})

describe('a check and a list', () => {
  it('locks a check with its reason', async () => {
    const check = await mountSuspended(BaseCheck, { props: { label: 'Covers are back on', why: 'Energising comes after this.' } })
    expect(check.get(`#${check.get('input').attributes('aria-describedby')}`).text()).toBe('Energising comes after this.')
  })

  it('begins a list with nothing chosen', async () => {
    const list = await mountSuspended(BaseSelect, { props: { label: 'Crew', options: [{ value: 'a', label: 'Crew A' }], modelValue: null } })
    expect(list.get('select').element.selectedOptions[0]?.text).toBe('Choose one')
    await list.get('select').setValue('a')
    expect(list.emitted('update:modelValue')).toEqual([['a']])
  })
})

describe('a date', () => {
  it('gives a real day once all three boxes are filled', async () => {
    const field = await mountSuspended(BaseDateInput, { props: { label: 'Visit on', modelValue: null } })
    const [day, month, year] = field.findAll('input')
    await day!.setValue('2')
    await month!.setValue('3')
    await year!.setValue('2027')
    expect(field.emitted('update:modelValue')?.at(-1)).toEqual(['2027-03-02'])
  })

  it('offers Today and Tomorrow of the day it is given', async () => {
    const field = await mountSuspended(BaseDateInput, { props: { label: 'Visit on', today: '2027-02-28' } })
    await field.findAll('button').find(button => button.text() === 'Tomorrow')!.trigger('click')
    expect(field.emitted('update:modelValue')?.at(-1)).toEqual(['2027-03-01'])
    expect(field.findAll('input').map(box => box.element.value)).toEqual(['1', '3', '2027'])
  })

  it('speaks of a day that does not exist when the date is left', async () => {
    const field = await mountSuspended(BaseDateInput, { props: { label: 'Visit on', modelValue: '2027-04-30' } })
    await field.findAll('input')[0]!.setValue('31')
    await field.get('fieldset').trigger('focusout')
    await nextTick()
    expect(field.text()).toContain('There is no such day.')
    expect(field.emitted('update:modelValue')?.at(-1)).toEqual([null])
  })
})
