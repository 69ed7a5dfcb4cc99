import { describe, expect, it } from 'vitest'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import Picker from '~/components/photo/Picker.vue'

const ready = { key: 'a', src: 'data:,', subject: 'roots', state: 'ready' } as const

describe('the photo picker', () => {
  it('offers the camera and the library, pictures only', async () => {
    const wrapper = await mountSuspended(Picker, { props: { photos: [] } })
    const inputs = wrapper.findAll('input[type="file"]')
    expect(inputs.map(input => input.attributes('capture'))).toEqual(['environment', undefined])
    expect(inputs.every(input => input.attributes('accept') === 'image/*')).toBe(true)
  })

  it('hands the chosen files on and forgets them', async () => {
    const wrapper = await mountSuspended(Picker, { props: { photos: [] } })
    const input = wrapper.get('input[type="file"]')
    const file = new File(['x'], 'roots.jpg', { type: 'image/jpeg' })
    Object.defineProperty(input.element, 'files', { value: [file], configurable: true })
    await input.trigger('change')
    expect(wrapper.emitted('add')).toEqual([[[file]]])
  })

  it('tells nothing when the camera was closed without a photo', async () => {
    const wrapper = await mountSuspended(Picker, { props: { photos: [] } })
    await wrapper.get('input[type="file"]').trigger('change')
    expect(wrapper.emitted('add')).toBeUndefined()
  })

  it('changes the subject and removes one', async () => {
    const wrapper = await mountSuspended(Picker, { props: { photos: [ready] } })
    await wrapper.get('input[value="fruit"]').trigger('change')
    expect(wrapper.emitted('subject')).toEqual([['a', 'fruit']])
    await wrapper.get('button').trigger('click')
    expect(wrapper.emitted('remove')).toEqual([['a']])
  })

  it('says why a file cannot be used, and asks no subject of it', async () => {
    const wrapper = await mountSuspended(Picker, { props: { photos: [{ ...ready, src: null, state: 'failed', message: 'Too large' }] } })
    expect(wrapper.text()).toContain('Too large')
    expect(wrapper.find('input[value="fruit"]').exists()).toBe(false)
  })

  it('takes no more when the entry is full', async () => {
    const wrapper = await mountSuspended(Picker, { props: { photos: [ready], full: true } })
    expect(wrapper.find('input[type="file"]').exists()).toBe(false)
  })
})
