import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { CROP_IDS } from '#shared/science/crops/crop-ids'
import { relativeYieldPercent } from '#shared/science/crops/salinity-yield'

// Maas & Hoffman 1977, J. Irrig. Drain. Div. ASCE 103:115. Thresholds and slopes
// are values from memory; the yields are computed from them by hand.
describe('relativeYieldPercent', () => {
  it('of pepper at 3.0 dS/m is 79.0 %', () => {
    expect(Math.abs((relativeYieldPercent('pepper', 3.0) ?? 0) - 79.0)).toBeLessThan(0.1)
  })

  it('of tomato at 5.0 dS/m is 75.25 %', () => {
    expect(Math.abs((relativeYieldPercent('tomato', 5.0) ?? 0) - 75.25)).toBeLessThan(0.1)
  })

  it('is whole up to the threshold and nothing where the line has ended', () => {
    expect(relativeYieldPercent('strawberry', 1.0)).toBe(100)
    expect(relativeYieldPercent('strawberry', 40)).toBe(0)
  })

  it('is not known for a crop without published values', () => {
    expect(relativeYieldPercent('sage', 2)).toBeNull()
  })

  it('refuses a conductivity that cannot be', () => {
    expect(() => relativeYieldPercent('tomato', -0.1)).toThrow(RangeError)
    expect(() => relativeYieldPercent('sage', Number.NaN)).toThrow(RangeError)
  })

  it('never rises with salt', () => {
    const salt = fc.double({ min: 0, max: 60, noNaN: true })
    fc.assert(fc.property(fc.constantFrom(...CROP_IDS), salt, salt, (cropId, one, other) => {
      const less = relativeYieldPercent(cropId, Math.min(one, other))
      const more = relativeYieldPercent(cropId, Math.max(one, other))
      if (less !== null) expect(more).toBeLessThanOrEqual(less)
    }))
  })
})
