import { describe, expect, it } from 'vitest'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import type { EntryFields } from '#shared/domain/entry.schema'
import EntryCard from '~/components/entry/Card.vue'
import type { PictureItem } from '~/types/ui'

const bare: EntryFields = {
  plantId: 'p', recordedAt: '2026-06-09T05:41:00.000Z', occurredAt: '2026-06-09T05:40:00.000Z', lookedNoChange: false, note: null,
  ph: null, ecMilliSiemensPerCm: null, waterLevelCm: null, airGapCm: null, waterCelsius: null, airCelsius: null,
  relativeHumidityPercent: null, actions: [], topUpLitres: null, topUpWith: null, changeLitres: null, harvestGrams: null, harvestCount: null,
}
const roots: PictureItem = { id: 'r', src: null, placeholder: null, subject: 'roots', day: 15, widthPx: 400, heightPx: 300, state: 'waiting' }

function card(entry: Partial<EntryFields> = {}, props: Record<string, unknown> = {}) {
  return mountSuspended(EntryCard, { props: { entry: { ...bare, ...entry }, timeZone: 'Asia/Kolkata', day: 15, ...props } })
}

describe('an entry card', () => {
  it('shows a note as text, whatever it holds', async () => {
    const note = '<img src=x onerror=alert(1)> <b>bold</b>'
    const wrapper = await card({ note })
    expect(wrapper.text()).toContain(note)
    expect(wrapper.find('img').exists()).toBe(false)
    expect(wrapper.find('b').exists()).toBe(false)
    expect(wrapper.get('p[dir="auto"]').text()).toBe(note)
  })

  it('tells the visit in the time zone of the plant', async () => {
    const wrapper = await card()
    expect(wrapper.get('time').attributes('datetime')).toBe('2026-06-09T05:40:00.000Z')
    expect(wrapper.get('time').text()).toContain('11:10')
  })

  it('names readings in words and adds the verdict for those who cannot see its colour', async () => {
    const wrapper = await card({ ph: 7.2, waterLevelCm: 9.4 }, { verdicts: { ph: { side: 'above', far: true } } })
    expect(wrapper.findAll('[aria-label="Readings"] li').map(item => item.text())).toEqual(['pH 7.2, far too high', 'level 9.4 cm'])
  })

  it('says what was done, and how much of what', async () => {
    const wrapper = await card({ actions: ['topped-up'], topUpLitres: 1.5, topUpWith: 'plain-water' })
    expect(wrapper.get('h2').text()).toBe('Topped up')
    expect(wrapper.text()).toContain('1.5 L plain water added')
  })

  it('marks what was not sent, and prefers what needs a look', async () => {
    expect((await card({}, { unsent: true })).text()).toContain('Not sent yet')
    const both = await card({}, { unsent: true, attention: true })
    expect(both.text()).toContain('Needs a look')
    expect(both.text()).not.toContain('Not sent yet')
    await both.get('button').trigger('click')
    expect(both.emitted('attention')).toHaveLength(1)
  })

  it('says that it was typed in later', async () => {
    expect((await card({ recordedAt: '2026-06-10T05:40:00.000Z' })).text()).toContain('typed in later')
    expect((await card()).text()).not.toContain('typed in later')
  })

  it('opens a photo, and tells that its picture is still to come', async () => {
    const wrapper = await card({}, { photos: [roots] })
    expect(wrapper.text()).toContain('Picture is on its way')
    await wrapper.get('button').trigger('click')
    expect(wrapper.emitted('photo')).toEqual([['r']])
  })
})
