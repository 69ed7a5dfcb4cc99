import { describe, expect, it } from 'vitest'
import { emptyVesselFields } from '#shared/domain/vessel.schema'
import { cutMeasuresOf } from '~/utils/plant/cut-measures'
import { cupBottomOf, gapOf, levelOf, litresIn } from '~/utils/plant/vessel-water'

const bucket = {
  ...emptyVesselFields, name: 'Grey bucket', shape: 'round' as const, topLengthCm: 20, bottomLengthCm: 20, heightCm: 30, netCupRimCm: 8, netCupDepthCm: 6,
}

describe('level and gap', () => {
  it('follow from each other where the cup was measured', () => {
    expect(levelOf({ airGapCm: 4 }, bucket)).toBe(20)
    expect(gapOf({ waterLevelCm: 20 }, bucket)).toBe(4)
    expect([levelOf({ airGapCm: 4 }, null), gapOf({ waterLevelCm: 20 }, null)]).toEqual([null, null])
  })

  it('are taken as read when both were', () => {
    expect(levelOf({ waterLevelCm: 19, airGapCm: 4 }, bucket)).toBe(19)
    expect(gapOf({ waterLevelCm: 19, airGapCm: 4 }, bucket)).toBe(4)
  })

  it('say nothing of a gap that does not fit the vessel, or of none at all', () => {
    expect([levelOf({ airGapCm: 24.5 }, bucket), levelOf({ airGapCm: 0 }, bucket), levelOf({}, bucket)]).toEqual([null, null, null])
  })

  it('know no cup that is deeper than its vessel', () => {
    const wrong = { ...bucket, netCupDepthCm: 31 }
    expect(cupBottomOf(wrong)).toBeNull()
    expect(cutMeasuresOf(wrong)).toEqual({ topCm: 20, bottomCm: 20, heightCm: 30, cupRimCm: 8 })
  })
})

describe('litres', () => {
  it('are those of a cylinder in a straight bucket', () => {
    // pi * 10^2 * 20 cm3
    expect(litresIn(bucket, 20)).toBeCloseTo(6.283, 3)
  })

  it('are not told above the rim, without a level or without measures', () => {
    expect([litresIn(bucket, 30.5), litresIn(bucket, null), litresIn(emptyVesselFields, 10), litresIn(null, 10)]).toEqual([null, null, null, null])
  })
})
