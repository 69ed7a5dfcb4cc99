import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { PAUSE_MAX_MILLISECONDS, pauseBeforeRetry } from '#shared/sync/retry'

describe('pauseBeforeRetry', () => {
  it('doubles its span with each failure', () => {
    expect([1, 2, 3, 4].map(failures => pauseBeforeRetry(failures, 0.5, null))).toEqual([1_000, 2_000, 4_000, 8_000])
  })

  it('never waits longer than its longest pause by itself, however often it failed', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 1e9 }), fc.double({ min: 0, max: 0.999, noNaN: true }), (failures, random) => {
      expect(pauseBeforeRetry(failures, random, null)).toBeLessThan(PAUSE_MAX_MILLISECONDS)
    }))
  })

  it('waits at least as long as the server asked', () => {
    expect(pauseBeforeRetry(1, 0, 30)).toBe(30_000)
  })
})
