import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { brimLitres, litresAtLevel } from '#shared/science/vessel/level-to-litres'
import { levelAtLitres } from '#shared/science/vessel/litres-to-level'
import type { VesselMeasures } from '#shared/science/vessel/vessel-measures'

/** Exact by definition: 1 in = 2.54 cm, 1 in³ = 16.387064 mL, 1 US gal = 231 in³ (NIST Handbook 44, appendix C). */
const CM_PER_INCH = 2.54
const LITRES_PER_CUBIC_INCH = 0.016387064
const LITRES_PER_GALLON = 3.785411784

/** Nominal inside measures of a five-gallon bucket; makers differ by 0.3 in. Value from memory. */
const bucket: VesselMeasures = {
  shape: 'round', topDiameterCm: 11.25 * CM_PER_INCH, bottomDiameterCm: 10.25 * CM_PER_INCH, heightCm: 14 * CM_PER_INCH,
}

/** Nominal inside measures of a storage tote. Value from memory. */
const tote: VesselMeasures = {
  shape: 'rectangular',
  topLengthCm: 28 * CM_PER_INCH, topWidthCm: 18.5 * CM_PER_INCH,
  bottomLengthCm: 25 * CM_PER_INCH, bottomWidthCm: 15.5 * CM_PER_INCH, heightCm: 13.5 * CM_PER_INCH,
}

// Computed by hand from the frustum and prismatoid of CRC Standard Mathematical
// Tables, not by this code; the tolerance is the rounding of the hand-typed value.
describe('litresAtLevel against values computed from the textbook formula', () => {
  it('fills the bucket to 1271.6 in³, 5.505 US gal', () => {
    // Deviation seen: 0.04 in³.
    expect(Math.abs(brimLitres(bucket) / LITRES_PER_CUBIC_INCH - 1271.6)).toBeLessThan(0.2)
    expect(Math.abs(brimLitres(bucket) / LITRES_PER_GALLON - 5.505)).toBeLessThan(0.002)
  })

  it('fills a frustum of 20 and 30 cm, 30 cm high, to 14922.6 cm³', () => {
    const litres = brimLitres({ shape: 'round', bottomDiameterCm: 20, topDiameterCm: 30, heightCm: 30 })
    expect(Math.abs(litres * 1000 - 14922.6)).toBeLessThan(0.5)
  })

  it('fills a cylinder of 10 in, 12 in high, to 942.48 in³', () => {
    const litres = brimLitres({ shape: 'round', bottomDiameterCm: 25.4, topDiameterCm: 25.4, heightCm: 30.48 })
    expect(Math.abs(litres / LITRES_PER_CUBIC_INCH - 942.48)).toBeLessThan(0.01)
  })

  it('fills the tote to 6091.9 in³, 26.37 US gal', () => {
    expect(Math.abs(brimLitres(tote) / LITRES_PER_CUBIC_INCH - 6091.9)).toBeLessThan(0.5)
    expect(Math.abs(brimLitres(tote) / LITRES_PER_GALLON - 26.37)).toBeLessThan(0.005)
  })

  it('fills a bucket of 26 and 28.5 cm, 35.5 cm high, to 20.72 L', () => {
    const litres = brimLitres({ shape: 'round', bottomDiameterCm: 26, topDiameterCm: 28.5, heightCm: 35.5 })
    expect(Math.abs(litres - 20.72)).toBeLessThan(0.01)
  })

  it('needs 1.20 L to raise the bucket by 2 cm near a depth of 9 in', () => {
    const depthCm = 9 * CM_PER_INCH
    expect(Math.abs(litresAtLevel(bucket, depthCm + 2) - litresAtLevel(bucket, depthCm) - 1.2)).toBeLessThan(0.03)
  })

  it('reaches half an inch up a cup that hangs 4.5 in down with 3.827 US gal', () => {
    const litres = litresAtLevel(bucket, (14 - 4.5 + 0.5) * CM_PER_INCH)
    expect(Math.abs(litres / LITRES_PER_GALLON - 3.827)).toBeLessThan(0.005)
  })
})

