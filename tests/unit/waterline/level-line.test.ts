import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { buildLevelLine, levelOn } from '~/utils/waterline/level-line'
import { curveAt, monotoneCurve } from '~/utils/waterline/monotone'

const falling = [{ day: 0, levelCm: 20 }, { day: 4, levelCm: 17 }, { day: 7, levelCm: 12 }]

describe('the level line', () => {
  it('passes through every reading', () => {
    const line = buildLevelLine(falling, [], 7)
    for (const { day, levelCm } of falling) expect(levelOn(line, day)).toBeCloseTo(levelCm, 9)
  })

  it('says nothing before the first reading', () => {
    expect(levelOn(buildLevelLine(falling.slice(1), [], 9), 2)).toBeNull()
  })

  it('has no line at all without readings', () => {
    expect(buildLevelLine([], [{ day: 3, kind: 'changed-solution' }], 9)).toEqual({ readings: [], pieces: [], jumps: [] })
  })

  it('never leaves the span of the readings around it', () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 0, max: 60 }), { minLength: 2, maxLength: 8 }), fc.double({ min: 0, max: 1, noNaN: true }), (levels, share) => {
      const line = buildLevelLine(levels.map((levelCm, day) => ({ day, levelCm })), [], levels.length - 1)
      const day = share * (levels.length - 1)
      const around = [levels[Math.floor(day)]!, levels[Math.ceil(day)]!]
      const level = levelOn(line, day)!
      expect(level).toBeGreaterThanOrEqual(Math.min(...around) - 1e-9)
      expect(level).toBeLessThanOrEqual(Math.max(...around) + 1e-9)
    }))
  })

  it('jumps at a change, and takes the reading logged with it as the level after it', () => {
    const line = buildLevelLine([...falling, { day: 7.25, levelCm: 16 }, { day: 10, levelCm: 14 }], [{ day: 7.25, kind: 'changed-solution' }], 10)
    expect(line.jumps).toEqual([{ day: 7.25, fromCm: 12, toCm: 16 }])
    expect(levelOn(line, 7.2)).toBe(12)
    expect(levelOn(line, 7.25)).toBe(16)
  })

  it('marks as a guess what lies between a reading and a change days later', () => {
    const line = buildLevelLine([{ day: 1, levelCm: 18 }, { day: 9, levelCm: 17 }], [{ day: 8, kind: 'topped-up' }], 9)
    expect(line.pieces.map(({ kind, fromDay, toDay }) => ({ kind, fromDay, toDay }))).toEqual([
      { kind: 'guess', fromDay: 1, toDay: 8 },
      { kind: 'guess', fromDay: 8, toDay: 9 },
    ])
  })

  it('trusts a level for half a day, and calls it a guess after that', () => {
    const kindUntil = (untilDay: number) => buildLevelLine([{ day: 2, levelCm: 18 }], [], untilDay).pieces.map(piece => piece.kind)
    expect(kindUntil(2)).toEqual([])
    expect(kindUntil(2.5)).toEqual(['between'])
    expect(kindUntil(2.6)).toEqual(['guess'])
  })

  it('does not jump at setting up', () => {
    expect(buildLevelLine(falling, [{ day: 2, kind: 'set-up' }], 7).jumps).toEqual([])
  })

  it('reads the log in any order', () => {
    expect(buildLevelLine([...falling].reverse(), [], 7)).toEqual(buildLevelLine(falling, [], 7))
  })

  it('keeps the later of two readings of one moment', () => {
    expect(levelOn(buildLevelLine([{ day: 1, levelCm: 10 }, { day: 1, levelCm: 12 }, { day: 2, levelCm: 11 }], [], 2), 1)).toBe(12)
  })
})

describe('monotone interpolation', () => {
  it('is a straight line through points of a straight line', () => {
    const curve = monotoneCurve([{ at: 0, value: 10 }, { at: 3, value: 7 }, { at: 8, value: 2 }])
    expect(curveAt(curve, 5)).toBeCloseTo(5, 9)
  })

  it('keeps a flat part flat beside a steep one', () => {
    const curve = monotoneCurve([{ at: 0, value: 10 }, { at: 1, value: 10 }, { at: 2, value: 0 }])
    expect(curveAt(curve, 0.5)).toBe(10)
  })
})
