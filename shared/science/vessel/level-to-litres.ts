import { checkMeasures, type RectangularMeasures, type RoundMeasures, type VesselMeasures } from './vessel-measures'

const CUBIC_CM_PER_LITRE = 1_000

/**
 * Volume of the solution when it stands `levelCm` above the floor, L.
 *
 * Round: frustum of a cone, V = π y / 12 (Db² + Db D + D²), D = Db + (Dt − Db) y / H.
 * Rectangular: prismatoid, V = y / 6 (A(0) + 4 A(y/2) + A(y)), sides linear in height.
 * y: level, H: inside height, Db and Dt: inside diameter at floor and rim, all cm.
 * Exact for straight walls; ribs, feet and round corners are not counted.
 *
 * @param levelCm from 0 to the height of the vessel
 * @throws RangeError when the level is outside that interval or a measure is not above 0
 * @source crc-mathematical-tables frustum of a right circular cone; prismatoid
 */
export function litresAtLevel(measures: VesselMeasures, levelCm: number): number {
  checkMeasures(measures)
  if (!(levelCm >= 0 && levelCm <= measures.heightCm)) {
    throw new RangeError(`levelCm must be from 0 to ${measures.heightCm}, the height of the vessel`)
  }
  const cubicCm = measures.shape === 'round' ? frustum(measures, levelCm) : prismatoid(measures, levelCm)
  return cubicCm / CUBIC_CM_PER_LITRE
}

/**
 * Volume of the vessel filled to its rim, L.
 *
 * @throws RangeError when a measure is not above 0
 * @source crc-mathematical-tables frustum of a right circular cone; prismatoid
 */
export function brimLitres(measures: VesselMeasures): number {
  return litresAtLevel(measures, measures.heightCm)
}

function frustum(measures: RoundMeasures, levelCm: number): number {
  const floor = measures.bottomDiameterCm
  const surface = sideAt(floor, measures.topDiameterCm, levelCm / measures.heightCm)
  return (Math.PI * levelCm / 12) * (floor ** 2 + floor * surface + surface ** 2)
}

function prismatoid(measures: RectangularMeasures, levelCm: number): number {
  const areaAt = (heightCm: number) => {
    const share = heightCm / measures.heightCm
    return sideAt(measures.bottomLengthCm, measures.topLengthCm, share)
      * sideAt(measures.bottomWidthCm, measures.topWidthCm, share)
  }
  return (levelCm / 6) * (areaAt(0) + 4 * areaAt(levelCm / 2) + areaAt(levelCm))
}

function sideAt(bottomCm: number, topCm: number, share: number): number {
  return bottomCm + (topCm - bottomCm) * share
}
