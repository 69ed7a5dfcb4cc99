import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { refillLimitCm, type LevelReading } from '#shared/science/vessel/refill-limit'

const DAY_MS = 86_400_000
const cup = { cupBottomCm: 24 }
const unknownCup = { cupBottomCm: null }

/** One reading a day, in the order given. */
function daily(...levels: number[]): LevelReading[] {
  return levels.map((levelCm, day) => ({ atMs: day * DAY_MS, levelCm }))
}

// Kratky 2004, Acta Hort. 648:83-89, abstract: once the level has left the pot,
// raising it above 2 cm may injure the plant. The 2 below are that number.
describe('refillLimitCm', () => {
  it('sets no limit while the cup still touches the water', () => {
    expect(refillLimitCm(daily(26, 25, 24), cup)).toBeNull()
    expect(refillLimitCm([], cup)).toBeNull()
    expect(refillLimitCm([], unknownCup)).toBeNull()
  })

  it('lies 2 cm above the lowest level since roots hung free', () => {
    expect(refillLimitCm(daily(26, 22, 18, 15), cup)).toBe(17)
  })

  it('is not lifted by a refill, nor by one that went past it', () => {
    expect(refillLimitCm(daily(26, 15, 17, 16.5), cup)).toBe(17)
    expect(refillLimitCm(daily(26, 15, 24, 23), cup)).toBe(17)
  })

  it('never reaches back to above the bottom of the cup', () => {
    expect(refillLimitCm(daily(26, 23.5), cup)).toBe(24)
  })

  it('takes readings in any order', () => {
    expect(refillLimitCm(daily(26, 22, 15).reverse(), cup)).toBe(17)
    expect(refillLimitCm(daily(26, 22, 15).reverse(), unknownCup)).toBe(17)
  })

  it('falls to 2 cm when the vessel ran dry', () => {
    expect(refillLimitCm(daily(26, 10, 0), cup)).toBe(2)
  })

  // What a change of the solution does is common practice, no source.
  describe('at a solution change', () => {
    const before = daily(26, 20, 14)

    it('keeps counting the lowest level before it', () => {
      expect(refillLimitCm([...before, { atMs: 3 * DAY_MS, levelCm: 22, solutionChange: true }], cup)).toBe(16)
    })

    it('counts a lower level after it', () => {
      expect(refillLimitCm([...before, { atMs: 3 * DAY_MS, levelCm: 11, solutionChange: true }], cup)).toBe(13)
    })

    it('does not take the emptied vessel for a level that roots lived with', () => {
      expect(refillLimitCm([...before, { atMs: 3 * DAY_MS, levelCm: 0, solutionChange: true }], cup)).toBe(16)
    })

    it('counts levels of a grower who writes them down at changes only', () => {
      const changes = daily(26, 21, 19).map(reading => ({ ...reading, solutionChange: true }))
      expect(refillLimitCm(changes, cup)).toBe(21)
    })
  })

  describe('with a cup nobody measured', () => {
    it('takes the earliest reading for the cup', () => {
      expect(refillLimitCm(daily(20), unknownCup)).toBeNull()
      expect(refillLimitCm(daily(20, 21), unknownCup)).toBeNull()
      expect(refillLimitCm(daily(20, 19), unknownCup)).toBe(20)
      expect(refillLimitCm(daily(20, 12), unknownCup)).toBe(14)
    })
  })

  it('refuses a level or a cup that cannot be', () => {
    expect(() => refillLimitCm(daily(-1), cup)).toThrow(/levelCm/)
    expect(() => refillLimitCm(daily(20, Number.NaN), cup)).toThrow(/levelCm/)
    expect(() => refillLimitCm(daily(20), { cupBottomCm: -2 })).toThrow(/cupBottomCm/)
  })

  const readings = fc.array(
    fc.record({
      atMs: fc.integer({ min: 0, max: 1e12 }),
      levelCm: fc.double({ min: 0, max: 60, noNaN: true }),
      solutionChange: fc.boolean(),
    }),
    { minLength: 1, maxLength: 30 },
  )

  it('only ever sinks as more is written down', () => {
    fc.assert(fc.property(readings, readings, (earlier, later) => {
      const before = refillLimitCm(earlier, cup)
      const after = refillLimitCm([...earlier, ...later], cup)
      if (before !== null) expect(after).toBeLessThanOrEqual(before)
    }))
  })

  it('never lies above the cup nor more than 2 cm above any level roots hung over', () => {
    fc.assert(fc.property(readings, (levels) => {
      const limit = refillLimitCm(levels, cup)
      if (limit === null) return
      expect(limit).toBeLessThanOrEqual(cup.cupBottomCm)
      levels.filter(level => level.levelCm > 0).forEach((level) => {
        expect(limit).toBeLessThanOrEqual(level.levelCm + 2)
      })
    }))
  })
})
