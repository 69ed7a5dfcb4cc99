import { describe, expect, it } from 'vitest'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import NumberField from '~/components/form/NumberField.vue'

async function field(props: Record<string, unknown> = {}) {
  const wrapper = await mountSuspended(NumberField, { props: { label: 'pH', step: 0.1, max: 14, decimals: 1, ...props } })
  return { wrapper, input: wrapper.get('input') }
}

const stepper = (wrapper: Awaited<ReturnType<typeof field>>['wrapper'], name: string) => (
  wrapper.findAll('button').find(button => button.text() === name)!
)

describe('a number field', () => {
  it('asks for the number pad and keeps its label visible', async () => {
    const { wrapper, input } = await field()
    expect(input.attributes('inputmode')).toBe('decimal')
    expect(wrapper.get('label').attributes('for')).toBe(input.attributes('id'))
    expect(wrapper.get('label').text()).toBe('pH')
  })

  it('takes a decimal comma and leaves the typed text alone', async () => {
    const { wrapper, input } = await field()
    await input.setValue('6,1')
    expect(wrapper.emitted('update:modelValue')!.at(-1)).toEqual([6.1])
    expect(input.element.value).toBe('6,1')
  })

  it('gives null for an emptied field', async () => {
    const { wrapper, input } = await field({ modelValue: 6 })
    await input.setValue('')
    expect(wrapper.emitted('update:modelValue')!.at(-1)).toEqual([null])
  })

  it('keeps an unreadable text, says so and warns the form', async () => {
    const { wrapper, input } = await field({ modelValue: 6 })
    await input.setValue('six')
    expect(input.element.value).toBe('six')
    expect(wrapper.emitted('update:modelValue')!.at(-1)).toEqual([null])
    expect(wrapper.emitted('unreadable')!.at(-1)).toEqual([true])
    expect(wrapper.text()).toContain('"six" is not a number.')
    expect(input.attributes('aria-invalid')).toBe('true')
  })

  it('links hint, mark and error to the input', async () => {
    const { wrapper, input } = await field({ aim: { low: 5.6, high: 6.3 }, verdict: { side: 'above' }, error: 'is above 14' })
    const described = input.attributes('aria-describedby')!.split(' ').map(id => wrapper.get(`[id="${id}"]`).text())
    expect(described).toEqual(['aim 5.6 to 6.3', 'above', 'is above 14'])
  })

  it('steps from the last reading', async () => {
    const { wrapper, input } = await field({ start: 6.2 })
    await stepper(wrapper, 'More: pH').trigger('click')
    expect(input.element.value).toBe('6.2')
    await stepper(wrapper, 'Less: pH').trigger('click')
    expect(wrapper.emitted('update:modelValue')!.at(-1)).toEqual([6.1])
  })

  it('stops stepping at its limits', async () => {
    const { wrapper } = await field({ modelValue: 14 })
    expect(stepper(wrapper, 'More: pH').attributes('disabled')).toBeDefined()
    expect(stepper(wrapper, 'Less: pH').attributes('disabled')).toBeUndefined()
  })

  it('shows a value that comes from outside', async () => {
    const { wrapper, input } = await field({ modelValue: null })
    await wrapper.setProps({ modelValue: 7 })
    expect(input.element.value).toBe('7.0')
  })
})
