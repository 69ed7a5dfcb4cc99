const TICK_MILLISECONDS = 10_000

/** An end that was foreseen: its text is for the person at the keyboard, and a stack would not help them. */
export class Refusal extends Error {}

/** @param {string} text */
export function say(text) {
  process.stdout.write(`${text}\n`)
}

/** @param {number} milliseconds */
export function inWords(milliseconds) {
  const seconds = milliseconds / 1000
  if (seconds < 10) return `${seconds.toFixed(1)} s`
  if (seconds < 120) return `${Math.round(seconds)} s`
  return `${Math.floor(seconds / 60)} min ${Math.round(seconds % 60)} s`
}

/**
 * Says what begins, that it still goes on, and how long it took.
 * @template T
 * @param {string} label
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(label, work) {
  const started = performance.now()
  const elapsed = () => inWords(performance.now() - started)
  say(`${label} …`)
  const ticker = setInterval(() => say(`  still at it, ${elapsed()}`), TICK_MILLISECONDS)
  try {
    const result = await work()
    say(`  done in ${elapsed()}`)
    return result
  } finally {
    clearInterval(ticker)
  }
}

/** @param {unknown} error */
export function explain(error) {
  if (error instanceof Refusal) return error.message
  return error instanceof Error ? error.stack ?? error.message : String(error)
}
