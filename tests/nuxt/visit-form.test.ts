import { describe, expect, it } from 'vitest'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import VisitForm from '~/components/log/VisitForm.vue'
import { useJournalStore } from '~/stores/journal'
import { createMemoryStorage } from '~/tests/support/memory-storage'
import { ids, validPlant } from '~/tests/support/valid-fields'
import { keys } from '~/utils/offline/keys'
import { surroundings } from '~/utils/offline/phone'

const plant = { id: ids.plant, ver: 1, data: { ...validPlant, id: ids.plant, ownerId: ids.club }, unsent: false, attention: false }

/** A form on a phone whose store is memory, as it is after a while of typing. */
async function form(storage = createMemoryStorage()) {
  const runner = { kick: () => undefined, close: () => undefined }
  useJournalStore().phone = { accountId: ids.club, storage, around: surroundings, runner, close: () => undefined }
  const wrapper = await mountSuspended(VisitForm, { props: { plant } })
  await flushPromises()
  const type = async (id: string, text: string) => {
    await wrapper.get(`[id="${id}"]`).setValue(text)
    await flushPromises()
  }
  const save = async () => {
    await wrapper.get('form').trigger('submit')
    await flushPromises()
  }
  const value = (id: string) => (wrapper.get(`[id="${id}"]`).element as HTMLInputElement).value
  return { wrapper, storage, type, save, value }
}

const saved = (storage: ReturnType<typeof createMemoryStorage>) => [...storage.contents()].filter(([key]) => key.startsWith('outbox/')).map(([, item]) => item)

describe('the form of a visit', () => {
  it('keeps what is typed on every change, and takes it up again with a word', async () => {
    const first = await form()
    await first.type('reading-ph', '6,1')
    await first.type('note', 'White roots')
    expect(first.storage.contents().get(keys.draft(ids.plant))).toMatchObject({ note: 'White roots', readings: { ph: 6.1 } })
    first.wrapper.unmount()

    const again = await form(first.storage)
    expect([again.value('reading-ph'), again.value('note')]).toEqual(['6.1', 'White roots'])
    expect(again.wrapper.get('[role="status"]').text()).toBe('Here is what you had typed before.')
  })

  it('saves one entry and ends the draft in the same step', async () => {
    const { wrapper, storage, type, save } = await form()
    await type('reading-ph', '6,1')
    await save()
    expect(saved(storage)).toMatchObject([{ op: { kind: 'create', entityType: 'entry', fields: { plantId: ids.plant, ph: 6.1, note: null } } }])
    expect(storage.contents().has(keys.draft(ids.plant))).toBe(false)
    expect(wrapper.emitted('saved')).toHaveLength(1)
  })

  it('saves "Looked, no change" with one tap', async () => {
    const { wrapper, storage } = await form()
    await wrapper.findAll('button').find(button => button.text().includes('Looked, no change'))?.trigger('click')
    await flushPromises()
    expect(saved(storage)).toMatchObject([{ op: { fields: { lookedNoChange: true } } }])
  })

  it('says what is wrong at its field and in a list, and loses nothing', async () => {
    const { wrapper, storage, type, save, value } = await form()
    await type('reading-ph', '55')
    await type('note', 'White roots')
    await save()
    expect(wrapper.get('[role="alert"]').text()).toContain('pH is above 14.')
    expect(wrapper.get('[id="reading-ph"]').attributes('aria-invalid')).toBe('true')
    expect([saved(storage).length, value('note')]).toEqual([0, 'White roots'])
    expect(storage.contents().get(keys.draft(ids.plant))).toMatchObject({ note: 'White roots' })
  })

  it('does not leave out silently what is no number', async () => {
    const { wrapper, storage, type, save } = await form()
    await type('reading-ph', 'six')
    await type('note', 'White roots')
    await save()
    expect(wrapper.get('[role="alert"]').text()).toContain('pH: what is typed there is not a number.')
    expect(saved(storage)).toEqual([])
  })

  it('saves nothing while there is nothing to save', async () => {
    const { wrapper, storage, save } = await form()
    await save()
    expect(wrapper.get('[role="alert"]').text()).toContain('There is nothing to save yet.')
    expect(saved(storage)).toEqual([])
  })

  it('keeps everything when the phone is full', async () => {
    const { wrapper, storage, type, save, value } = await form()
    await type('reading-ph', '6.1')
    storage.fillOnce()
    await save()
    expect(wrapper.text()).toContain('Not saved yet')
    expect(value('reading-ph')).toBe('6.1')
    await save()
    expect(saved(storage)).toHaveLength(1)
  })
})
