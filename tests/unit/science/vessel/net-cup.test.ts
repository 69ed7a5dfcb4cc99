import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { airGapCm, cupBottomCm, cupImmersionCm, levelFromAirGapCm } from '#shared/science/vessel/net-cup'

describe('cupBottomCm', () => {
  // Bucket 14 in high, rim of the cup level with the rim of the bucket: plain subtraction.
  it.each([
    [4, 10], [4.25, 9.75], [4.5, 9.5], [4.75, 9.25], [5, 9], [5.5, 8.5],
  ])('hangs a cup of %d in at %d in', (depthInches, bottomInches) => {
    expect(cupBottomCm(14 * 2.54, depthInches * 2.54)).toBeCloseTo(bottomInches * 2.54, 10)
  })

  it('refuses a cup deeper than the vessel and a measure of nothing', () => {
    expect(() => cupBottomCm(30, 30.1)).toThrow(/at most 30/)
    expect(() => cupBottomCm(30, 0)).toThrow(RangeError)
    expect(() => cupBottomCm(0, 5)).toThrow(RangeError)
    expect(() => cupBottomCm(Number.NaN, 5)).toThrow(RangeError)
  })
})

describe('air gap and immersion', () => {
  it('has no gap while the cup touches the water', () => {
    expect(airGapCm(24, 24)).toBe(0)
    expect(airGapCm(24, 27)).toBe(0)
    expect(cupImmersionCm(24, 27)).toBe(3)
  })

  it('has a gap and no immersion once the water has left the cup', () => {
    expect(airGapCm(24, 20.5)).toBe(3.5)
    expect(cupImmersionCm(24, 20.5)).toBe(0)
  })

  it('refuses heights below the floor', () => {
    expect(() => airGapCm(24, -1)).toThrow(/levelCm/)
    expect(() => airGapCm(-1, 24)).toThrow(/bottomCm/)
    expect(() => cupImmersionCm(Number.NaN, 3)).toThrow(RangeError)
    expect(() => levelFromAirGapCm(24, 24.1)).toThrow(/from 0 to 24/)
    expect(() => levelFromAirGapCm(24, -0.1)).toThrow(/from 0 to 24/)
  })

  const height = fc.double({ min: 0, max: 500, noNaN: true })

  it('comes back to the level it was measured at', () => {
    fc.assert(fc.property(height, height, (one, other) => {
      const [levelCm, bottomCm] = [Math.min(one, other), Math.max(one, other)]
      expect(Math.abs(levelFromAirGapCm(bottomCm, airGapCm(bottomCm, levelCm)) - levelCm)).toBeLessThan(1e-9)
    }))
  })

  it('is never both: air below the cup and cup in the water', () => {
    fc.assert(fc.property(height, height, (bottomCm, levelCm) => {
      expect(Math.min(airGapCm(bottomCm, levelCm), cupImmersionCm(bottomCm, levelCm))).toBe(0)
      expect(Math.max(airGapCm(bottomCm, levelCm), cupImmersionCm(bottomCm, levelCm))).toBe(Math.abs(bottomCm - levelCm))
    }))
  })
})
