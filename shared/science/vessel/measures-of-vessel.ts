import type { VesselMeasures } from './vessel-measures'

/** What a vessel's record says of its measures; null is a measure nobody took. */
export type RecordedMeasures = {
  readonly shape: 'round' | 'rectangular' | 'unmeasured'
  /** Diameter of a round vessel, length of a rectangular one. */
  readonly topLengthCm: number | null
  readonly topWidthCm: number | null
  readonly bottomLengthCm: number | null
  readonly bottomWidthCm: number | null
  readonly heightCm: number | null
}

/**
 * The measures to compute a vessel with, or null when one that its shape needs
 * was not taken. Nothing is guessed: a floor 1 cm narrower than a rim of 28 cm
 * already takes 3.5 % off the volume.
 *
 * @source common practice, no source
 */
export function measuresOfVessel(vessel: RecordedMeasures): VesselMeasures | null {
  const { shape, topLengthCm, topWidthCm, bottomLengthCm, bottomWidthCm, heightCm } = vessel
  if (shape === 'unmeasured' || topLengthCm === null || bottomLengthCm === null || heightCm === null) return null
  if (shape === 'round') {
    return { shape, topDiameterCm: topLengthCm, bottomDiameterCm: bottomLengthCm, heightCm }
  }
  if (topWidthCm === null || bottomWidthCm === null) return null
  return { shape, topLengthCm, topWidthCm, bottomLengthCm, bottomWidthCm, heightCm }
}
