/** One row of the timeline: a day with entries, or the days between two of them. */
export type RailRow =
  | { kind: 'day', day: number, fromDay: number, toDay: number }
  | { kind: 'gap', days: number, fromDay: number, toDay: number }

/**
 * Rows from the newest down, so that every slice of the rail spans exactly the
 * time its cards stand for and the next slice goes on where it ends.
 * `untilDay` is now.
 */
export function railRows(days: readonly number[], untilDay: number): RailRow[] {
  const sorted = [...new Set(days)].sort((a, b) => b - a)
  const rows: RailRow[] = []
  let top = untilDay
  for (const day of sorted) {
    const end = day + 1
    const quiet = Math.floor(top + 1e-9) - end
    if (quiet >= 1 || (rows.length === 0 && top > end)) rows.push({ kind: 'gap', days: Math.max(0, quiet), fromDay: end, toDay: top })
    // The present day ends now, not at midnight, but keeps some room when it has only begun.
    const toDay = rows.length === 0 ? Math.max(top, day + 0.05) : end
    rows.push({ kind: 'day', day, fromDay: day, toDay })
    top = day
  }
  return rows
}
