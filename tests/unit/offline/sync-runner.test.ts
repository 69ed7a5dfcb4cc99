import { describe, expect, it } from 'vitest'
import type { CycleOutcome } from '~/utils/offline/sync-cycle'
import { createSyncRunner } from '~/utils/offline/sync-runner'
import type { RunnerState } from '~/utils/offline/sync-runner'

/** A runner whose cycles, lock and timers the test holds in its hand. */
function setUp(options: { lockFree?: boolean } = {}) {
  const states: RunnerState[] = []
  const timers: { work: () => void, milliseconds: number }[] = []
  const cycles: ((outcome: CycleOutcome) => void)[] = []
  const runner = createSyncRunner({
    cycle: () => new Promise(resolve => cycles.push(resolve)),
    around: { now: () => 0, random: () => 0.5, newId: () => '' },
    async withLock(work) {
      if (options.lockFree === false) return false
      await work()
      return true
    },
    setTimer(work, milliseconds) {
      const timer = { work, milliseconds }
      timers.push(timer)
      return () => timers.splice(timers.indexOf(timer), 1)
    },
    tell: state => states.push(state),
  })
  const settle = () => new Promise(resolve => setTimeout(resolve))
  return { runner, states, timers, cycles, settle }
}

describe('the runner', () => {
  it('runs one cycle at a time, and once more when kicked meanwhile', async () => {
    const { runner, cycles, settle } = setUp()
    runner.kick()
    runner.kick()
    runner.kick()
    await settle()
    expect(cycles).toHaveLength(1)
    cycles[0]?.({ kind: 'done' })
    await settle()
    expect(cycles).toHaveLength(2)
  })

  it('waits longer after each failure, and starts over after a success', async () => {
    const { runner, cycles, timers, settle } = setUp()
    const pauses: number[] = []
    for (let failure = 0; failure < 3; failure += 1) {
      if (failure === 0) runner.kick()
      else timers.at(-1)?.work()
      await settle()
      cycles.at(-1)?.({ kind: 'wait', why: 'unreachable', retryAfterSeconds: null })
      await settle()
      pauses.push(timers.at(-1)?.milliseconds ?? 0)
    }
    expect(pauses).toEqual([1_000, 2_000, 4_000])
  })

  it('stops when a person has to act, and goes on when kicked', async () => {
    const { runner, states, timers, cycles, settle } = setUp()
    runner.kick()
    await settle()
    cycles[0]?.({ kind: 'signed-out' })
    await settle()
    expect(states.at(-1)).toEqual({ kind: 'stopped', why: 'signed-out' })
    expect(timers).toHaveLength(0)
    runner.kick()
    await settle()
    expect(cycles).toHaveLength(2)
  })

  it('leaves the work to the tab that holds the lock, and looks again later', async () => {
    const { runner, states, timers, cycles, settle } = setUp({ lockFree: false })
    runner.kick()
    await settle()
    expect(cycles).toHaveLength(0)
    expect(states).toEqual([{ kind: 'elsewhere' }])
    expect(timers).toHaveLength(1)
  })

  it('says nothing and plans nothing once it is closed', async () => {
    const { runner, states, timers, cycles, settle } = setUp()
    runner.kick()
    await settle()
    runner.close()
    cycles[0]?.({ kind: 'done' })
    await settle()
    expect(states).toEqual([{ kind: 'running' }])
    expect(timers).toHaveLength(0)
  })
})
