import { counted } from './numbers'

/** "4 days since the last look"; null when nobody has looked yet. */
export function lookWords(daysSince: number | null, locale?: string): string {
  if (daysSince === null) return 'No look yet'
  // A visit may carry a time of later today, or of tomorrow by a clock that runs ahead.
  if (daysSince <= 0) return 'Looked today'
  return `${counted(daysSince, 'day', 'days', locale)} since the last look`
}

/** Most forgotten first; a plant that nobody has looked at counts from its day 0. */
export function byForgotten<T extends { id: string, data: { name: string } }>(daysSinceOf: (plant: T) => number) {
  return (left: T, right: T): number => (
    daysSinceOf(right) - daysSinceOf(left) || left.data.name.localeCompare(right.data.name) || left.id.localeCompare(right.id)
  )
}
