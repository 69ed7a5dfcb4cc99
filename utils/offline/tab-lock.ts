/** After so long without an end, a lock is taken from its holder: some browsers keep locks of pages that are gone. */
const STEAL_MILLISECONDS = 60_000

/**
 * Lets one tab at a time run `work`. Nothing depends on it for correctness;
 * where a browser has no locks every tab runs.
 *
 * @returns false when another tab was at it
 */
export async function withTabLock(name: string, work: () => Promise<void>): Promise<boolean> {
  if (!navigator.locks) {
    await work()
    return true
  }
  const ran = await navigator.locks.request(name, { ifAvailable: true }, async (lock) => {
    if (lock) await workFor(name, work)
    return lock !== null
  })
  if (ran || !isStale(name)) return ran
  return navigator.locks.request(name, { steal: true }, async () => {
    await workFor(name, work)
    return true
  })
}

const beatKey = (name: string) => `stillroot-${name}-beat`

async function workFor(name: string, work: () => Promise<void>): Promise<void> {
  const beat = () => localStorage.setItem(beatKey(name), String(Date.now()))
  beat()
  const timer = setInterval(beat, STEAL_MILLISECONDS / 6)
  try {
    await work()
  } finally {
    clearInterval(timer)
  }
}

function isStale(name: string): boolean {
  const last = Number(localStorage.getItem(beatKey(name)) ?? 0)
  return Math.abs(Date.now() - last) > STEAL_MILLISECONDS
}
