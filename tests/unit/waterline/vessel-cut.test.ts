import { describe, expect, it } from 'vitest'
import { airRootFuzz, rootLengthShare, rootMass } from '~/utils/waterline/roots'
import { CUT_VIEW, cutGeometry, layer, PICTURE_BUCKET, spreadApart } from '~/utils/waterline/vessel-cut'
import { softPath } from '~/utils/waterline/paths'

const bed = { centreX: 110, halfWidth: 20, topY: 120, floorY: 240, spread: 60, atLeastY: 150, day: 20 }

describe('the vessel in section', () => {
  const shapes = [
    ['a bucket', PICTURE_BUCKET],
    ['a flat tote', { topCm: 60, bottomCm: 55, heightCm: 20, cupRimCm: 8, cupDepthCm: 7 }],
    ['a bottle', { topCm: 9, bottomCm: 9, heightCm: 30, cupRimCm: 4, cupDepthCm: 4 }],
  ] as const

  it.each(shapes)('keeps %s inside the drawing, with room for the plant', (_, measures) => {
    const { inside, topY } = cutGeometry(measures)
    for (const { x } of inside) {
      expect(x).toBeGreaterThanOrEqual(0)
      expect(x).toBeLessThanOrEqual(CUT_VIEW.width)
    }
    expect(topY).toBeGreaterThanOrEqual(CUT_VIEW.top - 1e-9)
  })

  it('puts half the height half way between floor and rim', () => {
    const { yOf, topY, floorY } = cutGeometry(PICTURE_BUCKET)
    expect(yOf(PICTURE_BUCKET.heightCm / 2)).toBeCloseTo((topY + floorY) / 2, 9)
  })

  it('lets no water rise above the rim or sink through the floor', () => {
    const { yOf, topY, floorY } = cutGeometry(PICTURE_BUCKET)
    expect(yOf(400)).toBeCloseTo(topY, 9)
    expect(yOf(-3)).toBe(floorY)
  })

  it('narrows the water with the walls', () => {
    const geometry = cutGeometry(PICTURE_BUCKET)
    const [upperLeft, upperRight, lowerRight, lowerLeft] = layer(geometry, 150, geometry.floorY)
    expect(upperRight!.x - upperLeft!.x).toBeGreaterThan(lowerRight!.x - lowerLeft!.x)
  })
})

describe('drawn roots', () => {
  const deepest = (day: number) => Math.max(...rootMass({ ...bed, day }).flatMap(root => root.points).map(point => point.y))

  it('grow longer with the days and stay inside the vessel', () => {
    expect(rootLengthShare(10)).toBeGreaterThan(rootLengthShare(2))
    expect(deepest(40)).toBeGreaterThan(deepest(3))
    expect(deepest(400)).toBeLessThanOrEqual(bed.floorY)
  })

  it('reach the water from the first day', () => {
    const first = rootMass({ ...bed, day: 0 })
    expect(Math.min(...first.map(root => root.points.at(-1)!.y))).toBeGreaterThan(bed.atLeastY)
  })

  it('are the same at every drawing', () => {
    expect(rootMass(bed)).toEqual(rootMass(bed))
  })

  it('grow fuzz only above the water', () => {
    const fuzz = airRootFuzz(rootMass(bed), 170)
    expect(fuzz.length).toBeGreaterThan(0)
    expect(Math.max(...fuzz.map(([start]) => start.y))).toBeLessThan(170)
  })
})

describe('small things of the drawing', () => {
  it('moves labels apart without changing their order', () => {
    const places = spreadApart([100, 102, 30], 16)
    expect(places[1]! - places[0]!).toBeGreaterThanOrEqual(16 - 0.01)
    expect(places[2]).toBe(30)
    expect((places[0]! + places[1]!) / 2).toBeCloseTo(101, 6)
  })

  it('draws nothing for a single point', () => {
    expect(softPath([{ x: 1, y: 1 }])).toBe('')
  })
})
