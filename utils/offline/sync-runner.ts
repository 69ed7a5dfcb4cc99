import { pauseBeforeRetry } from '#shared/sync/retry'
import type { Surroundings } from './ports'
import type { CycleOutcome } from './sync-cycle'

/**
 * Decides when to sync. States: idle → running → idle, or → waiting (tries again
 * by itself) or → stopped (signed out, other account, update needed: a person
 * acts, then `kick`). A kick while running makes it run once more afterwards.
 */
export type RunnerState =
  | { kind: 'idle' }
  | { kind: 'running' }
  | { kind: 'elsewhere' }
  | { kind: 'waiting', why: 'unreachable' | 'server', untilMilliseconds: number }
  | { kind: 'stopped', why: 'signed-out' | 'other-account' | 'update-needed' | 'store' }

export type RunnerPorts = {
  /** One whole round: text first, then photos. */
  cycle: () => Promise<CycleOutcome>
  around: Surroundings
  /** Runs `work` unless another tab holds the lock; tells whether it ran. */
  withLock: (work: () => Promise<void>) => Promise<boolean>
  setTimer: (work: () => void, milliseconds: number) => () => void
  tell: (state: RunnerState) => void
}

/** While the app is open it looks for news this often. */
const REGULAR_MILLISECONDS = 60_000

export function createSyncRunner(ports: RunnerPorts) {
  let running = false
  let again = false
  let closed = false
  let failures = 0
  let cancelTimer: (() => void) | null = null

  /** Syncs now, or once more after the round that is going on. */
  function kick(): void {
    if (closed) return
    if (running) {
      again = true
      return
    }
    running = true
    cancelTimer?.()
    void round().finally(() => {
      running = false
      if (again) {
        again = false
        kick()
      }
    })
  }

  async function round(): Promise<void> {
    const ran = await ports.withLock(async () => {
      ports.tell({ kind: 'running' })
      settle(await outcomeOfCycle())
    })
    if (ran || closed) return
    ports.tell({ kind: 'elsewhere' })
    schedule(REGULAR_MILLISECONDS)
  }

  async function outcomeOfCycle(): Promise<CycleOutcome | { kind: 'store' }> {
    try {
      return await ports.cycle()
    } catch {
      return { kind: 'store' }
    }
  }

  function settle(outcome: CycleOutcome | { kind: 'store' }): void {
    if (closed) return
    if (outcome.kind === 'done') {
      failures = 0
      ports.tell({ kind: 'idle' })
      schedule(REGULAR_MILLISECONDS)
    } else if (outcome.kind === 'wait') {
      failures += 1
      const pause = pauseBeforeRetry(failures, ports.around.random(), outcome.retryAfterSeconds)
      ports.tell({ kind: 'waiting', why: outcome.why, untilMilliseconds: ports.around.now() + pause })
      schedule(pause)
    } else {
      ports.tell({ kind: 'stopped', why: outcome.kind })
      if (outcome.kind === 'store') schedule(REGULAR_MILLISECONDS)
    }
  }

  function schedule(milliseconds: number): void {
    cancelTimer?.()
    cancelTimer = ports.setTimer(kick, milliseconds)
  }

  function close(): void {
    closed = true
    cancelTimer?.()
  }

  return { kick, close }
}

export type SyncRunner = ReturnType<typeof createSyncRunner>
