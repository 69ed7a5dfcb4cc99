import { brimLitres, litresAtLevel } from './level-to-litres'
import type { VesselMeasures } from './vessel-measures'

/** 60 halvings of the tallest vessel leave less than a millionth of a millionth of a centimetre. */
const HALVINGS = 60

/** A level just under the rim can round to a volume this share above the volume at the rim. */
const ROUNDING_SHARE = 1e-14

/**
 * Level at which the vessel holds `litres`, cm above the floor: the inverse of
 * the frustum and the prismatoid. Volume rises with level all the way, so
 * halving the interval always closes in on the one level.
 *
 * @param litres from 0 to the brim volume
 * @throws RangeError when the volume is outside that interval or a measure is not above 0
 * @source crc-mathematical-tables frustum of a right circular cone; prismatoid, inverted numerically
 */
export function levelAtLitres(measures: VesselMeasures, litres: number): number {
  const brim = brimLitres(measures)
  if (!(litres >= 0 && litres <= brim * (1 + ROUNDING_SHARE))) {
    throw new RangeError(`litres must be from 0 to ${brim}, the volume at the rim`)
  }
  if (litres === 0) return 0
  if (litres >= brim) return measures.heightCm
  let low = 0
  let high = measures.heightCm
  for (let step = 0; step < HALVINGS; step += 1) {
    const middle = (low + high) / 2
    if (litresAtLevel(measures, middle) < litres) low = middle
    else high = middle
  }
  return (low + high) / 2
}
