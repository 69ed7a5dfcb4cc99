import type { LevelLine } from '../waterline/level-line'
import { number } from './numbers'
import { dayWords } from './moments'

const STEP_LIMIT = 40

/** The rail in words, for those who hear it: each reading and each jump, newest first. */
export function waterlineSentences(line: LevelLine, limitCm: number | null, locale?: string): string[] {
  const cm = (value: number): string => `${number(value, 1, locale)} cm`
  const readings = line.readings.map(({ day, levelCm }) => ({ day, order: 1, text: `${dayWords(Math.floor(day))}: water ${cm(levelCm)}.` }))
  // The plant drank since the reading before, so a refill that ends no higher is still a refill.
  const jumps = line.jumps.map(({ day, fromCm, toCm }) => ({
    day, order: 0, text: `${dayWords(Math.floor(day))}: filled ${toCm > fromCm ? `from ${cm(fromCm)} ` : ''}to ${cm(toCm)}.`,
  }))
  const told = [...readings, ...jumps].sort((a, b) => b.day - a.day || b.order - a.order).slice(0, STEP_LIMIT).map(one => one.text)
  const limit = limitCm === null ? [] : [`Refill limit: ${cm(limitCm)}. Roots above it breathe air.`]
  return [...limit, ...told]
}
