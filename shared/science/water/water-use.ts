import { stopLineLitres } from '../vessel/stop-line'

/**
 * Mean use of one vessel, L a day: litres drunk over days.
 *
 * @param litresDrunk 0 or more
 * @param days above 0
 * @throws RangeError when an argument is outside its interval
 * @source common practice, no source
 */
export function meanLitresPerDay(litresDrunk: number, days: number): number {
  checkFrom0('litresDrunk', litresDrunk)
  checkAbove0('days', days)
  return litresDrunk / days
}

/**
 * Days until the stop line at a steady use, (V − Vmin) / use, with Vmin a tenth
 * of the start volume; 0 once the line is reached. A guide, not a promise: use
 * about doubles when light and dryness of the air both double.
 *
 * @param litresNow 0 or more
 * @param startLitres volume at set-up, 0 or more
 * @param litresPerDay above 0
 * @throws RangeError when an argument is outside its interval
 * @source kratky-2004 Acta Hort. 648:83-89, abstract, the 10 % line
 */
export function daysToStopLine(litresNow: number, startLitres: number, litresPerDay: number): number {
  checkFrom0('litresNow', litresNow)
  checkAbove0('litresPerDay', litresPerDay)
  return Math.max(0, litresNow - stopLineLitres(startLitres)) / litresPerDay
}

/**
 * Least and most water a tomato needs for each kilogram of fruit, L/kg.
 * A trial in aerated water found 120 to 325 where yields were poor.
 *
 * @source kratky-2005-tomatoes as quoted: 25 to 40 L/kg
 */
export const TOMATO_LITRES_PER_KG = { low: 25, high: 40 } as const

/**
 * Water a tomato needs for its fruit, L: what to size a vessel by that nobody refills.
 *
 * @param fruitKg 0 or more
 * @throws RangeError when the mass is negative or not finite
 * @source kratky-2005-tomatoes as quoted: 25 to 40 L/kg
 */
export function tomatoLitres(fruitKg: number): { low: number, high: number } {
  checkFrom0('fruitKg', fruitKg)
  return { low: TOMATO_LITRES_PER_KG.low * fruitKg, high: TOMATO_LITRES_PER_KG.high * fruitKg }
}

function checkFrom0(name: string, value: number): void {
  if (!Number.isFinite(value) || value < 0) throw new RangeError(`${name} must be a finite number from 0 up`)
}

function checkAbove0(name: string, value: number): void {
  if (!Number.isFinite(value) || value <= 0) throw new RangeError(`${name} must be a finite number above 0`)
}
