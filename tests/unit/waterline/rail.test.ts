import { describe, expect, it } from 'vitest'
import { buildLevelLine } from '~/utils/waterline/level-line'
import { railRows } from '~/utils/waterline/rail-rows'
import type { SliceFrame } from '~/utils/waterline/rail-slice'
import { railSlice } from '~/utils/waterline/rail-slice'

const frame: SliceFrame = { fromDay: 3, toDay: 4, widthPx: 80, heightPx: 200, topCm: 20, cupFloorCm: 18 }

/** The points of a path that is made of straight lines. */
function points(path: string): { x: number, y: number }[] {
  return path.replace('Z', '').split(/[ML]/).filter(Boolean).map((pair) => {
    const [x = Number.NaN, y = Number.NaN] = pair.split(' ').map(Number)
    return { x, y }
  })
}

describe('rows of the rail', () => {
  it('run from the newest day down and leave no time out', () => {
    const rows = railRows([0, 3, 7, 8], 8.6)
    expect(rows.map(row => row.kind === 'day' ? row.day : `gap ${row.days}`)).toEqual([8, 7, 'gap 3', 3, 'gap 2', 0])
    rows.slice(1).forEach((row, index) => expect(row.toDay).toBe(rows[index]!.fromDay))
    expect(rows[0]!.toDay).toBe(8.6)
  })

  it('begin with a gap when nothing was logged lately', () => {
    expect(railRows([2], 5.5)[0]).toEqual({ kind: 'gap', days: 2, fromDay: 3, toDay: 5.5 })
  })

  it('count no day as missed before it is over', () => {
    expect(railRows([2], 3.2)[0]).toMatchObject({ kind: 'gap', days: 0 })
  })

  it('take a day once however often it is named, days before set-up included', () => {
    expect(railRows([1, 1, -2], 1.5).filter(row => row.kind === 'day')).toHaveLength(2)
  })

  it('are none without days', () => {
    expect(railRows([], 4)).toEqual([])
  })
})

describe('a slice of the rail', () => {
  const line = buildLevelLine([{ day: 2, levelCm: 12 }, { day: 3.5, levelCm: 10 }, { day: 5, levelCm: 8 }], [], 5)

  it('draws the surface as wide as the level, from its head to its foot', () => {
    const surface = points(railSlice(line, frame).surface.join(''))
    expect(surface[0]!.y).toBe(0)
    expect(surface.at(-1)!.y).toBe(200)
    const middle = surface.find(point => Math.abs(point.y - 100) < 0.01)
    expect(middle!.x).toBeCloseTo(40, 1)
  })

  it('puts a dot where and when it was read', () => {
    expect(railSlice(line, frame).dots).toEqual([{ x: 40, y: 100 }])
  })

  it('joins the slice below it without a step', () => {
    const upper = points(railSlice(line, frame).surface.join('')).at(-1)!
    const lower = points(railSlice(line, { ...frame, fromDay: 2, toDay: 3, heightPx: 90 }).surface.join(''))[0]!
    expect(lower.x).toBeCloseTo(upper.x, 6)
  })

  it('shows a jump once, in the slice of its moment', () => {
    const changed = buildLevelLine([{ day: 2, levelCm: 8 }, { day: 4, levelCm: 16 }, { day: 5, levelCm: 15 }], [{ day: 4, kind: 'changed-solution' }], 5)
    const below = railSlice(changed, frame)
    const above = railSlice(changed, { ...frame, fromDay: 4, toDay: 5 })
    expect([...below.jumps, ...above.jumps]).toHaveLength(1)
  })

  it('draws water above the rim no wider than the rail', () => {
    const flooded = buildLevelLine([{ day: 2, levelCm: 90 }, { day: 5, levelCm: 90 }], [], 5)
    expect(Math.max(...points(railSlice(flooded, frame).surface.join('')).map(point => point.x))).toBe(80)
  })

  it('is empty where no level reaches', () => {
    const slice = railSlice(line, { ...frame, fromDay: 0, toDay: 1 })
    expect([...slice.water, ...slice.guess, ...slice.rootsInAir, ...slice.dots]).toEqual([])
  })

  it('parts every root at the surface: air to the right of it, water to the left', () => {
    const flat = buildLevelLine([{ day: 0, levelCm: 10 }, { day: 9, levelCm: 10 }], [], 9)
    const slice = railSlice(flat, { ...frame, fromDay: 8, toDay: 9 })
    expect(slice.rootsInAir.length).toBeGreaterThan(0)
    expect(Math.min(...slice.rootsInAir.flatMap(points).map(point => point.x))).toBeGreaterThanOrEqual(40)
    expect(Math.max(...slice.rootsInWater.flatMap(points).map(point => point.x))).toBeLessThanOrEqual(42)
  })
})
