import { describe, expect, it } from 'vitest'
import { mountSuspended } from '@nuxt/test-utils/runtime'
import Rail from '~/components/waterline/Rail.vue'
import VesselCut from '~/components/waterline/VesselCut.vue'

const slots = { day: ({ day }: { day: number }) => `cards of ${day}` }

describe('the waterline rail', () => {
  it('gives every day its cards, newest first, and names the days between', async () => {
    const wrapper = await mountSuspended(Rail, { props: { days: [0, 7, 3], readings: [{ day: 0.4, levelCm: 20 }], untilDay: 7.5 }, slots })
    const rows = wrapper.findAll('ol > li').map(row => row.text())
    expect(rows.filter(row => row.includes('cards')).map(row => row.replace(/.*cards/, 'cards'))).toEqual(['cards of 7', 'cards of 3', 'cards of 0'])
    expect(rows.filter(row => row.includes('without'))).toEqual(['3 days without an entry', '2 days without an entry'])
  })

  it('tells the levels in words', async () => {
    const wrapper = await mountSuspended(Rail, { props: { days: [0, 3], readings: [{ day: 0.4, levelCm: 20 }, { day: 3.2, levelCm: 18 }], untilDay: 3.5, limitCm: 14 }, slots })
    expect(wrapper.findAll('section.sr-only li').map(item => item.text())).toEqual([
      'Refill limit: 14 cm. Roots above it breathe air.', 'Day 3: water 18 cm.', 'Day 0: water 20 cm.',
    ])
  })

  it('is a plain ruler with a hint while no level was logged', async () => {
    const wrapper = await mountSuspended(Rail, { props: { days: [2], readings: [], untilDay: 2.5 }, slots })
    expect(wrapper.text()).toContain('No water level yet.')
    expect(wrapper.find('svg path').exists()).toBe(false)
    expect(wrapper.text()).toContain('Day 2')
  })

  it('draws the refill limit only where there is one', async () => {
    const props = { days: [0], readings: [{ day: 0.1, levelCm: 20 }], untilDay: 0.5 }
    expect((await mountSuspended(Rail, { props, slots })).find('line.limit').exists()).toBe(false)
    expect((await mountSuspended(Rail, { props: { ...props, limitCm: 15 }, slots })).find('line.limit').exists()).toBe(true)
  })
})

describe('the vessel cut', () => {
  const label = async (props: Record<string, unknown>) => (await mountSuspended(VesselCut, { props })).get('svg').attributes('aria-label')

  it('tells in words what it draws', async () => {
    const measures = { heightCm: 26, cupDepthCm: 6 }
    expect(await label({ measures, levelCm: 11, litres: 6.1, limitCm: 14.5 }))
      .toBe('Vessel in section, water 11 cm, 6.1 L, air gap 9 cm, refill limit 14.5 cm')
  })

  it('claims no gap while the water touches the net cup', async () => {
    expect(await label({ measures: { heightCm: 26, cupDepthCm: 6 }, levelCm: 21 })).not.toContain('air gap')
  })

  it('is silent as a decoration', async () => {
    const wrapper = await mountSuspended(VesselCut, { props: { decorative: true } })
    expect(wrapper.get('svg').attributes('aria-hidden')).toBe('true')
    expect(wrapper.get('svg').attributes('aria-label')).toBeUndefined()
  })
})
