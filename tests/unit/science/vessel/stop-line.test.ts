import { describe, expect, it } from 'vitest'
import { stopLineLevelCm, stopLineLitres } from '#shared/science/vessel/stop-line'

// Kratky 2004, Acta Hort. 648:83-89, abstract: end the crop below 10 % of the solution.
describe('stop line', () => {
  it('of 13.25 L is 1.325 L', () => {
    expect(Math.abs(stopLineLitres(13.25) - 1.325)).toBeLessThan(0.001)
  })

  it('stands at a tenth of the start level in a straight vessel', () => {
    const levelCm = stopLineLevelCm({ shape: 'round', topDiameterCm: 20, bottomDiameterCm: 20, heightCm: 30 }, 2.5 * Math.PI)
    expect(levelCm).toBeCloseTo(2.5, 9)
  })

  it('refuses a start volume that cannot be', () => {
    expect(() => stopLineLitres(-1)).toThrow(RangeError)
    expect(() => stopLineLitres(Number.POSITIVE_INFINITY)).toThrow(RangeError)
  })
})
