/** Lets `limit` pieces of work run at once; the others wait for their turn, in order. */
export function atMost(limit: number): <T>(work: () => Promise<T>) => Promise<T> {
  let running = 0
  const waiting: (() => void)[] = []

  return async function inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (running >= limit) await new Promise<void>(resolve => waiting.push(resolve))
    else running += 1
    try {
      return await work()
    } finally {
      const next = waiting.shift()
      // The place is handed on, so that nobody who comes in between can take it.
      if (next) next()
      else running -= 1
    }
  }
}
