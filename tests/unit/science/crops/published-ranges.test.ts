import { describe, expect, it } from 'vitest'
import { CROP_IDS, type CropId } from '#shared/science/crops/crop-ids'
import { placeInRange, primaryRange, publishedRanges, type RangedQuantity } from '#shared/science/crops/published-ranges'

/** Bands that one source gives, as "low–high". */
function bandsOf(cropId: CropId, quantity: RangedQuantity, source: string): string[] {
  return publishedRanges(cropId, quantity).filter(range => range.source === source).map(range => `${range.low}–${range.high}`)
}

// Oklahoma State University Extension HLA-6722, table 2. Values from memory.
const leaflet: [CropId, string, string][] = [
  ['aubergine', '2.5–3.5', '6–6'],
  ['basil', '1–1.6', '5.5–6'],
  ['bean', '2–4', '6–6'],
  ['broccoli', '2.8–3.5', '6–6.8'],
  ['cabbage', '2.5–3', '6.5–7'],
  ['celery', '1.8–2.4', '6.5–6.5'],
  ['courgette', '1.8–2.4', '6–6'],
  ['cucumber', '1.7–2', '5–5.5'],
  ['leek', '1.4–1.8', '6.5–7'],
  ['lettuce', '1.2–1.8', '6–7'],
  ['okra', '2–2.4', '6.5–6.5'],
  ['pak-choi', '1.5–2', '7–7'],
  ['parsley', '1.8–2.2', '6–6.5'],
  ['pepper', '0.8–1.8', '5.5–6'],
  ['sage', '1–1.6', '5.5–6.5'],
  ['spinach', '1.8–2.3', '6–7'],
  ['strawberry', '1.8–2.2', '6–6'],
  ['tomato', '2–4', '6–6.5'],
]

describe('publishedRanges', () => {
  it.each(leaflet)('repeats the leaflet for %s: EC %s, pH %s', (cropId, ec, ph) => {
    expect(bandsOf(cropId, 'ec', 'singh-dunn-2016')[0]).toBe(ec)
    expect(bandsOf(cropId, 'ph', 'singh-dunn-2016')).toEqual([ph])
  })

  it('has a row of the leaflet for every crop but "other"', () => {
    expect(leaflet.map(([cropId]) => cropId)).toEqual(CROP_IDS.filter(cropId => cropId !== 'other'))
  })

  it('shows both sides where sources disagree on pepper', () => {
    // Peppers 101, Hydroponic Production Primers, Produce Grower: 0.5 in propagation, 2.0 to 2.5 after transplanting. Seen.
    expect(bandsOf('pepper', 'ec', 'produce-grower-peppers')).toEqual(['0.5–0.5', '2–2.5'])
    // Sonneveld & Voogt 2009: drip 2.1, root zone 2.7 to 3.0. Value from memory.
    expect(bandsOf('pepper', 'ec', 'sonneveld-voogt-2009')).toEqual(['2.1–2.1', '2.7–3'])
    expect(bandsOf('pepper', 'ec', 'singh-dunn-2016')).toEqual(['0.8–1.8'])
  })

  it('shows both sides where sources disagree on tomato', () => {
    // The same table is also quoted as 2.0 to 5.0. Value from memory.
    expect(bandsOf('tomato', 'ec', 'singh-dunn-2016')).toEqual(['2–4', '2–5'])
    // Sonneveld & Voogt 2009: drip 2.6, root zone 3.7 to 4.0. Value from memory.
    expect(bandsOf('tomato', 'ec', 'sonneveld-voogt-2009')).toEqual(['2.6–2.6', '3.7–4'])
    // Carruthers, summary: fruiting Solanaceae 2.5 to 3.6 in summer, 3.6 to 5.0 in winter. Seen.
    expect(bandsOf('tomato', 'ec', 'carruthers-summary')).toEqual(['2.5–3.6', '3.6–5'])
  })

  it('shows both sides where sources disagree on lettuce', () => {
    // Cornell lettuce handbook: 5.6 to 6.0. Value from memory.
    expect(bandsOf('lettuce', 'ph', 'brechner-both-lettuce')).toEqual(['5.6–6'])
    // Carruthers, summary: leafy greens 0.7 to 1.5 in winter, 1.5 to 1.8 in summer. Seen.
    expect(bandsOf('lettuce', 'ec', 'carruthers-summary')).toEqual(['0.7–1.5', '1.5–1.8'])
  })

  it('keeps the trial in which basil did not mind', () => {
    // Walters & Currey 2018, HortScience 53:1319: no effect on yield from 0.5 to 4.0 mS/cm. Seen.
    expect(bandsOf('basil', 'ec', 'walters-currey-2018')).toEqual(['0.5–4'])
  })

  it.each(CROP_IDS)('ends the pH of %s with the bands for all crops', (cropId) => {
    // Jones 2005: 5.5 to 6.5, value from memory. Combrink: 5.3 to 6.3, seen.
    expect(publishedRanges(cropId, 'ph').slice(-2).map(range => [range.low, range.high, range.source]))
      .toEqual([[5.5, 6.5, 'jones-2005'], [5.3, 6.3, 'combrink-mixing']])
  })

  it('has no strength for "other"', () => {
    expect(publishedRanges('other', 'ec')).toEqual([])
  })

  it.each(CROP_IDS)('gives bands of %s that a solution can have', (cropId) => {
    for (const quantity of ['ph', 'ec'] as const) {
      publishedRanges(cropId, quantity).forEach((range) => {
        expect(range.low).toBeGreaterThan(0)
        expect(range.high).toBeGreaterThanOrEqual(range.low)
        expect(range.high).toBeLessThanOrEqual(quantity === 'ph' ? 7 : 5)
        expect(range.context).not.toBe('')
      })
    }
  })
})

describe('primaryRange', () => {
  it('is the crop\'s own row where that row is a band', () => {
    expect(primaryRange('basil', 'ec')).toMatchObject({ low: 1.0, high: 1.6, source: 'singh-dunn-2016' })
    expect(primaryRange('basil', 'ph')).toMatchObject({ low: 5.5, high: 6.0, source: 'singh-dunn-2016' })
  })

  it('passes over rows up to pH 7.0, which repeat an older list', () => {
    expect(primaryRange('lettuce', 'ph')).toMatchObject({ low: 5.6, high: 6.0, source: 'brechner-both-lettuce' })
    expect(primaryRange('spinach', 'ph')).toMatchObject({ low: 5.5, high: 6.5, source: 'jones-2005' })
  })

  it('passes over a single printed pH', () => {
    expect(primaryRange('bean', 'ph')).toMatchObject({ low: 5.5, high: 6.5 })
  })

  it('is the general pH band for "other", and no strength', () => {
    expect(primaryRange('other', 'ph')).toMatchObject({ low: 5.5, high: 6.5 })
    expect(primaryRange('other', 'ec')).toBeNull()
  })
})

describe('placeInRange', () => {
  const band = { low: 5.5, high: 6.5 }

  it.each([
    [5.4, 'below'], [5.5, 'in'], [6, 'in'], [6.5, 'in'], [6.6, 'above'],
  ] as const)('places %d %s a band from 5.5 to 6.5', (value, place) => {
    expect(placeInRange(value, band)).toBe(place)
  })

  it('refuses what is no reading', () => {
    expect(() => placeInRange(Number.NaN, band)).toThrow(RangeError)
  })
})
