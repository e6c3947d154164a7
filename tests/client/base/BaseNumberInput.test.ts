import { mount } from '@vue/test-utils'
import { afterEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import BaseDecimalInput from '../../../src/components/base/BaseDecimalInput.vue'
import BaseLengthInput from '../../../src/components/base/BaseLengthInput.vue'
import { byRole, describedBy, type } from '../../support/screen'

function mountLength(modelValue: number, props = {}) {
  document.body.innerHTML = ''
  return mount(BaseLengthInput, { props: { modelValue, label: 'Along x', ...props }, attachTo: document.body })
}
const field = () => byRole('textbox', 'Along x, mm') as HTMLInputElement

describe('BaseLengthInput', () => {
  afterEach(() => (document.body.innerHTML = ''))

  it('takes thousands with or without a comma', () => {
    const wrapper = mountLength(6000)
    expect(field().value).toBe('6,000')
    type(field(), '6,600')
    type(field(), '5400')
    expect(wrapper.emitted('update:modelValue')).toEqual([[6600], [5400]])
  })

  it('keeps what cannot be read, says what was expected and leaves the value', async () => {
    const wrapper = mountLength(6000)
    type(field(), 'six metres')
    await nextTick()
    expect(field().value).toBe('six metres')
    expect(describedBy(field())).toBe('expected a whole number from 0 to 1,000,000')
    expect(field().getAttribute('aria-invalid')).toBe('true')
    expect(wrapper.emitted('update:modelValue')).toBeUndefined()
    expect(wrapper.emitted('wrong')).toEqual([['expected a whole number from 0 to 1,000,000']])
  })

  it.each(['NaN', '1e9', '6,60', '540.5', '-1', ''])('refuses %j', async (text) => {
    const wrapper = mountLength(6000)
    type(field(), text)
    await nextTick()
    expect(wrapper.emitted('update:modelValue')).toBeUndefined()
    expect(describedBy(field())).toContain('expected')
  })

  it('shows a problem that comes from elsewhere', async () => {
    const wrapper = mountLength(540)
    await wrapper.setProps({ problem: 'leaves 290 clear; a row needs 600' })
    expect(describedBy(field())).toBe('leaves 290 clear; a row needs 600')
  })

  it('follows the model when it changes from outside', async () => {
    const wrapper = mountLength(6000)
    await wrapper.setProps({ modelValue: 7200 })
    expect(field().value).toBe('7,200')
  })
})

describe('BaseDecimalInput', () => {
  it('keeps every digit of the text', () => {
    document.body.innerHTML = ''
    const wrapper = mount(BaseDecimalInput, { props: { modelValue: '149.63', label: 'Rate' }, attachTo: document.body })
    type(byRole('textbox', 'Rate'), '1,149.630001')
    type(byRole('textbox', 'Rate'), '149.63000001')
    expect(wrapper.emitted('update:modelValue')).toEqual([['1149.630001']])
  })
})
