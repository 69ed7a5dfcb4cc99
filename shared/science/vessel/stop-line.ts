import { levelAtLitres } from './litres-to-level'
import type { VesselMeasures } from './vessel-measures'

/**
 * Share of the start volume at which a crop is ended or its solution changed.
 *
 * @source kratky-2004 Acta Hort. 648:83-89, abstract: end below 10 % of the solution
 */
export const STOP_LINE_SHARE = 0.1

/**
 * Volume at the stop line, L: a tenth of what the vessel started with.
 *
 * @param startLitres volume at set-up, 0 or more
 * @throws RangeError when the volume is negative or not finite
 * @source kratky-2004 Acta Hort. 648:83-89, abstract
 */
export function stopLineLitres(startLitres: number): number {
  if (!Number.isFinite(startLitres) || startLitres < 0) {
    throw new RangeError('startLitres must be a finite number from 0 up')
  }
  return STOP_LINE_SHARE * startLitres
}

/**
 * Level at the stop line, cm above the floor.
 *
 * @param startLitres volume at set-up, from 0 to ten times the brim volume
 * @throws RangeError when the volume is outside that interval or a measure is not above 0
 * @source kratky-2004 Acta Hort. 648:83-89, abstract
 */
export function stopLineLevelCm(measures: VesselMeasures, startLitres: number): number {
  return levelAtLitres(measures, stopLineLitres(startLitres))
}
