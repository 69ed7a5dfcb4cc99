import { describe, expect, it } from 'vitest'
import { measuresOfVessel, type RecordedMeasures } from '#shared/science/vessel/measures-of-vessel'

const bucket: RecordedMeasures = {
  shape: 'round', topLengthCm: 28.5, topWidthCm: null, bottomLengthCm: 26, bottomWidthCm: null, heightCm: 35.5,
}
const tote: RecordedMeasures = {
  shape: 'rectangular', topLengthCm: 71, topWidthCm: 47, bottomLengthCm: 63.5, bottomWidthCm: 39, heightCm: 34,
}

describe('measuresOfVessel', () => {
  it('reads lengths of a round vessel as diameters', () => {
    expect(measuresOfVessel(bucket)).toEqual({
      shape: 'round', topDiameterCm: 28.5, bottomDiameterCm: 26, heightCm: 35.5,
    })
  })

  it('needs no width of a round vessel and ignores one', () => {
    expect(measuresOfVessel({ ...bucket, topWidthCm: 12 })).toEqual(measuresOfVessel(bucket))
  })

  it('takes all five measures of a rectangular vessel', () => {
    expect(measuresOfVessel(tote)).toEqual(tote)
  })

  it.each(['topLengthCm', 'bottomLengthCm', 'heightCm'] as const)('gives nothing for a round vessel without %s', (field) => {
    expect(measuresOfVessel({ ...bucket, [field]: null })).toBeNull()
  })

  it.each([
    'topLengthCm', 'topWidthCm', 'bottomLengthCm', 'bottomWidthCm', 'heightCm',
  ] as const)('gives nothing for a rectangular vessel without %s', (field) => {
    expect(measuresOfVessel({ ...tote, [field]: null })).toBeNull()
  })

  it('gives nothing for a vessel that nobody measured, even when numbers are left in it', () => {
    expect(measuresOfVessel({ ...bucket, shape: 'unmeasured' })).toBeNull()
  })
})
