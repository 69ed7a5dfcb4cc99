/** Longest pause between two tries, ms. */
export const PAUSE_MAX_MILLISECONDS = 5 * 60_000
const PAUSE_FIRST_MILLISECONDS = 1_000

/**
 * How long to wait before trying again: a random share of a span that doubles
 * with each failure, so that many phones that lost the same server do not come
 * back at the same moment. There is no last try.
 *
 * @param failures how many tries failed in a row, 1 or more
 * @param random from 0 up to, not including, 1
 * @param retryAfterSeconds what the server asked for, or null
 * @returns milliseconds
 */
export function pauseBeforeRetry(failures: number, random: number, retryAfterSeconds: number | null): number {
  const span = Math.min(PAUSE_MAX_MILLISECONDS, PAUSE_FIRST_MILLISECONDS * 2 ** Math.min(failures, 20))
  return Math.max(random * span, (retryAfterSeconds ?? 0) * 1_000)
}