describe('levelAtLitres', () => {
  // Depths of the same bucket, inverted by hand from the frustum.
  it.each([
    [1, 2.75], [2, 5.39], [3, 7.95], [3.25, 8.58], [3.5, 9.2], [3.75, 9.81], [4, 10.42], [4.25, 11.03], [4.5, 11.63], [5, 12.82],
  ])('finds %d US gal at %d in', (gallons, depthInches) => {
    const levelCm = levelAtLitres(bucket, gallons * LITRES_PER_GALLON)
    expect(Math.abs(levelCm / CM_PER_INCH - depthInches)).toBeLessThan(0.02)
  })

  it('is exact at the floor and at the rim', () => {
    expect(levelAtLitres(tote, 0)).toBe(0)
    expect(levelAtLitres(tote, brimLitres(tote))).toBe(tote.heightCm)
  })

  it('refuses less than nothing and more than the vessel holds, naming the interval', () => {
    const round: VesselMeasures = { shape: 'round', topDiameterCm: 20, bottomDiameterCm: 20, heightCm: 10 }
    expect(() => levelAtLitres(round, -0.001)).toThrow(/from 0 to 3\.14/)
    expect(() => levelAtLitres(round, 3.2)).toThrow(/from 0 to 3\.14/)
    expect(() => levelAtLitres(round, Number.NaN)).toThrow(RangeError)
  })
})

describe('what is out of range', () => {
  it.each([-0.001, 35.561, Number.NaN, Number.POSITIVE_INFINITY])('refuses a level of %d cm', (levelCm) => {
    expect(() => litresAtLevel(bucket, levelCm)).toThrow(/from 0 to 35\.56/)
  })

  it.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY])('refuses a vessel with a measure of %d cm', (measure) => {
    expect(() => litresAtLevel({ ...bucket, heightCm: measure }, 0)).toThrow(RangeError)
    expect(() => litresAtLevel({ ...tote, bottomWidthCm: measure }, 0)).toThrow(RangeError)
  })
})

const side = fc.double({ min: 0.1, max: 500, noNaN: true })
const share = fc.double({ min: 0, max: 1, noNaN: true })
const anyVessel: fc.Arbitrary<VesselMeasures> = fc.oneof(
  fc.record({ shape: fc.constant('round' as const), topDiameterCm: side, bottomDiameterCm: side, heightCm: side }),
  fc.record({
    shape: fc.constant('rectangular' as const),
    topLengthCm: side, topWidthCm: side, bottomLengthCm: side, bottomWidthCm: side, heightCm: side,
  }),
)

describe('properties of every vessel', () => {
  it('comes back to the same volume from level to litres to level', () => {
    fc.assert(fc.property(anyVessel, share, (vessel, part) => {
      const litres = litresAtLevel(vessel, part * vessel.heightCm)
      const back = litresAtLevel(vessel, levelAtLitres(vessel, litres))
      expect(Math.abs(back - litres)).toBeLessThanOrEqual(1e-9 * brimLitres(vessel))
    }))
  })

  it('comes back to the same level', () => {
    fc.assert(fc.property(anyVessel, share, (vessel, part) => {
      const levelCm = part * vessel.heightCm
      const back = levelAtLitres(vessel, litresAtLevel(vessel, levelCm))
      expect(Math.abs(back - levelCm)).toBeLessThanOrEqual(1e-6 * vessel.heightCm)
    }))
  })

  it('holds more the higher the level stands', () => {
    fc.assert(fc.property(anyVessel, share, share, (vessel, one, other) => {
      fc.pre(Math.abs(one - other) > 1e-9)
      const [low, high] = [Math.min(one, other), Math.max(one, other)]
      expect(litresAtLevel(vessel, low * vessel.heightCm)).toBeLessThan(litresAtLevel(vessel, high * vessel.heightCm))
    }))
  })

  it('holds the same upside down', () => {
    fc.assert(fc.property(side, side, side, (topDiameterCm, bottomDiameterCm, heightCm) => {
      const upright = brimLitres({ shape: 'round', topDiameterCm, bottomDiameterCm, heightCm })
      const turned = brimLitres({ shape: 'round', topDiameterCm: bottomDiameterCm, bottomDiameterCm: topDiameterCm, heightCm })
      expect(Math.abs(turned - upright)).toBeLessThanOrEqual(1e-12 * upright)
    }))
  })
})
