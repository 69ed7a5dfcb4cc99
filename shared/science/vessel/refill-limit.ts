/** One reading of the depth of the solution in the vessel the plant stands in now. */
export type LevelReading = {
  readonly atMs: number
  readonly levelCm: number
  /** True when the solution was changed during the visit. */
  readonly solutionChange?: boolean
}

export type RefillOptions = {
  /** Height of the net cup's bottom above the floor; null when the cup was not measured. */
  readonly cupBottomCm: number | null
}

/**
 * How far the level may be raised once roots have learnt to breathe, cm.
 *
 * @source kratky-2004 Acta Hort. 648:83-89, abstract: raising the level above 2 cm may injure the plant
 */
export const REFILL_RISE_CM = 2

/**
 * Highest level to refill to without drowning roots that live in air, cm above
 * the floor: 2 cm above the lowest level since the roots first hung free, and
 * never back to the net cup. Null while no root hangs free.
 *
 * - Roots hang free from the first level below the bottom of the cup. With a cup
 *   nobody measured, from the first level below the earliest reading, and that
 *   reading takes the place of the cup: the cautious choice, as the limit then
 *   errs towards too little water.
 * - A solution change lifts nothing. The same roots come back into the new
 *   solution, so the lowest level before it keeps counting, and the level after
 *   it counts like any other. Only a level of 0 read at a change is passed over:
 *   it is the emptied vessel, and nothing grew in those minutes.
 * - A refill past the limit does not lift it either: that the plant was put at
 *   risk once makes no root safe.
 *
 * The 2 cm are published. The cup as upper end, and what a change does, are
 * common practice, no source.
 *
 * @param levels readings from one vessel, in any order; 0 or more, finite
 * @throws RangeError when a level or the cup's height is negative or not finite
 * @source kratky-2004 Acta Hort. 648:83-89, abstract
 */
export function refillLimitCm(levels: readonly LevelReading[], options: RefillOptions): number | null {
  const readings = levels
    .filter(reading => !(reading.solutionChange === true && reading.levelCm === 0))
    .sort((one, other) => one.atMs - other.atMs)
  const ceiling = options.cupBottomCm ?? readings[0]?.levelCm
  if (ceiling === undefined) return null
  checkHeight('cupBottomCm', ceiling)
  readings.forEach(reading => checkHeight('levelCm', reading.levelCm))
  const lowest = Math.min(...readings.map(reading => reading.levelCm))
  return lowest < ceiling ? Math.min(lowest + REFILL_RISE_CM, ceiling) : null
}

function checkHeight(name: string, heightCm: number): void {
  if (!Number.isFinite(heightCm) || heightCm < 0) throw new RangeError(`${name} must be a finite number from 0 up`)
}
