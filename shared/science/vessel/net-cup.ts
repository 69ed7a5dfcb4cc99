/**
 * Height of the net cup's bottom above the floor of the vessel, cm: the cup
 * hangs from the lid with its rim level with the rim of the vessel.
 *
 * @param vesselHeightCm inside height of the vessel, above 0
 * @param cupDepthCm from rim to bottom of the cup, above 0 and not deeper than the vessel
 * @throws RangeError when the cup does not fit or a measure is not above 0
 * @source common practice, no source
 */
export function cupBottomCm(vesselHeightCm: number, cupDepthCm: number): number {
  if (!Number.isFinite(vesselHeightCm) || vesselHeightCm <= 0) {
    throw new RangeError('vesselHeightCm must be a finite number above 0')
  }
  if (!(cupDepthCm > 0 && cupDepthCm <= vesselHeightCm)) {
    throw new RangeError(`cupDepthCm must be above 0 and at most ${vesselHeightCm}, the height of the vessel`)
  }
  return vesselHeightCm - cupDepthCm
}

/**
 * Air between the bottom of the net cup and the water, cm; 0 while the cup
 * touches the water. The roots that cross it become the ones that breathe.
 *
 * @param bottomCm height of the cup's bottom above the floor, 0 or more
 * @param levelCm depth of the solution above the floor, 0 or more
 * @throws RangeError when a height is negative or not finite
 * @source kratky-2010 page 1, the moist air space between pot and solution
 */
export function airGapCm(bottomCm: number, levelCm: number): number {
  checkHeight('bottomCm', bottomCm)
  checkHeight('levelCm', levelCm)
  return Math.max(0, bottomCm - levelCm)
}

/**
 * Depth of the cup in the water, cm; 0 once the water has left it.
 * Publications start a seedling with 1.3 to 5 cm of its pot in the water.
 *
 * @param bottomCm height of the cup's bottom above the floor, 0 or more
 * @param levelCm depth of the solution above the floor, 0 or more
 * @throws RangeError when a height is negative or not finite
 * @source kratky-2004 lower 2 cm or more
 * @source kratky-2010 page 1, about half an inch
 */
export function cupImmersionCm(bottomCm: number, levelCm: number): number {
  checkHeight('bottomCm', bottomCm)
  checkHeight('levelCm', levelCm)
  return Math.max(0, levelCm - bottomCm)
}

/**
 * Depth of the solution for an air gap that was measured from the cup, cm.
 *
 * @param bottomCm height of the cup's bottom above the floor, 0 or more
 * @param gapCm from the cup's bottom down to the water, 0 to `bottomCm`
 * @throws RangeError when the gap would end below the floor or a height is negative
 * @source common practice, no source
 */
export function levelFromAirGapCm(bottomCm: number, gapCm: number): number {
  checkHeight('bottomCm', bottomCm)
  if (!(gapCm >= 0 && gapCm <= bottomCm)) {
    throw new RangeError(`gapCm must be from 0 to ${bottomCm}, the height of the cup's bottom`)
  }
  return bottomCm - gapCm
}

function checkHeight(name: string, heightCm: number): void {
  if (!Number.isFinite(heightCm) || heightCm < 0) throw new RangeError(`${name} must be a finite number from 0 up`)
}
