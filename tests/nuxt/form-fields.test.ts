import { describe, expect, it } from 'vitest'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import ChoiceChips from '~/components/form/ChoiceChips.vue'
import ErrorSummary from '~/components/form/ErrorSummary.vue'
import SelectField from '~/components/form/SelectField.vue'
import TextArea from '~/components/form/TextArea.vue'
import TextField from '~/components/form/TextField.vue'

const choices = [{ value: 'roots', label: 'Roots' }, { value: 'leaf', label: 'Leaf' }, { value: 'fruit', label: 'Fruit' }]

describe('a text field', () => {
  it('has a visible label and links its error', async () => {
    const wrapper = await mountSuspended(TextField, { props: { label: 'Name', error: 'is empty', hint: 'What you call it' } })
    const input = wrapper.get('input')
    expect(wrapper.get('label').attributes('for')).toBe(input.attributes('id'))
    const described = input.attributes('aria-describedby')!.split(' ').map(id => wrapper.get(`[id="${id}"]`).text())
    expect(described).toEqual(['What you call it', 'is empty'])
  })

  it('lets no phone correct an address', async () => {
    const wrapper = await mountSuspended(TextField, { props: { label: 'E-mail', type: 'email' } })
    expect(wrapper.get('input').attributes('autocapitalize')).toBe('none')
    expect(wrapper.get('input').attributes('aria-invalid')).toBeUndefined()
  })
})

describe('a text area', () => {
  it('keeps a text that is too long whole, and counts what is too much', async () => {
    const wrapper = await mountSuspended(TextArea, { props: { label: 'Note', maxlength: 10 } })
    await wrapper.get('textarea').setValue('Thirteen long')
    expect(wrapper.emitted('update:modelValue')).toEqual([['Thirteen long']])
    expect(wrapper.get('textarea').attributes('maxlength')).toBeUndefined()
    expect(wrapper.text()).toContain('3 characters too many')
  })
})

describe('choice chips', () => {
  it('replace a single answer', async () => {
    const wrapper = await mountSuspended(ChoiceChips, { props: { label: 'What it shows', choices, modelValue: ['roots'] } })
    await wrapper.get('input[value="leaf"]').trigger('change')
    expect(wrapper.emitted('update:modelValue')!.at(-1)).toEqual([['leaf']])
    expect(wrapper.findAll('input[type="radio"]')).toHaveLength(3)
  })

  it('add and take away when several may be chosen', async () => {
    const wrapper = await mountSuspended(ChoiceChips, { props: { label: 'What it shows', choices, multiple: true, modelValue: ['roots', 'fruit'] } })
    await wrapper.get('input[value="leaf"]').trigger('change')
    await wrapper.get('input[value="roots"]').trigger('change')
    expect(wrapper.emitted('update:modelValue')).toEqual([[['roots', 'fruit', 'leaf']], [['fruit', 'leaf']]])
  })
})

describe('a select field', () => {
  it('gives a value of its list, and null for the empty answer', async () => {
    const wrapper = await mountSuspended(SelectField, { props: { label: 'Subject', choices, modelValue: 'leaf', emptyLabel: 'None' } })
    await wrapper.get('select').setValue('roots')
    await wrapper.get('select').setValue('')
    expect(wrapper.emitted('update:modelValue')).toEqual([['roots'], [null]])
  })
})

describe('the error summary', () => {
  it('is not there without errors', async () => {
    const wrapper = await mountSuspended(ErrorSummary, { props: { issues: [] } })
    expect(wrapper.find('[role="alert"]').exists()).toBe(false)
  })

  it('names each error as a link to its field', async () => {
    const wrapper = await mountSuspended(ErrorSummary, { props: { issues: [{ fieldId: 'name', message: 'Name is empty' }] } })
    expect(wrapper.get('a').attributes('href')).toBe('#name')
    expect(wrapper.get('a').text()).toBe('Name is empty')
  })
})
