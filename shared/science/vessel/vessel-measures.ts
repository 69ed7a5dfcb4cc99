/** Inside measures of a vessel whose wall is straight from floor to rim, cm. */
export type VesselMeasures = RoundMeasures | RectangularMeasures

export type RoundMeasures = {
  readonly shape: 'round'
  readonly topDiameterCm: number
  readonly bottomDiameterCm: number
  readonly heightCm: number
}

export type RectangularMeasures = {
  readonly shape: 'rectangular'
  readonly topLengthCm: number
  readonly topWidthCm: number
  readonly bottomLengthCm: number
  readonly bottomWidthCm: number
  readonly heightCm: number
}

/**
 * Throws a RangeError when a measure is not a finite number above 0: a vessel
 * without a floor or a height has no level.
 *
 * @source common practice, no source
 */
export function checkMeasures(measures: VesselMeasures): void {
  const sides = measures.shape === 'round'
    ? [measures.topDiameterCm, measures.bottomDiameterCm, measures.heightCm]
    : [measures.topLengthCm, measures.topWidthCm, measures.bottomLengthCm, measures.bottomWidthCm, measures.heightCm]
  if (!sides.every(side => Number.isFinite(side) && side > 0)) {
    throw new RangeError('every measure of a vessel must be a finite number of centimetres above 0')
  }
}
